package slantfall.check;

/**
 * The numbers of a film that criteria look at.
 *
 * @param angle incline from the horizontal [rad]
 * @param reynolds Γ/μ
 * @param filmNumber Ka_f = σ³ρ/(gμ⁴), NaN if the surface tension is unknown
 * @param prandtl Pr, NaN if unknown
 * @param gradient ρ g sin β [N/m³]
 * @param shear stress on the surface, positive downhill [Pa]
 * @param thickness film thickness [m]
 * @param length length of the incline [m]
 * @param entryLength length over which the film settles [m]
 * @param logs logarithms that many limits share
 */
public record FilmCase(
        double angle,
        double reynolds,
        double filmNumber,
        double prandtl,
        double gradient,
        double shear,
        double thickness,
        double length,
        double entryLength,
        Logs logs) {

    /**
     * Logarithms that many limits share, so that a margin costs no power.
     *
     * @param reynolds ln Γ/μ
     * @param filmNumber ln Ka_f
     */
    public record Logs(double reynolds, double filmNumber) {

        /** Of a Reynolds number Γ/μ and a film number. */
        public static Logs of(double reynolds, double filmNumber) {
            return new Logs(Math.log(reynolds), Math.log(filmNumber));
        }
    }

    /** Whether the film runs under still air, which every published regime limit assumes. */
    boolean stillAir() {
        return shear == 0;
    }
}
