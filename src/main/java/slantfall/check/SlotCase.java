package slantfall.check;

/**
 * The numbers of a slot that criteria look at.
 *
 * @param reynolds 2b|u_m|/ν, on D_h = 2b
 * @param gapInlet gap at the inlet [m]
 * @param gapOutlet gap at the outlet [m]
 * @param length length [m]
 * @param sideWallFactor flow with side walls over flow of the wide slot, pressure and gravity part
 * @param lowestPressure lowest absolute pressure inside [Pa]
 * @param vapourPressure absolute pressure at which the liquid boils [Pa], NaN if unknown
 * @param onwardness 1 for pressure flow, 0 where reversal of the profile begins; NaN without flow
 */
public record SlotCase(
        double reynolds,
        double gapInlet,
        double gapOutlet,
        double length,
        double sideWallFactor,
        double lowestPressure,
        double vapourPressure,
        double onwardness) {

    /** Change of gap per length. */
    double slope() {
        return Math.abs(gapOutlet - gapInlet) / length;
    }
}
