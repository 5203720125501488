package slantfall.quantity;

import java.util.List;

/** An entry that could not be read as a quantity: what is wrong, what it could mean, what to type instead. */
public final class QuantityProblem extends RuntimeException {

    private static final int LONGEST = 390;
    private static final long serialVersionUID = 1L;

    private final String what;
    private final List<String> readings;
    private final String remedy;

    /**
     * A problem with its remedy.
     *
     * @param what what is wrong, as one sentence with the entry quoted and without its full stop
     * @param readings the meanings that an ambiguous entry could have, empty where it has none
     * @param remedy what to type instead, as one sentence without its full stop
     */
    public QuantityProblem(String what, List<String> readings, String remedy) {
        super(line(what, readings, remedy));
        this.what = what;
        this.readings = List.copyOf(readings);
        this.remedy = remedy;
    }

    /** A problem of an entry that has no possible meaning here. */
    static QuantityProblem plain(String what, String remedy) {
        return new QuantityProblem(what, List.of(), remedy);
    }

    /** What is wrong, without a full stop. */
    public String what() {
        return what;
    }

    /** The readings an ambiguous entry could have; empty where the entry has none. */
    public List<String> readings() {
        return readings;
    }

    /** What to type instead, without a full stop. */
    public String remedy() {
        return remedy;
    }

    private static String line(String what, List<String> readings, String remedy) {
        String meanings = readings.isEmpty() ? "" : " It could mean " + String.join(", or ", readings) + ".";
        String line = what + "." + meanings + (remedy.isEmpty() ? "" : " " + remedy + ".");
        return line.length() <= LONGEST ? line : line.substring(0, LONGEST - 1) + "…";
    }
}
