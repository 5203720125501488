package slantfall.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import slantfall.declare.CheckInfo;
import slantfall.declare.CheckResult;
import slantfall.declare.Panel;
import slantfall.declare.PanelResult;
import slantfall.declare.Side;
import slantfall.declare.Verdict;
import slantfall.quantity.Kind;
import slantfall.quantity.UnitSystem;
import slantfall.source.Mark;
import slantfall.source.Source;

class LadderFigureTest {

    private static final Source INVENTED = Source.of("invented", "Invented for this test", Mark.COMMON_PRACTICE);

    static List<String> names() {
        return new ArrayList<>(Cases.all().keySet());
    }

    private static CheckResult rule(String author, Kind kind, double value, double limit, boolean inRange) {
        CheckInfo info = CheckInfo.log(
                new CheckInfo.Criterion("p", author, "Author " + author, "Re ≤ limit", "any"), kind, Side.AT_MOST, INVENTED);
        double margin = info.margin(value, limit);
        return new CheckResult(info, Verdict.of(margin, info.near()), value, limit, margin, inRange, "a thing is unknown", false);
    }

    private static PanelResult panel(CheckResult... rules) {
        return PanelResult.of(new Panel("p", "Does it?", "calm", "wild", Panel.Sort.REGIME), List.of(rules), null);
    }

    private static RecordingPen drawn(PanelResult panel) {
        LadderFigure figure = new LadderFigure(panel, UnitSystem.SI);
        Rect area = new Rect(0, 0, 640, figure.height());
        RecordingPen pen = new RecordingPen();
        figure.draw(pen, area);
        BoardPropertyTest.check(pen, area);
        assertThat(BoardPropertyTest.meetings(pen)).isEmpty();
        return pen;
    }

    @ParameterizedTest
    @MethodSource("names")
    void everyPanelOfEverySetUpIsDrawnWithAllItsRules(String name) {
        for (PanelResult panel : Cases.assess(Cases.all().get(name)).panels()) {
            RecordingPen pen = drawn(panel);
            for (CheckResult r : panel.results()) {
                assertThat(pen.texts).anyMatch(t -> t.startsWith(r.info().name().substring(0, 5)));
                assertThat(pen.texts).contains(r.verdict().shape() + " " + r.verdict().word());
            }
        }
    }

    /** 4Γ/μ = 1600 and Γ/μ = 400 are one limit, so their marks lie above each other. */
    @Test
    void multiplesOfOneReynoldsNumberShareTheAxis() {
        CheckResult one = rule("a", Kind.REYNOLDS_FILM, 30, 400, true);
        CheckResult four = rule("b", Kind.REYNOLDS_FILM_4, 120, 1600, true);
        LadderAxis axis = LadderAxis.of(List.of(one, four));
        assertThat(axis.mode()).isEqualTo(LadderAxis.Mode.QUANTITY);
        assertThat(axis.limit(four)).isCloseTo(400, within(1e-9));
        assertThat(axis.value(four)).isCloseTo(30, within(1e-9));
        assertThat(drawn(panel(one, four)).texts).contains("this set-up 30.0", "Reynolds number Γ/μ");
    }

    @Test
    void differentQuantitiesAreShownAsValueOverLimit() {
        CheckResult film = rule("a", Kind.REYNOLDS_FILM, 30, 400, true);
        CheckResult surface = rule("b", Kind.REYNOLDS_SURFACE, 45, 500, true);
        LadderAxis axis = LadderAxis.of(List.of(film, surface));
        assertThat(axis.mode()).isEqualTo(LadderAxis.Mode.RATIO);
        assertThat(axis.value(surface)).isCloseTo(0.09, within(1e-12));
        assertThat(drawn(panel(film, surface)).texts).contains("value over limit").noneMatch(t -> t.startsWith("this set-up"));
    }

    @Test
    void aValueOfZeroIsShownByItsMargin() {
        assertThat(LadderAxis.of(List.of(rule("a", Kind.REYNOLDS_FILM, 0, 400, true))).mode()).isEqualTo(LadderAxis.Mode.MARGIN);
        assertThat(drawn(panel(rule("a", Kind.REYNOLDS_FILM, 0, 400, true))).texts)
                .contains("margin, 0 at the limit, clear to the right; ends mean more");
    }

    @Test
    void outOfRangeIsSaidAndNotInked() {
        RecordingPen pen = drawn(panel(rule("a", Kind.REYNOLDS_FILM, 500, 400, false)));
        assertThat(pen.texts).anyMatch(t -> t.startsWith("outside its range"));
        assertThat(pen.marks).noneMatch(m -> m.ink() == Ink.CROSSED || m.ink() == Ink.CLEAR);
        assertThat(drawn(panel(rule("a", Kind.REYNOLDS_FILM, 500, 400, true))).marks).anyMatch(m -> m.ink() == Ink.CROSSED);
    }

    @Test
    void unknownSaysWhy() {
        RecordingPen pen = drawn(panel(rule("a", Kind.REYNOLDS_FILM, Double.NaN, 400, true)));
        assertThat(pen.texts).contains("a thing is unknown", "○ unknown");
    }

    @Test
    void logarithmicTicks() {
        assertThat(LogTicks.of(0.9, 60, 6)).containsExactly(1.0, 2.0, 5.0, 10.0, 20.0, 50.0);
        assertThat(LogTicks.of(1, 1e6, 20)).hasSize(7);
        assertThat(LogTicks.of(1e-3, 1e9, 5)).hasSizeBetween(3, 5);
        assertThat(LogTicks.label(1000)).isEqualTo("1000");
        assertThat(LogTicks.label(0.02)).isEqualTo("0.02");
    }
}
