package slantfall.bench.shell;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import slantfall.bench.model.Desk;
import slantfall.bench.shell.Notices.Answer;
import slantfall.catalogue.Catalogue;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.liquid.Preset;
import slantfall.session.Scheduler;
import slantfall.session.Session;
import slantfall.store.FileStamp;
import slantfall.store.Preferences;
import slantfall.store.ProjectFile;

/**
 * The life of a set-up on disk. Unsaved work is never dropped without the user's word, and is kept beside the files in
 * case the program dies.
 */
public final class FileLife {

    private static final String KEEP = "keep";
    private static final String PREFER = "prefer";

    private final Desk desk;
    private final FileDesk disk;
    private final Chooser chooser;
    private final Notices notices;
    private final Scheduler work;
    private final Session session;
    private final Keeper keeper;

    /**
     * Files of a desk.
     *
     * @param chooser asks for a file
     * @param work keeps unsaved work without holding up the screen
     */
    public FileLife(Desk desk, FileDesk disk, Chooser chooser, Notices notices, Scheduler work) {
        this.desk = desk;
        this.disk = disk;
        this.chooser = chooser;
        this.notices = notices;
        this.work = work;
        this.session = desk.session();
        this.keeper = new Keeper(disk);
        session.listen(s -> keep());
        session.onSettled(this::keepNow);
    }

    /** Unsaved work of last time, else the last file, else the first example. */
    public void start() {
        Optional<FileDesk.Found> found = disk.found();
        if (found.isPresent()) {
            recover(found.get());
            return;
        }
        String last = disk.preferences().last();
        boolean there = !last.isBlank() && Files.isRegularFile(Path.of(last));
        if (!there || !take(Path.of(last))) {
            disk.examples().stream().findFirst().ifPresent(this::example);
        }
        if (!disk.reports().isEmpty()) {
            notices.say(String.join(" ", disk.reports()));
        }
    }

    private void recover(FileDesk.Found found) {
        SetUp kept = found.setUp();
        if (found.file() != null && Files.isRegularFile(found.file()) && take(found.file())) {
            session.change(kept, null);
        } else {
            desk.open(SetUp.blank(kept.arrangement(), kept.base()), null, null);
            session.change(kept, null);
        }
        desk.refresh();
        notices.say("Unsaved work of last time is back. Save it, or undo to what was there before.",
                new Answer("Save", this::save));
    }

    /** A new set-up with nothing set. */
    public void blank(String arrangement) {
        leave(() -> {
            Optional<Preset> water = disk.presets().stream().findFirst();
            LiquidBase base = water.map(LiquidBase::of).orElseGet(LiquidBase::measured);
            show(SetUp.blank(Catalogue.named(arrangement).key(), base), null, null);
        });
    }

    /** Asks for a file and opens it. */
    public void open() {
        leave(() -> chooser.open().ifPresent(this::take));
    }

    /** Opens a file. */
    public void open(Path file) {
        leave(() -> take(file));
    }

    /** Opens an example; saving it asks where. */
    public void example(String name) {
        leave(() -> {
            FileDesk.Opened opened = disk.example(name);
            show(opened.setUp(), null, null);
        });
    }

    private boolean take(Path file) {
        try {
            FileDesk.Opened opened = disk.read(file);
            show(opened.setUp(), file, opened.stamp());
            remember(file);
            if (!opened.reports().isEmpty()) {
                notices.say(String.join(" ", opened.reports()));
            }
            return true;
        } catch (RuntimeException e) {
            notices.problem(said(e));
            return false;
        }
    }

    private void show(SetUp setUp, Path file, FileStamp stamp) {
        notices.dismiss();
        desk.open(setUp, file, stamp);
        keep();
    }

    /** Does something that replaces the set-up, after the user's word if there is unsaved work. */
    private void leave(Runnable next) {
        if (!session.dirty()) {
            next.run();
            return;
        }
        notices.say("This set-up has changes that are not saved.",
                new Answer("Save first", () -> {
                    if (save()) {
                        next.run();
                    }
                }),
                new Answer("Leave them", () -> {
                    notices.dismiss();
                    next.run();
                }),
                new Answer("Stay here", notices::dismiss));
    }

