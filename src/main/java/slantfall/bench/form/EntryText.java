package slantfall.bench.form;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import slantfall.declare.Interval;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.quantity.Entry;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.QuantityProblem;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;

/**
 * Reads what was typed into a field: a number in the unit shown or in one that stands beside it, a number with
 * plus-or-minus, or a question mark for "somewhere in this range".
 */
final class EntryText {

    private static final Pattern BARE = Pattern.compile("[-+−]?[\\d.,\\s]*\\d[\\d.,\\s]*(?:[eE][-+]?\\d+)?");
    private static final Pattern PLUS_MINUS = Pattern.compile("(.+?)\\s*(?:±|\\+/?-)\\s*(.+)");
    private static final Pattern RANGE = Pattern.compile("\\?\\s*(?:(.+?)\\s*(?:\\.\\.|…|\\bto\\b)\\s*(.+))?");

    private final Setting setting;
    private final Unit unit;
    private final EntryContext context;

    /**
     * A reader for one setting.
     *
     * @param unit unit of a number that has none beside it
     * @param context density and width, where a unit needs them
     */
    EntryText(Setting setting, Unit unit, EntryContext context) {
        this.setting = setting;
        this.unit = unit;
        this.context = context;
    }

    /** What was read: the value, the unit it was typed in, and what was understood. */
    record Read(Value value, Unit unit, String echo) {}

    /**
     * Reads an entry.
     *
     * @throws QuantityProblem if it cannot be understood
     */
    Read read(String typed) {
        String text = typed.strip();
        Matcher range = RANGE.matcher(text);
        if (range.matches()) {
            return range.group(1) == null ? usualRange() : range(range.group(1), range.group(2));
        }
        Matcher plusMinus = PLUS_MINUS.matcher(text);
        if (plusMinus.matches()) {
            return plusMinus(plusMinus.group(1), plusMinus.group(2));
        }
        Entry entry = entry(text);
        return new Read(Value.typed(entry.si(), entry.typed()), entry.unit(), entry.echo());
    }

    private Entry entry(String text) {
        return EntryReader.read(withUnit(text, setting.kind(), unit), setting.kind(), context);
    }

    /** A bare number takes the unit shown beside the field. */
    static String withUnit(String text, Kind kind, Unit unit) {
        boolean bare = BARE.matcher(text).matches() && !kind.dimensionless();
        return bare ? text + " " + unit.symbol() : text;
    }

    private Read plusMinus(String centre, String half) {
        Entry entry = entry(centre);
        String typedHalf = withUnit(half, setting.kind(), entry.unit());
        double width = EntryReader.plusMinus(typedHalf, setting.kind(), entry.si(), context);
        Tolerance tolerance = new Tolerance(
                Tolerance.Shape.UNIFORM, entry.si() - width, entry.si() + width, List.of(typedHalf));
        String echo = entry.echo() + ", from " + shown(tolerance.low()) + " to " + shown(tolerance.high());
        return new Read(new Value(entry.si(), entry.typed(), tolerance), entry.unit(), echo);
    }

    private Read usualRange() {
        Interval usual = setting.usual();
        return unknown(usual.low(), usual.high(), List.of(exact(usual.low()), exact(usual.high())));
    }

    private Read range(String low, String high) {
        Entry to = entry(high);
        Entry from = EntryReader.read(withUnit(low, setting.kind(), to.unit()), setting.kind(), context);
        if (from.si() > to.si()) {
            throw new QuantityProblem("the range runs from " + low + " down to " + high, List.of(),
                    "give the smaller end first");
        }
        return unknown(from.si(), to.si(), List.of(from.typed(), to.typed()));
    }

    private Read unknown(double low, double high, List<String> typed) {
        boolean log = setting.scale() == Scale.LOG && low > 0;
        double middle = log ? Math.sqrt(low) * Math.sqrt(high) : low + (high - low) / 2;
        Value value = new Value(middle, "", new Tolerance(Tolerance.Shape.UNKNOWN, low, high, typed));
        return new Read(value, unit,
                "unknown between " + shown(low) + " and " + shown(high) + "; computed at " + shown(middle));
    }

    private String exact(double si) {
        return Show.exact(si, setting.kind());
    }

    private String shown(double si) {
        return Show.value(si, setting.kind(), unit, 3);
    }
}
