package slantfall.bench.question;

import javafx.scene.Node;
import slantfall.declare.Assessment;

/** One thing to ask of the open set-up. */
public interface Question {

    /** Stable key, used for ids. */
    String key();

    /** The question in plain words. */
    String words();

    /** What answers it; made when the question is first asked. */
    Node node();

    /** Brings the answer up to date; called only while it is shown. */
    void show(Assessment assessment);
}
