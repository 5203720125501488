package slantfall.arrangement;

import java.util.List;
import slantfall.declare.Profile;
import slantfall.declare.Profile.Column;
import slantfall.flow.slot.NewtonianSlot;
import slantfall.flow.slot.TaperedSlot;
import slantfall.quantity.Kind;

/** Traverses across and courses along a slot. */
final class SlotProfiles {

    private static final int POINTS = 41;

    private SlotProfiles() {}

    /** Velocity, shear stress and shear rate of the wide slot, in the middle of the length. */
    static Profile across(SlotPoint p) {
        double x = p.inputs().shape().length() / 2;
        double gap = p.inputs().shape().gap(x);
        double gradient = p.gradient(gap);
        double wall = p.inputs().wallSpeed();
        double[] y = new double[POINTS];
        double[] velocity = new double[POINTS];
        double[] stress = new double[POINTS];
        double[] rate = new double[POINTS];
        for (int i = 0; i < POINTS; i++) {
            y[i] = gap * i / (POINTS - 1);
            velocity[i] = NewtonianSlot.velocity(gradient, p.viscosity(), gap, wall, y[i]);
            stress[i] = NewtonianSlot.stress(gradient, p.viscosity(), gap, wall, y[i]);
            rate[i] = stress[i] / p.viscosity();
        }
        return new Profile(
                new Column("y", "Distance from the lower wall", Kind.LENGTH, y),
                x,
                List.of(
                        new Column("velocity", "Velocity", Kind.VELOCITY, velocity),
                        new Column("shearStress", "Shear stress", Kind.STRESS, stress),
                        new Column("shearRate", "Shear rate", Kind.SHEAR_RATE, rate)));
    }

    /** Absolute pressure of the developed flow and gap, from the inlet to the outlet. */
    static Profile along(SlotPoint p) {
        TaperedSlot.Shape shape = p.inputs().shape();
        double[] x = new double[POINTS];
        double[] pressure = new double[POINTS];
        double[] gap = new double[POINTS];
        for (int i = 0; i < POINTS; i++) {
            x[i] = place(shape, (double) i / (POINTS - 1));
            gap[i] = shape.gap(x[i]);
            pressure[i] = p.inletPressure()
                    + TaperedSlot.pressure(p.flowPerWidth(), p.viscosity(), shape, p.drive(), x[i]);
        }
        return new Profile(
                new Column("x", "Distance from the inlet", Kind.LENGTH, x),
                Double.NaN,
                List.of(
                        new Column("pressure", "Pressure", Kind.PRESSURE_ABSOLUTE, pressure),
                        new Column("gap", "Gap", Kind.LENGTH, gap)));
    }

    /** Places with equal ratios of gap from one to the next, so that the steep pressure at a narrow end is drawn smooth. */
    private static double place(TaperedSlot.Shape shape, double part) {
        double b1 = shape.inlet();
        double b2 = shape.outlet();
        if (part == 0 || part == 1 || b1 == b2) {
            return part * shape.length();
        }
        return shape.length() * b1 * (Math.pow(b2 / b1, part) - 1) / (b2 - b1);
    }
}
