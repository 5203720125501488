package slantfall.store;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import java.util.function.Supplier;
import slantfall.declare.Limits;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.quantity.Display;
import slantfall.quantity.Entry;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.Need;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.UnitSystem;

/** Reads the value of one setting: a number with its unit, with a plus-or-minus, or a range. */
final class ValueReader {

    private static final String FORMS =
            "Write \"NUMBER UNIT\", {\"value\", \"plusMinus\", \"shape\"} or {\"range\": [from, to]}";

    private final Setting setting;
    private final EntryContext context;
    private final Kept kept;
    private final List<Need> needs = new ArrayList<>();

    ValueReader(Setting setting, EntryContext context, Kept kept) {
        this.setting = setting;
        this.context = context;
        this.kept = kept;
    }

    /** Whether what was read leaned on the surroundings in some way. */
    boolean leaned(Predicate<Need> how) {
        return needs.stream().anyMatch(how);
    }

    /** Reads a value in any of its forms. */
    Value read(Node node) {
        return switch (node.sort()) {
            case TEXT, NUMBER -> Value.typed(possible(node), typed(node));
            case OBJECT -> uncertain(new Fields(node, "the value"));
            default -> throw node.problem(setting.name() + " must be a value, was " + node.sort().words(), FORMS);
        };
    }

    private Value uncertain(Fields fields) {
        Node centre = fields.take("value");
        Node half = fields.take("plusMinus");
        Node range = fields.take("range");
        Node shape = fields.take("shape");
        fields.keepRest(kept);
        if (half != null && range != null) {
            throw range.problem("both \"plusMinus\" and \"range\" are given", "Keep one of them");
        }
        if (range != null) {
            return within(centre, range, shape);
        }
        if (centre == null) {
            throw fields.node().problem(setting.name() + " has neither \"value\" nor \"range\"", FORMS);
        }
        double si = possible(centre);
        if (half == null) {
            return shapeless(centre, si, shape);
        }
        double width = plusMinus(half, si);
        Tolerance tolerance = new Tolerance(
                shape(shape, Tolerance.Shape.UNIFORM), si - width, si + width, List.of(halfText(half)));
        return new Value(si, typed(centre), tolerance);
    }

    private Value shapeless(Node centre, double si, Node shape) {
        if (shape != null) {
            throw shape.problem("a shape needs \"plusMinus\" or \"range\"", "Add one, or leave the shape out");
        }
        return Value.typed(si, typed(centre));
    }

    private Value within(Node centre, Node range, Node shape) {
        List<Node> ends = Fields.list(range, "Write [from, to]");
        if (ends.size() != 2) {
            throw range.problem("a range has two ends, not " + ends.size(), "Write [from, to]");
        }
        double low = possible(ends.get(0));
        double high = possible(ends.get(1));
        if (!(low <= high)) {
            throw range.problem("the range begins above its end", "Swap the two ends");
        }
        Tolerance tolerance = new Tolerance(
                shape(shape, Tolerance.Shape.UNKNOWN), low, high, List.of(typed(ends.get(0)), typed(ends.get(1))));
        if (centre == null) {
            return new Value(middle(setting, low, high), "", tolerance);
        }
        double si = possible(centre);
        if (!(si >= low && si <= high)) {
            throw centre.problem("the value lies outside its range", "Widen the range or change the value");
        }
        return new Value(si, typed(centre), tolerance);
    }

    /** What a range alone stands for: its middle on the setting's scale. */
    static double middle(Setting setting, double low, double high) {
        boolean geometric = setting.scale() == Scale.LOG && low > 0;
        return geometric ? Math.sqrt(low) * Math.sqrt(high) : low + (high - low) / 2;
    }

    private static Tolerance.Shape shape(Node node, Tolerance.Shape otherwise) {
        if (node == null) {
            return otherwise;
        }
        String word = Fields.text(node);
        List<String> words = new ArrayList<>();
        for (Tolerance.Shape shape : Tolerance.Shape.values()) {
            if (shape.word().equals(word.toLowerCase(Locale.ROOT))) {
                return shape;
            }
            words.add(shape.word());
        }
        throw node.problem("there is no shape \"" + Place.shortened(word) + "\"", "Write one of " + String.join(", ", words));
    }

    private double possible(Node node) {
        double si = entry(node, setting.kind(), context).si();
        if (!setting.possible().contains(si)) {
            throw node.problem(Limits.refusal(setting, si), "Change the value");
        }
        return si;
    }

    private double plusMinus(Node node, double centre) {
        String text = halfText(node);
        Entry half = guarded(node, () -> EntryReader.plusMinusEntry(text, setting.kind(), centre, context));
        needs.add(half.unit().need());
        if (!Double.isFinite(centre + half.si()) || !Double.isFinite(centre - half.si())) {
            throw node.problem("the plus-or-minus is no finite number", "Give a smaller one");
        }
        return half.si();
    }

    private String halfText(Node node) {
        return text(node, setting.kind());
    }

    private Entry entry(Node node, Kind kind, EntryContext surroundings) {
        Entry entry = entryOf(node, kind, surroundings);
        needs.add(entry.unit().need());
        return entry;
    }

    private String typed(Node node) {
        return text(node, setting.kind());
    }

    /**
     * Reads one quantity without plus-or-minus.
     *
     * @throws StoreProblem with the place
     */
    static Entry entryOf(Node node, Kind kind, EntryContext context) {
        String text = text(node, kind);
        Entry entry = guarded(node, () -> EntryReader.read(text, kind, context));
        if (!Double.isFinite(entry.si())) {
            throw node.problem("\"" + Place.shortened(text) + "\" is no finite number here", "Give a finite value");
        }
        return entry;
    }

    /** What was typed: a text, or a bare number where no unit is needed. */
    static String text(Node node, Kind kind) {
        if (node.is(Node.Sort.NUMBER) && kind.dimensionless()) {
            return node.text();
        }
        if (node.is(Node.Sort.NUMBER)) {
            String number = Place.shortened(node.text());
            throw node.problem("the number " + number + " has no unit",
                    "Write it with one, such as \"" + number + " " + Display.unit(kind, UnitSystem.TRADE).symbol() + "\"");
        }
        if (!node.is(Node.Sort.TEXT)) {
            throw node.problem("must be a quantity, was " + node.sort().words(), FORMS);
        }
        return node.text().strip();
    }

    private static Entry guarded(Node node, Supplier<Entry> reading) {
        try {
            return reading.get();
        } catch (QuantityProblem e) {
            throw new StoreProblem(node.place(), e.getMessage(), "", e);
        }
    }
}
