package slantfall.arrangement;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import slantfall.declare.Assessment;
import slantfall.declare.LiquidBase;
import slantfall.declare.Profile;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.flow.Physics;
import slantfall.flow.film.NewtonianFilm;
import slantfall.flow.slot.NewtonianSlot;

/** Mass balance, limits and symmetry of films and slots over random set-ups. */
class FlowPropertyTest {

    private static SetUp liquid(String arrangement, double viscosity) {
        return SetUp.blank(arrangement, LiquidBase.measured())
                .with("liquid.density", Value.of(1200))
                .with("liquid.viscosity", Value.of(viscosity));
    }

    /** Boole's rule on the 41 points of a traverse, exact for the parabola. */
    private static double integral(Profile profile) {
        double[] y = profile.axis().values();
        double[] u = profile.column("velocity").orElseThrow().values();
        double step = y[1] - y[0];
        double sum = 0;
        for (int i = 0; i + 4 < y.length; i += 4) {
            sum += 2 * step / 45 * (7 * u[i] + 32 * u[i + 1] + 12 * u[i + 2] + 32 * u[i + 3] + 7 * u[i + 4]);
        }
        return sum;
    }

    @Property(tries = 300)
    void theFilmsProfileCarriesTheFeed(
            @ForAll @Scale(12) @DoubleRange(min = 0.01, max = 1.57) double angle,
            @ForAll @Scale(12) @DoubleRange(min = 1e-4, max = 1) double feed,
            @ForAll @Scale(12) @DoubleRange(min = 0.01, max = 10) double viscosity,
            @ForAll @Scale(12) @DoubleRange(min = -20, max = 20) double shear) {
        Assessment a = new InclinedFilm().assess(liquid("inclined-film", viscosity)
                .with("angle", Value.of(angle))
                .with("feed", Value.of(feed))
                .with("interfacialShear", Value.of(shear)));
        double h = a.value("thickness");
        // Where gas drags uphill the flow is the small difference of two large terms.
        double terms = feed / 1200 + Math.abs(shear) * h * h / (2 * viscosity);
        assertThat(integral(a.profiles().traverses())).isCloseTo(feed / 1200, within(1e-12 * terms));
        double balance = 1200 * Physics.G * Math.sin(angle) * h + shear;
        assertThat(a.value("wallShear")).isCloseTo(balance, within(1e-12 * (Math.abs(balance) + Math.abs(shear))));
    }

    @Property(tries = 300)
    void theSlotsProfileCarriesTheFlow(
            @ForAll @Scale(12) @DoubleRange(min = -1.57, max = 1.57) double angle,
            @ForAll @Scale(12) @DoubleRange(min = 1e-4, max = 0.05) double gap,
            @ForAll @Scale(12) @DoubleRange(min = 0.3, max = 3) double ratio,
            @ForAll @Scale(12) @DoubleRange(min = -1e5, max = 1e5) double drop,
            @ForAll @Scale(12) @DoubleRange(min = -2, max = 2) double wall) {
        Assessment a = new ClosedSlot().assess(liquid("closed-slot", 0.5)
                .with("angle", Value.of(angle))
                .with("gap", Value.of(gap))
                .with("gapOutlet", Value.of(gap * ratio))
                .with("pressureDrop", Value.of(drop))
                .with("wallSpeed", Value.of(wall)));
        double q = a.value("flowPerWidth");
        double scale = Math.abs(q) + Math.abs(wall * gap);
        assertThat(integral(a.profiles().traverses())).isCloseTo(q, within(1e-9 * scale));
        double[] p = a.profiles().courses().column("pressure").orElseThrow().values();
        double narrow = gap * Math.min(1, ratio);
        double terms = Math.abs(drop) + 1e5 + 6 * 0.5 * 0.5 * (Math.abs(wall) + 2 * Math.abs(q) / narrow) / (narrow * narrow);
        assertThat(p[0] - p[p.length - 1]).isCloseTo(drop, within(1e-12 * terms));
        for (double pressure : p) {
            assertThat(a.value("lowestPressure")).isLessThanOrEqualTo(pressure + 1e-9 * terms);
        }
    }

    /** A film is half a slot of twice its depth with no stress in the middle: a quarter of the slot's flow at equal depth. */
    @Property(tries = 100)
    void aFilmIsHalfASlotOfTwiceItsDepth(
            @ForAll @Scale(12) @DoubleRange(min = 1e-4, max = 0.1) double h, @ForAll @Scale(12) @DoubleRange(min = 1e-3, max = 100) double mu) {
        double gradient = 5000;
        double film = NewtonianFilm.flow(gradient, mu, 0, h);
        assertThat(NewtonianSlot.flow(gradient, mu, 2 * h, 0) / 2).isCloseTo(film, within(1e-13 * film));
        assertThat(NewtonianSlot.flow(gradient, mu, h, 0) * 4).isCloseTo(film, within(1e-13 * film));
    }

    @Property(tries = 200)
    void thicknessAndFlowAreInverse(
            @ForAll @Scale(12) @DoubleRange(min = 1e-9, max = 1) double flow,
            @ForAll @Scale(12) @DoubleRange(min = 1e-4, max = 1e3) double mu,
            @ForAll @Scale(12) @DoubleRange(min = -1e3, max = 1e3) double shear) {
        double h = NewtonianFilm.thickness(8000, mu, shear, flow);
        assertThat(h).isPositive();
        double back = NewtonianFilm.flow(8000, mu, shear, h);
        double terms = 8000 * h * h * h / (3 * mu);
        assertThat(back).isCloseTo(flow, within(1e-12 * (flow + terms)));
    }

    /** Turning the slot upside down and the drive around turns every signed reading around. */
    @Property(tries = 200)
    void aSlotIsSymmetric(
            @ForAll @Scale(12) @DoubleRange(min = 0.01, max = 1.57) double angle,
            @ForAll @Scale(12) @DoubleRange(min = -1e5, max = 1e5) double drop,
            @ForAll @Scale(12) @DoubleRange(min = -2, max = 2) double wall) {
        Assessment down = new ClosedSlot().assess(slot(angle, drop, wall));
        Assessment up = new ClosedSlot().assess(slot(-angle, -drop, -wall));
        for (String key : new String[] {"flow", "flowPerWidth", "meanVelocity", "maxVelocity", "wallShearLower", "wallShearUpper"}) {
            double value = down.value(key);
            assertThat(up.value(key)).as(key).isCloseTo(-value, within(1e-12 * Math.abs(value)));
        }
        assertThat(up.value("viscousHeating")).isNaN();
    }

    private static SetUp slot(double angle, double drop, double wall) {
        return liquid("closed-slot", 0.5)
                .with("angle", Value.of(angle))
                .with("pressureDrop", Value.of(drop))
                .with("wallSpeed", Value.of(wall));
    }

    @Property(tries = 100)
    void moreFeedMakesAThickerFilm(
            @ForAll @Scale(12) @DoubleRange(min = 1e-4, max = 5) double feed,
            @ForAll @Scale(12) @DoubleRange(min = 0.01, max = 1.57) double angle,
            @ForAll @Scale(12) @DoubleRange(min = -5, max = 5) double shear) {
        SetUp setUp = liquid("inclined-film", 1e-3)
                .with("angle", Value.of(angle))
                .with("interfacialShear", Value.of(shear));
        double thin = new InclinedFilm().assess(setUp.with("feed", Value.of(feed))).value("thickness");
        double thick = new InclinedFilm().assess(setUp.with("feed", Value.of(feed * 1.1))).value("thickness");
        assertThat(thick).isGreaterThan(thin);
    }
}
