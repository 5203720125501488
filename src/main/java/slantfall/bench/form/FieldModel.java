package slantfall.bench.form;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Optional;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Nudge;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidReport;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.liquid.Property;
import slantfall.liquid.Provision;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;

/**
 * One number of the set-up as a slider and a field that agree exactly. A wrong entry stays in the field with the reason
 * until it is put right, restored, or the slider takes over.
 */
public final class FieldModel {

    /** Digits of a number that somebody gave. */
    private static final int DIGITS = 6;

    /** Digits of a number that a correlation gave: as many as it can be trusted for. */
    private static final int CORRELATED_DIGITS = 4;

    private final Desk desk;
    private final Setting setting;
    private final Property property;
    private final StringProperty text = new SimpleStringProperty("");
    private final StringProperty echo = new SimpleStringProperty("");
    private final StringProperty problem = new SimpleStringProperty("");
    private final StringProperty badge = new SimpleStringProperty("");
    private final StringProperty origin = new SimpleStringProperty("");
    private final StringProperty spoken = new SimpleStringProperty("");
    private final DoubleProperty position = new SimpleDoubleProperty();
    private final ObjectProperty<Standing> standing = new SimpleObjectProperty<>(Standing.DEFAULT);
    private final ObjectProperty<Unit> unit = new SimpleObjectProperty<>();
    private String shown = "";
    private Value echoed;
    private double si = Double.NaN;

    /** The field of a declared setting, or of a property of the liquid. */
    public FieldModel(Desk desk, Setting setting) {
        this.desk = desk;
        this.setting = setting;
        this.property = propertyOf(setting.key());
        refresh(desk.assessment());
    }

    private static Property propertyOf(String key) {
        for (Property p : Property.values()) {
            if (key.equals(Declaration.LIQUID + p.key())) {
                return p;
            }
        }
        return null;
    }

    /** The setting it edits. */
    public Setting setting() {
        return setting;
    }

    /** What stands in the field; an edit becomes a value with {@link #commit()}. */
    public StringProperty textProperty() {
        return text;
    }

    /** What was understood, empty if nothing needs saying. */
    public StringProperty echoProperty() {
        return echo;
    }

    /** Why the entry is wrong, empty if it is not. */
    public StringProperty problemProperty() {
        return problem;
    }

    /** How the number came about, in words. */
    public StringProperty badgeProperty() {
        return badge;
    }

    /** Where a property of the liquid comes from, empty for a setting. */
    public StringProperty originProperty() {
        return origin;
    }

    /** The setting with its value and standing, for a screen reader. */
    public StringProperty spokenProperty() {
        return spoken;
    }

    /** Where the value lies in the usual range, 0 to 1. */
    public DoubleProperty positionProperty() {
        return position;
    }

    /** How the number came about. */
    ObjectProperty<Standing> standingProperty() {
        return standing;
    }

    /** The unit it is shown in. */
    public ObjectProperty<Unit> unitProperty() {
        return unit;
    }

    /** The value [SI], NaN if it is not known. */
    public double si() {
        return si;
    }

    /** The value with every digit. */
    String exact() {
        return Double.isNaN(si) ? "not known" : Show.exact(si, setting.kind());
    }

    /** Takes what an assessment says, but leaves an entry that is being edited or is wrong. */
    public void refresh(Assessment assessment) {
        Optional<LiquidReport.Row> row = property == null ? Optional.empty() : desk.property(property);
        Value given = assessment.setUp().values().get(setting.key());
        si = given != null ? given.si() : property != null
                ? row.map(LiquidReport.Row::value).orElse(Double.NaN)
                : assessment.setUp().value(setting);
        unit.set(desk.unit(setting, Double.isNaN(si) || si == 0 ? setting.usual().high() : si));
        standing.set(standing(given, row));
        badge.set(badgeText());
        origin.set(row.map(LiquidReport.Row::origin).orElse(""));
        position.set(Double.isNaN(si) ? 0 : positionOf(si));
        showText(given);
        spoken.set(setting.name() + ", " + shown + " " + unit.get().label()
                + (badge.get().isEmpty() ? "" : ", " + badge.get()));
        if (given == null || !given.equals(echoed)) {
            echo.set(rangeEcho(given));
        }
    }

    private void showText(Value given) {
        boolean unknown = given != null && given.tolerance()
                .filter(t -> t.shape() == Tolerance.Shape.UNKNOWN)
                .isPresent();
        boolean editing = !text.get().equals(shown);
        String plusMinus = given == null || unknown ? "" : given.tolerance()
                .map(t -> " ± " + String.join(" ", t.typed()))
                .orElse("");
        shown = unknown ? "?" : Double.isNaN(si) ? "" : number(si) + plusMinus;
        if (!editing) {
            text.set(shown);
        }
    }

