package slantfall.store;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Supplier;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.CheckInfo;
import slantfall.declare.Choice;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.HouseRule;
import slantfall.declare.LiquidBase;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Panel;
import slantfall.declare.Reading;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.quantity.EntryContext;
import slantfall.quantity.Kind;
import slantfall.quantity.Need;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;

/**
 * Makes a set-up of a file's nodes. What other entries lean on is read first, whatever the order in the file: the liquid,
 * since a volume needs its density, then the width, since a total needs it.
 */
final class SetUpReader {

    private static final String WIDTH = "width";

    private final Presets presets;
    private final Kept kept = new Kept();
    private SetUp setUp;
    private Declaration declaration;

    private SetUpReader(Presets presets) {
        this.presets = presets;
    }

    /** A set-up with what to tell about it. */
    record Result(SetUp setUp, List<String> reports) {}

    /**
     * Reads the nodes of a file.
     *
     * @throws StoreProblem with the place, where something is refused
     */
    static Result read(Node root, Presets presets) {
        SetUpReader reader = new SetUpReader(presets);
        reader.read(root);
        return new Result(reader.setUp, reader.kept.reports());
    }

    private void read(Node root) {
        Fields fields = new Fields(root, "a set-up");
        Version.check(fields);
        Arrangement arrangement = arrangement(fields);
        setUp = SetUp.blank(arrangement.key(), LiquidBase.measured()).titled(fields.text("title", ""));
        String notes = fields.text("notes", "");
        Node liquid = fields.take("liquid");
        if (liquid != null) {
            setUp = new LiquidReader(presets, arrangement, kept).read(setUp, new Fields(liquid, "\"liquid\""));
        } else {
            kept.report("no liquid is given: readings that need its properties stay unknown");
        }
        Node settings = fields.take("settings");
        Fields given = settings == null ? new Fields(Node.object(), "") : new Fields(settings, "\"settings\"");
        choices(arrangement, given);
        declaration = arrangement.declare(setUp.structure());
        numbers(given);
        keepUnknownSettings(given);
        requirements(fields);
        houseRules(fields);
        correlations(fields);
        fields.keepRest(kept);
        setUp = setUp.withRemarks(new SetUp.Remarks(notes, kept.values()));
    }

    private static Arrangement arrangement(Fields fields) {
        List<String> known = Catalogue.all().stream().map(Arrangement::key).toList();
        Node node = fields.need("arrangement", "Add \"arrangement\": one of " + String.join(", ", known));
        String key = Fields.text(node);
        return Catalogue.find(key).orElseThrow(() -> node.problem(
                "there is no arrangement \"" + Place.shortened(key) + "\"", "Write one of " + String.join(", ", known)));
    }

    private void choices(Arrangement arrangement, Fields given) {
        for (Choice choice : arrangement.declare(setUp.structure()).choices()) {
            Node node = given.take(choice.key());
            if (node != null) {
                String word = Fields.text(node);
                if (!choice.allows(word)) {
                    List<String> words = choice.options().stream().map(Choice.Option::key).toList();
                    throw node.problem(choice.name() + ": there is no option \"" + Place.shortened(word) + "\"",
                            "Write one of " + String.join(", ", words));
                }
                setUp = setUp.withChoice(choice.key(), word);
            }
        }
    }

    private void numbers(Fields given) {
        declaration.setting(WIDTH).ifPresent(s -> number(given, s));
        declaration.settings().stream().filter(s -> !s.key().equals(WIDTH)).forEach(s -> number(given, s));
    }

    private void number(Fields given, Setting setting) {
        Node node = given.take(setting.key());
        if (node == null) {
            return;
        }
        EntryContext context = Entries.context(setUp, declaration);
        ValueReader reader = new ValueReader(setting, context, kept);
        Value value = reader.read(node);
        if (reader.leaned(Need::width) && !setUp.touched(WIDTH)) {
            kept.report(node.place().key() + " is a total; it was spread over the width of "
                    + Show.value(context.width(), Kind.LENGTH, UnitSystem.SI, 3) + " that nobody gave");
        }
        setUp = setUp.with(setting.key(), value);
    }

    private void keepUnknownSettings(Fields given) {
        for (String key : given.node().members().keySet()) {
            if (key.startsWith(Declaration.LIQUID) && known(key)) {
                Node node = given.take(key);
                String own = key.substring(Declaration.LIQUID.length());
                throw node.problem("belongs to the liquid", "Move it to \"liquid\": {\"" + own + "\": …}");
            }
        }
        given.keepRest(kept);
    }

