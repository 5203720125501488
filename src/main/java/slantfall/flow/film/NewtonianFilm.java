package slantfall.flow.film;

import slantfall.numerics.Cubic;

/**
 * Steady, fully developed laminar film of a Newtonian liquid with a shear stress on its surface.
 *
 * <p>u(y) = (ρg_s/μ)(hy − y²/2) + τ_i y/μ, q = ρg_s h³/(3μ) + τ_i h²/(2μ), τ(y) = ρg_s(h − y) + τ_i, with g_s = g sin β
 * the gravity along the plate, y from the plate, τ_i the stress that gas or another liquid puts on the surface (positive
 * downhill). Without τ_i this is Nusselt's film (W. Nusselt, Z. VDI 60 (1916) 541, 569); with it, the superposition of
 * two solutions of the same linear equation.
 */
public final class NewtonianFilm {

    private NewtonianFilm() {}

    /**
     * Flow per width [m²/s].
     *
     * @param gradient body force along the plate ρ g sin β [N/m³]
     * @param viscosity dynamic viscosity [Pa s]
     * @param shear stress on the surface, positive downhill [Pa]
     * @param thickness film thickness [m]
     */
    public static double flow(double gradient, double viscosity, double shear, double thickness) {
        double h2 = thickness * thickness;
        return (gradient * thickness / 3 + shear / 2) * h2 / viscosity;
    }

    /**
     * Thickness that carries a flow [m]; 0 for no flow without gas drag uphill, NaN where no steady film exists.
     *
     * <p>For a positive flow the cubic has exactly one positive root whatever the sign of the shear. A horizontal plate
     * needs a shear that drives the film.
     *
     * @param gradient body force along the plate ρ g sin β, 0 or more [N/m³]
     * @param viscosity dynamic viscosity [Pa s]
     * @param shear stress on the surface, positive downhill [Pa]
     * @param flow flow per width, 0 or more [m²/s]
     */
    public static double thickness(double gradient, double viscosity, double shear, double flow) {
        if (flow == 0) {
            return 0;
        }
        if (gradient == 0) {
            return shear > 0 ? Math.sqrt(2 * viscosity * flow / shear) : Double.NaN;
        }
        if (shear == 0) {
            return Math.cbrt(3 * viscosity * flow / gradient);
        }
        return Cubic.positiveRoot(gradient / 3, shear / 2, 0, -viscosity * flow);
    }

    /** Velocity at a distance from the plate [m/s]. */
    public static double velocity(double gradient, double viscosity, double shear, double thickness, double y) {
        return (gradient * (thickness - y / 2) + shear) * y / viscosity;
    }

    /** Shear stress at a distance from the plate, that of the upper on the lower liquid [Pa]. */
    public static double stress(double gradient, double shear, double thickness, double y) {
        return gradient * (thickness - y) + shear;
    }

    /** Speed of small long waves, dq/dh at fixed surface shear [m/s]. */
    public static double waveVelocity(double gradient, double viscosity, double shear, double thickness) {
        return (gradient * thickness + shear) * thickness / viscosity;
    }

    /** Largest velocity downhill [m/s]; below the surface where the gas drags the surface uphill. */
    public static double largestVelocity(double gradient, double viscosity, double shear, double thickness) {
        double slowing = gradient * thickness + shear;
        if (shear >= 0 || gradient == 0) {
            return velocity(gradient, viscosity, shear, thickness, thickness);
        }
        return slowing <= 0 ? 0 : slowing * slowing / (2 * gradient * viscosity);
    }

    /** Whether the surface runs uphill: ρ g sin β h < −2τ_i. */
    public static boolean uphillSurface(double gradient, double shear, double thickness) {
        return gradient * thickness + 2 * shear < 0;
    }
}
