package slantfall.quantity;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads inclinations. Per cent and 1:N are rise over run (tan) by the meaning of a ratio, and the echo says so; the
 * words "1 in N" are used both ways in the trade and are refused without {@code tan} or {@code sin}.
 */
final class SlopeReader {

    private static final String WAY = "(?: ?\\(?(tan|tangent|of run|sin|sine|of length)\\)?)?";
    private static final Pattern FROM = Pattern.compile(
            "(.*?) ?\\(?from (?:the )?(vertical|horizontal)\\)?", Pattern.CASE_INSENSITIVE);
    private static final Pattern RATIO = Pattern.compile("(?::|(in) (?=[0-9.,]))(.*)", Pattern.CASE_INSENSITIVE);
    private static final Pattern RATIO_END = Pattern.compile(WAY, Pattern.CASE_INSENSITIVE);
    private static final Pattern UNIT = Pattern.compile("(.*?)" + WAY, Pattern.CASE_INSENSITIVE);
    private static final Map<String, Double> RISE_OVER_RUN = Map.of(
            UnitText.formOf("%"), 0.01, UnitText.formOf("mm/m"), 1e-3, UnitText.formOf("cm/m"), 1e-2,
            UnitText.formOf("in/ft"), 1.0 / 12, UnitText.formOf("m/m"), 1.0);

    private static final int DEGREE_DIGITS = 4;

    private SlopeReader() {
    }

    static Optional<Entry> read(Typed given) {
        Typed typed = given.as(given.clean().replaceAll("(?i)^slope (?:of )?| ?\\bslope$", ""));
        NumberText number = NumberText.first(typed.clean());
        Matcher ratio = RATIO.matcher(number.rest());
        if (ratio.matches()) {
            return Optional.of(ratio(typed, number, ratio));
        }
        Matcher from = FROM.matcher(number.rest());
        if (from.matches()) {
            boolean vertical = from.group(2).equalsIgnoreCase("vertical");
            return Optional.of(angle(typed, number, from.group(1), vertical));
        }
        Matcher unit = UNIT.matcher(number.rest());
        if (unit.matches() && !unit.group(1).isEmpty()) {
            Double share = RISE_OVER_RUN.get(onlyForm(unit.group(1)));
            if (share != null) {
                String said = number.shown() + " " + unit.group(1);
                return Optional.of(slope(typed, number.value() * share, said, unit.group(2)));
            }
        }
        return number.rest().isEmpty() ? Optional.empty() : Optional.of(angle(typed, number, number.rest(), false));
    }

    private static String onlyForm(String text) {
        var forms = UnitText.of(text).forms();
        return forms.size() == 1 ? forms.iterator().next() : "?";
    }

    private static Entry angle(Typed typed, NumberText number, String unitText, boolean fromVertical) {
        Unit unit = UnitIndex.find(typed, unitText);
        double stated = unit.toSi(number.value());
        double si = fromVertical ? Math.PI / 2 - stated : stated;
        return typed.entry(si, unit, both(si));
    }

    private static String both(double si) {
        return degrees(si) + " from the horizontal (" + degrees(Math.PI / 2 - si) + " from the vertical)";
    }

    private static String degrees(double si) {
        return Show.trimmed(Math.rint(Math.toDegrees(si) * 1e9) / 1e9, DEGREE_DIGITS) + "°";
    }

    private static Entry ratio(Typed typed, NumberText rise, Matcher rest) {
        NumberText run = NumberText.first(Cleaned.trimmed(rest.group(2)));
        Matcher way = RATIO_END.matcher(run.rest());
        if (!way.matches()) {
            throw typed.refused("has " + Cleaned.quote(run.rest()) + " after its ratio",
                    "Type 1:12, 1:12 tan or 1:12 sin");
        }
        if (run.value() == 0) {
            throw typed.refused("divides by zero", "Type a ratio such as 1:12, or the angle in deg");
        }
        double share = rise.value() / run.value();
        if (rest.group(1) != null && way.group(1) == null) {
            throw inWords(typed, share);
        }
        String said = rise.shown() + (rest.group(1) == null ? ":" : " in ") + run.shown();
        return slope(typed, share, said, way.group(1));
    }

    private static QuantityProblem inWords(Typed typed, double share) {
        String sine = Math.abs(share) > 1 ? "no angle" : degrees(Math.asin(share));
        return typed.ambiguous("may be counted along the run or along the slope",
                List.of(degrees(Math.atan(share)) + " (tan, over the run)",
                        sine + " (sin, over the length of the slope)"),
                "Add tan or sin");
    }

    private static Entry slope(Typed typed, double share, String said, String way) {
        boolean sine = way != null && (way.toLowerCase(java.util.Locale.ROOT).startsWith("sin")
                || way.equalsIgnoreCase("of length"));
        if (sine && Math.abs(share) > 1) {
            throw typed.refused("rises more than its own length", "A slope by sin is at most 1");
        }
        double si = sine ? Math.asin(share) : Math.atan(share);
        String over = sine ? " of length (sin)" : " of run (tan)";
        String other = way == null && Math.abs(share) <= 1
                ? "; read by sin it would be " + degrees(Math.asin(share)) : "";
        return typed.entry(si, typed.kind().unit("deg"), both(si) + ", from " + said + over + other);
    }
}
