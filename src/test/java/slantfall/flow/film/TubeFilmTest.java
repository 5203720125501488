package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Films on tubes against a numerical integration of the axial momentum balance. */
class TubeFilmTest {

    private static final double WEIGHT = 1050 * 9.80665;
    private static final double VISCOSITY = 0.03;
    private static final double RADIUS = 0.012;

    @ParameterizedTest
    @ValueSource(doubles = {0.001, 0.04, 0.0999, 0.1001, 0.3, 0.8})
    void agreesWithAnIntegration(double share) {
        double h = share * RADIUS;
        assertThat(TubeFilm.flowInside(WEIGHT, VISCOSITY, RADIUS, h)).isCloseTo(integrate(h, -1), withPercentage(1e-3));
        assertThat(TubeFilm.flowOutside(WEIGHT, VISCOSITY, RADIUS, h)).isCloseTo(integrate(h, 1), withPercentage(1e-3));
    }

    @Test
    void aFullTubeIsPoiseuilleFlow() {
        double poiseuille = Math.PI * WEIGHT * Math.pow(RADIUS, 4) / (8 * VISCOSITY);
        assertThat(TubeFilm.flowInside(WEIGHT, VISCOSITY, RADIUS, RADIUS)).isCloseTo(poiseuille, withPercentage(1e-10));
    }

    @Test
    void aThinFilmIsFlat() {
        double h = 1e-6 * RADIUS;
        double flat = 2 * Math.PI * RADIUS * NewtonianFilm.flow(WEIGHT, VISCOSITY, 0, h);
        assertThat(TubeFilm.flowInside(WEIGHT, VISCOSITY, RADIUS, h)).isCloseTo(flat, withPercentage(2e-4));
        assertThat(TubeFilm.flowOutside(WEIGHT, VISCOSITY, RADIUS, h)).isCloseTo(flat, withPercentage(2e-4));
        assertThat(TubeFilm.flowInside(WEIGHT, VISCOSITY, RADIUS, 0)).isZero();
    }

    @Test
    void impossibleFilmsAreRefused() {
        assertThatThrownBy(() -> TubeFilm.flowInside(WEIGHT, VISCOSITY, RADIUS, 1.01 * RADIUS))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("radius");
        assertThatThrownBy(() -> TubeFilm.flowOutside(WEIGHT, VISCOSITY, RADIUS, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
    }

    /** Shear stress from the weight of the film beyond each radius, velocity and flow by the midpoint rule. */
    private static double integrate(double thickness, int side) {
        int steps = 20000;
        double surface = RADIUS + side * thickness;
        double step = thickness / steps;
        double velocity = 0;
        double flow = 0;
        for (int i = 0; i < steps; i++) {
            double r = RADIUS + side * (i + 0.5) * step;
            double stress = WEIGHT * Math.abs(surface * surface - r * r) / (2 * r);
            double next = velocity + stress / VISCOSITY * step;
            flow += (velocity + next) / 2 * 2 * Math.PI * r * step;
            velocity = next;
        }
        return flow;
    }
}
