package slantfall.declare;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class MarginTest {

    @Test
    void oneMeansAFactorOfE() {
        assertThat(Margin.atMostLog(1, Math.E)).isCloseTo(1, within(1e-15));
        assertThat(Margin.atMostLog(Math.E, 1)).isCloseTo(-1, within(1e-15));
        assertThat(Margin.atLeastLog(Math.E, 1)).isCloseTo(1, within(1e-15));
    }

    @Test
    void aLimitOfZeroCannotBeMetAndAFeedOfZeroIsFarClear() {
        assertThat(Margin.atMostLog(5, 0)).isEqualTo(-20);
        assertThat(Margin.atMostLog(0, 0)).isEqualTo(20);
        assertThat(Margin.atMostLog(0, 5)).isEqualTo(20);
        assertThat(Margin.atLeastLog(0, 5)).isEqualTo(-20);
        assertThat(Margin.atLeastLog(5, 0)).isEqualTo(20);
    }

    @Test
    void unknownStaysUnknown() {
        assertThat(Margin.atMostLog(Double.NaN, 1)).isNaN();
        assertThat(Margin.atLeastLog(1, Double.NaN)).isNaN();
        assertThat(Margin.of(Side.AT_MOST, Scale.LINEAR, 1, Double.NaN, 1)).isNaN();
        assertThat(Verdict.of(Double.NaN, 0.1)).isEqualTo(Verdict.UNKNOWN);
    }

    @Test
    void linearMarginsAreScaledByTheSpanAndClamped() {
        assertThat(Margin.of(Side.AT_MOST, Scale.LINEAR, 4, 1, 3)).isEqualTo(0.5);
        assertThat(Margin.of(Side.AT_LEAST, Scale.LINEAR, 4, 1, 3)).isEqualTo(-0.5);
        assertThat(Margin.of(Side.AT_LEAST, Scale.LINEAR, 1e-9, 1, 3)).isEqualTo(-20);
    }

    @Test
    void nearIsClearButBelowATenth() {
        assertThat(Verdict.of(0, 0.1)).isEqualTo(Verdict.NEAR);
        assertThat(Verdict.of(0.0999, 0.1)).isEqualTo(Verdict.NEAR);
        assertThat(Verdict.of(0.1, 0.1)).isEqualTo(Verdict.CLEAR);
        assertThat(Verdict.of(-1e-12, 0.1)).isEqualTo(Verdict.CROSSED);
    }

    @Test
    void aRequirementThatContradictsItselfIsRefused() {
        assertThatThrownBy(() -> new Requirement("thickness", 2, 1, 0, "", "", ""))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("thickness");
        assertThatThrownBy(() -> new Requirement("thickness", Double.NaN, Double.NaN, 0, "", "", ""))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void aRequirementKeepsItsMargin() {
        Reading thickness = Reading.positive("thickness", "Film thickness", "h", slantfall.quantity.Kind.LENGTH, "");
        Requirement most = new Requirement("thickness", Double.NaN, 1e-3, 0.25, "", "", "");
        assertThat(most.margin(thickness, 0.8e-3)).isCloseTo(0, within(1e-12));
        Requirement least = new Requirement("thickness", 1e-3, Double.NaN, 0.25, "", "", "");
        assertThat(least.margin(thickness, 1.25e-3)).isCloseTo(0, within(1e-12));
        Requirement both = new Requirement("thickness", 1e-3, 2e-3, 0, "", "", "");
        assertThat(both.margin(thickness, 1.1e-3)).isCloseTo(Math.log(1.1), within(1e-12));
        assertThat(both.margin(thickness, 3e-3)).isNegative();
    }

    @Test
    void marginsInWordsSayHowFarTheValueMayMove() {
        assertThat(words(Side.AT_MOST, Math.log(1.12))).isEqualTo("12 % in hand");
        assertThat(words(Side.AT_LEAST, Math.log(2))).isEqualTo("50 % in hand");
        assertThat(words(Side.AT_MOST, -Math.log(1.3))).isEqualTo("over by 30 %");
        assertThat(words(Side.AT_LEAST, -Math.log(2))).isEqualTo("short by 50 %");
        assertThat(words(Side.AT_MOST, Math.log(8))).isEqualTo("factor 8.0 in hand");
        assertThat(words(Side.AT_MOST, -20)).isEqualTo("nothing in hand");
    }

    private static String words(Side side, double margin) {
        CheckInfo info = CheckInfo.log(
                new CheckInfo.Criterion("p", "a", "n", "f", "r"),
                slantfall.quantity.Kind.LENGTH,
                side,
                slantfall.source.Source.of("k", "c", slantfall.source.Mark.COMPUTED));
        return MarginWords.of(new CheckResult(info, Verdict.of(margin, 0.1), 1, 1, margin, true, "", false));
    }
}
