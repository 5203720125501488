package slantfall.flow.slot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Profile factors, entry lengths and turbulent friction. */
class SlotLawsTest {

    /** Pressure flow 6/5 and 54/35, drag flow 4/3 and 2: integrals of the parabola and of the straight line. */
    @Test
    void profileFactorsOfPressureAndOfDrag() {
        assertThat(ProfileFactors.momentum(3e4, 0.1, 2e-3, 0)).isCloseTo(1.2, offset(1e-12));
        assertThat(ProfileFactors.energy(3e4, 0.1, 2e-3, 0)).isCloseTo(54.0 / 35, offset(1e-12));
        assertThat(ProfileFactors.momentum(0, 0.1, 2e-3, 0.4)).isCloseTo(4.0 / 3, offset(1e-12));
        assertThat(ProfileFactors.energy(0, 0.1, 2e-3, 0.4)).isCloseTo(2, offset(1e-12));
    }

    @ParameterizedTest
    @ValueSource(doubles = {3000, 5000, 20000, 1e5, 1e7})
    void darcySolvesItsLaw(double reynolds) {
        double f = TurbulentSlot.darcy(reynolds);
        assertThat(1 / Math.sqrt(f)).isCloseTo(2 * Math.log10(reynolds * Math.sqrt(f)) - 0.8, offset(1e-10));
    }

    /** Dean 1978, C_f = 0.073 (u_m b/ν)^−¼ from channel measurements (second-hand), Darcy 4 C_f. */
    @ParameterizedTest
    @ValueSource(doubles = {5000, 10000, 50000})
    void wideSlotsAgreeWithDean(double reynolds) {
        double dean = 4 * 0.073 * Math.pow(reynolds / 2, -0.25);
        double equivalent = TurbulentSlot.laminarEquivalent(0) * reynolds;
        assertThat(TurbulentSlot.darcy(equivalent)).isCloseTo(dean, withPercentage(3));
    }

    /** Two authors of the entry length within 10 % of each other. */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 10, 100, 1000, 2000})
    void chenAndDurstAgree(double reynolds) {
        assertThat(SlotEntry.chen(reynolds)).isCloseTo(SlotEntry.durst(reynolds), withPercentage(10));
    }
}
