package slantfall.figure;

/**
 * Liquid running along a straight wall, as the section draws it.
 *
 * @param angle incline from the horizontal, negative where the outlet lies above the inlet [rad]
 * @param length length along the flow [m]
 * @param inletDepth thickness or gap at the inlet [m]
 * @param outletDepth thickness or gap at the outlet [m]
 * @param upper what bounds the liquid above
 * @param stresses at the walls
 * @param grips what can be dragged
 */
record Strip(
        double angle,
        double length,
        double inletDepth,
        double outletDepth,
        Upper upper,
        Stresses stresses,
        Grips grips) {

    /** Whether there is a thickness to draw. */
    boolean filled() {
        return inletDepth > 0 && outletDepth > 0;
    }

    double deepest() {
        return Math.max(inletDepth, outletDepth);
    }

    double depth(double part) {
        return inletDepth + (outletDepth - inletDepth) * part;
    }

    /**
     * What bounds the liquid above.
     *
     * @param wall a wall, otherwise a free surface
     * @param speed speed of that wall, positive downhill [m/s]
     */
    record Upper(boolean wall, double speed) {}

    /**
     * Stresses that are drawn, μ du/dy [Pa], NaN where none.
     *
     * @param lower at the lower wall
     * @param upper at the upper wall or surface
     */
    record Stresses(double lower, double upper) {}

    /**
     * What can be dragged.
     *
     * @param depth setting or reading of the thickness at the inlet
     * @param depthBy setting that answers where the thickness is a reading, empty otherwise
     * @param outlet setting of the gap at the outlet, empty if none
     * @param speed setting of the wall's speed, empty if none
     * @param anyAngle whether the angle may be negative
     */
    record Grips(String depth, String depthBy, String outlet, String speed, boolean anyAngle) {}
}
