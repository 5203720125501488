package slantfall.liquid;

/**
 * Viscosity of water by a common handbook fit of Vogel's form, 2.414e-5·10^(247.8/(T − 140)) Pa s (from memory): within
 * 0.7 % of IAPWS from 20 to 60 °C. Only for comparison.
 */
public final class HandbookWater {

    private HandbookWater() {}

    /** Dynamic viscosity [Pa s] at a temperature [K]. */
    public static double viscosity(double temperature) {
        return 2.414e-5 * Math.pow(10, 247.8 / (temperature - 140));
    }
}
