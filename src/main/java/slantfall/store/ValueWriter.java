package slantfall.store;

import java.util.List;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Show;

/**
 * Writes values as the user typed them, as long as the text still means the same number; what leans on a density or a
 * width that has changed since, and what came from a slider, is written in the SI unit with every digit.
 */
final class ValueWriter {

    private static final String NUMBER = "-?(0|[1-9]\\d*)(\\.\\d+)?([eE][+-]?\\d+)?";

    private ValueWriter() {}

    /** A value in the form that holds all that is known of it. */
    static Node node(Value value, Setting setting, EntryContext context) {
        Kind kind = setting.kind();
        Tolerance known = value.known();
        if (known == null) {
            return quantity(value.si(), value.typed(), kind, context);
        }
        if (known.typed().size() == 1 && symmetric(value, kind, context)) {
            return Node.object()
                    .put("value", quantity(value.si(), value.typed(), kind, context))
                    .put("plusMinus", bare(known.typed().get(0), kind))
                    .put("shape", known.shape().word());
        }
        Node node = Node.object();
        boolean middle = value.typed().isEmpty()
                && value.si() == ValueReader.middle(setting, known.low(), known.high());
        if (!middle) {
            node.put("value", quantity(value.si(), value.typed(), kind, context));
        }
        boolean two = known.typed().size() == 2;
        node.put("range", Node.list()
                .add(quantity(known.low(), two ? known.typed().get(0) : "", kind, context))
                .add(quantity(known.high(), two ? known.typed().get(1) : "", kind, context)));
        return known.shape() == Tolerance.Shape.UNKNOWN ? node : node.put("shape", known.shape().word());
    }

    /**
     * One number: as typed if that still reads to the same, else exactly.
     *
     * @param si the number [SI]
     * @param typed what was typed, empty if nothing
     */
    static Node quantity(double si, String typed, Kind kind, EntryContext context) {
        return bare(!typed.isEmpty() && same(si, typed, kind, context) ? typed : Show.exact(si, kind), kind);
    }

    private static boolean same(double si, String typed, Kind kind, EntryContext context) {
        try {
            return EntryReader.read(typed, kind, context).si() == si;
        } catch (QuantityProblem e) {
            return false;
        }
    }

    private static boolean symmetric(Value value, Kind kind, EntryContext context) {
        List<String> typed = value.known().typed();
        try {
            double half = EntryReader.plusMinus(typed.get(0), kind, value.si(), context);
            return value.si() - half == value.known().low() && value.si() + half == value.known().high();
        } catch (QuantityProblem e) {
            return false;
        }
    }

    // A quantity without dimension stands as a bare number.
    private static Node bare(String text, Kind kind) {
        return kind.dimensionless() && text.matches(NUMBER) ? Node.literal(text) : Node.text(text);
    }
}
