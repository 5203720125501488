package slantfall.figure;

/**
 * A stretch of an axis.
 *
 * @param low lower end
 * @param high upper end, above low
 */
public record Span(double low, double high) {

    /** A stretch around the values that has some air and always contains zero. */
    static Span around(double least, double largest) {
        double low = Math.min(0, least);
        double high = Math.max(0, largest);
        if (!(high - low > 0) || Double.isInfinite(high - low)) {
            return new Span(0, 1);
        }
        double air = 0.08 * (high - low);
        return new Span(low < 0 ? low - air : 0, high > 0 ? high + air : 0);
    }

    boolean holds(Span other) {
        return other.low >= low && other.high <= high;
    }

    double length() {
        return high - low;
    }
}
