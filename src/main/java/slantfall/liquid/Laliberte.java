package slantfall.liquid;

import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Aqueous electrolytes and sugar by M. Laliberté, J. Chem. Eng. Data 52 (2007) 321 with the updated coefficients of 54
 * (2009) 1725, as quoted in a public data table.
 *
 * <p>Viscosity: μ = μ_w^{w_w} Π μ_i^{w_i}, μ_w = (t + 246)/((0.05594t + 5.2842)t + 137.37) mPa s, μ_i = exp[(v₁(1 − w_w)^{v₂} +
 * v₃)/(v₄t + 1)]/[v₅(1 − w_w)^{v₆} + 1] mPa s, t in °C. Density (Laliberté and Cooper 2004): 1/ρ = w_w/ρ_w + w_i/ρ_i, ρ_i = (c₀(1 −
 * w_w) + c₁) exp[10⁻⁶(t + c₄)²]/((1 − w_w) + c₂ + c₃t).
 *
 * @param name stem of the key, the solute in words with hyphens
 * @param v v₁ to v₆
 * @param c c₀ to c₄
 * @param viscosityRange temperatures of the viscosity data [K]
 * @param densityRange temperatures of the density data [K]
 * @param strongest largest mass fraction of the data
 */
record Laliberte(String name, double[] v, double[] c, Range viscosityRange, Range densityRange, double strongest) {

    static final Source SOURCE = new Source(
            "laliberte-2009", "Laliberté 2007, J. Chem. Eng. Data 52, 321; coefficients of 2009, 54, 1725", "", Mark.SECOND_HAND);

    static final Laliberte SODIUM_CHLORIDE = new Laliberte(
            "sodium-chloride",
            new double[] {
                16.221788633396, 1.32293086770011, 1.48485985010431, 0.00746912559657377, 30.7802007540575, 2.05826852322558
            },
            new double[] {
                -0.00324112223655149, 0.0636354335906616, 1.01371399467365, 0.0145951015210159, 3317.34854426537
            },
            Range.celsius(5, 154),
            Range.celsius(0, 140),
            0.2645);

    static final Laliberte SODIUM_HYDROXIDE = new Laliberte(
            "sodium-hydroxide",
            new double[] {
                448.457566713375, 0.00871452408983102, -431.97212334697, 0.0160144202049452, 104.011738670148, 4.64493684488816
            },
            new double[] {
                319.020509469838, 528.592358475315, -0.102197896602724, 0.000350420706415566, 765.970470238438
            },
            Range.celsius(12.5, 70),
            Range.celsius(4, 120),
            0.5029);

    static final Laliberte SUCROSE = new Laliberte(
            "sucrose",
            new double[] {
                16.2391830818804, 1.46930910938613, 3.28485782809427, 0.0102845759149181, 33.9389495762169, 2.28172425556793
            },
            new double[] {
                532.919899042424, 13692.5881480438, 12.6127261369233, 0.0266415899284128, 649.049186827162
            },
            Range.celsius(15, 55),
            Range.celsius(15, 55),
            0.5066);

    /** Viscosity of water in this model [Pa s], t in °C. */
    static double waterViscosity(double t) {
        return 1e-3 * (t + 246) / ((0.05594 * t + 5.2842) * t + 137.37);
    }

    /** Density of water in this model [kg/m³], t in °C. */
    static double waterDensity(double t) {
        double top = ((((-2.8054253e-10 * t + 1.0556302e-7) * t - 4.6170461e-5) * t - 0.0079870401) * t + 16.945176) * t
                + 999.83952;
        return top / (1 + 0.01687985 * t);
    }

    /** Dynamic viscosity [Pa s]. */
    double viscosity(double temperature, double w) {
        double t = temperature - 273.15;
        if (w == 0) {
            return waterViscosity(t);
        }
        double ln = (v[0] * Math.pow(w, v[1]) + v[2]) / (v[3] * t + 1) - Math.log(v[4] * Math.pow(w, v[5]) + 1);
        return Math.exp((1 - w) * Math.log(waterViscosity(t)) + w * (ln + Math.log(1e-3)));
    }

    /** Density [kg/m³]. */
    double density(double temperature, double w) {
        double t = temperature - 273.15;
        double own = (c[0] * w + c[1]) * Math.exp(1e-6 * (t + c[4]) * (t + c[4])) / (w + c[2] + c[3] * t);
        return 1 / ((1 - w) / waterDensity(t) + w / own);
    }
}
