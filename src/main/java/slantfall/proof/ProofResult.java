package slantfall.proof;

import java.util.List;

/**
 * What recomputing the published values gave.
 *
 * @param rows one per number
 * @param unknown ids whose family no formula here answers for
 */
public record ProofResult(List<Row> rows, List<String> unknown) {

    public ProofResult {
        rows = List.copyOf(rows);
        unknown = List.copyOf(unknown);
    }

    /** Whether every recomputed number is close enough; unknown families do not count. */
    public boolean ok() {
        return rows.stream().allMatch(Row::ok);
    }

    /** How many numbers are not close enough. */
    public long failures() {
        return rows.stream().filter(r -> !r.ok()).count();
    }

    /**
     * One number.
     *
     * @param id with its place in a list or table, {@code 1.N.Re[0]}
     * @param quantity what it is, in words
     * @param source where it is published
     * @param mark letters as in the file
     * @param expected published
     * @param obtained recomputed, NaN where it could not be
     * @param deviation magnitude of obtained minus expected, over the magnitude of expected unless absolute
     * @param tolerance largest deviation allowed
     * @param absolute whether deviation and tolerance are absolute
     * @param ok whether the deviation is allowed
     * @param reason why there is no obtained number, empty where there is one
     */
    public record Row(
            String id,
            String quantity,
            String source,
            String mark,
            double expected,
            double obtained,
            double deviation,
            double tolerance,
            boolean absolute,
            boolean ok,
            String reason) {

        /** The mark in words. */
        public String markInWords() {
            return MarkWords.of(mark);
        }
    }
}
