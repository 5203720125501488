package slantfall.declare;

/**
 * The user's own bound on a reading.
 *
 * @param reading key of the reading
 * @param atLeast lower bound [SI], NaN if none
 * @param atMost upper bound [SI], NaN if none
 * @param margin relative margin kept inside the bounds, such as 0.25 for 25 %
 * @param reason why, in the user's words
 * @param typedAtLeast what the user typed, empty if nothing
 * @param typedAtMost what the user typed, empty if nothing
 */
public record Requirement(
        String reading,
        double atLeast,
        double atMost,
        double margin,
        String reason,
        String typedAtLeast,
        String typedAtMost) {

    public Requirement {
        if (Double.isNaN(atLeast) && Double.isNaN(atMost)) {
            throw new IllegalArgumentException("requirement on " + reading + ": give atLeast, atMost or both");
        }
        if (atLeast > atMost) {
            throw new IllegalArgumentException("requirement on " + reading + ": atLeast is greater than atMost");
        }
        if (!(margin >= 0 && margin < 100)) {
            throw new IllegalArgumentException("requirement on " + reading + ": margin must be 0 or more, below 10000 %");
        }
    }

    /** Key of the check that it becomes. */
    public String checkKey() {
        return "requirement." + reading;
    }

    /** The bound that applies with the margin kept [SI]. */
    public double effectiveLow() {
        return atLeast + margin * Math.abs(atLeast);
    }

    /** The bound that applies with the margin kept [SI]. */
    public double effectiveHigh() {
        return atMost >= 0 ? atMost / (1 + margin) : atMost - margin * Math.abs(atMost);
    }

    /**
     * Signed margin of a value, the smaller of the two sides.
     *
     * @param declared the reading that is bounded
     * @param value its value [SI]
     */
    public double margin(Reading declared, double value) {
        double low = Double.isNaN(atLeast)
                ? Margin.CLAMP
                : Margin.of(Side.AT_LEAST, scaleAt(declared, atLeast), declared.span(), value, effectiveLow());
        double high = Double.isNaN(atMost)
                ? Margin.CLAMP
                : Margin.of(Side.AT_MOST, scaleAt(declared, atMost), declared.span(), value, effectiveHigh());
        return Math.min(low, high);
    }

    /** How a distance from a bound is measured: by ratio from a positive one, by difference from any other. */
    static Scale scaleAt(Reading declared, double bound) {
        return bound > 0 ? declared.scale() : Scale.LINEAR;
    }
}
