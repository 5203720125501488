package slantfall.declare;

/**
 * An interval of a quantity in SI units, each end open or closed.
 *
 * @param low lower end [SI]
 * @param lowOpen true if the lower end itself is excluded
 * @param high upper end [SI]
 * @param highOpen true if the upper end itself is excluded
 */
public record Interval(double low, boolean lowOpen, double high, boolean highOpen) {

    public Interval {
        if (!(low <= high)) {
            throw new IllegalArgumentException("interval: low " + low + " must not exceed high " + high);
        }
    }

    /** Both ends included. */
    public static Interval closed(double low, double high) {
        return new Interval(low, false, high, false);
    }

    /** Lower end excluded, for quantities that must be positive. */
    public static Interval above(double low, double high) {
        return new Interval(low, true, high, false);
    }

    /** Whether the value lies inside; NaN never does. */
    public boolean contains(double value) {
        boolean aboveLow = lowOpen ? value > low : value >= low;
        boolean belowHigh = highOpen ? value < high : value <= high;
        return aboveLow && belowHigh;
    }

    /** Distance between the ends [SI]. */
    public double span() {
        return high - low;
    }

    /** The value moved to the nearest included place. */
    public double clamp(double value) {
        return Math.max(low, Math.min(high, value));
    }
}
