package slantfall.store;

import java.util.List;
import slantfall.declare.Arrangement;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.LiquidBase;
import slantfall.declare.LiquidSettings;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.liquid.Preset;
import slantfall.quantity.EntryContext;

/** Reads the liquid of a set-up: temperature and strength first, then the density, then what may lean on it. */
final class LiquidReader {

    /** Keys that need nothing else, in the order they are read. */
    static final List<String> FIRST = List.of("temperature", "strength", "density");

    private final Presets presets;
    private final Arrangement arrangement;
    private final Kept kept;

    LiquidReader(Presets presets, Arrangement arrangement, Kept kept) {
        this.presets = presets;
        this.arrangement = arrangement;
        this.kept = kept;
    }

    /** The set-up with the liquid of the file. */
    SetUp read(SetUp blank, Fields fields) {
        Node preset = fields.take("preset");
        SetUp setUp = blank;
        if (preset != null) {
            setUp = setUp.withBase(LiquidBase.of(preset(preset)));
        }
        for (String key : FIRST) {
            setUp = property(setUp, fields, LiquidSettings.of(key), EntryContext.none());
        }
        setUp = withPoints(setUp, fields);
        for (Setting setting : LiquidSettings.list()) {
            if (!FIRST.contains(key(setting))) {
                setUp = property(setUp, fields, setting, context(setUp));
            }
        }
        rheology(fields);
        noticeIdleStrength(setUp, fields);
        fields.keepRest(kept);
        return setUp;
    }

    /** The key of a setting inside the liquid's block. */
    static String key(Setting setting) {
        return setting.key().substring(Declaration.LIQUID.length());
    }

    private Preset preset(Node node) {
        String key = Fields.text(node);
        List<String> known = presets.all().stream().map(Preset::key).toList();
        return presets.find(key).orElseThrow(() -> node.problem(
                "there is no liquid \"" + Place.shortened(key) + "\" among the presets",
                "Write one of " + String.join(", ", known) + ", or give measured values"
                        + (presets.problems().isEmpty() ? "" : ". A liquid of your own is broken: " + presets.problems().get(0))));
    }

    private SetUp property(SetUp setUp, Fields fields, Setting setting, EntryContext context) {
        Node node = fields.take(key(setting));
        if (node == null) {
            return setUp;
        }
        Value value = new ValueReader(setting, context, kept).read(node);
        return setUp.with(setting.key(), value);
    }

    private EntryContext context(SetUp setUp) {
        return Entries.context(setUp, arrangement.declare(setUp.structure()));
    }

    private SetUp withPoints(SetUp setUp, Fields fields) {
        Node list = fields.take("viscosityPoints");
        Node law = fields.take("viscosityFit");
        if (list == null) {
            if (law != null) {
                throw law.problem("a fit needs \"viscosityPoints\"", "Add the points, or leave the fit out");
            }
            return setUp;
        }
        Points points = Points.read(list, law, t -> at(setUp, t));
        return setUp.withBase(new LiquidBase(setUp.base().preset(), points.fit(), points.typed(), points.law()));
    }

    /** What a viscosity at some temperature may lean on: the density there. */
    private EntryContext at(SetUp setUp, double temperature) {
        return context(setUp.with(Declaration.LIQUID + "temperature", Value.of(temperature)));
    }

    private void rheology(Fields fields) {
        Node node = fields.take("rheology");
        if (node == null) {
            return;
        }
        Node model = new Fields(node, "\"rheology\"").need("model", "Write {\"model\": \"newtonian\"}");
        if (!Fields.text(model).equals("newtonian")) {
            throw model.problem("the rheology \"" + Place.shortened(model.text()) + "\" is not computed yet",
                    "Only \"newtonian\" is; a later version brings the others");
        }
        kept.keep(node);
    }

    private void noticeIdleStrength(SetUp setUp, Fields fields) {
        Node node = fields.take("strength");
        boolean solution = setUp.base().preset() != null && !setUp.base().preset().solute().isEmpty();
        if (node != null && !solution) {
            kept.report("liquid.strength has no effect: the liquid is no preset of a solution");
        }
    }
}
