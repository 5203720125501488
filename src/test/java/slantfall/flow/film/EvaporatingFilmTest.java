package slantfall.flow.film;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The laws cross where they say, near the printed limit. */
class EvaporatingFilmTest {

    @ParameterizedTest
    @ValueSource(doubles = {1.75, 3, 5.8})
    void theLawsCross(double prandtl) {
        double crossing = EvaporatingFilm.crossing(prandtl);
        assertThat(EvaporatingFilm.wavy(crossing))
                .isCloseTo(EvaporatingFilm.turbulent(crossing, prandtl), withPercentage(1e-9));
        assertThat(crossing).isCloseTo(5800 * Math.pow(prandtl, -1.06), withPercentage(3));
    }
}