    private void requirements(Fields fields) {
        Set<String> seen = new HashSet<>();
        List<Requirement> list = new ArrayList<>();
        for (Node node : fields.list("requirements", "Write [{\"reading\", \"atLeast\", \"atMost\", \"margin\", \"reason\"}]")) {
            Requirement requirement = requirement(new Fields(node, "a requirement"));
            if (!seen.add(requirement.reading())) {
                throw node.problem("there is a second requirement on " + requirement.reading(),
                        "Put atLeast and atMost into one");
            }
            list.add(requirement);
        }
        setUp = setUp.withRequirements(list);
    }

    private Requirement requirement(Fields fields) {
        Node key = fields.need("reading", "Name the reading that is bounded");
        String name = Fields.text(key);
        List<String> known = declaration.readings().stream().map(Reading::key).toList();
        Reading reading = declaration.reading(name).orElseThrow(() -> unknown(key, "reading", known, name));
        Bound low = bound(fields.take("atLeast"), reading.kind());
        Bound high = bound(fields.take("atMost"), reading.kind());
        double margin = margin(fields);
        String reason = fields.text("reason", "");
        fields.keepRest(kept);
        return legal(fields.node(), () -> new Requirement(
                name, low.si(), high.si(), margin, reason, low.typed(), high.typed()));
    }

    private record Bound(double si, String typed) {}

    private Bound bound(Node node, Kind kind) {
        return node == null
                ? new Bound(Double.NaN, "")
                : new Bound(
                        ValueReader.entryOf(node, kind, Entries.context(setUp, declaration)).si(),
                        ValueReader.text(node, kind));
    }

    private static double margin(Fields fields) {
        Node node = fields.take("margin");
        return node == null ? 0 : ValueReader.entryOf(node, Kind.RATIO, EntryContext.none()).si();
    }

    private void houseRules(Fields fields) {
        Node node = fields.take("houseRules");
        if (node == null) {
            return;
        }
        Map<String, HouseRule> rules = new LinkedHashMap<>();
        List<String> panels = declaration.panels().stream().map(Panel::key).toList();
        new Fields(node, "\"houseRules\"").node().members().forEach((panel, rule) -> {
            if (!panels.contains(panel)) {
                throw unknown(rule, "panel of rules", panels, panel);
            }
            rules.put(panel, houseRule(panel, new Fields(rule, "a house rule")));
        });
        setUp = setUp.withHouseRules(rules);
    }

    private HouseRule houseRule(String panel, Fields fields) {
        List<String> known = declaration.checks().stream()
                .filter(c -> c.panel().equals(panel))
                .map(CheckInfo::key)
                .toList();
        Node key = fields.need("rule", "Write one of " + String.join(", ", known));
        String rule = Fields.text(key);
        if (!known.contains(rule)) {
            throw unknown(key, "check in the panel " + panel, known, rule);
        }
        Node typed = fields.take("margin");
        double margin = margin(fields);
        fields.keepRest(kept);
        String text = typed == null ? "" : ValueReader.text(typed, Kind.RATIO);
        return legal(fields.node(), () -> new HouseRule(panel, rule, margin, text));
    }

    private void correlations(Fields fields) {
        String form = "Write [[KEY, KEY, 0.7], …]";
        List<SetUp.Correlated> list = new ArrayList<>();
        for (Node node : fields.list("correlations", form)) {
            List<Node> parts = Fields.list(node, form);
            if (parts.size() != 3) {
                throw node.problem("a correlation has two keys and a number", form);
            }
            String first = input(parts.get(0));
            String second = input(parts.get(1));
            if (first.equals(second)) {
                throw node.problem("a correlation needs two different keys", form);
            }
            double coefficient = ValueReader.entryOf(parts.get(2), Kind.RATIO, EntryContext.none()).si();
            list.add(legal(parts.get(2), () -> new SetUp.Correlated(first, second, coefficient)));
        }
        setUp = new SetUp(setUp.title(), setUp.arrangement(), setUp.base(), setUp.values(), setUp.choices(),
                setUp.requirements(), setUp.houseRules(), list, setUp.remarks());
    }

    private String input(Node node) {
        String key = Fields.text(node);
        if (!known(key)) {
            List<String> all = new ArrayList<>(declaration.settings().stream().map(Setting::key).toList());
            LiquidSettings.list().forEach(s -> all.add(s.key()));
            throw unknown(node, "setting", all, key);
        }
        return key;
    }

    private boolean known(String key) {
        return declaration.settings().stream().anyMatch(s -> s.key().equals(key))
                || LiquidSettings.list().stream().anyMatch(s -> s.key().equals(key));
    }

    private StoreProblem unknown(Node node, String what, List<String> known, String key) {
        return node.problem(
                declaration.key() + " has no " + what + " \"" + Place.shortened(key) + "\"" + Entries.nearest(known, key), "");
    }

    private static <T> T legal(Node node, Supplier<T> made) {
        try {
            return made.get();
        } catch (IllegalArgumentException e) {
            throw new StoreProblem(node.place(), e.getMessage(), "Change the numbers", e);
        }
    }
}
