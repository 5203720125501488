package slantfall.declare;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

class PanelResultTest {

    private static final Panel LIMIT = new Panel("wetting", "Does the wall stay wet?", "wet", "dry", Panel.Sort.LIMIT);
    private static final Panel REGIME = new Panel("regime", "?", "laminar", "turbulent", Panel.Sort.REGIME);

    private static CheckResult result(double margin, boolean inRange) {
        CheckInfo info = CheckInfo.log(
                new CheckInfo.Criterion("wetting", "a", "n", "f", "r"), Kind.LENGTH, Side.AT_MOST,
                Source.of("k", "c", Mark.COMPUTED));
        return new CheckResult(info, Verdict.of(margin, 0.1), 1, 1, margin, inRange, "", false);
    }

    private static List<CheckResult> results(double... margins) {
        List<CheckResult> list = new ArrayList<>();
        for (double m : margins) {
            list.add(result(m, true));
        }
        return list;
    }

    private static String phrase(Panel panel, List<CheckResult> results, CheckResult house) {
        return PanelResult.of(panel, results, house).phrase();
    }

    @Test
    void theFourPhrases() {
        CheckResult met = result(0.5, true);
        CheckResult missed = result(-0.5, true);
        assertThat(phrase(LIMIT, results(1, 2), met)).isEqualTo("clear of all");
        assertThat(phrase(LIMIT, results(1, -2), met)).isEqualTo("meets your rule, others dispute");
        assertThat(phrase(LIMIT, results(1, -2), missed)).isEqualTo("below your rule, others allow");
        assertThat(phrase(LIMIT, results(-1, -2), missed)).isEqualTo("below all");
    }

    @Test
    void withoutAHouseRuleItCounts() {
        assertThat(phrase(LIMIT, results(1, 2, -1), null)).isEqualTo("2 of 3 clear");
        assertThat(phrase(LIMIT, results(1, 2), null)).isEqualTo("clear of all 2");
        assertThat(phrase(REGIME, results(1, -2), null)).isEqualTo("laminar by 1 of 2, turbulent by 1");
        assertThat(phrase(REGIME, results(-1, -2), null)).isEqualTo("turbulent by all 2");
    }

    @Test
    void unknownAndOutOfRangeRulesAreLeftOut() {
        List<CheckResult> list = results(1, Double.NaN);
        list.add(result(-3, false));
        assertThat(phrase(LIMIT, list, null)).isEqualTo("wet");
        assertThat(phrase(LIMIT, List.of(result(-3, false)), null)).isEqualTo("no rule applies here");
    }
}
