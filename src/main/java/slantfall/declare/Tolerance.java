package slantfall.declare;

import java.util.List;

/**
 * How well a number is known.
 *
 * @param shape distribution between the ends; {@code UNKNOWN} means anywhere within, nothing else known
 * @param low lower end [SI]
 * @param high upper end [SI]; for a normal shape the ends are two standard deviations away
 * @param typed what the user typed: one plus-or-minus, or two ends
 */
public record Tolerance(Shape shape, double low, double high, List<String> typed) {

    public Tolerance {
        typed = List.copyOf(typed);
        if (!(low <= high)) {
            throw new IllegalArgumentException("tolerance: low " + low + " must not exceed high " + high);
        }
    }

    /** Distribution between the ends. */
    public enum Shape {
        UNIFORM,
        NORMAL,
        TRIANGULAR,
        UNKNOWN;

        /** The word in files. */
        public String word() {
            return name().toLowerCase(java.util.Locale.ROOT);
        }
    }
}