    /** Saves to its file, or asks where; true if it is on disk now. */
    public boolean save() {
        Path file = session.file();
        if (file == null) {
            return saveAs();
        }
        if (session.stamp() != null && disk.changed(file, session.stamp())) {
            askAboutOther(file);
            return false;
        }
        return write(file);
    }

    private void askAboutOther(Path file) {
        notices.problem(file.getFileName() + " was changed on disk since it was opened here.",
                new Answer("Save over it", () -> write(file)),
                new Answer("Save as …", this::saveAs),
                new Answer("Open what is on disk", () -> take(file)));
    }

    /** Asks where and saves; true if it is on disk now. */
    public boolean saveAs() {
        return chooser.save(suggestedName() + ProjectFile.ENDING).map(this::write).orElse(false);
    }

    /** Saves a picture of the set-up where the user wants it. */
    public void savePicture(Consumer<Path> save) {
        try {
            chooser.picture(suggestedName() + ".svg").ifPresent(save);
        } catch (RuntimeException e) {
            notices.problem(said(e));
        }
    }

    private String suggestedName() {
        String name = session.current().title().isBlank() ? session.arrangement().key() : session.current().title();
        return name.strip().replaceAll("[^\\p{L}\\p{N}._ -]", "").replace(' ', '-');
    }

    private boolean write(Path file) {
        try {
            FileStamp stamp = disk.write(session.current(), file);
            session.savedTo(file, stamp);
            remember(file);
            notices.dismiss();
            return true;
        } catch (RuntimeException e) {
            notices.problem(said(e), new Answer("Save as …", this::saveAs));
            return false;
        }
    }

    private void remember(Path file) {
        prefer(disk.preferences().opened(file));
    }

    /** Remembers something for the next start. */
    public void prefer(Preferences preferences) {
        disk.prefer(preferences);
        behind(PREFER, disk::writePreferences);
    }

    /** What is remembered. */
    public Preferences preferences() {
        return disk.preferences();
    }

    /** Looks whether the file was changed by somebody else; called when the window comes to the front. */
    public void look() {
        Path file = session.file();
        if (file == null || session.stamp() == null || !disk.changed(file, session.stamp())) {
            return;
        }
        if (session.dirty()) {
            askAboutOther(file);
        } else {
            notices.say(file.getFileName() + " was changed on disk.",
                    new Answer("Open it anew", () -> take(file)),
                    new Answer("Keep this one", notices::dismiss));
        }
    }

    /** Files used lately. */
    public List<Path> recent() {
        return disk.preferences().recent().stream().map(Path::of).toList();
    }

    /** Examples that come with the program. */
    public List<String> examples() {
        return disk.examples();
    }

    /** Keeps what is not saved, the newest only; while a drag runs the ones between are passed over. */
    private void keep() {
        SetUp now = session.current();
        Path file = session.file();
        boolean dirty = session.dirty();
        long version = session.version();
        behind(KEEP, () -> keeper.keep(version, dirty ? now : null, file));
    }

    /** Keeps a committed edit before anything else happens, so that a kill at any later moment finds it. */
    private void keepNow() {
        try {
            keeper.keep(session.version(), session.dirty() ? session.current() : null, session.file());
        } catch (RuntimeException e) {
            notices.problem(said(e));
        }
    }

    private void behind(String question, Runnable task) {
        work.request(
                question,
                () -> {
                    task.run();
                    return "";
                },
                done -> { },
                e -> notices.problem(said(e)));
    }

    /** The end: unsaved work is kept for the next start. */
    public void end() {
        work.close();
        if (session.dirty()) {
            disk.keep(session.current(), session.file());
        } else {
            disk.forget();
        }
        disk.writePreferences();
    }

    private static String said(RuntimeException e) {
        return e.getMessage() == null ? "Something went wrong (" + e.getClass().getSimpleName() + ")." : e.getMessage();
    }
}
