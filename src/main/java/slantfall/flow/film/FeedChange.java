package slantfall.flow.film;

/**
 * How a change of feed runs down a smooth laminar film: kinematic waves, ∂h/∂t + ∂q(h)/∂x = 0 with q = g_s h³/(3ν).
 *
 * <p>More feed catches up with less and runs as a front; less feed lags behind more and opens a fan (M. J. Lighthill and
 * G. B. Whitham, Proc. R. Soc. A 229 (1955) 281, from memory; for a film computed here). Inertia, surface tension and
 * the normal part of gravity are left out, so a front is a jump where the real one has a length.
 */
public final class FeedChange {

    private FeedChange() {}

    /**
     * Speed of the front between two thicknesses, (q₂ − q₁)/(h₂ − h₁) [m/s].
     *
     * <p>Onto a dry wall (one thickness 0) it is the mean velocity of the film behind; for a small step it is three times
     * that, the speed of small waves.
     *
     * @param gravity gravity along the plate g sin β [m/s²]
     * @param kinematicViscosity ν [m²/s]
     * @param ahead thickness downstream [m]
     * @param behind thickness upstream [m]
     */
    public static double front(double gravity, double kinematicViscosity, double ahead, double behind) {
        if (ahead == behind) {
            return edge(gravity, kinematicViscosity, ahead);
        }
        double difference = NewtonianFilm.flow(gravity, kinematicViscosity, 0, behind)
                - NewtonianFilm.flow(gravity, kinematicViscosity, 0, ahead);
        return difference / (behind - ahead);
    }

    /**
     * Speed at which a thickness travels in a fan, 3u_m [m/s].
     *
     * @param gravity gravity along the plate g sin β [m/s²]
     * @param kinematicViscosity ν [m²/s]
     * @param thickness the thickness followed [m]
     */
    public static double edge(double gravity, double kinematicViscosity, double thickness) {
        return NewtonianFilm.waveVelocity(gravity, kinematicViscosity, 0, thickness);
    }

    /**
     * Thickness inside a fan, √(νx/(g_s t)) [m].
     *
     * @param gravity gravity along the plate g sin β [m/s²]
     * @param kinematicViscosity ν [m²/s]
     * @param distance from where the feed changed [m]
     * @param time since the feed changed, above 0 [s]
     */
    public static double fanThickness(double gravity, double kinematicViscosity, double distance, double time) {
        return Math.sqrt(kinematicViscosity * distance / (gravity * time));
    }
}
