package slantfall.proof;

import java.util.List;

/**
 * One published check value or list of them, as in a rows file.
 *
 * @param id family, then what tells the row from others of the family
 * @param quantity what it is, in words
 * @param inputs what to compute it from
 * @param expected the published numbers
 * @param tolerance how close the recomputed numbers must come
 * @param origin where they are published
 * @param problem what is wrong with the row itself, empty if nothing is
 */
public record PublishedRow(
        String id,
        String quantity,
        Inputs inputs,
        List<Expected> expected,
        Tolerance tolerance,
        Origin origin,
        String problem) {

    public PublishedRow {
        expected = List.copyOf(expected);
    }

    /** The id of one number of this row: the row's own for a single one, {@code id[0]} or {@code id[key]} in a list. */
    String id(Expected number) {
        return number.place().isEmpty() ? id : id + "[" + number.place() + "]";
    }

    /**
     * One published number.
     *
     * @param place index in a list, key in a table, empty for a single number
     * @param value the number
     */
    public record Expected(String place, double value) {}

    /**
     * How close is close enough.
     *
     * @param relative largest deviation over the expected value
     * @param absolute largest deviation [unit of the quantity], NaN where none is given
     */
    public record Tolerance(double relative, double absolute) {

        /** Whether a deviation from this value is measured absolutely: a bound is given, or nothing to divide by. */
        boolean absoluteFor(double expected) {
            return !Double.isNaN(absolute) || expected == 0;
        }

        /** The bound that applies. */
        double bound() {
            return Double.isNaN(absolute) ? relative : absolute;
        }
    }

    /**
     * Where a value comes from.
     *
     * @param source authors, year, table or equation
     * @param mark letters as in the file, such as {@code M/C}
     * @param note remarks
     * @param outOfRange whether the inputs lie outside the law's stated range, so that only the formula is checked
     */
    public record Origin(String source, String mark, String note, boolean outOfRange) {

        /** The mark in words. */
        public String markInWords() {
            return MarkWords.of(mark);
        }
    }
}
