package slantfall.source;

/** How well a published formula, constant or check value is vouched for. Printed wherever the value is. */
public enum Mark {
    /** Read in the source itself or in its own abstract. */
    READ("S", "read in the source"),
    /** Read second-hand, in a file or text that quotes the source. */
    SECOND_HAND("S2", "read second-hand"),
    /** Derived or computed here from the stated principle, checked by an independent calculation. */
    COMPUTED("C", "derived and computed here"),
    /** Recalled and not read; to be confirmed. */
    FROM_MEMORY("M", "from memory"),
    /** A rule of the trade that nobody's name stands behind. */
    COMMON_PRACTICE("P", "common practice"),
    /** Stated by the user: a requirement or a measured property. */
    USER("U", "stated by the user");

    private final String letter;
    private final String words;

    Mark(String letter, String words) {
        this.letter = letter;
        this.words = words;
    }

    /** The short sign used in tables. */
    public String letter() {
        return letter;
    }

    /** The sign in words, as printed beside a value. */
    public String words() {
        return words;
    }
}
