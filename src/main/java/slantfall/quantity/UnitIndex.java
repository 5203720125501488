package slantfall.quantity;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;

/** Finds the unit that an expression means for a kind, or says why there is none. */
final class UnitIndex {

    private static final Map<Kind, Map<String, Unit>> NATIVE = new ConcurrentHashMap<>();
    private static final Map<Kind, Map<String, Unit>> ACCEPTED = new ConcurrentHashMap<>();
    private static final int LISTED = 5;

    private UnitIndex() {
    }

    /**
     * The unit meant.
     *
     * @param typed the entry it stands in, for messages
     * @param unitText the cleaned unit expression
     */
    static Unit find(Typed typed, String unitText) {
        return find(typed, unitText, typed.kind());
    }

    /** The unit meant among those of another kind: an absolute pressure takes the units of a difference. */
    static Unit find(Typed typed, String unitText, Kind searched) {
        UnitText text = UnitText.of(unitText);
        if (text.forms().size() > 1) {
            throw caseMatters(typed, text);
        }
        if (text.forms().isEmpty()) {
            throw unknown(typed, unitText, text.unknown());
        }
        String form = text.forms().iterator().next();
        Unit unit = accepted(searched).get(form);
        if (unit == null) {
            throw wrongKind(typed, unitText, form);
        }
        return unit;
    }

    /** Whether an expression is one of a kind's own units. */
    static boolean isOf(Kind kind, String unitText) {
        return UnitText.of(unitText).forms().stream().anyMatch(own(kind)::containsKey);
    }

    /** The first few units of a kind, for a remedy. */
    static String likely(Kind kind) {
        List<String> symbols = new ArrayList<>();
        for (Unit unit : kind.units()) {
            if (symbols.size() < LISTED && unit.need() == Need.NONE && !unit.symbol().equals("1")) {
                symbols.add(unit.label());
            }
        }
        return symbols.isEmpty() ? "a number without a unit" : String.join(", ", symbols);
    }

    /** "a length", "an area". */
    static String withArticle(String words) {
        return ("aeiou".indexOf(words.charAt(0)) >= 0 ? "an " : "a ") + words;
    }

    private static QuantityProblem caseMatters(Typed typed, UnitText text) {
        List<String> readings = new ArrayList<>();
        for (String form : text.forms()) {
            readings.add(form.trim().replace("^1", "").replaceAll("([A-Za-z]+)\\^(-?[0-9])", "$1$2"));
        }
        return new QuantityProblem(typed.quoted() + " has a unit whose upper and lower case matter", readings,
                "Type the unit with its proper case, such as mPa or MPa");
    }

    private static QuantityProblem unknown(Typed typed, String unitText, String word) {
        if (unitText.matches("(?s).*(^|[ x*])[+-]?[0-9]+([.,][0-9]+)?( .*|$)")) {
            return QuantityProblem.plain(typed.quoted() + " holds more than one number",
                    "Type one number and its unit");
        }
        return QuantityProblem.plain(typed.quoted() + ": the unit " + Cleaned.quote(word.isEmpty() ? unitText : word)
                + " is not known", "For " + withArticle(typed.kind().words()) + " use " + likely(typed.kind()));
    }

    private static QuantityProblem wrongKind(Typed typed, String unitText, String form) {
        String wanted = withArticle(typed.kind().words());
        for (Kind other : Kind.values()) {
            if (other != typed.kind() && own(other).containsKey(form)) {
                return QuantityProblem.plain(typed.quoted() + " is " + withArticle(other.words()) + "; " + wanted
                        + " is wanted here", "Use " + likely(typed.kind()));
            }
        }
        return unknown(typed, unitText, "");
    }

    private static Map<String, Unit> own(Kind kind) {
        return NATIVE.computeIfAbsent(kind, UnitIndex::index);
    }

    private static Map<String, Unit> accepted(Kind kind) {
        return ACCEPTED.computeIfAbsent(kind, UnitIndex::withConversions);
    }

    private static Map<String, Unit> index(Kind kind) {
        Map<String, Unit> index = new HashMap<>();
        for (Unit unit : kind.units()) {
            if (unit.symbol().endsWith("(a)") || unit.symbol().endsWith("(g)")) {
                continue; // the reader of pressures takes these apart itself
            }
            put(index, unit.symbol(), unit);
            unit.aliases().forEach(alias -> put(index, alias, unit));
        }
        return index;
    }

    private static void put(Map<String, Unit> index, String spelling, Unit unit) {
        index.putIfAbsent(UnitText.formOf(spelling), unit);
    }

    private static Map<String, Unit> withConversions(Kind kind) {
        Map<String, Unit> index = new HashMap<>(own(kind));
        for (Conversion way : Conversion.into(kind)) {
            own(way.from()).forEach((form, unit) -> {
                if (unit.need() == Need.NONE) {
                    index.putIfAbsent(form, unit.needing(way.need(), way.factor()));
                }
            });
        }
        return index;
    }
}
