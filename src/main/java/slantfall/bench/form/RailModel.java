package slantfall.bench.form;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Setting;
import slantfall.liquid.Property;
import slantfall.quantity.Kind;

/** The settings of the open arrangement in groups. Rebuilt when the declaration changes, refreshed otherwise. */
public final class RailModel {

    private static final Set<Kind> SHAPES = Set.of(Kind.LENGTH, Kind.ANGLE, Kind.COUNT);

    /** Properties that every liquid is asked for; the others are kept apart. */
    private static final Set<Property> MAIN = Set.of(Property.DENSITY, Property.VISCOSITY, Property.SURFACE_TENSION);

    private final Desk desk;
    private final Map<String, FieldModel> fields = new LinkedHashMap<>();
    private final ReadOnlyIntegerWrapper edition = new ReadOnlyIntegerWrapper();
    private final BooleanProperty starting = new SimpleBooleanProperty();
    private List<ChoiceModel> choices = List.of();
    private List<String> shape = List.of();

    /** Follows a desk. */
    public RailModel(Desk desk) {
        this.desk = desk;
        desk.follow(this::refresh);
    }

    /** Groups of settings, in the order shown. */
    public enum Group {
        LIQUID("Liquid"),
        PROPERTIES("Further properties"),
        GEOMETRY("Geometry"),
        DUTY("Duty"),
        QUESTIONS("For single questions");

        private final String title;

        Group(String title) {
            this.title = title;
        }

        /** The words over the group. */
        public String title() {
            return title;
        }
    }

    /** Whether a new set-up has just begun, so that only what it must have is asked for. */
    public BooleanProperty startingProperty() {
        return starting;
    }

    /** The few fields that a new set-up is asked for. */
    public List<FieldModel> essentials() {
        return desk.declaration().essentials().stream().flatMap(k -> field(k).stream()).toList();
    }

    /** Counts up whenever the fields themselves are others. */
    public ReadOnlyIntegerProperty editionProperty() {
        return edition.getReadOnlyProperty();
    }

    /** The fields of a group. */
    public List<FieldModel> fields(Group group) {
        return fields.values().stream().filter(f -> group(f.setting()) == group).toList();
    }

    /** Every field. */
    public List<FieldModel> fields() {
        return List.copyOf(fields.values());
    }

    /** The field of a key, if the open set-up has it. */
    public Optional<FieldModel> field(String key) {
        return Optional.ofNullable(fields.get(key));
    }

    /** Words that can be chosen. */
    public List<ChoiceModel> choices() {
        return choices;
    }

    /** What the rail edits. */
    public Desk desk() {
        return desk;
    }

    private static Group group(Setting setting) {
        if (setting.key().startsWith(Declaration.LIQUID)) {
            String own = setting.key().substring(Declaration.LIQUID.length());
            boolean state = own.equals("temperature") || own.equals("strength");
            return state || MAIN.stream().anyMatch(p -> p.key().equals(own)) ? Group.LIQUID : Group.PROPERTIES;
        }
        if (!setting.inAssessment()) {
            return Group.QUESTIONS;
        }
        return SHAPES.contains(setting.kind()) ? Group.GEOMETRY : Group.DUTY;
    }

    private void refresh(Assessment assessment) {
        List<Setting> wanted = settings(assessment.declaration());
        List<String> keys = new ArrayList<>(List.of(assessment.declaration().key()));
        wanted.forEach(s -> keys.add(s.key()));
        assessment.declaration().choices().forEach(c -> keys.add(c.key()));
        if (keys.equals(shape)) {
            fields.values().forEach(f -> f.refresh(assessment));
            choices.forEach(c -> c.refresh(assessment));
            return;
        }
        boolean other = shape.isEmpty() || !shape.get(0).equals(keys.get(0));
        Map<String, FieldModel> kept = other ? Map.of() : Map.copyOf(fields);
        fields.clear();
        for (Setting setting : wanted) {
            FieldModel known = kept.get(setting.key());
            fields.put(setting.key(), known == null ? new FieldModel(desk, setting) : known);
        }
        fields.values().forEach(f -> f.refresh(assessment));
        choices = assessment.declaration().choices().stream().map(c -> new ChoiceModel(desk, c)).toList();
        shape = List.copyOf(keys);
        starting.set(starting.get() && !other);
        edition.set(edition.get() + 1);
    }

    /** The declared settings, the liquid's state, and every property whether it is measured or not. */
    private static List<Setting> settings(Declaration declaration) {
        List<Setting> all = new ArrayList<>(declaration.liquidSettings().stream()
                .filter(s -> !isProperty(s.key()))
                .toList());
        for (Property property : Property.values()) {
            all.add(LiquidSettings.of(property.key()));
        }
        all.addAll(declaration.settings());
        return all;
    }

    private static boolean isProperty(String key) {
        return java.util.Arrays.stream(Property.values()).anyMatch(p -> key.equals(Declaration.LIQUID + p.key()));
    }
}
