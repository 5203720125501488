package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Numbers of a film against an independent solution and against units. */
class FilmNumbersTest {

    /**
     * The onset from the long-wave limit of the Orr–Sommerfeld problem, integrated numerically: with U = 3(y − y²/2) and
     * the leading mode φ₀ = 3y²/2 of speed 3, the next order is φ₁⁗ = Re[(U − 3)φ₀″ + 3φ₀], φ₁ = φ₁′ = 0 on the plate,
     * φ₁″ = 0 and φ₁‴ = 3 cot β − (3/2) Re φ₀′ on the surface; waves grow where φ₁(1) &gt; 0.
     */
    @ParameterizedTest
    @ValueSource(doubles = {1, 4.6, 30, 45, 60, 85})
    void onsetIsWhereLongWavesBeginToGrow(double degrees) {
        double angle = Math.toRadians(degrees);
        double cot = 1 / Math.tan(angle);
        double low = 0;
        double high = 100 * cot;
        for (int i = 0; i < 60; i++) {
            double middle = (low + high) / 2;
            if (growth(middle, cot) > 0) {
                high = middle;
            } else {
                low = middle;
            }
        }
        assertThat(FilmNumbers.onset(angle)).isCloseTo(low, withPercentage(1e-6));
    }

    @Test
    void verticalFilmsHaveNoThreshold() {
        assertThat(FilmNumbers.onset(Math.PI / 2)).isCloseTo(0, offset(1e-15));
    }

    /** Water at 20 °C: 3389 and 3.9e10 as the physics page gives them from independent arithmetic. */
    @Test
    void kapitzaNumbersOfWater() {
        double kapitza = FilmNumbers.kapitza(998.2067, 0.0010016, 0.07274, 9.80665);
        double film = FilmNumbers.filmNumber(998.2067, 0.0010016, 0.07274, 9.80665);
        assertThat(kapitza).isCloseTo(3389, offset(0.5));
        assertThat(film).isCloseTo(3.9e10, withPercentage(1));
        assertThat(Math.cbrt(film)).isCloseTo(kapitza, withPercentage(1e-10));
    }

    /** Numbers without dimension do not change when kilogram, metre and second are measured otherwise. */
    @Test
    void unitsDoNotMatter() {
        double kg = 3.7;
        double m = 0.21;
        double s = 11;
        double density = kg / (m * m * m);
        double viscosity = kg / (m * s);
        double tension = kg / (s * s);
        double gravity = m / (s * s);
        assertThat(FilmNumbers.kapitza(1200 * density, 0.3 * viscosity, 0.05 * tension, 9.81 * gravity))
                .isCloseTo(FilmNumbers.kapitza(1200, 0.3, 0.05, 9.81), withPercentage(1e-10));
        assertThat(FilmNumbers.filmNumber(1200 * density, 0.3 * viscosity, 0.05 * tension, 9.81 * gravity))
                .isCloseTo(FilmNumbers.filmNumber(1200, 0.3, 0.05, 9.81), withPercentage(1e-10));
        assertThat(FilmNumbers.reynolds(0.4 * kg / (m * s), 0.3 * viscosity)).isCloseTo(0.4 / 0.3, withPercentage(1e-10));
    }

    /** φ₁(1) by superposition of three integrations from the plate. */
    private static double growth(double reynolds, double cot) {
        double[] forced = march(0, 0, reynolds);
        double[] bent = march(1, 0, 0);
        double[] turned = march(0, 1, 0);
        double third = 3 * cot - 1.5 * reynolds * 3;
        double turn = third - forced[3];
        double bend = -(forced[2] + turn * turned[2]);
        return forced[0] + bend * bent[0] + turn * turned[0];
    }

    /** φ, φ′, φ″, φ‴ on the surface from φ″ and φ‴ on the plate, by Simpson steps of the Taylor series. */
    private static double[] march(double second, double third, double reynolds) {
        int steps = 400;
        double h = 1.0 / steps;
        double[] f = {0, 0, second, third};
        for (int i = 0; i < steps; i++) {
            double y = i * h;
            double start = source(y, reynolds);
            double middle = source(y + h / 2, reynolds);
            double end = source(y + h, reynolds);
            double mean = (start + 4 * middle + end) / 6;
            double h2 = h * h;
            f[0] += h * f[1] + h2 / 2 * f[2] + h2 * h / 6 * f[3] + h2 * h2 / 24 * mean;
            f[1] += h * f[2] + h2 / 2 * f[3] + h2 * h / 6 * mean;
            f[2] += h * f[3] + h2 / 6 * (start + 2 * middle);
            f[3] += h * mean;
        }
        return f;
    }

    private static double source(double y, double reynolds) {
        double velocity = 3 * (y - y * y / 2);
        return reynolds * ((velocity - 3) * 3 + 3 * 1.5 * y * y);
    }
}
