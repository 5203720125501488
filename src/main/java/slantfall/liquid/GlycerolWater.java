package slantfall.liquid;

import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Glycerol and water, w the mass fraction of glycerol, t in °C inside.
 *
 * <p>Viscosity by N.-S. Cheng, Ind. Eng. Chem. Res. 47 (2008) 3285, eqs 6, 11–13, 21, 22, 0 to 100 °C: μ = μ_g exp(Aα), A =
 * ln(μ_w/μ_g), α = 1 − w + a b w(1 − w)/(a w + b(1 − w)), a = 0.705 − 0.0017t, b = (4.9 + 0.036t)a^2.5, μ_w =
 * 1.790 exp[(−1230 − t)t/(36100 + 360t)], μ_g = 12100 exp[(−1233 + t)t/(9900 + 70t)] in mPa s. Within 3.5 % of Segur and
 * Oberstar's 1951 table.
 *
 * <p>Density by A. Volk and C. J. Kähler, Exp. Fluids 59 (2018) 75, 15 to 30 °C: ideal mixing of ρ_g = 1273 − 0.612t and
 * ρ_w = 1000[1 − |(t − 3.98)/615|^1.71] times 1 + A sin(w^1.31 π)^0.81, A = 1.78e-6 t² − 1.82e-4 t + 1.41e-2.
 */
public final class GlycerolWater {

    static final Source CHENG = new Source(
            "cheng-2008", "Cheng 2008, Ind. Eng. Chem. Res. 47, 3285", "equations 6, 11 to 13, 21, 22", Mark.SECOND_HAND);
    static final Source VOLK =
            new Source("volk-kaehler-2018", "Volk and Kähler 2018, Exp. Fluids 59, 75", "", Mark.SECOND_HAND);

    private GlycerolWater() {}

    /**
     * Dynamic viscosity [Pa s].
     *
     * @param temperature [K]
     * @param w mass fraction of glycerol
     */
    public static double viscosity(double temperature, double w) {
        double t = temperature - 273.15;
        double water = 1.790e-3 * Math.exp((-1230 - t) * t / (36100 + 360 * t));
        double glycerol = 12.1 * Math.exp((-1233 + t) * t / (9900 + 70 * t));
        double a = 0.705 - 0.0017 * t;
        double b = (4.9 + 0.036 * t) * Math.pow(a, 2.5);
        double alpha = 1 - w + a * b * w * (1 - w) / (a * w + b * (1 - w));
        return glycerol * Math.exp(Math.log(water / glycerol) * alpha);
    }

    /**
     * Density [kg/m³].
     *
     * @param temperature [K]
     * @param w mass fraction of glycerol
     */
    public static double density(double temperature, double w) {
        double t = temperature - 273.15;
        double glycerol = 1273 - 0.612 * t;
        double water = 1000 * (1 - Math.pow(Math.abs((t - 3.98) / 615), 1.71));
        double a = 1.78e-6 * t * t - 1.82e-4 * t + 1.41e-2;
        double contraction = 1 + a * Math.pow(Math.max(0, Math.sin(Math.pow(w, 1.31) * Math.PI)), 0.81);
        double ideal = water + w * (glycerol - water) / (w + glycerol / water * (1 - w));
        return contraction * ideal;
    }
}
