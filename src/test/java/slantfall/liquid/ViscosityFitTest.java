package slantfall.liquid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
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
}