    private String rangeEcho(Value given) {
        if (given == null) {
            return "";
        }
        if (given.tolerance().isEmpty()) {
            return typedOtherwise(given) ? "typed as " + given.typed() : "";
        }
        Tolerance t = given.known();
        String between = Show.value(t.low(), setting.kind(), unit.get(), 3) + " to "
                + Show.value(t.high(), setting.kind(), unit.get(), 3);
        return t.shape() == Tolerance.Shape.UNKNOWN
                ? "unknown: " + between + "; computed at " + Show.value(si, setting.kind(), unit.get(), 3)
                : between;
    }

    /** Whether the user typed it in another way than it is shown in. */
    private boolean typedOtherwise(Value given) {
        String typed = given.typed().strip();
        boolean bare = setting.kind().dimensionless() && !typed.endsWith("%");
        return !typed.isEmpty() && !bare && !typed.endsWith(" " + unit.get().symbol())
                && !typed.endsWith(" " + unit.get().label());
    }

    private Standing standing(Value given, Optional<LiquidReport.Row> row) {
        if (given != null && given.tolerance().filter(t -> t.shape() == Tolerance.Shape.UNKNOWN).isPresent()) {
            return Standing.RANGE;
        }
        if (property == null) {
            return given == null ? Standing.DEFAULT : Standing.GIVEN;
        }
        if (given != null) {
            return Standing.MEASURED;
        }
        Provision provision = desk.setUp().liquid().provision(property).orElse(null);
        if (provision == null) {
            return Standing.MISSING;
        }
        if (row.isEmpty()) {
            return Standing.UNUSED;
        }
        return provision instanceof Provision.Correlated
                ? Standing.CORRELATED
                : provision instanceof Provision.Constant ? Standing.ASSUMED : Standing.MEASURED;
    }

    private String badgeText() {
        if (standing.get() == Standing.DEFAULT && !setting.follows().isEmpty()) {
            return "follows " + desk.declaration().setting(setting.follows()).map(Setting::name).orElse("")
                    .toLowerCase(java.util.Locale.ROOT);
        }
        return standing.get().word();
    }

    private String number(double value) {
        return Nudge.text(new BigDecimal(unit.get().fromSi(value))
                .round(new MathContext(property != null && standing.get() != Standing.MEASURED
                        ? CORRELATED_DIGITS
                        : DIGITS)));
    }

    /** Makes what was typed the value; a wrong entry stays, with the reason. */
    public void commit() {
        String typed = text.get();
        if (typed.equals(shown)) {
            problem.set("");
            return;
        }
        take(typed, null);
    }

    private boolean take(String typed, Object gesture) {
        try {
            EntryText.Read read = new EntryText(setting, unit.get(), desk.context()).read(typed);
            Value value = read.value();
            desk.session().set(setting.key(), value, gesture);
            desk.typedIn(setting.key(), read.unit());
            echoed = value;
            echo.set(gesture == null ? "understood: " + read.echo() : "");
        } catch (QuantityProblem | IllegalArgumentException e) {
            problem.set(e.getMessage());
            return false;
        }
        problem.set("");
        text.set(shown);
        desk.refresh();
        refresh(desk.assessment());
        return true;
    }

    /** Drops what was typed and shows the value again. */
    public void restore() {
        problem.set("");
        text.set(shown);
    }

    /** Takes the place of the slider; the value snaps to a number that a person would type. */
    public void slide(double newPosition, Object gesture) {
        restore();
        desk.moveNear(setting, siAt(newPosition), gesture);
    }

    /**
     * Moves by sensible steps.
     *
     * @param direction +1 or −1
     * @param factor steps at once: 1, 10 or 0.1
     */
    public void nudge(int direction, double factor, Object gesture) {
        if (Double.isNaN(si)) {
            return;
        }
        restore();
        double number = unit.get().fromSi(si);
        BigDecimal step = Nudge.step(setting, unit.get(), number).multiply(BigDecimal.valueOf(factor));
        desk.move(setting, Nudge.moved(number, step, direction), gesture);
    }

    /** Ends a drag or a run of keys, so that the next one is an undo step of its own. */
    public void endGesture() {
        desk.session().endGesture();
    }

    /** Gives the number back to its default, its correlation or the setting it follows. */
    public void release() {
        problem.set("");
        text.set(shown);
        desk.session().release(setting.key());
    }

    /** Whether there is something to give back. */
    public boolean released() {
        return !desk.session().current().touched(setting.key());
    }

    /** Shows the same quantity in another unit. */
    public void showIn(Unit other) {
        desk.showIn(setting.key(), other);
    }

    /** Keeps the number and takes the other unit: the quantity changes. */
    public void meant(Unit other) {
        take(number(si) + " " + other.symbol(), null);
    }

    private double siAt(double p) {
        double low = setting.usual().low();
        double high = setting.usual().high();
        double at = Math.max(0, Math.min(1, p));
        return setting.scale() == Scale.LOG ? low * Math.pow(high / low, at) : low + at * (high - low);
    }

    private double positionOf(double value) {
        double low = setting.usual().low();
        double high = setting.usual().high();
        double p = setting.scale() == Scale.LOG
                ? (value > 0 ? Math.log(value / low) / Math.log(high / low) : 0)
                : (value - low) / (high - low);
        return Math.max(0, Math.min(1, p));
    }
}
