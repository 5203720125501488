package slantfall.flow.film;

/**
 * The two heat-transfer laws whose crossing is the turbulent limit of K. R. Chun and R. A. Seban, J. Heat Transfer 93
 * (1971) 391: h* = (α/k)(ν²/g)^⅓, on 4Γ/μ.
 *
 * <p>Wavy: 0.821 (4Γ/μ)^−0.22; turbulent: 0.0038 (4Γ/μ)^0.4 Pr^0.65 (both second-hand, in two public evaporator files).
 * They cross at 5827 Pr^−1.048, of which the printed limits 5800 Pr^−1.06 and 5840 Pr^−1.06 are roundings.
 */
public final class EvaporatingFilm {

    private static final double WAVY = 0.821;
    private static final double WAVY_POWER = -0.22;
    private static final double TURBULENT = 0.0038;
    private static final double TURBULENT_POWER = 0.4;
    private static final double PRANDTL_POWER = 0.65;

    private EvaporatingFilm() {}

    /** h* of a wavy laminar film from 4Γ/μ. */
    public static double wavy(double fourGamma) {
        return WAVY * Math.pow(fourGamma, WAVY_POWER);
    }

    /** h* of a turbulent film from 4Γ/μ and Pr. */
    public static double turbulent(double fourGamma, double prandtl) {
        return TURBULENT * Math.pow(fourGamma, TURBULENT_POWER) * Math.pow(prandtl, PRANDTL_POWER);
    }

    /** 4Γ/μ at which the two laws give the same h*. */
    public static double crossing(double prandtl) {
        double ratio = WAVY / TURBULENT * Math.pow(prandtl, -PRANDTL_POWER);
        return Math.pow(ratio, 1 / (TURBULENT_POWER - WAVY_POWER));
    }
}
