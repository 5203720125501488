package slantfall.bench.look;

import javafx.css.PseudoClass;

/** Names that the style sheet knows: classes and states. */
public final class Mark {

    public static final String PART = "part";
    public static final String GROUP = "group-title";
    public static final String NAME = "setting-name";
    public static final String SYMBOL = "symbol";
    public static final String BADGE = "badge";
    public static final String ECHO = "echo";
    public static final String PROBLEM = "problem";
    public static final String VALUE = "value";
    public static final String UNIT = "unit";
    public static final String MUTED = "muted";
    public static final String ROW = "row";
    public static final String CARD = "card";
    public static final String HEADLINE = "headline";
    public static final String FINDER = "finder";
    public static final String STRIP = "notice-strip";
    public static final String WORKING = "working";

    /** A number that nobody has given: drawn hollow. */
    public static final PseudoClass HOLLOW = PseudoClass.getPseudoClass("hollow");

    /** An entry that is wrong. */
    public static final PseudoClass WRONG = PseudoClass.getPseudoClass("wrong");

    private Mark() {}

    /** A state of the style sheet by its word, such as a verdict. */
    public static PseudoClass state(String word) {
        return PseudoClass.getPseudoClass(word);
    }
}
