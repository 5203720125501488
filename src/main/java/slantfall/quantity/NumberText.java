package slantfall.quantity;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The number at the start of a cleaned entry, and what follows it.
 *
 * @param value the number
 * @param shown the number as understood, with a decimal point
 * @param rest what follows, without outer blanks
 */
record NumberText(double value, String shown, String rest) {

    private static final Pattern NUMBER = Pattern.compile("([+-]?) ?((?:[0-9.,]|(?<=[0-9])\u00A0(?=[0-9]{3}))*)"
            + "(?:[eE]([+-]?[0-9]+)| ?[x*] ?10(?:\\^|\\*\\*)([+-]?[0-9]+)|[x*]10([+-][0-9]+))?(.*)", Pattern.DOTALL);
    private static final Pattern GROUPED = Pattern.compile("[0-9]{1,3}(\u00A0[0-9]{3})+([.,][0-9]*)?");
    private static final Pattern PLAIN = Pattern.compile("[0-9]+[.,]?[0-9]*|[.,][0-9]+");
    private static final Pattern COMMA_AND_THREE = Pattern.compile("[1-9][0-9]*,[0-9]{3}");
    private static final String REMEDY = "Write the number with a decimal point and without separators";

    /**
     * Splits a cleaned entry.
     *
     * @param entry the entry, from {@link Cleaned#entry(String)}
     * @throws QuantityProblem where it does not start with one clear, finite number
     */
    static NumberText first(String entry) {
        Matcher m = NUMBER.matcher(entry);
        if (!m.matches() || m.group(2).chars().noneMatch(c -> c >= '0' && c <= '9')) {
            throw noNumber(entry);
        }
        String exponent = m.group(3) != null ? m.group(3) : m.group(4) != null ? m.group(4) : m.group(5);
        String digits = digits(m.group(2), exponent, entry);
        String shown = m.group(1).replace("+", "") + digits + (exponent == null ? "" : "e" + exponent);
        double value = finite(shown, entry);
        return new NumberText(value, shown, Cleaned.trimmed(m.group(6)));
    }

    private static QuantityProblem noNumber(String entry) {
        String word = entry.toLowerCase(java.util.Locale.ROOT).replaceFirst("^[+-] ?", "");
        if (word.startsWith("nan") || word.startsWith("inf") || word.startsWith("∞")) {
            return QuantityProblem.plain(Cleaned.quote(entry) + " is not a finite number", "Type a finite number");
        }
        return QuantityProblem.plain(Cleaned.quote(entry) + " does not start with a number",
                "Type the number first, then its unit");
    }

    private static String digits(String text, String exponent, String entry) {
        if (text.indexOf(Cleaned.GROUPING) >= 0) {
            if (!GROUPED.matcher(text).matches()) {
                throw QuantityProblem.plain(Cleaned.quote(entry) + " has digits that are not grouped in threes",
                        REMEDY);
            }
            return text.replace(String.valueOf(Cleaned.GROUPING), "").replace(',', '.');
        }
        String power = exponent == null ? "" : "e" + exponent;
        if (COMMA_AND_THREE.matcher(text).matches()) {
            throw ambiguous(entry, List.of(text.replace(',', '.') + power, text.replace(",", "") + power));
        }
        if (PLAIN.matcher(text).matches()) {
            return text.replace(',', '.');
        }
        throw separators(text, power, entry);
    }

    private static QuantityProblem separators(String text, String power, String entry) {
        int comma = text.lastIndexOf(',');
        int point = text.lastIndexOf('.');
        boolean oneComma = text.indexOf(',') == comma;
        boolean onePoint = text.indexOf('.') == point;
        if (point > comma && onePoint && comma >= 0) {
            return ambiguous(entry, List.of(text.replace(",", "") + power));
        }
        if (comma > point && oneComma && point >= 0) {
            return ambiguous(entry, List.of(text.replace(".", "").replace(',', '.') + power));
        }
        if (point < 0 && text.matches("[0-9]{1,3}(,[0-9]{3})+")) {
            return ambiguous(entry, List.of(text.replace(",", "") + power));
        }
        return QuantityProblem.plain(Cleaned.quote(entry) + " has more than one decimal sign", REMEDY);
    }

    private static QuantityProblem ambiguous(String entry, List<String> readings) {
        String what = readings.size() > 1 ? " has a comma that could be decimal or part thousands"
                : " mixes decimal signs and thousands separators";
        return new QuantityProblem(Cleaned.quote(entry) + what, readings, REMEDY);
    }

    private static double finite(String shown, String entry) {
        double value = Double.parseDouble(shown);
        if (Double.isInfinite(value)) {
            throw QuantityProblem.plain(Cleaned.quote(entry) + " is too large a number", "Check the exponent");
        }
        if (value == 0 && shown.split("e")[0].chars().anyMatch(c -> c >= '1' && c <= '9')) {
            throw QuantityProblem.plain(Cleaned.quote(entry) + " is too small a number", "Check the exponent");
        }
        return value;
    }
}
