package slantfall.store;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import slantfall.declare.Arrangement;
import slantfall.declare.CheckInfo;
import slantfall.declare.Choice;
import slantfall.declare.Declaration;
import slantfall.declare.Interval;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Panel;
import slantfall.declare.Reading;
import slantfall.declare.SetUp;
import slantfall.declare.Setting;
import slantfall.quantity.Kind;

/** What can be set, read and checked, for programs. */
public final class DescribeJson {

    private DescribeJson() {}

    /** The arrangements with their settings, the liquid's own included, and the liquids to choose from. */
    public static String text(List<Arrangement> arrangements, Presets presets) {
        Node list = Node.list();
        for (Arrangement arrangement : arrangements) {
            SetUp blank = SetUp.blank(arrangement.key(), presets.initial());
            list.add(arrangement(arrangement.declare(blank.structure())));
        }
        Node root = Node.object().put("arrangements", list).put("liquids", PresetJson.summaries(presets.all()));
        return NodeWriter.pretty(root).stripTrailing();
    }

    private static Node arrangement(Declaration declaration) {
        List<Setting> settings = new ArrayList<>(declaration.settings());
        settings.addAll(LiquidSettings.list());
        return Node.object()
                .put("key", declaration.key())
                .put("name", declaration.name())
                .put("summary", declaration.summary())
                .put("essentials", Node.texts(declaration.essentials()))
                .put("settings", all(settings, DescribeJson::setting))
                .put("choices", all(declaration.choices(), DescribeJson::choice))
                .put("readings", all(declaration.readings(), DescribeJson::reading))
                .put("panels", all(declaration.panels(), DescribeJson::panel))
                .put("checks", all(declaration.checks(), DescribeJson::check));
    }

    private static <T> Node all(List<T> items, java.util.function.Function<T, Node> form) {
        Node list = Node.list();
        items.forEach(i -> list.add(form.apply(i)));
        return list;
    }

    private static Node setting(Setting s) {
        Node node = named(s.key(), s.name(), s.symbol(), s.kind())
                .put("default", s.initial())
                .put("possible", ends(s.possible()))
                .put("possibleOpen", Node.list()
                        .add(Node.word(s.possible().lowOpen()))
                        .add(Node.word(s.possible().highOpen())))
                .put("usual", ends(s.usual()))
                .put("scale", s.scale().name().toLowerCase(Locale.ROOT))
                .put("help", s.help())
                .put("question", s.question());
        return s.follows().isEmpty() ? node : node.put("follows", s.follows());
    }

    private static Node named(String key, String name, String symbol, Kind kind) {
        return Node.object()
                .put("key", key)
                .put("name", name)
                .put("symbol", symbol)
                .put("kind", kind.key())
                .put("unit", kind.si().symbol());
    }

    private static Node ends(Interval interval) {
        return Node.list().add(Node.number(interval.low())).add(Node.number(interval.high()));
    }

    private static Node choice(Choice choice) {
        return Node.object()
                .put("key", choice.key())
                .put("name", choice.name())
                .put("default", choice.initial())
                .put("options", all(choice.options(), o -> Node.object().put("key", o.key()).put("name", o.name())))
                .put("help", choice.help());
    }

    private static Node reading(Reading r) {
        return named(r.key(), r.name(), r.symbol(), r.kind()).put("help", r.help());
    }

    private static Node panel(Panel panel) {
        return Node.object()
                .put("key", panel.key())
                .put("question", panel.question())
                .put("clear", panel.clear())
                .put("crossed", panel.crossed())
                .put("sort", panel.kindOfPanel().name().toLowerCase(Locale.ROOT));
    }

    private static Node check(CheckInfo check) {
        return Node.object()
                .put("key", check.key())
                .put("panel", check.panel())
                .put("name", check.name())
                .put("kind", AssessmentJson.kind(check.kind()))
                .put("unit", check.kind().si().symbol())
                .put("side", check.side().words())
                .put("formula", check.formula())
                .put("range", check.range())
                .put("source", check.source().text());
    }
}
