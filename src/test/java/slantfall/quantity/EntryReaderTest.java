package slantfall.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What entries are understood as, and which are refused. */
class EntryReaderTest {

    private static final EntryContext CONTEXT = new EntryContext(998.2, 0.4);

    static Stream<Arguments> understood() {
        return Published.lines("understood.csv").stream().map(line -> line.split("\\|"))
                .map(c -> Arguments.of(UnitFactorTest.kind(c[0]), c[1], Double.valueOf(c[2]), Double.valueOf(c[3])));
    }

    static Stream<Arguments> refused() {
        return Published.lines("refused.csv").stream().map(line -> line.split("\\|"))
                .map(c -> Arguments.of(UnitFactorTest.kind(c[0]), c[1], Integer.valueOf(c[2]), c[3]));
    }

    @ParameterizedTest
    @MethodSource("understood")
    void readsTheValue(Kind kind, String text, double si, double tolerance) {
        Entry entry = EntryReader.read(text, kind, CONTEXT);
        assertThat(entry.si()).isCloseTo(si, within(Math.abs(si) * (tolerance + 2e-16)));
        assertThat(entry.typed()).isEqualTo(text);
        assertThat(entry.kind()).isEqualTo(kind);
        assertThat(entry.echo()).isNotBlank();
    }

    @ParameterizedTest
    @MethodSource("refused")
    void refusesWithTheReadings(Kind kind, String text, int readings, String word) {
        QuantityProblem problem = problem(kind, text, CONTEXT);
        assertThat(problem.readings()).hasSize(readings);
        assertThat(problem.getMessage()).contains(word).contains(Cleaned.quote(text)).hasSizeLessThan(400);
    }

