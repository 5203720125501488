package slantfall.bench.ledger;

import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import slantfall.declare.CheckResult;
import slantfall.declare.MarginWords;
import slantfall.declare.Verdict;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/** One check as words: verdict, value against limit, what is in hand, and where it comes from. */
public final class CheckRow {

    private final String key;
    private final ReadOnlyStringWrapper name = new ReadOnlyStringWrapper("");
    private final ReadOnlyObjectWrapper<Verdict> verdict = new ReadOnlyObjectWrapper<>(Verdict.UNKNOWN);
    private final ReadOnlyStringWrapper compared = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper margin = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper source = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper note = new ReadOnlyStringWrapper("");
    private CheckResult result;

    CheckRow(CheckResult first) {
        this.key = first.info().key();
        this.result = first;
    }

    /** Key of the check. */
    public String key() {
        return key;
    }

    /** The numbers behind the words. */
    public CheckResult result() {
        return result;
    }

    /** Author and criterion. */
    public ReadOnlyStringProperty nameProperty() {
        return name.getReadOnlyProperty();
    }

    /** What it says. */
    public ReadOnlyObjectProperty<Verdict> verdictProperty() {
        return verdict.getReadOnlyProperty();
    }

    /** Value and limit, such as "1.2 mm, at most 1.5 mm". */
    public ReadOnlyStringProperty comparedProperty() {
        return compared.getReadOnlyProperty();
    }

    /** What is in hand. */
    public ReadOnlyStringProperty marginProperty() {
        return margin.getReadOnlyProperty();
    }

    /** Where it is published and how far that is vouched for. */
    public ReadOnlyStringProperty sourceProperty() {
        return source.getReadOnlyProperty();
    }

    /** Why it is unknown or left out, empty otherwise. */
    public ReadOnlyStringProperty noteProperty() {
        return note.getReadOnlyProperty();
    }

    void refresh(CheckResult fresh, UnitSystem units) {
        result = fresh;
        name.set(fresh.info().name());
        verdict.set(fresh.verdict());
        compared.set(Show.value(fresh.value(), fresh.info().kind(), units, ReadingRow.DIGITS) + ", "
                + fresh.info().side().words() + " "
                + Show.value(fresh.limit(), fresh.info().kind(), units, ReadingRow.DIGITS));
        margin.set(MarginWords.of(fresh));
        source.set(fresh.info().source().text());
        note.set(fresh.inRange() ? fresh.note() : "left out of the phrase: " + fresh.note());
    }
}
