package slantfall.session;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.Consumer;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.store.FileStamp;

/**
 * The set-up that is open: one current state, its history, where it is saved and whether it has changed since. Used from
 * one thread.
 */
public final class Session {

    private final History<SetUp> history;
    private final List<Consumer<SetUp>> listeners = new ArrayList<>();
    private final List<Runnable> settled = new ArrayList<>();
    private boolean running;
    private SetUp saved;
    private Path file;
    private FileStamp stamp;
    private long version;

    /** Opens a set-up that is on no disk yet. */
    public Session(SetUp first) {
        history = new History<>(first);
        saved = first;
    }

    /** The current set-up. */
    public SetUp current() {
        return history.current();
    }

    /** Counts up with every change, so that late results can be told from current ones. */
    public long version() {
        return version;
    }

    /** The arrangement of the current set-up. */
    public Arrangement arrangement() {
        return Catalogue.named(current().arrangement());
    }

    /** What can be set and read now. */
    public Declaration declaration() {
        return arrangement().declare(current().structure());
    }

    /** Everything computed for the current set-up. */
    public Assessment assess() {
        return arrangement().assess(current());
    }

    /**
     * Changes one number.
     *
     * @param gesture equal ids in a row make one undo step, null for a step of its own
     * @throws IllegalArgumentException outside the possible range; nothing is changed then
     */
    public void set(String key, Value value, Object gesture) {
        Setting setting = declaration()
                .setting(key)
                .orElseGet(() -> slantfall.declare.LiquidSettings.of(key.substring(Declaration.LIQUID.length())));
        if (!setting.possible().contains(value.si())) {
            throw new IllegalArgumentException(slantfall.declare.Limits.refusal(setting, value.si()));
        }
        change(current().with(key, value), gesture);
    }

    /** Gives a number back to its declared or correlated value. */
    public void release(String key) {
        change(current().without(key), null);
    }

    /** Changes a word. */
    public void choose(String key, String word) {
        change(current().withChoice(key, word), null);
    }

    /** Any other change. */
    public void change(SetUp next, Object gesture) {
        if (next.equals(current())) {
            return;
        }
        history.record(next, gesture);
        running = gesture != null;
        changed();
        settleIfAtRest();
    }

    /** Ends a drag or a run of keys. */
    public void endGesture() {
        history.endGesture();
        if (running) {
            running = false;
            settleIfAtRest();
        }
    }

    /** Tells whenever a change is committed: a typed value, the end of a drag, an undo; not at every tick of a drag. */
    public void onSettled(Runnable listener) {
        settled.add(listener);
    }

    /** Whether a drag or a run of keys is under way. */
    public boolean inGesture() {
        return running;
    }

    private void settleIfAtRest() {
        if (!running) {
            List.copyOf(settled).forEach(Runnable::run);
        }
    }

    /** One step back, if there is one. */
    public void undo() {
        if (history.canUndo()) {
            history.undo();
            running = false;
            changed();
            settleIfAtRest();
        }
    }

    /** One step forward, if there is one. */
    public void redo() {
        if (history.canRedo()) {
            history.redo();
            running = false;
            changed();
            settleIfAtRest();
        }
    }

    /** Whether there is something to undo. */
    public boolean canUndo() {
        return history.canUndo();
    }

    /** Whether there is something to redo. */
    public boolean canRedo() {
        return history.canRedo();
    }

    /** Whether the current set-up differs from what is on disk. */
    public boolean dirty() {
        return !current().equals(saved);
    }

    /** Where it is saved, null if nowhere yet. */
    public Path file() {
        return file;
    }

    /** State of the file when it was read or written, null if none. */
    public FileStamp stamp() {
        return stamp;
    }

    /** Replaces everything by a set-up read from a file, or by a new one with no file. */
    public void open(SetUp opened, Path from, FileStamp fromStamp) {
        history.restart(Objects.requireNonNull(opened, "opened"));
        saved = opened;
        file = from;
        stamp = fromStamp;
        changed();
    }

    /** Remembers that the current set-up is on disk. */
    public void savedTo(Path to, FileStamp newStamp) {
        saved = current();
        file = to;
        stamp = newStamp;
        version++;
        listeners.forEach(l -> l.accept(current()));
    }

    /** Tells about every change. */
    public void listen(Consumer<SetUp> listener) {
        listeners.add(listener);
    }

    private void changed() {
        version++;
        List.copyOf(listeners).forEach(l -> l.accept(current()));
    }
}
