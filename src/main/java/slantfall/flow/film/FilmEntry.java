package slantfall.flow.film;

/**
 * Length over which a film settles to its developed thickness.
 *
 * <p>Integral momentum balance with the parabolic profile, (6/5) d(q²/h)/dx = g_s h − 3νq/h² (von Kármán's method;
 * derived here), linearised about the developed thickness: the excess decays as exp(−x/ℓ), ℓ = (2/15) Re h with Re = Γ/μ,
 * so that 1 % is left after ln(100) ℓ = 0.614 Re h. The normal part of gravity is left out. For Re → 0 the profile
 * settles over the film's own depth: the creeping limit of a channel twice as deep, 0.631·2h (Durst et al. 2005, from
 * memory), joined by their exponent 1.6.
 */
public final class FilmEntry {

    /** ln(100)·2/15: length to 1 % over Re h. */
    public static final double INERTIAL = Math.log(100) * 2 / 15;

    /** Creeping limit over h: Durst et al. 2005 channel constant on the doubled depth, from memory. */
    public static final double CREEPING = 2 * 0.631;

    private static final double JOIN = 1.6;

    private static final double CREEPING_JOINED = Math.pow(CREEPING, JOIN);

    private FilmEntry() {}

    /**
     * Entry length [m].
     *
     * @param reynolds Γ/μ
     * @param thickness developed thickness [m]
     */
    public static double length(double reynolds, double thickness) {
        // x^p as exp(p ln x), a third of the time of the general power.
        double inertial = reynolds == 0 ? 0 : Math.exp(JOIN * Math.log(INERTIAL * reynolds));
        return thickness * Math.exp(Math.log(CREEPING_JOINED + inertial) / JOIN);
    }
}
