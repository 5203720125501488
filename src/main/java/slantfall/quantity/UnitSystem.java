package slantfall.quantity;

/** The units that numbers are shown in; a choice of the reader that changes no value. */
public enum UnitSystem {
    /** SI units with their usual prefixes. */
    SI("SI"),
    /** The metric units of the trade, such as cP, m3/h and bar. */
    TRADE("trade metric"),
    /** United States customary units. */
    US("US customary");

    private final String words;

    UnitSystem(String words) {
        this.words = words;
    }

    /** The name for people. */
    public String words() {
        return words;
    }
}