    private static QuantityProblem problem(Kind kind, String text, EntryContext context) {
        QuantityProblem problem = catchThrowableOfType(QuantityProblem.class,
                () -> EntryReader.read(text, kind, context));
        assertThat(problem).as(text).isNotNull();
        return problem;
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "MASS_FLOW_PER_WIDTH | 12 L/(h cm) | density of the product first",
        "MASS_FLOW_PER_WIDTH | 1440 kg/h | the width first",
        "MASS_FLOW_PER_WIDTH | 1.5 m3/h | density of the product and the width first",
        "VOLUME_FLOW_PER_WIDTH | 0.3 kg/(m s) | density of the product first",
        "VOLUME_FLOW | 1440 kg/h | density of the product first",
        "VISCOSITY | 45 cSt | density of the product first",
        "KINEMATIC_VISCOSITY | 45 cP | density of the product first",
        "PRESSURE_DIFFERENCE | 250 mm of product | density of the product first",
        "HEAD | 3 kPa | density of the product first",
        "FRACTION | 120 g/L | density of the product first",
    })
    void saysWhatToGiveFirst(Kind kind, String text, String words) {
        assertThat(problem(kind, text, EntryContext.none())).hasMessageContaining(words);
    }

    @Test
    void aDensityThatIsNoneIsRefused() {
        for (double density : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
            EntryContext context = EntryContext.none().withDensity(density);
            assertThatExceptionOfType(QuantityProblem.class)
                    .isThrownBy(() -> EntryReader.read("45 cSt", Kind.VISCOSITY, context));
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "MASS_FLOW_PER_WIDTH | 1.5 m3/h | 1.0398 kg/(m s), from 1.5 m³/h over 0.4 m at 998.2 kg/m³",
        "VISCOSITY | 45 cSt | 0.044919 Pa s, from 45 cSt kinematic, with 998.2 kg/m³",
        "VOLUME_FLOW | 5 gpm | 5 gal/min (US gallon) = 3.1545×10⁻⁴ m³/s",
        "VOLUME_FLOW | 5 imp gal/min | 5 imp gal/min (imperial gallon) = 3.7884×10⁻⁴ m³/s",
        "ANGLE | 60 deg | 60° from the horizontal (30° from the vertical)",
        "ANGLE | 12 deg from vertical | 78° from the horizontal (12° from the vertical)",
        "LENGTH | 0,8 mm | 0.8 mm = 8×10⁻⁴ m",
        "MASS_FLOW_PER_WIDTH | 0.3 kg/m/s | 0.3 kg/(m s)",
        "TEMPERATURE | 20 C | 20 °C = 293.15 K",
    })
    void echoesInFull(Kind kind, String text, String echo) {
        assertThat(EntryReader.read(text, kind, CONTEXT).echo()).isEqualTo(echo);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "ANGLE | 5 % | of run (tan)", "ANGLE | 1:12 | by sin it would be 4.78°", "ANGLE | 1:12 sin | of length (sin)",
        "PRESSURE_ABSOLUTE | 3 psig | gauge against the standard atmosphere of 101325 Pa",
        "PRESSURE_ABSOLUTE | 90000 Pa | absolute", "PRESSURE_DIFFERENCE | 14 in w.c. | conventional water",
        "HEAD | 250 mm | of product", "FRACTION | 12 % TS | total solids", "FRACTION | 65 Bx | sucrose",
        "DENSITY | 12 °Bé | 145/(145 − °Bé)", "DENSITY | SG 1.04 | water at 4 °C",
        "LENGTH | 1.5 in x 16 BWG | 16 BWG", "LENGTH | 47.5 mm ID | inside diameter",
        "HEAT_CAPACITY | 1 Btu/(lb F) | International Table"})
    void echoNamesTheMeaning(Kind kind, String text, String words) {
        assertThat(EntryReader.read(text, kind, CONTEXT).echo()).contains(words);
    }

    @Test
    void hostileTextIsOneClearProblem() {
        String[] hostile = {"", "   ", "\u00A0", "\t\n", "x".repeat(10_000), "9".repeat(10_000), "1 " + "m".repeat(190),
            "5 m\u0000m", "5\nmm", "5 \u001B[31mmm", "\uD800", "5 \uD83D\uDE00", "5\u2028mm", "\u202E5 mm",
            "١٢ mm", "５ mm",
            "1e99999999999999999999 m", "1e2147483648 m", "5 m^99999999", "5 m^-", "5 ((((((((((m", "5 %%%", "5 /////",
            "5 mpa mpa mpa mpa mpa mpa", "±", "+", "-", ".", ",", "e5 m", "1..2 m", "5 $1 m", "5 \\1 m", "5 mm OD OD",
            "x 16 BWG", " x 16 BWG", "ID", "5 ID", "OD",
            "1:", ":1", "1:12:12", "in 12", "slope", "SG", "SG SG", "°Bé",
            "% of value", "points", "(g)", "5 (a)", "null"};
        for (String text : hostile) {
            for (Kind kind : Kind.values()) {
                assertThat(problem(kind, text, CONTEXT).getMessage()).as(text).hasSizeLessThan(400)
                        .doesNotContain("\n").doesNotContain("\u001B").doesNotContain("\u0000");
            }
        }
        assertThatExceptionOfType(QuantityProblem.class)
                .isThrownBy(() -> EntryReader.read(null, Kind.LENGTH, CONTEXT));
    }

    @ParameterizedTest
    @ValueSource(strings = {"5 mm", " 5 mm ", "5mm", "5\u00A0mm", "5\u202Fmm", "5  mm", "5\tmm", "5 mm\n"})
    void blanksDoNotMatter(String text) {
        assertThat(EntryReader.read(text, Kind.LENGTH, CONTEXT).si()).isEqualTo(0.005);
    }

    @Test
    void everyUnitIsReadByItsSymbolItsLabelAndItsAliases() {
        for (Kind kind : Kind.values()) {
            for (Unit unit : kind.units()) {
                if (unit.symbol().equals("1")) {
                    continue; // a bare number
                }
                double si = unit.toSi(2, CONTEXT);
                assertThat(EntryReader.read("2 " + unit.symbol(), kind, CONTEXT).si()).as(unit.symbol()).isEqualTo(si);
                assertThat(EntryReader.read("2 " + unit.label(), kind, CONTEXT).si()).as(unit.label()).isEqualTo(si);
                for (String alias : unit.aliases()) {
                    assertThat(EntryReader.read("2 " + alias, kind, CONTEXT).si()).as(alias).isEqualTo(si);
                }
            }
        }
    }
}
