package slantfall.arrangement;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.HouseRule;
import slantfall.declare.LiquidBase;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.declare.Verdict;
import slantfall.store.Presets;

class InclinedFilmTest extends ArrangementContract {

    private static final LiquidBase WATER = LiquidBase.of(Presets.load().find("water").orElseThrow());

    @Override
    Arrangement arrangement() {
        return new InclinedFilm();
    }

    @Override
    List<SetUp> setUps() {
        return List.of(
                SetUp.blank(InclinedFilm.KEY, WATER),
                measured(InclinedFilm.KEY),
                SetUp.blank(InclinedFilm.KEY, WATER).withChoice("thicknessLaw", "kapitza"));
    }

    @Override
    Set<String> mayBeUnknown() {
        // A film dragged uphill has no residence; one beyond laminar no profile.
        return Set.of("residenceMean", "residenceMin", "surfaceVelocity", "filmReynoldsSurface");
    }

    private static SetUp film(double angleDegrees, double feed) {
        return SetUp.blank(InclinedFilm.KEY, LiquidBase.measured())
                .with("liquid.density", Value.of(1000))
                .with("liquid.viscosity", Value.of(0.001))
                .with("liquid.surfaceTension", Value.of(0.07274))
                .with("angle", Value.of(Math.toRadians(angleDegrees)))
                .with("feed", Value.of(feed));
    }

    /** Values 1.N.* of the project's published table: Nusselt's film at 30°, 0.05 kg/(m s). */
    @Test
    void reproducesTheTabulatedFilm() {
        Assessment a = arrangement().assess(film(30, 0.05));
        assertThat(a.value("thickness")).isCloseTo(0.0003127520701616317, within(1e-14));
        assertThat(a.value("meanVelocity")).isCloseTo(0.1598710440962382, within(1e-11));
        assertThat(a.value("surfaceVelocity")).isCloseTo(0.2398065661443576, within(1e-11));
        assertThat(a.value("wallShear")).isCloseTo(1.5335250444252824, within(1e-10));
        assertThat(a.value("filmReynolds4")).isCloseTo(200, within(1e-9));
        assertThat(a.value("filmReynoldsSurface")).isCloseTo(75, within(1e-9));
        assertThat(a.value("waveVelocity")).isCloseTo(3 * 0.1598710440962382, within(1e-10));
    }

    /** Reference numbers of the job description: water at 20 °C, 0.1 kg/(m s), vertical. */
    @Test
    void reproducesTheReferenceFilmOfWater() {
        SetUp setUp = SetUp.blank(InclinedFilm.KEY, WATER)
                .with("angle", Value.of(Math.PI / 2))
                .with("feed", Value.of(0.1))
                .with("liquid.temperature", Value.of(293.15));
        Assessment a = arrangement().assess(setUp);
        assertThat(a.value("thickness")).isCloseTo(0.3133e-3, within(0.00005e-3));
        assertThat(a.value("meanVelocity")).isCloseTo(0.3197, within(0.0001));
        assertThat(a.value("surfaceVelocity")).isCloseTo(0.4796, within(0.0001));
        assertThat(a.value("waveVelocity")).isCloseTo(0.959, within(0.0005));
        assertThat(a.value("wallShear")).isCloseTo(3.067, within(0.001));
        assertThat(a.value("filmReynolds")).isCloseTo(99.8, within(0.05));
        assertThat(a.value("kapitza")).isCloseTo(3389, within(2.0));
    }

    @Test
    void withoutFeedEverythingIsZeroOrExplained() {
        Assessment a = arrangement().assess(film(30, 0));
        for (String key : List.of("thickness", "meanVelocity", "surfaceVelocity", "wallShear", "waveVelocity",
                "filmReynolds", "holdUp")) {
            assertThat(a.value(key)).as(key).isZero();
        }
        assertThat(a.value("residenceMean")).isNaN();
        assertThat(a.value("entryLength")).isNaN();
        assertThat(a.check("onset.benjamin-1957-yih-1963").orElseThrow().margin()).isEqualTo(20);
    }

    @Test
    void horizontalPlateHasNoFilmUnlessGasDragsIt() {
        Assessment none = arrangement().assess(film(0, 0.05));
        assertThat(none.value("thickness")).isNaN();
        assertThat(none.notices()).anyMatch(n -> n.text().contains("No steady film"));
        Assessment dragged = arrangement().assess(film(0, 0.05).with("interfacialShear", Value.of(2)));
        assertThat(dragged.value("thickness")).isCloseTo(Math.sqrt(2 * 0.001 * 5e-5 / 2), within(1e-15));
    }

    @Test
    void gasDragUphillThickensTheFilmAndIsSaid() {
        Assessment a = arrangement().assess(film(30, 0.05).with("interfacialShear", Value.of(-2)));
        double least = 1.5 * 2 / (1000 * 9.80665 * 0.5);
        assertThat(a.value("thickness")).isGreaterThan(least);
        assertThat(a.value("surfaceVelocity")).isNegative();
        assertThat(a.value("residenceMean")).isNaN();
        assertThat(a.check("surface.uphill-gas-drag").orElseThrow().verdict()).isEqualTo(Verdict.CROSSED);
    }

    @Test
    void verticalWallHasNoOnsetLimit() {
        Assessment a = arrangement().assess(film(90, 0.05));
        assertThat(a.check("onset.benjamin-1957-yih-1963").orElseThrow().margin()).isEqualTo(-20);
    }

    @Test
    void thicknessIsContinuousWhereTheLawSwitches() {
        double crossing = Math.pow(0.302, -5) * 0.001;
        double below = arrangement().assess(film(90, crossing * (1 - 1e-9))).value("thickness");
        double above = arrangement().assess(film(90, crossing * (1 + 1e-9))).value("thickness");
        assertThat(above).isCloseTo(below, within(1e-8 * below));
    }

    @Test
    void saysWhetherTheDisputeChangesTheNumber() {
        assertThat(arrangement().assess(film(90, 0.395)).notices())
                .anyMatch(n -> n.text().contains("changes the number"));
        assertThat(arrangement().assess(film(90, 1.0)).notices())
                .anyMatch(n -> n.about().equals("thicknessLaw") && n.text().contains("the choice of law changes"));
    }

    @Test
    void requirementAndHouseRuleBecomeChecks() {
        SetUp setUp = film(30, 0.05)
                .withRequirements(List.of(new Requirement("thickness", Double.NaN, 0.3e-3, 0, "", "", "0.3 mm")))
                .withHouseRules(java.util.Map.of(
                        "regime", new HouseRule("regime", "regime.brauer-1956-turbulent", 0.25, "25 %")));
        Assessment a = arrangement().assess(setUp);
        assertThat(a.check("requirement.thickness").orElseThrow().verdict()).isEqualTo(Verdict.CROSSED);
        assertThat(a.check("house.regime").orElseThrow().margin())
                .isCloseTo(Math.log(400 / 50.0) - Math.log(1.25), within(1e-12));
        assertThat(a.ownRulesCrossed()).hasSize(1);
    }

    @Test
    void missingSurfaceTensionMakesOnlyItsReadingsUnknown() {
        Assessment a = arrangement().assess(film(90, 0.05).without("liquid.surfaceTension"));
        assertThat(a.value("kapitza")).isNaN();
        assertThat(a.value("thickness")).isPositive();
        assertThat(a.check("waviness.brauer-1956-onset").orElseThrow().verdict()).isEqualTo(Verdict.UNKNOWN);
    }
}
