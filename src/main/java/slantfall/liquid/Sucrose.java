package slantfall.liquid;

import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Viscosity of sucrose in water by Génotelle 1978, in Mathlouthi and Reiser (eds) 1995, Sucrose, eq. 6.29, as quoted in
 * three public files: log₁₀ μ[mPa s] = 22.46N − 0.114 + φ(1.1 + 43.1N^1.25), N = B/(1900 − 18B), φ = (30 − t)/(91 + t), B in
 * mass per cent, t in °C. 3.6 % low at zero sugar: not to be used near water.
 */
final class Sucrose {

    static final Source SOURCE = new Source(
            "genotelle-1978", "Génotelle 1978, in Mathlouthi and Reiser 1995, Sucrose", "equation 6.29", Mark.SECOND_HAND);

    private Sucrose() {}

    /** Dynamic viscosity [Pa s]. */
    static double viscosity(double temperature, double w) {
        double t = temperature - 273.15;
        double percent = 100 * w;
        double n = percent / (1900 - 18 * percent);
        double phi = (30 - t) / (91 + t);
        return 1e-3 * Math.pow(10, 22.46 * n - 0.114 + phi * (1.1 + 43.1 * Math.pow(n, 1.25)));
    }
}
