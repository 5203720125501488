package slantfall.liquid;

/**
 * Where a law holds [SI], both ends included.
 *
 * @param low lower end
 * @param high upper end
 */
public record Range(double low, double high) {

    /** No bound. */
    public static final Range ANY = new Range(Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY);

    public Range {
        if (!(low <= high)) {
            throw new IllegalArgumentException("range: low " + low + " must not exceed high " + high);
        }
    }

    /** In °C. */
    public static Range celsius(double low, double high) {
        return new Range(low + 273.15, high + 273.15);
    }

    /** Whether a value lies inside. */
    public boolean contains(double value) {
        return value >= low && value <= high;
    }
}
