package slantfall.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;

class NumericsTest {

    @Test
    void theCubicHasItsKnownRoot() {
        assertThat(Cubic.positiveRoot(1, 0, 0, -27)).isCloseTo(3, within(1e-14));
        assertThat(Cubic.positiveRoot(1, -6, 11, -6 - 1e-3)).isGreaterThan(3);
        Random random = new Random(3);
        for (int i = 0; i < 2000; i++) {
            double root = Math.exp(10 * random.nextDouble() - 5);
            double b = 20 * random.nextDouble() - 10;
            double d = -((root + b) * root * root);
            if (d < 0) {
                assertThat(Cubic.positiveRoot(1, b, 0, d)).isCloseTo(root, within(1e-11 * root));
            }
        }
    }

    @Test
    void gaussIsExactForPolynomials() {
        double[][] rule = Quadrature.unitGauss(12);
        for (int power = 0; power <= 23; power++) {
            double sum = 0;
            for (int i = 0; i < 12; i++) {
                sum += rule[1][i] * Math.pow(rule[0][i], power);
            }
            assertThat(sum).isCloseTo(1.0 / (power + 1), within(1e-14));
        }
    }

    /** NIST StRD linear set Norris: certified intercept, slope and residual standard deviation. */
    @Test
    void aLineReproducesACertifiedSet() {
        double[] y = {
            0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3, 448.9,
            10.8, 557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4,
            449.2, 0.2
        };
        double[] x = {
            0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0, 447.5,
            11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3, 229.2, 669.1,
            448.9, 0.5
        };
        LinearFit fit = LinearFit.of(x, y);
        assertThat(fit.intercept()).isCloseTo(-0.262323073774029, within(1e-10));
        assertThat(fit.slope()).isCloseTo(1.00211681802045, within(1e-12));
        assertThat(fit.residual()).isCloseTo(0.884796396144373, within(1e-10));
    }

    @Test
    void theMinimumOfAParabola() {
        assertThat(Minimum.golden(x -> (x - 2) * (x - 2), 0, 10, 1e-9)).isCloseTo(2, within(1e-7));
    }
}
