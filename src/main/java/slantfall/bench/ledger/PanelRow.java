package slantfall.bench.ledger;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import slantfall.declare.CheckResult;
import slantfall.declare.MarginWords;
import slantfall.declare.Panel;
import slantfall.declare.PanelResult;
import slantfall.declare.Verdict;
import slantfall.quantity.UnitSystem;

/** One question with its phrase; opens into the rules of its authors. */
public final class PanelRow {

    private final Panel panel;
    private final List<CheckRow> authors = new ArrayList<>();
    private final ReadOnlyStringWrapper phrase = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper margin = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Verdict> verdict = new ReadOnlyObjectWrapper<>(Verdict.UNKNOWN);
    private double tightest = Double.POSITIVE_INFINITY;

    PanelRow(PanelResult first) {
        this.panel = first.panel();
        first.results().forEach(r -> authors.add(new CheckRow(r)));
    }

    /** The question. */
    public Panel panel() {
        return panel;
    }

    /** One row per author, by limit. */
    public List<CheckRow> authors() {
        return authors;
    }

    /** What the rules say together. */
    public ReadOnlyStringProperty phraseProperty() {
        return phrase.getReadOnlyProperty();
    }

    /** The smallest margin among the rules that count, with its author. */
    public ReadOnlyStringProperty marginProperty() {
        return margin.getReadOnlyProperty();
    }

    /** The verdict of the house rule, else of the tightest rule that counts. */
    public ReadOnlyObjectProperty<Verdict> verdictProperty() {
        return verdict.getReadOnlyProperty();
    }

    /** Whether crossing is a change of manner and no failure. */
    public boolean regime() {
        return panel.kindOfPanel() == Panel.Sort.REGIME;
    }

    /** Smallest margin among the rules that count, infinite if none does. */
    double tightest() {
        return tightest;
    }

    void refresh(PanelResult fresh, Optional<CheckResult> house, UnitSystem units) {
        for (CheckRow row : authors) {
            fresh.results().stream()
                    .filter(r -> r.info().key().equals(row.key()))
                    .findFirst()
                    .ifPresent(r -> row.refresh(r, units));
        }
        phrase.set(fresh.phrase());
        Optional<CheckResult> least = fresh.results().stream()
                .filter(CheckResult::counts)
                .min(Comparator.comparingDouble(CheckResult::margin));
        tightest = least.map(CheckResult::margin).orElse(Double.POSITIVE_INFINITY);
        verdict.set(house.or(() -> least).map(CheckResult::verdict).orElse(Verdict.UNKNOWN));
        margin.set(least.map(r -> MarginWords.of(r) + (authors.size() > 1 ? ", " + r.info().name() : "")).orElse(""));
    }
}
