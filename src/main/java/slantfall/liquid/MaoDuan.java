package slantfall.liquid;

import slantfall.source.Mark;
import slantfall.source.Source;

/**
 * Viscosity of sodium chloride brine by S. Mao and Z. Duan, Int. J. Thermophys. 30 (2009) 1510, eqs 2–5: ln(μ/μ_w) = Am +
 * Bm² + Cm³, A = a₀ + a₁T + a₂T² and alike, m molality up to 6 mol/kg, 273 to 623 K; coefficients as quoted in two public
 * libraries. The water here is that of IAPWS SR6-08, so that it holds at 0.1 MPa only.
 */
public final class MaoDuan {

    static final Source SOURCE = new Source(
            "mao-duan-2009", "Mao and Duan 2009, Int. J. Thermophys. 30, 1510", "equations 2 to 5", Mark.SECOND_HAND);

    /** Molar mass of sodium chloride [kg/mol]. */
    private static final double MOLAR_MASS = 58.443e-3;

    private MaoDuan() {}

    /**
     * Viscosity over that of water.
     *
     * @param temperature [K]
     * @param molality [mol/kg of water]
     */
    public static double relative(double temperature, double molality) {
        double t = temperature;
        double a = -0.21319213 + t * (0.13651589e-2 - t * 0.12191756e-5);
        double b = 0.69161945e-1 + t * (-0.27292263e-3 + t * 0.20852448e-6);
        double c = -0.25988855e-2 + t * 0.77989227e-5;
        return Math.exp(molality * (a + molality * (b + molality * c)));
    }

    /** Dynamic viscosity [Pa s] at a temperature [K] and mass fraction of salt. */
    static double viscosity(double temperature, double w) {
        return relative(temperature, w / (MOLAR_MASS * (1 - w))) * Water.viscosity(temperature);
    }
}
