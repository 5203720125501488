package slantfall.bench;

import java.util.logging.Level;
import java.util.logging.Logger;
import javafx.application.Application;

/** Opens the window. */
public final class Bench {

    /** From the class path JavaFX warns that it is no named module; that is by choice. Held, or the setting is lost. */
    private static final Logger QUIET = Logger.getLogger("javafx");

    private Bench() {}

    /**
     * Opens the window and returns when it is closed.
     *
     * @param args a file to open, if there is one
     */
    public static void open(String[] args) {
        QUIET.setLevel(Level.SEVERE);
        Application.launch(BenchApp.class, args);
    }
}
