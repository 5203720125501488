package slantfall.store;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.HouseRule;
import slantfall.declare.LiquidBase;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Reading;
import slantfall.declare.Requirement;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Show;

/** Makes a file's nodes of a set-up. */
final class SetUpWriter {

    private final SetUp setUp;
    private final Declaration declaration;
    private final EntryContext context;

    private SetUpWriter(SetUp setUp) {
        this.setUp = setUp;
        this.declaration = Catalogue.named(setUp.arrangement()).declare(setUp.structure());
        this.context = Entries.context(setUp, declaration);
    }

    /** The whole file. */
    static Node node(SetUp setUp) {
        SetUpWriter writer = new SetUpWriter(setUp);
        Node root = Node.object()
                .put(Version.KEY, Node.whole(Version.CURRENT))
                .put("title", setUp.title())
                .put("arrangement", setUp.arrangement())
                .put("liquid", writer.liquid())
                .put("settings", writer.settings());
        writer.rules(root);
        if (!setUp.remarks().notes().isEmpty()) {
            root.put("notes", setUp.remarks().notes());
        }
        return Replanted.into(root, setUp.remarks().unknown());
    }

    private Node liquid() {
        Node node = Node.object();
        LiquidBase base = setUp.base();
        if (base.preset() != null) {
            node.put("preset", base.preset().key());
        }
        for (Setting setting : LiquidSettings.list()) {
            Value value = setUp.values().get(setting.key());
            if (value != null) {
                boolean first = LiquidReader.FIRST.contains(LiquidReader.key(setting));
                node.put(LiquidReader.key(setting),
                        ValueWriter.node(value, setting, first ? EntryContext.none() : context));
            }
        }
        if (base.points() != null) {
            node.put("viscosityPoints", Points.node(base.points(), base.typedPoints(), this::at));
            if (!base.fitKind().isEmpty()) {
                node.put("viscosityFit", base.fitKind());
            }
        }
        return node;
    }

    private EntryContext at(double temperature) {
        return Entries.context(setUp.with(Declaration.LIQUID + "temperature", Value.of(temperature)), declaration);
    }

    private Node settings() {
        Node node = Node.object();
        declaration.choices().forEach(c -> {
            String word = setUp.choices().get(c.key());
            if (word != null) {
                node.put(c.key(), word);
            }
        });
        for (Setting setting : declaration.settings()) {
            Value value = setUp.values().get(setting.key());
            if (value != null) {
                node.put(setting.key(), ValueWriter.node(value, setting, context));
            }
        }
        strangers(node);
        return node;
    }

    // Numbers of another arrangement that the set-up was changed from: their kind is not known here.
    private void strangers(Node node) {
        List<String> known = new ArrayList<>(declaration.settings().stream().map(Setting::key).toList());
        LiquidSettings.list().forEach(s -> known.add(s.key()));
        setUp.values().forEach((key, value) -> {
            if (!known.contains(key)) {
                node.put(key, value.typed().isEmpty() ? Node.number(value.si()) : Node.text(value.typed()));
            }
        });
    }

    private void rules(Node root) {
        if (!setUp.requirements().isEmpty()) {
            Node list = Node.list();
            setUp.requirements().forEach(r -> list.add(requirement(r)));
            root.put("requirements", list);
        }
        if (!setUp.houseRules().isEmpty()) {
            Node rules = Node.object();
            for (Map.Entry<String, HouseRule> rule : setUp.houseRules().entrySet()) {
                rules.put(rule.getKey(), houseRule(rule.getValue()));
            }
            root.put("houseRules", rules);
        }
        if (!setUp.correlations().isEmpty()) {
            Node list = Node.list();
            setUp.correlations().forEach(c -> list.add(Node.list()
                    .add(Node.text(c.first()))
                    .add(Node.text(c.second()))
                    .add(Node.number(c.coefficient()))));
            root.put("correlations", list);
        }
    }

    private Node requirement(Requirement r) {
        Kind kind = declaration.reading(r.reading()).map(Reading::kind).orElse(Kind.RATIO);
        Node node = Node.object().put("reading", r.reading());
        if (!Double.isNaN(r.atLeast())) {
            node.put("atLeast", ValueWriter.quantity(r.atLeast(), r.typedAtLeast(), kind, context));
        }
        if (!Double.isNaN(r.atMost())) {
            node.put("atMost", ValueWriter.quantity(r.atMost(), r.typedAtMost(), kind, context));
        }
        if (r.margin() != 0) {
            node.put("margin", margin(r.margin(), ""));
        }
        return r.reason().isEmpty() ? node : node.put("reason", r.reason());
    }

    private static Node houseRule(HouseRule rule) {
        Node node = Node.object().put("rule", rule.rule());
        boolean said = rule.margin() != 0 || !rule.typedMargin().isEmpty();
        return said ? node.put("margin", margin(rule.margin(), rule.typedMargin())) : node;
    }

    private static Node margin(double margin, String typed) {
        String percent = BigDecimal.valueOf(margin).movePointRight(2).stripTrailingZeros().toPlainString() + " %";
        for (String text : List.of(typed, percent)) {
            if (!text.isEmpty() && reads(text, margin)) {
                return ValueWriter.quantity(margin, text, Kind.RATIO, EntryContext.none());
            }
        }
        return Node.text(Show.exact(margin, Kind.RATIO));
    }

    private static boolean reads(String text, double margin) {
        try {
            return EntryReader.read(text, Kind.RATIO, EntryContext.none()).si() == margin;
        } catch (QuantityProblem e) {
            return false;
        }
    }
}
