package slantfall.declare;

/** On which side of its limit a value is clear. */
public enum Side {
    /** The value must not exceed the limit. */
    AT_MOST("at most"),
    /** The value must not fall below the limit. */
    AT_LEAST("at least");

    private final String words;

    Side(String words) {
        this.words = words;
    }

    public String words() {
        return words;
    }
}
