package slantfall.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers for people. */
class ShowTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "0.8 | 3 | 0.800", "0.8 | 1 | 0.8", "1.23456 | 3 | 1.23", "1.235 | 3 | 1.24", "12345 | 3 | 12300",
        "99999 | 3 | 1.00×10⁵", "99999 | 5 | 99999", "100000 | 3 | 1.00×10⁵", "0.001 | 3 | 0.00100",
        "0.00099996 | 3 | 0.00100", "0.0009 | 3 | 9.00×10⁻⁴", "-0.5 | 2 | −0.50", "0 | 3 | 0", "-0.0 | 3 | 0",
        "NaN | 3 | unknown", "Infinity | 3 | ∞", "-Infinity | 3 | −∞", "1e300 | 2 | 1.0×10³⁰⁰",
        "-1.5e-12 | 3 | −1.50×10⁻¹²", "9.996 | 3 | 10.0", "4.9e-324 | 2 | 4.9×10⁻³²⁴"})
    void numberHasTheDigitsItDeserves(double v, int digits, String text) {
        assertThat(Show.number(v, digits)).isEqualTo(text);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "0.0008 | LENGTH | SI | 0.800 mm", "3.0 | LENGTH | SI | 3.00 m", "0.0000254 | LENGTH | US | 1.00 mil",
        "0.0254 | LENGTH | US | 1.00 in", "0.35 | VISCOSITY | SI | 350 mPa s", "22.7 | VISCOSITY | SI | 22.7 Pa s",
        "0.35 | VISCOSITY | TRADE | 350 cP", "293.15 | TEMPERATURE | SI | 20.0 °C",
        "293.15 | TEMPERATURE | US | 68.0 °F", "0.65 | FRACTION | SI | 65.0 %",
        "1.0471975511966 | ANGLE | SI | 60.0°", "125 | COUNT | SI | 125", "12345 | COUNT | SI | 12345",
        "400 | REYNOLDS_FILM | TRADE | 400", "101325 | PRESSURE_ABSOLUTE | SI | 101 kPa(a)",
        "101325 | PRESSURE_ABSOLUTE | TRADE | 1.01 bar(a)", "101325 | PRESSURE_ABSOLUTE | US | 14.7 psi(a)",
        "0 | LENGTH | SI | 0 m", "NaN | LENGTH | SI | unknown", "998.2 | DENSITY | US | 62.3 lb/ft³",
        "-250 | PRESSURE_DIFFERENCE | SI | −250 Pa"})
    void valueIsShownInTheUnitOfTheSystem(double si, Kind kind, UnitSystem system, String text) {
        assertThat(Show.value(si, kind, system, 3)).isEqualTo(text);
    }

    @Test
    void everyKindHasAUnitInEverySystem() {
        for (Kind kind : Kind.values()) {
            for (UnitSystem system : UnitSystem.values()) {
                assertThat(kind.units()).as(kind.key()).containsAll(Display.ladder(kind, system));
                assertThat(Display.ladder(kind, system)).allMatch(unit -> unit.need() == Need.NONE);
                assertThat(Display.ladder(kind, system)).as(kind.key())
                        .isSortedAccordingTo((a, b) -> Double.compare(b.scale(), a.scale()));
            }
        }
    }

    @Test
    void exactTextNeedsAFiniteNumber() {
        assertThatIllegalArgumentException().isThrownBy(() -> Show.exact(Double.NaN, Kind.LENGTH));
        assertThatIllegalArgumentException().isThrownBy(() -> Show.number(1, 0));
        assertThat(Show.exact(0.1, Kind.LENGTH)).isEqualTo("0.1 m");
        assertThat(Show.exact(0.1, Kind.FRACTION)).isEqualTo("0.1");
    }

    @Test
    void reynoldsNumbersNameTheirDefinition() {
        assertThat(Kind.REYNOLDS_FILM.words()).contains("Γ/μ").doesNotContain("4");
        assertThat(Kind.REYNOLDS_FILM_4.words()).contains("4Γ/μ");
        assertThat(Kind.REYNOLDS_SURFACE.words()).contains("u_s h/ν");
        assertThat(Kind.REYNOLDS_SLOT.words()).contains("2b u/ν", "D_h = 2b");
    }

    @Test
    void keysAreStableWords() {
        assertThat(Kind.values()).extracting(Kind::key).doesNotHaveDuplicates().allMatch(k -> k.matches("[a-z0-9-]+"));
        assertThat(Kind.MASS_FLOW_PER_WIDTH.key()).isEqualTo("mass-flow-per-width");
        assertThat(Kind.MASS_FLOW_PER_WIDTH.si().symbol()).isEqualTo("kg/(m s)");
    }
}
