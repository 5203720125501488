package slantfall.store;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import slantfall.declare.Entries;
import slantfall.declare.Limits;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Setting;
import slantfall.liquid.Correlation;
import slantfall.liquid.Correlations;
import slantfall.liquid.Preset;
import slantfall.liquid.Property;
import slantfall.liquid.Provision;
import slantfall.liquid.Range;
import slantfall.quantity.EntryContext;
import slantfall.quantity.Kind;
import slantfall.source.Mark;
import slantfall.source.Source;

/** Liquids in files; the form is described in docs/howto/add-a-liquid.md. */
final class PresetJson {

    private static final String RANGE = "Write [from, to]";

    private final Kept kept = new Kept();
    private String solute;

    private PresetJson() {}

    /**
     * Reads a liquid.
     *
     * @param told receives what is not understood and does no harm
     * @throws StoreProblem with the place, where something is refused
     */
    static Preset read(String text, String file, List<String> told) {
        PresetJson reader = new PresetJson();
        Preset preset = reader.preset(new Fields(NodeReader.read(text, file), "a liquid"));
        reader.kept.reports().forEach(r -> told.add(file + ": " + r.replace("was kept", "was passed over")));
        return preset;
    }

    private Preset preset(Fields fields) {
        Node version = fields.need("preset", "Add \"preset\": 1 if this is a liquid for Slantfall");
        if (!version.text().equals("1")) {
            throw version.problem("only form 1 of a liquid is known", "Write 1, or use a newer Slantfall");
        }
        Node key = fields.need("key", "Add a short key such as \"plant-syrup\"");
        if (!Fields.text(key).matches("[a-z0-9][a-z0-9-]{0,59}")) {
            throw key.problem("a key has small letters, digits and hyphens, at most 60", "Choose another");
        }
        String name = fields.text("name", key.text());
        solute = fields.text("solute", "");
        Map<Property, Provision> properties =
                properties(new Fields(fields.need("properties", "Add \"properties\": {…}"), "\"properties\""));
        Range temperature = range(fields.take("temperature"), Kind.TEMPERATURE);
        Range strength = range(fields.take("strength"), Kind.FRACTION);
        List<String> cautions =
                fields.list("cautions", "Write [\"…\"]").stream().map(Fields::text).toList();
        Preset.Words words = new Preset.Words(cautions, fields.text("note", ""));
        fields.keepRest(kept);
        return new Preset(key.text(), name, solute, properties, temperature, strength, words);
    }

    private Map<Property, Provision> properties(Fields fields) {
        Map<Property, Provision> properties = new EnumMap<>(Property.class);
        EntryContext context = EntryContext.none();
        for (Property property : Property.values()) {
            Node node = fields.take(property.key());
            if (node != null) {
                Provision provision = provision(property, new Fields(node, "a property"), context);
                properties.put(property, provision);
                if (property == Property.DENSITY && provision instanceof Provision.Constant) {
                    context = context.withDensity(((Provision.Constant) provision).value());
                }
            }
        }
        fields.keepRest(kept);
        return properties;
    }

    private Provision provision(Property property, Fields fields, EntryContext context) {
        Node law = fields.take("correlation");
        Node value = fields.take("value");
        Node points = fields.take("points");
        int given = (law == null ? 0 : 1) + (value == null ? 0 : 1) + (points == null ? 0 : 1);
        if (given != 1) {
            throw fields.node().problem("give exactly one of \"correlation\", \"value\" and \"points\"", "Keep one of them");
        }
        Provision provision;
        if (law != null) {
            provision = correlated(property, law);
        } else if (value != null) {
            provision = constant(property, value, fields, context);
        } else {
            provision = fitted(property, points, fields, context);
        }
        fields.keepRest(kept);
        return provision;
    }

