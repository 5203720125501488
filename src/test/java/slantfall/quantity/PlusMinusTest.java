package slantfall.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Half widths: relative, absolute, and those that could be either. */
class PlusMinusTest {

    private static final EntryContext CONTEXT = new EntryContext(998.2, 0.4);

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "VISCOSITY | ± 20 % | 0.35 | 0.07", "VISCOSITY | 20 % | 0.35 | 0.07", "VISCOSITY | +/- 20 % | 0.35 | 0.07",
        "VISCOSITY | 20 % of value | 0.35 | 0.07", "VISCOSITY | ± 10 cP | 0.35 | 0.01",
        "VISCOSITY | ± 10 cSt | 0.35 | 0.009982", "LENGTH | +/- 0.5 mm | 0.045 | 0.0005",
        "LENGTH | 1 thou | 0.045 | 0.0000254", "LENGTH | ±0,5 mm | 0.045 | 0.0005",
        "PRESSURE_DIFFERENCE | 10 % | -3000 | 300", "PRESSURE_ABSOLUTE | ± 5 kPa | 101325 | 5000",
        "PRESSURE_ABSOLUTE | ± 1 psi | 101325 | 6894.757293168",
        "TEMPERATURE | ± 0.5 °C | 333.15 | 0.5", "TEMPERATURE | ± 0.5 K | 333.15 | 0.5",
        "TEMPERATURE | ± 9 °F | 333.15 | 5", "ANGLE | 0.5 deg | 0.2 | 0.00872664625997165",
        "ANGLE | 5 % of value | 0.2 | 0.01", "CONTACT_ANGLE | ± 15° | 1.0 | 0.261799387799149",
        "FRACTION | 5 % of value | 0.8 | 0.04", "FRACTION | 5 points | 0.8 | 0.05",
        "FRACTION | 5 % points | 0.8 | 0.05", "FRACTION | 0.5 Bx | 0.45 | 0.005", "FRACTION | 0.05 | 0.8 | 0.05",
        "LENGTH | 1/32 in | 0.045 | 0.00079375", "DENSITY | 0.01 SG | 1040 | 9.9997495",
        "FRACTION | 0.5 % TS | 0.12 | 0.005", "COUNT | 4 | 125 | 4", "MASS_FLOW_PER_WIDTH | ± 0 % | 0.3 | 0", "DENSITY | 0.5 % | 1040 | 5.2"})
    void readsTheHalfWidth(Kind kind, String text, double centre, double half) {
        assertThat(EntryReader.plusMinus(text, kind, centre, CONTEXT)).isCloseTo(half, within(half * 1e-10));
        assertThat(EntryReader.plusMinusEntry(text, kind, centre, CONTEXT).echo()).startsWith("± ");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "FRACTION | 5 % | 0.8 | 5 points", "RATIO | 5 % | 0.8 | 5 % of value", "ANGLE | 5 % | 0.2 | of value",
        "TEMPERATURE | 5 % | 333 | zero is arbitrary", "LENGTH | -5 mm | 0.1 | negative", "LENGTH | 5 | 0.1 | no unit",
        "LENGTH | 5 kg | 0.1 | is a mass", "LENGTH | 20 % | 0 | zero or unknown", "LENGTH | ± | 0.1 | number",
        "DENSITY | 0.5 °Bé | 1040 | not known", "LENGTH | 1.5 in x 16 BWG | 0.04 | number",
        "LENGTH | 20 % | NaN | zero or unknown", "ANGLE | 1:12 | 0.2 | not known", "LENGTH | 1,234 mm | 3 | 1234"})
    void refusesWhatIsNoClearHalfWidth(Kind kind, String text, double centre, String words) {
        assertThatExceptionOfType(QuantityProblem.class)
                .isThrownBy(() -> EntryReader.plusMinus(text, kind, centre, CONTEXT)).withMessageContaining(words);
    }

    @Test
    void shareOfAFractionOffersBothReadings() {
        assertThatExceptionOfType(QuantityProblem.class)
                .isThrownBy(() -> EntryReader.plusMinus("5 %", Kind.FRACTION, 0.8, CONTEXT))
                .satisfies(p -> assertThat(p.readings()).containsExactly("5 points", "5 % of value"));
    }
}
