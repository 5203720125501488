package slantfall.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class LeastSquaresTest {

    private static double[][] line(double... x) {
        double[][] rows = new double[x.length][];
        for (int i = 0; i < x.length; i++) {
            rows[i] = new double[] {1, x[i]};
        }
        return rows;
    }

    /** By hand: mean 3, Sxx = 10, Sxy = 8, so y = 3 + 0.8 x, RSS = 10 − 6.4 = 3.6; t(0.975, 3) = 3.182446. */
    @Test
    void straightLineByHand() {
        LeastSquaresFit fit = LeastSquares.linear(line(-2, -1, 0, 1, 2), new double[] {1, 3, 2, 5, 4});
        assertThat(fit.coefficient(0)).isCloseTo(3, within(1e-13));
        assertThat(fit.coefficient(1)).isCloseTo(0.8, within(1e-13));
        assertThat(fit.residualSumOfSquares()).isCloseTo(3.6, within(1e-12));
        assertThat(fit.degreesOfFreedom()).isEqualTo(3);
        assertThat(fit.covariance(0, 0)).isCloseTo(1.2 / 5, within(1e-12));
        assertThat(fit.covariance(1, 1)).isCloseTo(1.2 / 10, within(1e-12));
        assertThat(fit.covariance(0, 1)).isCloseTo(0, within(1e-12));
        double[] at2 = {1, 2};
        assertThat(fit.confidence(at2, 0.95))
                .isCloseTo(3.182446 * Math.sqrt(1.2 * (1 / 5.0 + 4 / 10.0)), within(1e-5));
        assertThat(fit.prediction(at2, 0.95)).isCloseTo(3.182446 * Math.sqrt(1.2 * 1.6), within(1e-5));
    }

    @Test
    void exactPointsHaveNoBand() {
        LeastSquaresFit fit = LeastSquares.linear(line(1, 2), new double[] {5, 7});
        assertThat(fit.coefficient(0)).isCloseTo(3, within(1e-12));
        assertThat(fit.coefficient(1)).isCloseTo(2, within(1e-12));
        assertThat(fit.standardError()).isNaN();
        assertThat(fit.prediction(new double[] {1, 1.5}, 0.95)).isNaN();
    }

    @Test
    void columnsOfVeryDifferentSize() {
        LeastSquaresFit fit = LeastSquares.linear(line(1e-9, 2e-9, 4e-9), new double[] {3, 5, 9});
        assertThat(fit.coefficient(0)).isCloseTo(1, within(1e-9));
        assertThat(fit.coefficient(1)).isCloseTo(2e9, within(1e-3 * 2e9 * 1e-6));
    }

    @Test
    void refusesWhatCannotBeFitted() {
        assertThatThrownBy(() -> LeastSquares.linear(line(1, 1, 1), new double[] {1, 2, 3}))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("apart");
        assertThatThrownBy(() -> LeastSquares.linear(line(1), new double[] {1}))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("rows = 1");
        assertThatThrownBy(() -> LeastSquares.linear(new double[][] {{1, 0}, {2, 0}}, new double[] {1, 2}))
                .isInstanceOf(IllegalArgumentException.class).hasMessageContaining("apart");
        assertThatThrownBy(() -> LeastSquares.linear(line(1, 2), new double[] {5, 7})
                .prediction(new double[] {1, 1}, 95)).isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("level = 95");
    }
}
