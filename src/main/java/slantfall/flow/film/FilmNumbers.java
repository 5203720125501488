package slantfall.flow.film;

/** Dimensionless numbers of a film, each under the name of its definition. */
public final class FilmNumbers {

    /** Cosine of an angle that is a right one but for rounding. */
    private static final double UPRIGHT = 1e-12;

    private FilmNumbers() {}

    /** Γ/μ, the Reynolds number on mean velocity and thickness. */
    public static double reynolds(double massFlowPerWidth, double viscosity) {
        return massFlowPerWidth / viscosity;
    }

    /** Ka = σ/(ρ g^⅓ ν^{4/3}) with full g, the Kapitza number of wave papers (3389 for water at 20 °C). */
    public static double kapitza(double density, double viscosity, double surfaceTension, double g) {
        double nu = viscosity / density;
        return surfaceTension / (density * Math.cbrt(g) * nu * Math.cbrt(nu));
    }

    /** Ka_f = σ³ρ/(gμ⁴), the film number of regime criteria; the cube of {@link #kapitza}. */
    public static double filmNumber(double density, double viscosity, double surfaceTension, double g) {
        double mu2 = viscosity * viscosity;
        return surfaceTension * surfaceTension * surfaceTension * density / (g * mu2 * mu2);
    }

    /**
     * Γ/μ at which long waves begin to grow: (5/6) cot β (T. B. Benjamin, J. Fluid Mech. 2 (1957) 554; C.-S. Yih, Phys.
     * Fluids 6 (1963) 321; re-derived). Zero on a vertical plate. In 4Γ/μ four times, on surface velocity 1.5 times.
     *
     * @param angle angle from the horizontal, above 0 [rad]
     */
    public static double onset(double angle) {
        double cos = Math.cos(angle);
        return cos < UPRIGHT ? 0 : 5.0 / 6 * cos / Math.sin(angle);
    }

    /** Pr = μ c_p/k. */
    public static double prandtl(double viscosity, double heatCapacity, double conductivity) {
        return viscosity * heatCapacity / conductivity;
    }
}
