package slantfall.bench.shell;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import slantfall.declare.SetUp;
import slantfall.liquid.Preset;
import slantfall.store.FileStamp;
import slantfall.store.Preferences;

/** Files as the window needs them. Every method that fails throws a message that says what to do. */
public interface FileDesk {

    /**
     * A set-up that was read.
     *
     * @param reports what the file held that was not understood
     */
    record Opened(SetUp setUp, FileStamp stamp, List<String> reports) {}

    /**
     * Unsaved work found at the start.
     *
     * @param file where it belongs, null if nowhere yet
     */
    record Found(SetUp setUp, Path file) {}

    /** Reads a set-up. */
    Opened read(Path file);

    /** Writes a set-up over whatever the file holds, atomically and with a backup. */
    FileStamp write(SetUp setUp, Path file);

    /** Whether the file holds something else than when the stamp was taken; one that is gone has changed. */
    boolean changed(Path file, FileStamp stamp);

    /** Names of the examples that come with the program. */
    List<String> examples();

    /** An example, to be saved elsewhere. */
    Opened example(String name);

    /** Liquids that can be chosen. */
    List<Preset> presets();

    /** Keeps unsaved work beside the files, so that nothing is lost when the program dies. */
    void keep(SetUp setUp, Path file);

    /** Forgets kept work: it is on disk now, or was given up. */
    void forget();

    /** Work that was kept and never saved. */
    Optional<Found> found();

    /** What is remembered from one start to the next. */
    Preferences preferences();

    /** Takes it over; {@link #writePreferences} makes it last. */
    void prefer(Preferences preferences);

    /** Writes what is remembered. */
    void writePreferences();

    /** What was wrong with files of the user that nobody's work hangs on, one sentence each. */
    List<String> reports();
}
