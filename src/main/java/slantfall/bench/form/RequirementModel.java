package slantfall.bench.form;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import slantfall.bench.model.Desk;
import slantfall.declare.Reading;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.quantity.Display;
import slantfall.quantity.EntryReader;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;

/** The user's own bounds on one reading. It is part of the set-up as soon as one bound is given. */
public final class RequirementModel {

    private final Desk desk;
    private final Reading reading;
    private final StringProperty atLeast = new SimpleStringProperty("");
    private final StringProperty atMost = new SimpleStringProperty("");
    private final StringProperty margin = new SimpleStringProperty("");
    private final StringProperty reason = new SimpleStringProperty("");
    private final StringProperty problem = new SimpleStringProperty("");

    RequirementModel(Desk desk, Reading reading) {
        this.desk = desk;
        this.reading = reading;
    }

    /** The reading that is bounded. */
    public Reading reading() {
        return reading;
    }

    /** Lower bound as typed, empty for none. */
    public StringProperty atLeastProperty() {
        return atLeast;
    }

    /** Upper bound as typed, empty for none. */
    public StringProperty atMostProperty() {
        return atMost;
    }

    /** Margin to be kept, as typed. */
    public StringProperty marginProperty() {
        return margin;
    }

    /** Why, in the user's words. */
    public StringProperty reasonProperty() {
        return reason;
    }

    /** Why an entry is wrong, empty if none is. */
    public StringProperty problemProperty() {
        return problem;
    }

    /** The unit of a bound that is typed without one. */
    public Unit unit() {
        return Display.unit(reading.kind(), desk.unitsProperty().get(), desk.assessment().value(reading.key()));
    }

    /** Shows a requirement of the set-up, unless an entry is wrong. */
    void show(Requirement r) {
        if (problem.get().isEmpty()) {
            atLeast.set(bound(r.typedAtLeast(), r.atLeast()));
            atMost.set(bound(r.typedAtMost(), r.atMost()));
            margin.set(r.margin() == 0 ? "" : Show.number(100 * r.margin(), 3).replaceAll("\\.0+$", "") + " %");
            reason.set(r.reason());
        }
    }

    private String bound(String typed, double si) {
        return !typed.isEmpty() ? typed : Double.isNaN(si) ? "" : Show.exact(si, reading.kind());
    }

    /** Makes what was typed part of the set-up; a wrong entry stays, with the reason. */
    public void commit() {
        if (atLeast.get().isBlank() && atMost.get().isBlank()) {
            problem.set("");
            return;
        }
        try {
            Requirement made = new Requirement(
                    reading.key(),
                    read(atLeast.get()),
                    read(atMost.get()),
                    Share.read(margin.get()),
                    reason.get().strip(),
                    withUnit(atLeast.get()),
                    withUnit(atMost.get()));
            problem.set("");
            SetUp now = desk.session().current();
            List<Requirement> all = new ArrayList<>(now.requirements());
            int at = index(all);
            if (at < 0) {
                all.add(made);
            } else {
                all.set(at, made);
            }
            desk.session().change(now.withRequirements(all), null);
        } catch (QuantityProblem | IllegalArgumentException e) {
            problem.set(e.getMessage());
        }
    }

    /** Takes the requirement out of the set-up. */
    public void remove() {
        problem.set("");
        SetUp now = desk.session().current();
        List<Requirement> all = new ArrayList<>(now.requirements());
        all.removeIf(r -> r.reading().equals(reading.key()));
        desk.session().change(now.withRequirements(all), null);
    }

    private int index(List<Requirement> all) {
        for (int i = 0; i < all.size(); i++) {
            if (all.get(i).reading().equals(reading.key())) {
                return i;
            }
        }
        return -1;
    }

    private double read(String text) {
        return text.isBlank() ? Double.NaN : EntryReader.read(withUnit(text), reading.kind(), desk.context()).si();
    }

    private String withUnit(String text) {
        return text.isBlank() ? "" : EntryText.withUnit(text.strip(), reading.kind(), unit());
    }
}
