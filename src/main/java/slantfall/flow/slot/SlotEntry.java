package slantfall.flow.slot;

/** Length over which the profile in a slot develops, from a flat inlet to 99 % of the developed centre velocity. */
public final class SlotEntry {

    private SlotEntry() {}

    /**
     * R.-Y. Chen, J. Fluids Eng. 95 (1973) 153, constants from memory: L/D_h = 0.315/(0.0175 Re + 1) + 0.011 Re.
     *
     * @param reynolds 2b u_m/ν, on D_h = 2b
     * @return length over D_h
     */
    public static double chen(double reynolds) {
        return 0.315 / (0.0175 * reynolds + 1) + 0.011 * reynolds;
    }

    /**
     * Durst, Ray, Ünsal and Bayoumi, J. Fluids Eng. 127 (2005) 1154, channel constants from memory: on the gap L/b =
     * [0.631^1.6 + (0.0442 Re_b)^1.6]^(1/1.6) with Re_b = u_m b/ν.
     *
     * @param reynolds 2b u_m/ν, on D_h = 2b
     * @return length over D_h
     */
    public static double durst(double reynolds) {
        double inertial = 0.0442 * reynolds / 2;
        return Math.pow(Math.pow(0.631, 1.6) + Math.pow(inertial, 1.6), 1 / 1.6) / 2;
    }
}
