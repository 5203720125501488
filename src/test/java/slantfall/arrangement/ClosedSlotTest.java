package slantfall.arrangement;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.declare.Verdict;
import slantfall.store.Presets;

class ClosedSlotTest extends ArrangementContract {

    private static final LiquidBase WATER = LiquidBase.of(Presets.load().find("water").orElseThrow());

    @Override
    Arrangement arrangement() {
        return new ClosedSlot();
    }

    @Override
    List<SetUp> setUps() {
        return List.of(SetUp.blank(ClosedSlot.KEY, WATER), measured(ClosedSlot.KEY));
    }

    @Override
    Set<String> mayBeUnknown() {
        return Set.of();
    }

    private static SetUp slot(double gap, double viscosity, double angleDegrees) {
        return SetUp.blank(ClosedSlot.KEY, LiquidBase.measured())
                .with("liquid.density", Value.of(1000))
                .with("liquid.viscosity", Value.of(viscosity))
                .with("liquid.conductivity", Value.of(0.6))
                .with("angle", Value.of(Math.toRadians(angleDegrees)))
                .with("gap", Value.of(gap))
                .with("length", Value.of(0.5));
    }

    /** Row 5.CP.q of the published table. */
    @Test
    void reproducesTheTabulatedSlot() {
        Assessment a = arrangement().assess(slot(0.001, 0.1, 20)
                .with("pressureDrop", Value.of(2000))
                .with("wallSpeed", Value.of(0.05)));
        assertThat(a.value("flowPerWidth")).isCloseTo(3.112839319878723e-05, within(1e-15));
        double gradient = 2000 / 0.5 + 1000 * 9.80665 * Math.sin(Math.toRadians(20));
        assertThat(a.value("wallShearLower")).isCloseTo(gradient * 0.0005 + 5, within(1e-9));
        assertThat(a.value("wallShearUpper")).isCloseTo(5 - gradient * 0.0005, within(1e-9));
    }

    /** Row 5.taper.q of the published table. */
    @Test
    void reproducesTheTabulatedTaper() {
        Assessment a = arrangement().assess(slot(0.0012, 0.1, 20)
                .with("gapOutlet", Value.of(0.0008))
                .with("pressureDrop", Value.of(2000))
                .with("wallSpeed", Value.of(0.05)));
        assertThat(a.value("flowPerWidth")).isCloseTo(2.96479271720023e-05, within(1e-15));
    }

    /** Reference number of the job description: 1 mm, 10 mPa s, 30°, gravity only. */
    @Test
    void reproducesTheReferenceSlotAndAQuarterOfTheFilm() {
        double q = arrangement().assess(slot(0.001, 0.01, 30)).value("flowPerWidth");
        assertThat(q).isCloseTo(4.086e-5, within(0.0005e-5));
    }

    /** physics.md section 5: a vertical slot widening from 0.8 to 1.2 mm falls 739 Pa below both ends. */
    @Test
    void findsTheLowestPressureInsideAWideningSlot() {
        SetUp setUp = SetUp.blank(ClosedSlot.KEY, WATER)
                .with("liquid.temperature", Value.of(293.15))
                .with("angle", Value.of(Math.PI / 2))
                .with("gap", Value.of(0.8e-3))
                .with("gapOutlet", Value.of(1.2e-3))
                .with("length", Value.of(0.5));
        Assessment a = arrangement().assess(setUp);
        assertThat(a.value("lowestPressure") - 101325).isCloseTo(-739, within(2.0));
        assertThat(a.notices()).anyMatch(n -> n.about().equals("lowestPressure"));
    }

    @Test
    void nothingDrivingGivesNoFlow() {
        Assessment a = arrangement().assess(slot(0.001, 0.01, 0));
        assertThat(a.value("flow")).isZero();
        assertThat(a.value("slotReynolds")).isZero();
        assertThat(a.value("residenceMean")).isNaN();
        assertThat(a.value("entryLength")).isNaN();
    }

    @Test
    void outletAboveInletRunsBackwards() {
        Assessment a = arrangement().assess(slot(0.001, 0.01, -30));
        assertThat(a.value("flow")).isNegative();
        assertThat(a.value("slotReynolds")).isPositive();
    }

    @Test
    void reversalOfPartOfTheProfileIsFlagged() {
        Assessment a = arrangement().assess(slot(0.001, 0.1, 0)
                .with("wallSpeed", Value.of(0.1))
                .with("pressureDrop", Value.of(-0.5 * 7 * 0.1 * 0.1 / 1e-6)));
        assertThat(a.check("profile.couette-poiseuille").orElseThrow().verdict()).isEqualTo(Verdict.CROSSED);
        double least = java.util.Arrays.stream(
                        a.profiles().traverses().column("velocity").orElseThrow().values())
                .min()
                .orElseThrow();
        assertThat(least).isNegative();
    }

    /** μU²/8k for drag alone, 3μu_m²/4k for pressure alone (physics.md section 5). */
    @Test
    void viscousHeatingMatchesTheTwoLimits() {
        Assessment drag = arrangement().assess(slot(0.001, 0.1, 0).with("wallSpeed", Value.of(2)));
        assertThat(drag.value("viscousHeating")).isCloseTo(0.1 * 4 / 8 / 0.6, within(1e-12));
        Assessment pressure = arrangement().assess(slot(0.001, 0.1, 0).with("pressureDrop", Value.of(1e5)));
        double mean = pressure.value("flowPerWidth") / 0.001;
        assertThat(pressure.value("viscousHeating")).isCloseTo(0.75 * 0.1 * mean * mean / 0.6, within(1e-9));
    }

    /** Square duct: 0.4217 of the wide slot (Shah and London 1978). */
    @Test
    void sideWallsOfASquare() {
        Assessment a = arrangement().assess(slot(0.01, 1, 30).with("width", Value.of(0.01)));
        assertThat(a.value("sideWallFactor")).isCloseTo(0.42173104486546664, within(1e-12));
        assertThat(a.value("flow")).isCloseTo(a.value("flowPerWidth") * 0.01 * 0.42173104486546664, within(1e-15));
    }

    @Test
    void aVanishingTaperEqualsTheUniformSlot() {
        SetUp uniform = slot(0.01, 1, 30).with("width", Value.of(0.03)).with("wallSpeed", Value.of(0.01));
        SetUp taper = uniform.with("gapOutlet", Value.of(0.01 * (1 + 1e-9)));
        for (String key : List.of("flow", "flowPerWidth", "wallShearLower", "wallShearUpper", "viscousHeating")) {
            double expected = arrangement().assess(uniform).value(key);
            assertThat(arrangement().assess(taper).value(key)).as(key).isCloseTo(expected, within(1e-7 * Math.abs(expected)));
        }
    }

    @Test
    void outletGapFollowsTheGapUntilTouched() {
        SetUp setUp = slot(0.002, 1, 30);
        Assessment a = arrangement().assess(setUp);
        double[] gap = a.profiles().courses().column("gap").orElseThrow().values();
        assertThat(gap[gap.length - 1]).isEqualTo(0.002);
    }
}
