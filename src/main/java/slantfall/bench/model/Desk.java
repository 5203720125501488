package slantfall.bench.model;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.LiquidReport;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.liquid.Property;
import slantfall.quantity.Display;
import slantfall.quantity.EntryContext;
import slantfall.quantity.Need;
import slantfall.quantity.Unit;
import slantfall.quantity.UnitSystem;
import slantfall.session.Session;
import slantfall.store.FileStamp;

/**
 * What every part of the window looks at: the open set-up and its assessment, which follows each change within one
 * frame, and how numbers are shown.
 */
public final class Desk {

    private final Session session;
    private final Pulse pulse;
    private Assessment assessment;
    private final ObjectProperty<UnitSystem> units = new SimpleObjectProperty<>(UnitSystem.SI);
    private final ReadOnlyBooleanWrapper canUndo = new ReadOnlyBooleanWrapper();
    private final ReadOnlyBooleanWrapper canRedo = new ReadOnlyBooleanWrapper();
    private final ReadOnlyBooleanWrapper dirty = new ReadOnlyBooleanWrapper();
    private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper();
    private final DoubleProperty cursor = new SimpleDoubleProperty(Double.NaN);
    private final Map<String, Unit> chosenUnits = new HashMap<>();
    private final List<Consumer<Assessment>> followers = new ArrayList<>();
    private long shown = -1;

    /** Follows a session. */
    public Desk(Session session, Pulse pulse) {
        this.session = session;
        this.pulse = pulse;
        session.listen(s -> pulse.request(this::refresh));
        units.addListener((o, a, b) -> {
            chosenUnits.clear();
            tell();
        });
        refresh();
    }

    /** The session behind it, for changes. */
    public Session session() {
        return session;
    }

    /** Everything computed for the open set-up. */
    public Assessment assessment() {
        return assessment;
    }

    /** Tells now and from now on whenever something shown has changed: a number, a word or the units. */
    public void follow(Consumer<Assessment> follower) {
        followers.add(follower);
        follower.accept(assessment);
    }

    /** The set-up that the shown assessment answers. */
    public SetUp setUp() {
        return assessment.setUp();
    }

    /** What can be set and read now. */
    public Declaration declaration() {
        return assessment.declaration();
    }

    /** The units that numbers are shown in. */
    public ObjectProperty<UnitSystem> unitsProperty() {
        return units;
    }

    /** Distance from the lower wall at which the traverses are read [m], NaN for nowhere. */
    public DoubleProperty cursorProperty() {
        return cursor;
    }

    /** Whether there is something to undo. */
    public ReadOnlyBooleanProperty canUndoProperty() {
        return canUndo.getReadOnlyProperty();
    }

    /** Whether there is something to redo. */
    public ReadOnlyBooleanProperty canRedoProperty() {
        return canRedo.getReadOnlyProperty();
    }

    /** Whether the set-up differs from what is on disk. */
    public ReadOnlyBooleanProperty dirtyProperty() {
        return dirty.getReadOnlyProperty();
    }

    /** What the window is called: the set-up, with a mark while it differs from what is on disk. */
    public ReadOnlyStringProperty titleProperty() {
        return title.getReadOnlyProperty();
    }

    /** Brings everything up to date now rather than with the next frame. */
    public void refresh() {
        boolean changed = session.version() != shown;
        if (changed) {
            shown = session.version();
            assessment = session.assess();
        }
        canUndo.set(session.canUndo());
        canRedo.set(session.canRedo());
        dirty.set(session.dirty());
        title.set((dirty.get() ? "● " : "") + name() + " – Slantfall");
        if (changed) {
            tell();
        }
    }

    /**
     * The unit that a setting is shown in: the one it was typed or asked for in, else the one of the unit system that
     * suits its present size; it holds still while the value moves.
     *
     * @param si present value [SI]
     */
    public Unit unit(Setting setting, double si) {
        return chosenUnits.computeIfAbsent(setting.key(), k -> Display.unit(setting.kind(), units.get(), si));
    }

    /** Shows one setting in another unit; its value stays. */
    public void showIn(String key, Unit unit) {
        typedIn(key, unit);
        tell();
    }

    /** Remembers the unit that a setting was typed in; one that needs a density or a width is no unit to show in. */
    public void typedIn(String key, Unit unit) {
        if (unit.need() == Need.NONE) {
            chosenUnits.put(key, unit);
        }
    }

    /**
     * Moves a setting near a value, to a number that a person would type in the unit shown; what is impossible is left
     * alone.
     *
     * @param wanted where to [SI]
     * @param gesture equal ids in a row make one undo step
     */
    public void moveNear(Setting setting, double wanted, Object gesture) {
        Unit unit = unit(setting, wanted == 0 ? setting.usual().high() : wanted);
        double number = unit.fromSi(wanted);
        move(setting, Nudge.snap(number, Nudge.step(setting, unit, number)), gesture);
    }

    /**
     * Moves a setting to a number in the unit shown; what is impossible is left alone.
     *
     * @param number where to [in the unit shown]
     */
    public void move(Setting setting, BigDecimal number, Object gesture) {
        Unit unit = unit(setting, setting.usual().high());
        double si = unit.toSi(number.doubleValue());
        if (setting.possible().contains(si)) {
            String typed = Nudge.text(number) + (setting.kind().dimensionless() ? "" : " " + unit.symbol());
            session.set(setting.key(), Value.typed(si, typed), gesture);
        }
    }

    /** Replaces everything by another set-up; its numbers are shown in the units that they were typed in. */
    public void open(SetUp opened, Path from, FileStamp stamp) {
        chosenUnits.clear();
        cursor.set(Double.NaN);
        session.open(opened, from, stamp);
        for (Map.Entry<String, Value> entry : opened.values().entrySet()) {
            session.declaration()
                    .setting(entry.getKey())
                    .flatMap(s -> TypedUnit.of(entry.getValue().typed(), s.kind()))
                    .ifPresent(unit -> typedIn(entry.getKey(), unit));
        }
        shown = -1;
        refresh();
    }

    /** What the surroundings tell the reading of an entry. */
    public EntryContext context() {
        return Entries.context(session.current(), session.declaration());
    }

    /** A property of the liquid with its origin, if it is known. */
    public Optional<LiquidReport.Row> property(Property property) {
        return assessment.liquid().properties().stream()
                .filter(r -> r.property() == property)
                .findFirst();
    }

    private void tell() {
        List.copyOf(followers).forEach(f -> f.accept(assessment));
    }

    private String name() {
        String given = session.current().title();
        Path file = session.file();
        if (!given.isBlank()) {
            return given;
        }
        return file == null ? assessment.declaration().name() : file.getFileName().toString();
    }
}
