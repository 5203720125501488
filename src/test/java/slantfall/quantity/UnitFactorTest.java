package slantfall.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every unit's factor and zero against published tables. */
class UnitFactorTest {

    /** Units that no table of factors holds; each is checked by the test named here. */
    private static final Set<String> BY_A_TEST_OF_ITS_OWN = Set.of(
            "fraction degBx", "fraction ppm", "fraction g/L", "fraction %", // sharesAreHundredthsAndMillionths
            "ratio %", // sharesAreHundredthsAndMillionths
            "density SG", // specificGravityIsRelativeToWaterAtFourDegrees
            "temperature degF", // temperaturesMeetAtTheFixedPoints
            "frequency rpm", // turnsPerMinute
            "pressure-difference m of water"); // metreOfWaterIsAThousandMillimetres

    static Stream<Published.Row> rows() {
        return Published.rows().stream().filter(row -> !row.kind().equals("base"));
    }

    static Kind kind(String key) {
        return Stream.of(Kind.values()).filter(k -> k.key().equals(key)).findFirst().orElseThrow();
    }

    @ParameterizedTest
    @MethodSource("rows")
    void factorAgreesWithThePublishedDigits(Published.Row row) {
        Unit unit = kind(row.kind()).unit(row.unit());
        assertThat(unit.toSi(1) - unit.toSi(0)).isCloseTo(row.factor(), within(row.factor() * row.relativeDoubt()
                + Math.ulp(unit.offset())));
        assertThat(unit.fromSi(row.factor() + unit.offset())).isCloseTo(1.0, within(row.relativeDoubt()
                + Math.ulp(unit.offset()) / row.factor()));
    }

    @Test
    void everyUnitIsPublishedOrWorkedOutFromPublishedOnes() {
        Set<String> published = new HashSet<>();
        rows().forEach(row -> published.add(row.kind() + " " + row.unit()));
        List<String> uncovered = new ArrayList<>();
        for (Kind kind : Kind.values()) {
            for (Unit unit : kind.units()) {
                String name = kind.key() + " " + unit.symbol();
                if (!published.contains(name) && !BY_A_TEST_OF_ITS_OWN.contains(name) && !isWorkedOut(unit)) {
                    uncovered.add(name);
                }
            }
        }
        assertThat(uncovered).isEmpty();
    }

    private static boolean isWorkedOut(Unit unit) {
        String symbol = unit.symbol().replaceAll("\\((a|g)\\)$", "");
        if (symbol.equals("1")) {
            return unit.scale() == 1;
        }
        Published.Worked worked = symbol.equals("m of water") ? new Published.Worked(9806.65, 1e-15)
                : Published.worked(symbol);
        if (worked == null) {
            return false;
        }
        assertThat(unit.scale()).as(unit.symbol())
                .isCloseTo(worked.factor(), within(worked.factor() * worked.relativeDoubt()));
        return true;
    }

    @Test
    void theCoherentUnitStandsFirstAndHasFactorOne() {
        for (Kind kind : Kind.values()) {
            assertThat(kind.si().scale()).as(kind.key()).isEqualTo(1.0);
            assertThat(kind.si().offset()).as(kind.key()).isEqualTo(0.0);
        }
    }

    @Test
    void symbolsAreAsciiAndDifferWithinAKind() {
        for (Kind kind : Kind.values()) {
            List<String> symbols = kind.units().stream().map(Unit::symbol).toList();
            assertThat(symbols).as(kind.key()).doesNotHaveDuplicates().allMatch(s -> s.matches("\\p{ASCII}+"));
        }
    }

    @ParameterizedTest
    @CsvSource({"0, degC, 273.15", "100, degC, 373.15", "-273.15, degC, 0", "32, degF, 273.15", "212, degF, 373.15",
        "-459.67, degF, 0", "-40, degF, 233.15", "-40, degC, 233.15", "68, degF, 293.15"})
    void temperaturesMeetAtTheFixedPoints(double number, String symbol, double kelvin) {
        Unit unit = Kind.TEMPERATURE.unit(symbol);
        assertThat(unit.toSi(number)).isCloseTo(kelvin, within(1e-12 * 500));
        assertThat(unit.fromSi(kelvin)).isCloseTo(number, within(1e-12 * 500));
    }

