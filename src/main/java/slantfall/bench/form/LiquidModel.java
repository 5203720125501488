package slantfall.bench.form;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.liquid.Preset;
import slantfall.liquid.Property;
import slantfall.liquid.ViscosityFit;

/** Which liquid. Another liquid lets go what was measured on the former one; undo brings it back. */
public final class LiquidModel {

    private final Desk desk;
    private final Supplier<List<Preset>> presets;
    private final ObjectProperty<Optional<Preset>> preset = new SimpleObjectProperty<>(Optional.empty());
    private final ReadOnlyStringWrapper note = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper fit = new ReadOnlyStringWrapper("");
    private boolean showing;

    /** Follows a desk. */
    public LiquidModel(Desk desk, Supplier<List<Preset>> presets) {
        this.desk = desk;
        this.presets = presets;
        desk.follow(this::refresh);
        preset.addListener((o, a, chosen) -> {
            if (!showing && chosen != null) {
                take(chosen);
            }
        });
    }

    /** Liquids that can be chosen, the empty one for measured values alone. */
    public List<Optional<Preset>> options() {
        List<Optional<Preset>> options = new java.util.ArrayList<>();
        presets.get().forEach(p -> options.add(Optional.of(p)));
        options.add(Optional.empty());
        return options;
    }

    /** The liquid taken; setting it changes the set-up. */
    public ObjectProperty<Optional<Preset>> presetProperty() {
        return preset;
    }

    /** What to know about the liquid taken. */
    public ReadOnlyStringProperty noteProperty() {
        return note.getReadOnlyProperty();
    }

    /** Which law runs through the measured points, empty if there are none. */
    public ReadOnlyStringProperty fitProperty() {
        return fit.getReadOnlyProperty();
    }

    /** The measured points, one a line. */
    String pointsAsTyped() {
        return desk.session().current().base().typedPoints().stream()
                .map(p -> String.join("   ", p))
                .collect(Collectors.joining("\n"));
    }

    /**
     * Takes measured points; a viscosity typed as one number goes, it would win over them.
     *
     * @throws RuntimeException with what to change, nothing is taken then
     */
    void takePoints(String table, String temperatureUnit, String viscosityUnit) {
        PastedPoints pasted = PastedPoints.read(table, temperatureUnit, viscosityUnit, desk.context());
        ViscosityFit through = ViscosityFit.automatic(pasted.points());
        SetUp from = desk.session().current();
        LiquidBase base = new LiquidBase(from.base().preset(), through, pasted.typed(), "");
        desk.session().change(from.without(Declaration.LIQUID + Property.VISCOSITY.key()).withBase(base), null);
    }

    /** Lets the measured points go. */
    void dropPoints() {
        SetUp from = desk.session().current();
        desk.session().change(from.withBase(new LiquidBase(from.base().preset(), null, List.of(), "")), null);
    }

    private void refresh(Assessment assessment) {
        ViscosityFit points = assessment.setUp().base().points();
        fit.set(points == null ? "" : "Viscosity: " + points.words());

        Optional<Preset> now = Optional.ofNullable(assessment.setUp().base().preset());
        showing = true;
        if (!now.map(Preset::key).equals(preset.get() == null ? null : preset.get().map(Preset::key))) {
            preset.set(now);
        }
        showing = false;
        note.set(now.map(p -> p.words().note()).orElse("Type what you measured; what is missing stays unknown."));
    }

    private void take(Optional<Preset> chosen) {
        SetUp from = desk.session().current();
        LiquidBase base = chosen.map(LiquidBase::of).orElseGet(LiquidBase::measured);
        Map<String, Value> kept = from.values().entrySet().stream()
                .filter(e -> !measured(e.getKey()))
                .collect(Collectors.toMap(Map.Entry::getKey, Map.Entry::getValue, (x, y) -> x, LinkedHashMap::new));
        desk.session().change(from.withValues(kept).withBase(base), null);
    }

    private static boolean measured(String key) {
        return java.util.Arrays.stream(Property.values()).anyMatch(p -> key.equals(Declaration.LIQUID + p.key()));
    }
}
