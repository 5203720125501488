package slantfall.liquid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;

class ViscosityFitTest {

    private static ViscosityFit.Point point(double celsius, double viscosity) {
        return new ViscosityFit.Point(celsius + 273.15, viscosity);
    }

    @Test
    void twoPointsAreMetExactlyAndLeaveNoBand() {
        ViscosityFit fit = ViscosityFit.automatic(List.of(point(40, 1.2), point(20, 7.5)));
        assertThat(fit.kind()).isEqualTo(ViscosityFit.Kind.ANDRADE);
        assertThat(fit.at(293.15)).isCloseTo(7.5, within(1e-12));
        assertThat(fit.at(313.15)).isCloseTo(1.2, within(1e-12));
        assertThat(fit.bandFactor(303.15)).isNaN();
        assertThat(fit.extrapolated(281.15)).isTrue();
        assertThat(fit.extrapolated(303.15)).isFalse();
    }

    /** Scenario of the job description: three points of a syrup, straight fit 22.7 Pa s at 8 °C. */
    @Test
    void theStraightFitOfTheSyrupGivesTheFigureOfTheScenario() {
        ViscosityFit fit = ViscosityFit.of(
                ViscosityFit.Kind.ANDRADE, List.of(point(20, 7.5), point(40, 1.2), point(60, 0.3)));
        assertThat(fit.at(281.15)).isCloseTo(22.7, within(0.05));
        assertThat(fit.bandFactor(281.15)).isGreaterThan(1);
    }

    @Test
    void vftRecoversAHiddenLaw() {
        List<ViscosityFit.Point> points = new ArrayList<>();
        for (double t = 280; t <= 360; t += 10) {
            points.add(new ViscosityFit.Point(t, 2.414e-5 * Math.pow(10, 247.8 / (t - 140))));
        }
        ViscosityFit fit = ViscosityFit.automatic(points);
        assertThat(fit.kind()).isEqualTo(ViscosityFit.Kind.VFT);
        assertThat(fit.t0()).isCloseTo(140, within(0.01));
        assertThat(fit.at(300)).isCloseTo(2.414e-5 * Math.pow(10, 247.8 / 160), within(1e-8));
    }

    @Test
    void badPointsAreNamed() {
        assertThatThrownBy(() -> ViscosityFit.automatic(List.of(point(20, 1))))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("needs 2 to 10 points");
        assertThatThrownBy(() -> ViscosityFit.automatic(List.of(point(20, 1), point(20, 2))))
                .hasMessageContaining("two points at");
        assertThatThrownBy(() -> ViscosityFit.automatic(List.of(point(20, 1), point(30, -2))))
                .hasMessageContaining("positive");
    }

    @Test
    void risingPointsAreTakenAndSaid() {
        ViscosityFit fit = ViscosityFit.automatic(List.of(point(20, 1), point(40, 2)));
        assertThat(fit.rising()).isTrue();
    }

    private static List<ViscosityFit.Point> along(double a, double b, double t0, double... scatterByTwenty) {
        List<ViscosityFit.Point> points = new ArrayList<>();
        for (int i = 0; i < scatterByTwenty.length; i++) {
            double t = 273.15 + 20 * i;
            points.add(new ViscosityFit.Point(t, scatterByTwenty[i] * Math.exp(a + b / (t - t0))));
        }
        return points;
    }

    /** As many points as coefficients are met exactly: the error cannot be judged, and must not be called none. */
    @Test
    void threePointsLeaveAVftLawNoBand() {
        ViscosityFit fit = ViscosityFit.of(ViscosityFit.Kind.VFT, along(-10.6, 570, 140, 1, 1, 1));
        assertThat(fit.at(273.15)).isCloseTo(Math.exp(-10.6 + 570 / 133.15), within(1e-8));
        assertThat(fit.bandFactor(300)).isNaN();
    }

    /**
     * Four points leave one degree of freedom, t(0.975, 1) = 12.706 in any table, so no band can be narrower than
     * exp(12.706 s): s from the residuals themselves.
     */
    @Test
    void bandOfAVftLawCountsTheUncertaintyOfAllThreeCoefficients() {
        ViscosityFit fit = ViscosityFit.of(ViscosityFit.Kind.VFT, along(-10.6, 570, 140, 1.03, 0.97, 1.02, 0.99));
        double squares = 0;
        for (ViscosityFit.Point p : fit.points()) {
            squares += Math.pow(Math.log(p.viscosity() / fit.at(p.temperature())), 2);
        }
        assertThat(fit.bandFactor(303.15)).isGreaterThan(Math.exp(12.706 * Math.sqrt(squares)));
        assertThat(fit.bandFactor(373.15)).isGreaterThan(fit.bandFactor(303.15));
    }

    @Test
    void aVftLawSaysNothingBelowItsOwnZero() {
        ViscosityFit fit = ViscosityFit.of(
                ViscosityFit.Kind.VFT, List.of(point(20, 1.284), point(40, 0.00803), point(60, 0.00130)));
        assertThat(fit.t0()).isBetween(255.0, 284.0);
        assertThat(fit.at(fit.t0() - 1)).isNaN();
        assertThat(fit.bandFactor(fit.t0() - 1)).isNaN();
        Liquid liquid = Liquid.of(null, Set.of(), fit);
        LiquidState state = new LiquidState();
        liquid.evaluator(Set.of(Property.VISCOSITY)).at(new double[] {fit.t0() - 1}, 0, state);
        assertThat(state.viscosity).isNaN();
        assertThat(liquid.notices(state)).singleElement().asString().contains("unknown").contains("T₀");
    }

    /** Points on a straight line of ln mu against T bend the other way: T0 runs to 0 K and is not determined. */
    @Test
    void noBandWhereT0RanIntoItsEnd() {
        ViscosityFit fit = ViscosityFit.of(
                ViscosityFit.Kind.VFT, List.of(point(0, 1), point(20, 0.5), point(40, 0.2), point(60, 0.05)));
        assertThat(fit.t0()).isLessThan(0.001);
        assertThat(fit.bandFactor(300)).isNaN();
    }
}
