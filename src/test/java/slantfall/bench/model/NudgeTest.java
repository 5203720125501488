package slantfall.bench.model;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Steps that a person would take. */
class NudgeTest {

    @ParameterizedTest
    @CsvSource({"0.45,0.5", "0.0149,0.01", "1.6,2", "7.4,5", "7.6,10", "3.4e-5,2e-5", "250,200", "1000,1000"})
    void stepsAreOneTwoOrFive(double wanted, String nice) {
        assertThat(Nudge.nice(wanted)).isEqualByComparingTo(nice);
    }

    @Test
    void snapsToTheNearestMultiple() {
        assertThat(Nudge.snap(0.1031, new BigDecimal("0.002"))).isEqualByComparingTo("0.104");
        assertThat(Nudge.snap(-7.3, new BigDecimal("0.5"))).isEqualByComparingTo("-7.5");
    }

    @Test
    void aNumberBetweenTwoMultiplesGoesToTheNextOne() {
        assertThat(Nudge.moved(14.04, new BigDecimal("0.5"), 1)).isEqualByComparingTo("14.5");
        assertThat(Nudge.moved(14.04, new BigDecimal("0.5"), -1)).isEqualByComparingTo("14");
        assertThat(Nudge.moved(14.5, new BigDecimal("0.5"), 1)).isEqualByComparingTo("15");
    }

    @Test
    void aFloatThatIsAMultipleButForItsLastBitCountsAsOne() {
        assertThat(Nudge.moved(0.1 + 0.2, new BigDecimal("0.1"), 1)).isEqualByComparingTo("0.4");
        assertThat(Nudge.moved(0.30000000000000004, new BigDecimal("0.1"), -1)).isEqualByComparingTo("0.2");
    }

    @Test
    void textHasNoSpareZeros() {
        assertThat(Nudge.text(new BigDecimal("0.1200"))).isEqualTo("0.12");
        assertThat(Nudge.text(new BigDecimal("1200"))).isEqualTo("1200");
        assertThat(Nudge.text(new BigDecimal("0.00"))).isEqualTo("0");
        assertThat(Nudge.text(new BigDecimal("1.5e12"))).isEqualTo("1.5E+12");
    }
}
