package slantfall.declare;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;
import slantfall.liquid.Property;

/**
 * An arrangement with a liquid, all settings, requirements and house rules: what a project file holds. Immutable; a
 * change gives a new one.
 *
 * @param title what the user calls it
 * @param arrangement key of the arrangement
 * @param base the liquid before any measured number is put over it
 * @param values numbers the user gave, by key; a setting left out takes its declared initial value and counts as
 *     untouched. Keys of the liquid's numbers start with {@code liquid.}; one for a property means measured.
 * @param choices words the user chose, by key
 * @param requirements the user's own bounds
 * @param houseRules rules the user designs by, by panel
 * @param correlations pairs of keys with their correlation
 * @param remarks notes and whatever a file held that was not understood
 */
public record SetUp(
        String title,
        String arrangement,
        LiquidBase base,
        Map<String, Value> values,
        Map<String, String> choices,
        List<Requirement> requirements,
        Map<String, HouseRule> houseRules,
        List<Correlated> correlations,
        Remarks remarks) {

    public SetUp {
        values = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(values));
        choices = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(choices));
        requirements = List.copyOf(requirements);
        houseRules = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(houseRules));
        correlations = List.copyOf(correlations);
    }

    /** A set-up with nothing set. */
    public static SetUp blank(String arrangement, LiquidBase base) {
        return new SetUp(
                "", arrangement, base, Map.of(), Map.of(), List.of(), Map.of(), List.of(), Remarks.none());
    }

    /** How each property is obtained: what was measured wins over a fit, a fit over the preset. */
    public Liquid liquid() {
        Set<Property> measured = values.keySet().stream()
                .filter(k -> k.startsWith(Declaration.LIQUID))
                .map(k -> k.substring(Declaration.LIQUID.length()))
                .flatMap(k -> java.util.Arrays.stream(Property.values()).filter(p -> p.key().equals(k)))
                .collect(Collectors.toSet());
        return Liquid.of(base.preset(), measured, base.points());
    }

    /** Every known property of the liquid at this state, whether the arrangement uses it or not. */
    public LiquidState liquidState() {
        Liquid liquid = liquid();
        Set<Property> all = java.util.EnumSet.allOf(Property.class);
        double[] in = liquid.coordinates(all).stream()
                .mapToDouble(c -> value(LiquidSettings.of(c)))
                .toArray();
        LiquidState state = new LiquidState();
        liquid.evaluator(all).at(in, 0, state);
        return state;
    }

    /** Everything that is no number. */
    public Structure structure() {
        return new Structure(choices, liquid());
    }

    /** The value of a setting, given or initial [SI]. */
    public double value(Setting setting) {
        Value given = values.get(setting.key());
        if (given == null && !setting.follows().isEmpty()) {
            given = values.get(setting.follows());
        }
        return given == null ? setting.initial() : given.si();
    }

    /** Inputs of the evaluator. */
    public double[] coordinates(Declaration declaration) {
        return declaration.coordinates().stream().mapToDouble(this::value).toArray();
    }

    /** Whether the user gave the number himself. */
    public boolean touched(String key) {
        return values.containsKey(key);
    }

    /** Keys of requirements and settings, for messages. */
    public Set<String> keys() {
        return new TreeSet<>(values.keySet());
    }

    /** The same with one number changed. */
    public SetUp with(String key, Value value) {
        Map<String, Value> changed = new LinkedHashMap<>(values);
        changed.put(key, value);
        return withValues(changed);
    }

    /** The same with one number back at its declared or correlated value. */
    public SetUp without(String key) {
        Map<String, Value> changed = new LinkedHashMap<>(values);
        changed.remove(key);
        return withValues(changed);
    }

    /** The same with other numbers. */
    public SetUp withValues(Map<String, Value> changed) {
        return new SetUp(
                title, arrangement, base, changed, choices, requirements, houseRules, correlations, remarks);
    }

    /** The same with a word changed. */
    public SetUp withChoice(String key, String word) {
        Map<String, String> changed = new LinkedHashMap<>(choices);
        changed.put(key, word);
        return new SetUp(
                title, arrangement, base, values, changed, requirements, houseRules, correlations, remarks);
    }

    /** The same with another liquid; measured numbers stay unless told otherwise. */
    public SetUp withBase(LiquidBase changed) {
        return new SetUp(
                title, arrangement, changed, values, choices, requirements, houseRules, correlations, remarks);
    }

    /** The same with other requirements. */
    public SetUp withRequirements(List<Requirement> changed) {
        return new SetUp(
                title, arrangement, base, values, choices, changed, houseRules, correlations, remarks);
    }

    /** The same with other house rules. */
    public SetUp withHouseRules(Map<String, HouseRule> changed) {
        return new SetUp(
                title, arrangement, base, values, choices, requirements, changed, correlations, remarks);
    }

    /** The same under another title. */
    public SetUp titled(String changed) {
        return new SetUp(
                changed, arrangement, base, values, choices, requirements, houseRules, correlations, remarks);
    }

    /** The same with other remarks. */
    public SetUp withRemarks(Remarks changed) {
        return new SetUp(
                title, arrangement, base, values, choices, requirements, houseRules, correlations, changed);
    }

    /**
     * Two inputs that vary together.
     *
     * @param first key
     * @param second key
     * @param coefficient correlation, −1 to 1
     */
    public record Correlated(String first, String second, double coefficient) {

        public Correlated {
            if (!(coefficient >= -1 && coefficient <= 1)) {
                throw new IllegalArgumentException(
                        "correlation of " + first + " and " + second + " must lie between -1 and 1");
            }
        }
    }

    /**
     * What a set-up carries along without computing with it.
     *
     * @param notes the user's own notes
     * @param unknown parts of the file that were not understood, JSON text by JSON pointer; kept and reported
     */
    public record Remarks(String notes, Map<String, String> unknown) {

        public Remarks {
            unknown = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(unknown));
        }

        /** Nothing. */
        public static Remarks none() {
            return new Remarks("", Map.of());
        }
    }
}
