package slantfall.flow.slot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The uniform slot against finite differences of momentum and heat. */
class NewtonianSlotTest {

    private static final double VISCOSITY = 0.8;
    private static final double GAP = 1.5e-3;
    private static final double CONDUCTIVITY = 0.3;
    private static final int CELLS = 2000;

    @ParameterizedTest
    @CsvSource({"4e5, 0", "0, 1.2", "4e5, 1.2", "-4e5, 1.2", "4e5, -0.05", "1e6, -3", "2e4, 2"})
    void agreesWithFiniteDifferences(double gradient, double wall) {
        double[] u = velocity(gradient, wall);
        double flow = 0;
        double extreme = 0;
        for (int i = 0; i < CELLS; i++) {
            flow += (u[i] + u[i + 1]) / 2 * GAP / CELLS;
            extreme = Math.abs(u[i + 1]) > Math.abs(extreme) ? u[i + 1] : extreme;
        }
        double scale = Math.abs(gradient) * GAP * GAP / VISCOSITY + Math.abs(wall);
        assertThat(NewtonianSlot.flow(gradient, VISCOSITY, GAP, wall)).isCloseTo(flow, offset(1e-6 * scale * GAP));
        assertThat(NewtonianSlot.extremeVelocity(gradient, VISCOSITY, GAP, wall)).isCloseTo(extreme, offset(1e-6 * scale));
        double y = GAP * 700 / CELLS;
        assertThat(NewtonianSlot.velocity(gradient, VISCOSITY, GAP, wall, y)).isCloseTo(u[700], offset(1e-8 * scale));
        double slope = (u[701] - u[699]) / (2 * GAP / CELLS);
        assertThat(NewtonianSlot.stress(gradient, VISCOSITY, GAP, wall, y))
                .isCloseTo(VISCOSITY * slope, offset(1e-6 * scale * VISCOSITY / GAP));
    }

    @ParameterizedTest
    @CsvSource({"4e5, 0", "0, 1.2", "4e5, 1.2", "-4e5, 1.2", "4e5, -0.05", "1e6, -3", "2e4, 2"})
    void viscousRiseAgreesWithTheHeatEquation(double gradient, double wall) {
        assertThat(NewtonianSlot.viscousRise(gradient, VISCOSITY, GAP, wall, CONDUCTIVITY))
                .isCloseTo(hottest(gradient, wall), withPercentage(1e-3));
    }

    @Test
    void viscousRiseOfDragAndOfPressureAlone() {
        double drag = NewtonianSlot.viscousRise(0, VISCOSITY, GAP, 2, CONDUCTIVITY);
        assertThat(drag).isCloseTo(VISCOSITY * 4 / (8 * CONDUCTIVITY), withPercentage(1e-9));
        double mean = NewtonianSlot.flow(4e5, VISCOSITY, GAP, 0) / GAP;
        double pressure = NewtonianSlot.viscousRise(4e5, VISCOSITY, GAP, 0, CONDUCTIVITY);
        assertThat(pressure).isCloseTo(3 * VISCOSITY * mean * mean / (4 * CONDUCTIVITY), withPercentage(1e-9));
    }

    /** Reversal begins where the profile of the finite differences begins to have both signs. */
    @ParameterizedTest
    @CsvSource({"4e5, 0.3", "-1e4, 1.2", "-1e6, 1.2", "4e5, -0.01", "4e5, -1", "-4e5, -0.5"})
    void onwardnessIsNegativeWhereLiquidRunsBack(double gradient, double wall) {
        double[] u = velocity(gradient, wall);
        double low = 0;
        double high = 0;
        for (double value : u) {
            low = Math.min(low, value);
            high = Math.max(high, value);
        }
        double flow = NewtonianSlot.flow(gradient, VISCOSITY, GAP, wall);
        assertThat(NewtonianSlot.onwardness(flow, GAP, wall) < 0).isEqualTo(low < 0 && high > 0);
    }

    @Test
    void onwardnessOfPressureFlowIsOneAndWithoutFlowUnknown() {
        assertThat(NewtonianSlot.onwardness(1e-4, GAP, 0)).isEqualTo(1);
        assertThat(NewtonianSlot.onwardness(0, GAP, 0)).isNaN();
    }

    @Test
    void gradientIsTheInverseOfFlow() {
        double flow = NewtonianSlot.flow(3e4, VISCOSITY, GAP, 0.4);
        assertThat(NewtonianSlot.gradient(flow, VISCOSITY, GAP, 0.4)).isCloseTo(3e4, withPercentage(1e-9));
    }

    /** A slot twice as deep carries twice what a film carries: a film is half a slot of twice its depth. */
    @Test
    void aFilmIsHalfASlot() {
        double weight = 8e3;
        double film = slantfall.flow.film.NewtonianFilm.flow(weight, VISCOSITY, 0, GAP);
        assertThat(NewtonianSlot.flow(weight, VISCOSITY, 2 * GAP, 0)).isCloseTo(2 * film, withPercentage(1e-10));
    }

    /** μ u″ = −G with u = 0 below and u = U above. */
    private static double[] velocity(double gradient, double wall) {
        double h = GAP / CELLS;
        double[] right = new double[CELLS - 1];
        java.util.Arrays.fill(right, gradient * h * h / VISCOSITY);
        right[CELLS - 2] += wall;
        double[] inner = tridiagonal(right);
        double[] u = new double[CELLS + 1];
        System.arraycopy(inner, 0, u, 1, CELLS - 1);
        u[CELLS] = wall;
        return u;
    }

    /** Largest T of k T″ = −μ u′², T = 0 on both walls. */
    private static double hottest(double gradient, double wall) {
        double h = GAP / CELLS;
        double[] u = velocity(gradient, wall);
        double[] right = new double[CELLS - 1];
        for (int i = 1; i < CELLS; i++) {
            double slope = (u[i + 1] - u[i - 1]) / (2 * h);
            right[i - 1] = VISCOSITY * slope * slope / CONDUCTIVITY * h * h;
        }
        double[] t = tridiagonal(right);
        double hottest = 0;
        for (double value : t) {
            hottest = Math.max(hottest, value);
        }
        return hottest;
    }

    /** Solves −x_{i−1} + 2x_i − x_{i+1} = r_i with zero ends (Thomas). */
    private static double[] tridiagonal(double[] right) {
        int n = right.length;
        double[] upper = new double[n];
        double[] x = new double[n];
        for (int i = 0; i < n; i++) {
            double pivot = 2 - (i > 0 ? upper[i - 1] : 0);
            upper[i] = 1 / pivot;
            x[i] = (right[i] + (i > 0 ? x[i - 1] : 0)) / pivot;
        }
        for (int i = n - 2; i >= 0; i--) {
            x[i] += upper[i] * x[i + 1];
        }
        return x;
    }
}
