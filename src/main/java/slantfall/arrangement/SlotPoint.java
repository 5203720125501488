package slantfall.arrangement;

import slantfall.flow.duct.RectangularDuct;
import slantfall.flow.slot.NewtonianSlot;
import slantfall.flow.slot.TaperedSlot;

/**
 * A solved slot.
 *
 * @param inputs what was set
 * @param density [kg/m³]
 * @param viscosity [Pa s]
 * @param weight ρ g sin β [N/m³]
 * @param flowPerWidth wide slot [m²/s]
 * @param flow side walls in it [m³/s]
 * @param sideWallFactor pressure and gravity part
 */
record SlotPoint(
        Inputs inputs,
        double density,
        double viscosity,
        double weight,
        double flowPerWidth,
        double flow,
        double sideWallFactor) {

    /** Pressure and gravity together over the length [Pa]. */
    double driving() {
        return inputs.pressureDrop() + weight * inputs.shape().length();
    }

    TaperedSlot.Drive drive() {
        return new TaperedSlot.Drive(weight, inputs.wallSpeed());
    }

    boolean flowing() {
        return flowPerWidth != 0;
    }

    boolean tapered() {
        return inputs.shape().inlet() != inputs.shape().outlet();
    }

    /** Mean velocity at the inlet, side walls in it [m/s]. */
    double meanVelocity() {
        return flow / (inputs.width() * inputs.shape().inlet());
    }

    /** 2b|u_m|/ν of the wide slot, the same along a taper. */
    double reynolds() {
        return 2 * Math.abs(flowPerWidth) * density / viscosity;
    }

    /** Driving gradient at a place with gap b [Pa/m]. */
    double gradient(double gap) {
        return NewtonianSlot.gradient(flowPerWidth, viscosity, gap, inputs.wallSpeed());
    }

    /** Velocity of largest magnitude along the slot; it lies at an end. */
    double maxVelocity() {
        double atInlet = extreme(inputs.shape().inlet());
        double atOutlet = extreme(inputs.shape().outlet());
        return Math.abs(atOutlet) > Math.abs(atInlet) ? atOutlet : atInlet;
    }

    private double extreme(double gap) {
        return NewtonianSlot.extremeVelocity(gradient(gap), viscosity, gap, inputs.wallSpeed());
    }

    /**
     * Stress at a wall where it is largest in magnitude along the slot [Pa].
     *
     * <p>In s = 1/b it is 6μq s² − 2μU s at the lower and −6μq s² + 4μU s at the upper wall, so besides the ends only the
     * vertex of the parabola can be it.
     *
     * @param lower true for the lower wall
     */
    double wallStress(boolean lower) {
        double square = (lower ? 6 : -6) * viscosity * flowPerWidth;
        double linear = (lower ? -2 : 4) * viscosity * inputs.wallSpeed();
        double first = 1 / inputs.shape().inlet();
        double last = 1 / inputs.shape().outlet();
        double largest = larger(parabola(square, linear, first), parabola(square, linear, last));
        double vertex = -linear / (2 * square);
        boolean inside = vertex > Math.min(first, last) && vertex < Math.max(first, last);
        return inside ? larger(largest, parabola(square, linear, vertex)) : largest;
    }

    private static double parabola(double square, double linear, double s) {
        return (square * s + linear) * s;
    }

    private static double larger(double a, double b) {
        return Math.abs(b) > Math.abs(a) ? b : a;
    }

    /** (1 + K_∞)ρu_m²/2 at the mouth where the liquid enters [Pa]. */
    double entryLoss() {
        double gap = flow >= 0 ? inputs.shape().inlet() : inputs.shape().outlet();
        double mean = flow / (inputs.width() * gap);
        return (1 + RectangularDuct.entryLossNumber(gap / inputs.width())) * density * mean * mean / 2;
    }

    /** Absolute pressure at the inlet [Pa]. */
    double inletPressure() {
        return inputs.outletPressure() + inputs.pressureDrop();
    }

    /** Lowest absolute pressure: along the developed flow, and just inside the mouth where the liquid enters [Pa]. */
    double lowestPressure() {
        double along = inletPressure() + TaperedSlot.lowestPressure(flowPerWidth, viscosity, inputs.shape(), drive());
        double mouth = (flow >= 0 ? inletPressure() : inputs.outletPressure()) - entryLoss();
        return Math.min(along, mouth);
    }

    /** Smallest onwardness along the slot: at an end, since it is monotone in the gap. */
    double onwardness() {
        return Math.min(
                NewtonianSlot.onwardness(flowPerWidth, inputs.shape().inlet(), inputs.wallSpeed()),
                NewtonianSlot.onwardness(flowPerWidth, inputs.shape().outlet(), inputs.wallSpeed()));
    }

    /** Largest temperature rise, at the end where it is larger [K]. */
    double viscousRise(double conductivity) {
        return Math.max(rise(inputs.shape().inlet(), conductivity), rise(inputs.shape().outlet(), conductivity));
    }

    private double rise(double gap, double conductivity) {
        return NewtonianSlot.viscousRise(gradient(gap), viscosity, gap, inputs.wallSpeed(), conductivity);
    }

    /**
     * What was set.
     *
     * @param angle [rad]
     * @param shape gaps and length
     * @param width [m]
     * @param pressureDrop inlet minus outlet [Pa]
     * @param outletPressure absolute [Pa]
     * @param wallSpeed upper wall, positive downhill [m/s]
     */
    record Inputs(
            double angle,
            TaperedSlot.Shape shape,
            double width,
            double pressureDrop,
            double outletPressure,
            double wallSpeed) {}
}
