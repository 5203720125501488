package slantfall.declare;

/**
 * Signed, scaled distance from a limit: 0 at the limit, positive on the clear side, 1 means a factor of e (logarithmic)
 * or the full span (linear) away, clamped to ±20.
 */
public final class Margin {

    /** Largest magnitude. A limit of zero gives −20, a value of zero below a limit +20. */
    public static final double CLAMP = 20;

    private Margin() {}

    /**
     * Margin of a value that must not exceed a limit, logarithmic.
     *
     * @param value the value; zero or less is as far on the clear side as can be told
     * @param limit the limit; zero or less cannot be met by a positive value
     */
    public static double atMostLog(double value, double limit) {
        if (Double.isNaN(value) || Double.isNaN(limit)) {
            return Double.NaN;
        }
        if (value <= 0) {
            return CLAMP;
        }
        return limit <= 0 ? -CLAMP : clamp(Math.log(limit / value));
    }

    /** Margin of a value that must not fall below a limit, logarithmic. */
    public static double atLeastLog(double value, double limit) {
        if (Double.isNaN(value) || Double.isNaN(limit)) {
            return Double.NaN;
        }
        if (limit <= 0) {
            return CLAMP;
        }
        return value <= 0 ? -CLAMP : clamp(Math.log(value / limit));
    }

    /** Margin of a value on one side of a limit, by the check's or reading's own scale. */
    public static double of(Side side, Scale scale, double span, double value, double limit) {
        if (scale == Scale.LOG) {
            return side == Side.AT_MOST ? atMostLog(value, limit) : atLeastLog(value, limit);
        }
        double distance = (side == Side.AT_MOST ? limit - value : value - limit) / span;
        return clamp(distance);
    }

    /** Keeps NaN, limits everything else to ±{@value #CLAMP}. */
    public static double clamp(double margin) {
        return margin > CLAMP ? CLAMP : margin < -CLAMP ? -CLAMP : margin;
    }
}
