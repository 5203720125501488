package slantfall.bench.ledger;

import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import slantfall.declare.Assessment;
import slantfall.declare.Reading;
import slantfall.quantity.Display;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;
import slantfall.quantity.UnitSystem;

/** One reading as words: number and unit. */
public final class ReadingRow {

    static final int DIGITS = 3;

    private final Reading reading;
    private final ReadOnlyStringWrapper number = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper unit = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper why = new ReadOnlyStringWrapper("");

    ReadingRow(Reading reading) {
        this.reading = reading;
    }

    /** Which reading. */
    public Reading reading() {
        return reading;
    }

    /** The number with the digits it deserves, "unknown" if it is not known. */
    public ReadOnlyStringProperty numberProperty() {
        return number.getReadOnlyProperty();
    }

    /** Label of the unit. */
    public ReadOnlyStringProperty unitProperty() {
        return unit.getReadOnlyProperty();
    }

    /** What is to be known about it, empty if nothing. */
    public ReadOnlyStringProperty whyProperty() {
        return why.getReadOnlyProperty();
    }

    void refresh(Assessment a, double value, UnitSystem units) {
        Unit shown = Display.unit(reading.kind(), units, value);
        boolean known = Double.isFinite(value);
        number.set(known ? Show.number(shown.fromSi(value), DIGITS) : Show.number(value, DIGITS));
        unit.set(known ? shown.label() : "");
        why.set(a.notices().stream()
                .filter(n -> n.about().equals(reading.key()))
                .map(n -> n.text())
                .findFirst()
                .orElse(""));
    }
}
