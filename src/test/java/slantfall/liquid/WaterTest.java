package slantfall.liquid;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class WaterTest {

    /** IAPWS SR6-08(2011), table 8, at 260 K and 298.15 K. */
    @Test
    void reproducesTheReleasesTable() {
        assertThat(Water.density(260)).isCloseTo(997.06836, within(1e-5));
        assertThat(Water.viscosity(260)).isCloseTo(3058.36075e-6, within(1e-11));
        assertThat(Water.conductivity(260)).isCloseTo(0.51562801, within(1e-8));
        assertThat(Water.heatCapacity(260)).isCloseTo(4300.17472, within(1e-4));
        assertThat(Water.density(298.15)).isCloseTo(997.047013, within(1e-6));
        assertThat(Water.viscosity(298.15)).isCloseTo(889.996774e-6, within(1e-12));
        assertThat(Water.conductivity(298.15)).isCloseTo(0.606502308, within(1e-9));
        assertThat(Water.heatCapacity(298.15)).isCloseTo(4181.44618, within(1e-5));
    }

    /** IAPWS R1-76(2014), table 1: 20, 60 and 100 °C, printed to 0.01 mN/m. */
    @Test
    void reproducesTheTableOfSurfaceTension() {
        assertThat(Water.surfaceTension(293.15)).isCloseTo(72.74e-3, within(0.005e-3));
        assertThat(Water.surfaceTension(333.15)).isCloseTo(66.24e-3, within(0.005e-3));
        assertThat(Water.surfaceTension(373.15)).isCloseTo(58.91e-3, within(0.005e-3));
        assertThat(Water.surfaceTension(700)).isZero();
    }

    /**
     * Saturation pressures of IAPWS R7-97(2012), table 35: another equation by the same body; the two agree within 0.025 %.
     */
    @Test
    void agreesWithTheIndustrialFormulationOnVapourPressure() {
        assertThat(Water.vapourPressure(300)).isCloseTo(3.53658941e3, within(3.53658941e3 * 2.5e-4));
        assertThat(Water.vapourPressure(500)).isCloseTo(2.63889776e6, within(2.63889776e6 * 2.5e-4));
        assertThat(Water.vapourPressure(600)).isCloseTo(12.3443146e6, within(12.3443146e6 * 2.5e-4));
    }

    /** Normal boiling point 99.974 °C on ITS-90 (Wagner and Pruss 1993). */
    @Test
    void boilsWhereItShould() {
        assertThat(Water.vapourPressure(273.15 + 99.974)).isCloseTo(101325, within(20.0));
    }
}
