package slantfall.bench.form;

/** How a number came to be where it is. The word stands beside it; the looks only support it. */
enum Standing {
    DEFAULT("default"),
    GIVEN(""),
    MEASURED("measured"),
    CORRELATED("correlated"),
    ASSUMED("assumed"),
    RANGE("unknown in a range"),
    UNUSED("not needed here"),
    MISSING("not known");

    private final String word;

    Standing(String word) {
        this.word = word;
    }

    String word() {
        return word;
    }

    /** The style class that goes with it. */
    String style() {
        return "standing-" + name().toLowerCase(java.util.Locale.ROOT);
    }
}
