package slantfall.declare;

/**
 * Checks that answer the same question by different authors, shown side by side and never averaged.
 *
 * @param key stable key
 * @param question the question in plain words
 * @param clear what a check of this panel says when it is clear, such as {@code laminar}
 * @param crossed what it says when it is crossed, such as {@code turbulent}
 * @param kindOfPanel whether crossing is a change of regime, a doubt about the method, or a failure
 */
public record Panel(String key, String question, String clear, String crossed, Sort kindOfPanel) {

    /** What it means to cross a check of the panel. */
    public enum Sort {
        /** The flow changes its manner; the number may still be right. */
        REGIME,
        /** The method used is outside its assumptions. */
        VALIDITY,
        /** Something the user does not want happens. */
        LIMIT
    }
}