    private Provision correlated(Property property, Node node) {
        String key = Fields.text(node);
        List<String> fitting = Correlations.all().stream()
                .filter(c -> c.property() == property)
                .map(Correlation::key)
                .toList();
        if (!fitting.contains(key)) {
            throw node.problem("there is no correlation \"" + Place.shortened(key) + "\" of the " + property.words()
                    + Entries.nearest(fitting, key), "");
        }
        Correlation law = Correlations.named(key);
        if (law.needsStrength() && solute.isEmpty()) {
            throw node.problem(key + " depends on a strength, and the liquid names no solute", "Add \"solute\"");
        }
        return new Provision.Correlated(law);
    }

    private static Provision constant(Property property, Node node, Fields fields, EntryContext context) {
        Setting setting = LiquidSettings.of(property.key());
        double si = ValueReader.entryOf(node, setting.kind(), context).si();
        if (!setting.possible().contains(si)) {
            throw node.problem(Limits.refusal(setting, si), "Change the value");
        }
        Node source = fields.need("source", "Add \"source\": {\"key\", \"citation\", \"mark\"}");
        return new Provision.Constant(si, fields.text("at", ""), source(new Fields(source, "a source")));
    }

    private static Source source(Fields fields) {
        String key = Fields.text(fields.need("key", "Add a short key such as \"lab-2026\""));
        String citation = Fields.text(fields.need("citation", "Say who measured or published it, and when"));
        Node letter = fields.need("mark", "Say how it is vouched for: S, S2, C, M, P or U");
        for (Mark mark : Mark.values()) {
            if (mark.letter().equals(Fields.text(letter))) {
                return new Source(key, citation, fields.text("locator", ""), mark);
            }
        }
        throw letter.problem("there is no mark \"" + Place.shortened(letter.text()) + "\"", "Write S, S2, C, M, P or U");
    }

    private static Provision fitted(Property property, Node points, Fields fields, EntryContext context) {
        if (property != Property.VISCOSITY) {
            throw points.problem("only the viscosity is fitted through points", "Give a value with its source");
        }
        return new Provision.Fitted(Points.read(points, fields.take("fit"), t -> context).fit());
    }

    private static Range range(Node node, Kind kind) {
        if (node == null) {
            return Range.ANY;
        }
        List<Node> ends = Fields.list(node, RANGE);
        if (ends.size() != 2) {
            throw node.problem("a range has two ends, not " + ends.size(), RANGE);
        }
        double low = ValueReader.entryOf(ends.get(0), kind, EntryContext.none()).si();
        double high = ValueReader.entryOf(ends.get(1), kind, EntryContext.none()).si();
        if (!(low <= high)) {
            throw node.problem("the range begins above its end", "Swap the two ends");
        }
        return new Range(low, high);
    }

    /** What there is to choose from, for programs. */
    static Node summaries(List<Preset> presets) {
        Node list = Node.list();
        for (Preset preset : presets) {
            Node properties = Node.object();
            preset.properties().forEach((property, provision) -> properties.put(property.key(), origin(provision)));
            list.add(Node.object()
                    .put("key", preset.key())
                    .put("name", preset.name())
                    .put("solute", preset.solute())
                    .put("temperature", ends(preset.temperature()))
                    .put("strength", ends(preset.strength()))
                    .put("properties", properties)
                    .put("cautions", Node.texts(new ArrayList<>(preset.cautions())))
                    .put("note", preset.words().note()));
        }
        return list;
    }

    private static Node origin(Provision provision) {
        if (provision instanceof Provision.Correlated) {
            Correlation law = ((Provision.Correlated) provision).law();
            return Node.object().put("correlation", law.key()).put("source", law.source().text());
        }
        if (provision instanceof Provision.Constant) {
            Provision.Constant constant = (Provision.Constant) provision;
            return Node.object().put("value", constant.value()).put("source", constant.source().text());
        }
        return Node.object()
                .put("source", provision instanceof Provision.Fitted ? ((Provision.Fitted) provision).fit().words() : "measured");
    }

    private static Node ends(Range range) {
        return Node.list().add(Node.number(range.low())).add(Node.number(range.high()));
    }
}
