package slantfall.liquid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SolutionsTest {

    /** Segur and Oberstar 1951, Ind. Eng. Chem. 43, 2117 (as the glycerine handbook table 18): mass %, °C, mPa s. */
    @ParameterizedTest
    @CsvSource({
        "0,0,1.792", "0,20,1.005", "0,40,0.656", "20,20,1.76", "40,0,8.25", "40,20,3.72", "50,20,6.00", "60,0,29.9",
        "70,20,22.5", "80,20,60.1", "90,20,219", "95,40,121", "100,0,12070", "100,20,1410"
    })
    void glycerolFollowsTheMeasuredTable(double percent, double celsius, double measured) {
        double mu = GlycerolWater.viscosity(celsius + 273.15, percent / 100);
        assertThat(1e3 * mu).isCloseTo(measured, within(0.04 * measured));
    }

    /** Bingham and Jackson 1918, fluidity fits quoted in an abstract: 39.99 and 59.96 % sucrose. */
    @ParameterizedTest
    @CsvSource({"39.99,20,6.197882816,0.03", "59.96,20,59.80835436,0.02", "59.96,40,20.89267092,0.02", "39.99,60,1.976788736,0.03"})
    void sucroseFollowsTheOldStandard(double percent, double celsius, double measured, double tolerance) {
        double mu = Sucrose.viscosity(celsius + 273.15, percent / 100);
        assertThat(1e3 * mu).isCloseTo(measured, within(tolerance * measured));
    }

    /** Laliberté's own check value, read in a public test file: 0.581 % NaCl at 5 °C. */
    @ParameterizedTest
    @CsvSource({"0.00581,5,0.00152858285819614"})
    void sodiumChlorideReproducesTheAuthorsCheck(double w, double celsius, double expected) {
        assertThat(Laliberte.SODIUM_CHLORIDE.viscosity(celsius + 273.15, w)).isCloseTo(expected, within(1e-9 * expected));
    }

    @ParameterizedTest
    @CsvSource({"20", "40"})
    void twoIndependentLawsOfSucroseAgree(double percent) {
        double genotelle = Sucrose.viscosity(293.15, percent / 100);
        double laliberte = Laliberte.SUCROSE.viscosity(293.15, percent / 100);
        assertThat(genotelle).isCloseTo(laliberte, within(0.02 * laliberte));
    }
}
