package slantfall.declare;

import java.util.Optional;

/**
 * A number that the user gave.
 *
 * @param si the number [SI]
 * @param typed what the user typed, empty if it came from a slider
 * @param known how well it is known, null if nothing was said
 */
public record Value(double si, String typed, Tolerance known) {

    public Value {
        if (!Double.isFinite(si)) {
            throw new IllegalArgumentException("value must be finite, was " + si);
        }
    }

    /** A bare number, as a slider gives it. */
    public static Value of(double si) {
        return new Value(si, "", null);
    }

    /** A number as typed. */
    public static Value typed(double si, String typed) {
        return new Value(si, typed, null);
    }

    /** How well it is known, if anything was said. */
    public Optional<Tolerance> tolerance() {
        return Optional.ofNullable(known);
    }
}
