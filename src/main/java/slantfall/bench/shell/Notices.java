package slantfall.bench.shell;

import java.util.List;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/** The one message that stands over the parts until it is answered or dismissed. Never a dialog, never in the way. */
public final class Notices {

    private final ReadOnlyObjectWrapper<Notice> current = new ReadOnlyObjectWrapper<>();

    /**
     * A message.
     *
     * @param problem whether something went wrong
     * @param answers what the user may do about it
     */
    public record Notice(String text, boolean problem, List<Answer> answers) {}

    /** Something to do about a message. */
    public record Answer(String words, Runnable action) {}

    /** The message shown, null if none. */
    public ReadOnlyObjectProperty<Notice> currentProperty() {
        return current.getReadOnlyProperty();
    }

    /** Says something. */
    public void say(String text, Answer... answers) {
        current.set(new Notice(text, false, List.of(answers)));
    }

    /** Says what went wrong. */
    public void problem(String text, Answer... answers) {
        current.set(new Notice(text, true, List.of(answers)));
    }

    /** Takes the message away. */
    public void dismiss() {
        current.set(null);
    }
}
