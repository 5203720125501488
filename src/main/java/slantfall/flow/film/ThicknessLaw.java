package slantfall.flow.film;

import slantfall.source.Source;

/**
 * Mean thickness of a film as a function of its flow: h = d*(ν²/g_s)^⅓ with d* a power of Re = Γ/μ.
 *
 * @param key stable key of the author
 * @param name author and range in words
 * @param factor d* at Re = 1
 * @param exponent power of Re
 * @param from lowest Γ/μ at which it was tested
 * @param to highest Γ/μ at which it was tested
 * @param formula as printed
 * @param source where it is published
 */
public record ThicknessLaw(
        String key, String name, double factor, double exponent, double from, double to, String formula, Source source) {

    /**
     * Thickness over (ν²/g_s)^⅓.
     *
     * @param reynolds Γ/μ
     */
    public double dimensionless(double reynolds) {
        return factor * Math.pow(reynolds, exponent);
    }

    /**
     * Thickness [m].
     *
     * @param reynolds Γ/μ
     * @param kinematicViscosity ν [m²/s]
     * @param gravity gravity along the plate g sin β [m/s²]
     */
    public double thickness(double reynolds, double kinematicViscosity, double gravity) {
        return dimensionless(reynolds) * Math.cbrt(kinematicViscosity * kinematicViscosity / gravity);
    }

    /** Whether a flow lies where the law was tested. */
    public boolean covers(double reynolds) {
        return reynolds >= from && reynolds <= to;
    }
}
