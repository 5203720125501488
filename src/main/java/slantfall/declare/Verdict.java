package slantfall.declare;

/** What a check says. Never shown by colour alone: a shape and a word go with it. */
public enum Verdict {
    CLEAR("clear", "●"),
    NEAR("near", "◐"),
    CROSSED("crossed", "✕"),
    UNKNOWN("unknown", "○");

    private final String word;
    private final String shape;

    Verdict(String word, String shape) {
        this.word = word;
        this.shape = shape;
    }

    /** The word printed and written to files. */
    public String word() {
        return word;
    }

    /** The shape that stands beside the word. */
    public String shape() {
        return shape;
    }

    /**
     * The verdict of a margin.
     *
     * @param margin signed margin, 0 at the limit, NaN if it could not be computed
     * @param near margin below which a clear check counts as near
     */
    public static Verdict of(double margin, double near) {
        if (Double.isNaN(margin)) {
            return UNKNOWN;
        }
        if (margin < 0) {
            return CROSSED;
        }
        return margin < near ? NEAR : CLEAR;
    }
}