    @Test
    void differencesOfTemperatureKnowNoZero() {
        assertThat(Kind.TEMPERATURE_DIFFERENCE.unit("degC").toSi(10)).isEqualTo(10);
        assertThat(Kind.TEMPERATURE_DIFFERENCE.unit("degF").toSi(9)).isCloseTo(5, within(1e-14));
    }

    @Test
    void gaugePressuresStartAtTheStandardAtmosphere() {
        for (Unit unit : Kind.PRESSURE_ABSOLUTE.units()) {
            double zero = unit.symbol().endsWith("(g)") ? 101325 : 0;
            assertThat(unit.toSi(0)).as(unit.symbol()).isEqualTo(zero);
            assertThat(unit.fromSi(zero)).as(unit.symbol()).isEqualTo(0.0);
        }
    }

    @Test
    void sharesAreHundredthsAndMillionths() {
        assertThat(Kind.FRACTION.unit("%").toSi(65)).isEqualTo(0.65);
        assertThat(Kind.RATIO.unit("%").toSi(65)).isEqualTo(0.65);
        assertThat(Kind.FRACTION.unit("degBx").toSi(45)).isEqualTo(0.45);
        assertThat(Kind.FRACTION.unit("ppm").toSi(250)).isEqualTo(0.00025);
        EntryContext water = EntryContext.none().withDensity(1000);
        assertThat(Kind.FRACTION.unit("g/L").toSi(120, water)).isCloseTo(0.12, within(1e-15));
        assertThat(Kind.FRACTION.unit("g/L").fromSi(0.12, water)).isCloseTo(120, within(1e-12));
    }

    @Test
    void specificGravityIsRelativeToWaterAtFourDegrees() {
        // Greatest density of ordinary water: Tanaka et al. 2001 give 999.974950 kg/m3 (read second-hand).
        assertThat(Kind.DENSITY.unit("SG").toSi(1)).isCloseTo(999.97495, within(1e-6));
    }

    @Test
    void turnsPerMinute() {
        assertThat(Kind.FREQUENCY.unit("rpm").toSi(3000)).isEqualTo(50);
        assertThat(Kind.FREQUENCY.unit("rpm").fromSi(50)).isEqualTo(3000);
    }

    @Test
    void metreOfWaterIsAThousandMillimetres() {
        assertThat(Kind.PRESSURE_DIFFERENCE.unit("m of water").toSi(1))
                .isCloseTo(1000 * Kind.PRESSURE_DIFFERENCE.unit("mm of water").toSi(1), within(1e-9));
    }

    @Test
    void unitsThatNeedADensityDoNotGuessIt() {
        Unit unit = Kind.FRACTION.unit("g/L");
        assertThatThrownBy(() -> unit.toSi(1)).isInstanceOf(IllegalStateException.class);
        assertThat(unit.toSi(1, EntryContext.none())).isNaN();
    }

    @ParameterizedTest
    @CsvSource({"16, 1.651", "10, 3.404", "0, 8.636", "25, 0.508", "36, 0.102"})
    void wallsOfTheWireGauge(int gauge, double millimetres) {
        // Millimetres as a trade table prints them, to three decimals (read second-hand).
        assertThat(WireGauge.wall(gauge) * 1000).isCloseTo(millimetres, within(0.0005));
    }

    @Test
    void higherGaugesAreThinner() {
        for (int gauge = 1; gauge <= WireGauge.LAST; gauge++) {
            assertThat(WireGauge.wall(gauge)).isLessThan(WireGauge.wall(gauge - 1));
        }
    }

    @Test
    void noWallOutsideTheGauge() {
        assertThat(WireGauge.wall(-1)).isNaN();
        assertThat(WireGauge.wall(37)).isNaN();
    }
}
