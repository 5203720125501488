package slantfall.bench.form;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import slantfall.liquid.ViscosityFit;
import slantfall.quantity.EntryContext;

class PastedPointsTest {

    private static PastedPoints read(String table) {
        return PastedPoints.read(table, "degC", "mPa s", new EntryContext(1000, 1));
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "20\t7500\n40\t1200", "20;7500\n40;1200", "20 °C   7.5 Pa s\n40 °C   1.2 Pa s", "20 7500\n40 1200",
        "T\tviscosity\n20\t7500\n40\t1200\n", "68 degF; 7,5 Pa s\n104 degF; 1,2 Pa s", "20 degC 75 P\n40 degC 12 P"
    })
    void aTableIsReadAsPeoplePasteIt(String table) {
        PastedPoints pasted = read(table);
        assertThat(pasted.points()).hasSize(2);
        ViscosityFit.Point first = pasted.points().get(0);
        assertThat(first.temperature()).isCloseTo(293.15, within(1e-9));
        assertThat(first.viscosity()).isCloseTo(7.5, within(1e-9));
        assertThat(pasted.points().get(1).viscosity()).isCloseTo(1.2, within(1e-9));
        assertThat(pasted.typed()).hasSize(2).allMatch(p -> p.size() == 2);
    }

    @Test
    void aWrongLineIsNamed() {
        assertThatThrownBy(() -> read("20\t7500\n40")).hasMessageContaining("Line 2");
        assertThatThrownBy(() -> read("20\t7500\t3")).hasMessageContaining("Line 1");
        assertThatThrownBy(() -> read("")).hasMessageContaining("one point a line");
        assertThatThrownBy(() -> read("20\tbanana 3 kg")).isInstanceOf(RuntimeException.class);
    }
}
