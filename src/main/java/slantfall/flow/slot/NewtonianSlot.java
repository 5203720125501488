package slantfall.flow.slot;

/**
 * Steady developed laminar flow of a Newtonian liquid between two walls, the upper sliding in its own plane.
 *
 * <p>G = Δp/L + ρ g sin β drives, y from the lower wall: u = G y(b − y)/(2μ) + U y/b, q = G b³/(12μ) + U b/2, μ du/dy =
 * G(b/2 − y) + μU/b. Couette–Poiseuille flow, exact. Signs are positive downhill.
 */
public final class NewtonianSlot {

    private NewtonianSlot() {}

    /** Flow per width [m²/s] from the driving gradient G [Pa/m], viscosity [Pa s], gap [m] and wall speed [m/s]. */
    public static double flow(double gradient, double viscosity, double gap, double wallSpeed) {
        return gradient * gap * gap * gap / (12 * viscosity) + wallSpeed * gap / 2;
    }

    /** Driving gradient [Pa/m] that a flow per width needs at a place where the gap is b. */
    public static double gradient(double flow, double viscosity, double gap, double wallSpeed) {
        return 12 * viscosity * (flow - wallSpeed * gap / 2) / (gap * gap * gap);
    }

    /** Velocity at a distance from the lower wall [m/s]. */
    public static double velocity(double gradient, double viscosity, double gap, double wallSpeed, double y) {
        return gradient * y * (gap - y) / (2 * viscosity) + wallSpeed * y / gap;
    }

    /** μ du/dy at a distance from the lower wall [Pa]. */
    public static double stress(double gradient, double viscosity, double gap, double wallSpeed, double y) {
        return gradient * (gap / 2 - y) + viscosity * wallSpeed / gap;
    }

    /** The velocity of largest magnitude across the gap, with its sign [m/s]. */
    public static double extremeVelocity(double gradient, double viscosity, double gap, double wallSpeed) {
        if (gradient == 0) {
            return wallSpeed;
        }
        double place = gap / 2 + viscosity * wallSpeed / (gradient * gap);
        if (!(place > 0 && place < gap)) {
            return wallSpeed;
        }
        double inside = velocity(gradient, viscosity, gap, wallSpeed, place);
        return Math.abs(inside) >= Math.abs(wallSpeed) ? inside : wallSpeed;
    }

    /**
     * How far the profile is from turning back somewhere, 1 for pure pressure flow, 0 where reversal begins, negative
     * where part of the liquid runs against the net flow; NaN without net flow.
     *
     * <p>With the moving wall running with the net flow it is the stress at the resting wall over that of a pressure flow
     * of the same mean velocity, τ b/(6μu_m); with a wall that runs against it, the wall's speed over the mean velocity.
     */
    public static double onwardness(double flow, double gap, double wallSpeed) {
        if (flow == 0) {
            return Double.NaN;
        }
        double wallOverMean = wallSpeed * gap / flow;
        return wallOverMean < 0 ? wallOverMean : 1 - wallOverMean / 3;
    }

    /**
     * Largest temperature rise above two walls of equal temperature from the combined dissipation [K].
     *
     * <p>k T″ = −μ(u′)² with u′ linear in y. With w = 1 − 2y/b and A = Gb²/(2μ): T = (μ/4k)[A²(1 − w⁴)/12 + AU(w − w³)/3 +
     * U²(1 − w²)/2] (derived here). Drag alone gives μU²/8k, pressure alone 3μu_m²/4k; they do not add. T is concave in
     * w, so its single maximum is found by bisection of the derivative.
     */
    public static double viscousRise(double gradient, double viscosity, double gap, double wallSpeed, double conductivity) {
        double a = gradient * gap * gap / (2 * viscosity);
        double u = wallSpeed;
        double w = hottest(a, u);
        double w2 = w * w;
        double shape = a * a * (1 - w2 * w2) / 12 + a * u * w * (1 - w2) / 3 + u * u * (1 - w2) / 2;
        return viscosity / (4 * conductivity) * shape;
    }

    private static double hottest(double a, double u) {
        if (a == 0 || u == 0) {
            return 0;
        }
        double low = -1;
        double high = 1;
        for (int i = 0; i < 60 && high - low > 1e-9; i++) {
            double w = (low + high) / 2;
            double slope = -a * a * w * w * w + a * u * (1 - 3 * w * w) - 3 * u * u * w;
            if (slope > 0) {
                low = w;
            } else {
                high = w;
            }
        }
        return (low + high) / 2;
    }
}
