package slantfall.bench.shell;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import slantfall.declare.SetUp;
import slantfall.liquid.Preset;
import slantfall.store.Examples;
import slantfall.store.FileStamp;
import slantfall.store.Journal;
import slantfall.store.Preferences;
import slantfall.store.Presets;
import slantfall.store.ProjectFile;

/** Files on the disk, preferences and the journal in a folder of the user. */
public final class StoreDesk implements FileDesk {

    /** System property that names the user's folder. */
    public static final String HOME = "slantfall.home";

    private static final String PREFERENCES = "preferences.json";
    private static final String JOURNALS = "journal";

    private final Path home;
    private final List<String> reports = new ArrayList<>();
    private Preferences preferences;
    private Journal journal;
    private Path takenOver;

    /** Files of a user whose folder is given; it is made when something is to be kept there. */
    public StoreDesk(Path home) {
        this.home = home;
        Preferences.Opened opened = Preferences.read(home.resolve(PREFERENCES));
        preferences = opened.preferences();
        reports.addAll(opened.reports());
        reports.addAll(Presets.load().problems());
    }

    /** Files of the user who started the program. */
    public static StoreDesk ofUser() {
        String named = System.getProperty(HOME);
        return new StoreDesk(named == null
                ? Path.of(System.getProperty("user.home", "."), ".slantfall")
                : Path.of(named));
    }

    @Override
    public Opened read(Path file) {
        return opened(ProjectFile.read(file));
    }

    private static Opened opened(ProjectFile.Opened file) {
        return new Opened(file.setUp(), file.stamp(), file.reports());
    }

    @Override
    public FileStamp write(SetUp setUp, Path file) {
        return ProjectFile.save(file, setUp);
    }

    @Override
    public boolean changed(Path file, FileStamp stamp) {
        return !Files.isRegularFile(file) || !FileStamp.of(file).sameContent(stamp);
    }

    @Override
    public List<String> examples() {
        return Examples.list();
    }

    @Override
    public Opened example(String name) {
        return opened(Examples.open(name));
    }

    @Override
    public List<Preset> presets() {
        return Presets.load().all();
    }

    @Override
    public synchronized void keep(SetUp setUp, Path file) {
        if (journal == null) {
            journal = Journal.begin(home.resolve(JOURNALS));
        }
        journal.add(setUp, file);
        discardTakenOver();
    }

    @Override
    public synchronized void forget() {
        if (journal != null) {
            journal.close();
            journal = null;
        }
        discardTakenOver();
    }

    /** The journal that was taken over goes only when its work is kept or saved anew. */
    private void discardTakenOver() {
        if (takenOver != null) {
            Journal.discard(takenOver);
            takenOver = null;
        }
    }

    @Override
    public synchronized Optional<Found> found() {
        Optional<Journal.Recovered> newest = Journal.leftOver(home.resolve(JOURNALS)).stream().findFirst();
        newest.ifPresent(r -> takenOver = r.journal());
        return newest.map(r -> new Found(r.setUp(), r.file().isEmpty() ? null : Path.of(r.file())));
    }

    @Override
    public synchronized Preferences preferences() {
        return preferences;
    }

    @Override
    public synchronized void prefer(Preferences wanted) {
        preferences = wanted;
    }

    @Override
    public synchronized void writePreferences() {
        if (!Files.isDirectory(home)) {
            home.toFile().mkdirs();
        }
        preferences.write(home.resolve(PREFERENCES));
    }

    @Override
    public List<String> reports() {
        return reports;
    }
}
