package slantfall.flow.slot;

import slantfall.numerics.Quadrature;

/**
 * How uneven the developed velocity profile of a slot is: the factors by which its momentum and kinetic energy exceed
 * those of a flat profile with the same flow. 6/5 and 54/35 for flow by pressure alone.
 */
public final class ProfileFactors {

    /** Gauss–Legendre nodes and weights on (0, 1); u³ is of degree six, for which four points would be exact. */
    private static final double[][] GAUSS = Quadrature.unitGauss(12);

    private ProfileFactors() {}

    /** ⟨u²⟩/u_m² from the driving gradient G [Pa/m], viscosity [Pa s], gap [m] and wall speed [m/s]. */
    public static double momentum(double gradient, double viscosity, double gap, double wallSpeed) {
        return factor(gradient, viscosity, gap, wallSpeed, 2);
    }

    /** ⟨u³⟩/u_m³ from the driving gradient G [Pa/m], viscosity [Pa s], gap [m] and wall speed [m/s]. */
    public static double energy(double gradient, double viscosity, double gap, double wallSpeed) {
        return factor(gradient, viscosity, gap, wallSpeed, 3);
    }

    private static double factor(double gradient, double viscosity, double gap, double wallSpeed, int power) {
        double mean = NewtonianSlot.flow(gradient, viscosity, gap, wallSpeed) / gap;
        double sum = 0;
        for (int i = 0; i < GAUSS[0].length; i++) {
            double u = NewtonianSlot.velocity(gradient, viscosity, gap, wallSpeed, gap * GAUSS[0][i]) / mean;
            sum += GAUSS[1][i] * (power == 2 ? u * u : u * u * u);
        }
        return sum;
    }
}
