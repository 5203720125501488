package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.provider.ValueSource;

/** The entry length against a numerical solution of the momentum balance that it is derived from. */
class FilmEntryTest {

    /** (6/5) d(q²/h)/dx = g_s h − 3νq/h² marched from an excess of 0.1 % until a hundredth of it is left. */
    @ParameterizedTest
    @ValueSource(doubles = {200, 1000})
    void excessFallsToAHundredth(double reynolds) {
        double nu = 1e-6;
        double gravity = 4.9;
        double flow = reynolds * nu;
        double developed = Math.cbrt(3 * nu * flow / gravity);
        double h = developed * 1.001;
        double step = developed * reynolds * 1e-5;
        double x = 0;
        while (h / developed - 1 > 1e-5) {
            double middle = h + step / 2 * slope(h, flow, nu, gravity);
            h += step * slope(middle, flow, nu, gravity);
            x += step;
        }
        assertThat(FilmEntry.length(reynolds, developed)).isCloseTo(x, withPercentage(0.2));
    }

    @Test
    void creepingFilmsSettleOverTheirOwnDepth() {
        assertThat(FilmEntry.length(0, 1e-3)).isCloseTo(1.262e-3, withPercentage(0.01));
        assertThat(FilmEntry.length(1e-6, 1e-3)).isCloseTo(1.262e-3, withPercentage(0.01));
    }

    @Test
    void longerForFasterFilms() {
        double before = 0;
        for (double reynolds = 0.1; reynolds < 500; reynolds *= 2) {
            double length = FilmEntry.length(reynolds, 1e-3);
            assertThat(length).isGreaterThan(before);
            before = length;
        }
    }

    /** −(6/5)(q²/h²) dh/dx = g_s h − 3νq/h². */
    private static double slope(double h, double flow, double nu, double gravity) {
        return -(gravity * h - 3 * nu * flow / (h * h)) * h * h / (1.2 * flow * flow);
    }
}
