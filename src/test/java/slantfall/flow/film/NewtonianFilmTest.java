package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The laminar film against a numerical integration of μ du/dy = ρg_s(h − y) + τ_i. */
class NewtonianFilmTest {

    private static final double GRADIENT = 1000 * 9.80665 * Math.sin(Math.toRadians(30));
    private static final double VISCOSITY = 0.02;
    private static final int STEPS = 2000;

    @ParameterizedTest
    @CsvSource({"1e-3, 0", "1e-3, 2", "1e-3, -1.5", "1e-3, -4", "2e-4, 30", "5e-3, -20"})
    void flowAndVelocityAgreeWithAnIntegration(double thickness, double shear) {
        double[] integrated = integrate(thickness, shear);
        double scale = Math.max(Math.abs(integrated[1]), GRADIENT * thickness * thickness / VISCOSITY);
        assertThat(NewtonianFilm.velocity(GRADIENT, VISCOSITY, shear, thickness, thickness))
                .isCloseTo(integrated[0], offset(1e-9 * scale));
        assertThat(NewtonianFilm.flow(GRADIENT, VISCOSITY, shear, thickness))
                .isCloseTo(integrated[1], offset(1e-9 * scale * thickness));
        assertThat(NewtonianFilm.largestVelocity(GRADIENT, VISCOSITY, shear, thickness))
                .isCloseTo(integrated[2], offset(1e-6 * scale));
    }

    @ParameterizedTest
    @CsvSource({"1e-6, 0", "1e-6, 2", "1e-6, -1.5", "1e-5, -4", "1e-6, 30", "1e-4, -20"})
    void thicknessCarriesTheFlow(double flow, double shear) {
        double thickness = NewtonianFilm.thickness(GRADIENT, VISCOSITY, shear, flow);
        assertThat(integrate(thickness, shear)[1]).isCloseTo(flow, withPercentage(1e-8));
        if (shear < 0) {
            assertThat(thickness).isGreaterThan(1.5 * -shear / GRADIENT);
        }
    }

    @ParameterizedTest
    @CsvSource({"1e-3, 0", "1e-3, 2", "1e-3, -4"})
    void stressIsViscosityTimesTheSlopeOfTheVelocity(double thickness, double shear) {
        double step = thickness * 1e-3;
        for (double y = step; y < thickness - step; y += thickness / 7) {
            double slope = (NewtonianFilm.velocity(GRADIENT, VISCOSITY, shear, thickness, y + step)
                            - NewtonianFilm.velocity(GRADIENT, VISCOSITY, shear, thickness, y - step))
                    / (2 * step);
            assertThat(NewtonianFilm.stress(GRADIENT, shear, thickness, y)).isCloseTo(VISCOSITY * slope, offset(1e-7));
        }
    }

    @ParameterizedTest
    @CsvSource({"1e-3, 0", "1e-3, 2", "1e-3, -4"})
    void wavesTravelAtTheSlopeOfTheFlow(double thickness, double shear) {
        double step = thickness * 1e-4;
        double slope = (integrate(thickness + step, shear)[1] - integrate(thickness - step, shear)[1]) / (2 * step);
        assertThat(NewtonianFilm.waveVelocity(GRADIENT, VISCOSITY, shear, thickness)).isCloseTo(slope, offset(1e-5));
    }

    @Test
    void edges() {
        assertThat(NewtonianFilm.thickness(GRADIENT, VISCOSITY, -3, 0)).isZero();
        assertThat(NewtonianFilm.thickness(0, VISCOSITY, 0, 1e-6)).isNaN();
        assertThat(NewtonianFilm.thickness(0, VISCOSITY, -1, 1e-6)).isNaN();
        double horizontal = NewtonianFilm.thickness(0, VISCOSITY, 2, 1e-6);
        assertThat(NewtonianFilm.flow(0, VISCOSITY, 2, horizontal)).isCloseTo(1e-6, withPercentage(1e-9));
        assertThat(NewtonianFilm.uphillSurface(GRADIENT, -GRADIENT * 1e-3, 1e-3)).isTrue();
        assertThat(NewtonianFilm.uphillSurface(GRADIENT, -GRADIENT * 0.49e-3, 1e-3)).isFalse();
    }

    /** Surface velocity, flow and largest velocity: midpoint rule for the linear stress, Simpson for the velocity. */
    private static double[] integrate(double thickness, double shear) {
        double step = thickness / STEPS;
        double velocity = 0;
        double flow = 0;
        double largest = 0;
        for (int i = 0; i < STEPS; i++) {
            double middle = velocity + rate(thickness, shear, (i + 0.25) * step) * step / 2;
            double next = velocity + rate(thickness, shear, (i + 0.5) * step) * step;
            flow += (velocity + 4 * middle + next) / 6 * step;
            velocity = next;
            largest = Math.max(largest, velocity);
        }
        return new double[] {velocity, flow, largest};
    }

    /** du/dy from the weight of the liquid above and the stress on the surface. */
    private static double rate(double thickness, double shear, double y) {
        return (GRADIENT * (thickness - y) + shear) / VISCOSITY;
    }
}
