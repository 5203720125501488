package slantfall.store;

/** A file that could not be read or written: where, what is wrong, what to change. */
public final class StoreProblem extends RuntimeException {

    private static final int LONGEST = 880;
    private static final long serialVersionUID = 1L;

    private final transient Place place;
    private final String what;
    private final String remedy;

    /**
     * A problem with its remedy.
     *
     * @param place where
     * @param what what is wrong, without its full stop
     * @param remedy what to change, one sentence without its full stop
     */
    public StoreProblem(Place place, String what, String remedy) {
        this(place, what, remedy, null);
    }

    /** A problem that something else caused. */
    public StoreProblem(Place place, String what, String remedy, Throwable cause) {
        super(line(place, what, remedy), cause);
        this.place = place;
        this.what = what;
        this.remedy = remedy;
    }

    /** Where. */
    public Place place() {
        return place;
    }

    /** What is wrong. */
    public String what() {
        return what;
    }

    /** What to change. */
    public String remedy() {
        return remedy;
    }

    private static String line(Place place, String what, String remedy) {
        String tail = remedy.isEmpty() ? "" : " " + ended(remedy);
        String head = place.text() + ": ";
        int room = LONGEST - head.length() - Math.min(tail.length(), LONGEST / 2);
        String line = head + cut(ended(what), room) + tail;
        return cut(line, LONGEST);
    }

    private static String ended(String sentence) {
        String s = sentence.strip();
        return s.endsWith(".") || s.endsWith("?") || s.endsWith("…") ? s : s + ".";
    }

    private static String cut(String text, int longest) {
        return text.length() <= longest ? text : text.substring(0, longest - 1) + "…";
    }
}
