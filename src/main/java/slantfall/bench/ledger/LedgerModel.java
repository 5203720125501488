package slantfall.bench.ledger;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import slantfall.bench.model.CursorWords;
import slantfall.bench.model.Desk;
import slantfall.check.Cautions;
import slantfall.declare.Assessment;
import slantfall.declare.CheckResult;
import slantfall.declare.Working;
import slantfall.quantity.UnitSystem;

/** Everything the ledger says, in the chosen units, tightest first. */
public final class LedgerModel {

    private final Desk desk;
    private final ObservableList<ReadingRow> readings = FXCollections.observableArrayList();
    private final ObservableList<CheckRow> own = FXCollections.observableArrayList();
    private final ObservableList<PanelRow> panels = FXCollections.observableArrayList();
    private final ObservableList<String> cautions = FXCollections.observableArrayList();
    private final ObservableList<String> notices = FXCollections.observableArrayList();
    private final BooleanProperty brief = new SimpleBooleanProperty();
    private final ReadOnlyStringWrapper atCursor = new ReadOnlyStringWrapper("");
    private String arrangement = "";

    /** Follows a desk. */
    public LedgerModel(Desk desk) {
        this.desk = desk;
        desk.follow(this::refresh);
        desk.cursorProperty().addListener((o, a, b) -> atCursor.set(CursorWords.of(desk)));
    }

    /** What the traverses say at the cursor, empty if it reads nothing. */
    public ReadOnlyStringProperty atCursorProperty() {
        return atCursor.getReadOnlyProperty();
    }

    /** Readings in declared order. */
    public ObservableList<ReadingRow> readings() {
        return readings;
    }

    /** Requirements and house rules, tightest first. */
    public ObservableList<CheckRow> own() {
        return own;
    }

    /** Questions, tightest first, those without an answer last. */
    public ObservableList<PanelRow> panels() {
        return panels;
    }

    /** Where somebody could be hurt. */
    public ObservableList<String> cautions() {
        return cautions;
    }

    /** What is worth knowing and concerns no reading alone. */
    public ObservableList<String> notices() {
        return notices;
    }

    /** Whether only the tightest three questions are shown. */
    public BooleanProperty briefProperty() {
        return brief;
    }

    /** The steps behind a reading or check, if there are any. */
    public Optional<Working> working(String key) {
        return desk.assessment().working(key);
    }

    /** The units of the numbers. */
    public UnitSystem units() {
        return desk.unitsProperty().get();
    }

    /** Readings and checks as a table with tabs, for a sheet or a mail. */
    public String table() {
        return TableText.of(this, desk.setUp().title());
    }

    private void refresh(Assessment a) {
        if (!arrangement.equals(a.declaration().key())) {
            arrangement = a.declaration().key();
            readings.setAll(a.declaration().readings().stream().map(ReadingRow::new).toList());
            panels.setAll(a.panels().stream().map(PanelRow::new).toList());
        }
        UnitSystem units = desk.unitsProperty().get();
        for (int i = 0; i < readings.size(); i++) {
            readings.get(i).refresh(a, a.readings().get(i).value(), units);
        }
        for (PanelRow row : panels) {
            a.panels().stream()
                    .filter(p -> p.panel().key().equals(row.panel().key()))
                    .findFirst()
                    .ifPresent(p -> row.refresh(p, a.check("house." + p.panel().key()), units));
        }
        order(panels, Comparator.comparingDouble(PanelRow::tightest));
        refreshOwn(a, units);
        atCursor.set(CursorWords.of(desk));
        set(cautions, a.cautions());
        set(notices, a.notices().stream()
                .filter(n -> a.declaration().reading(n.about()).isEmpty())
                .map(n -> n.text())
                .toList());
    }

    private void refreshOwn(Assessment a, UnitSystem units) {
        List<CheckResult> fresh = a.checks().stream().filter(CheckResult::binding).toList();
        List<String> keys = fresh.stream().map(c -> c.info().key()).sorted().toList();
        if (!keys.equals(own.stream().map(CheckRow::key).sorted().toList())) {
            own.setAll(fresh.stream().map(CheckRow::new).toList());
        }
        own.forEach(row -> a.check(row.key()).ifPresent(r -> row.refresh(r, units)));
        order(own, Comparator.comparingDouble(r -> r.result().counts() ? r.result().margin() : Double.POSITIVE_INFINITY));
    }

    /** Sorts, but touches the list only where the order is another one, so that rows hold still. */
    private static <T> void order(ObservableList<T> rows, Comparator<T> by) {
        List<T> sorted = new ArrayList<>(rows);
        sorted.sort(by);
        set(rows, sorted);
    }

    private static <T> void set(ObservableList<T> rows, List<T> wanted) {
        if (!rows.equals(wanted)) {
            rows.setAll(wanted);
        }
    }

    /** The sentence that every result carries. */
    public String general() {
        return Cautions.general();
    }
}
