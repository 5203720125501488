package slantfall.quantity;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A unit expression taken apart: the same form comes out for {@code kg/(m s)}, {@code kg m⁻¹ s⁻¹}, {@code kg/m/s} and
 * {@code kg per metre second}.
 *
 * <p>Everything after a slash stands below it ({@code W/m2 K} is read as W/(m2 K)): no unit that is known here would
 * be written with a product after a quotient, and the echo shows what was understood.
 *
 * @param forms the forms it can have: one, or several where upper and lower case do not decide, or none
 * @param unknown the first word that is not known; empty where all are
 */
record UnitText(Set<String> forms, String unknown) {

    private static final Pattern TOKEN = Pattern.compile(
            "([A-Za-z°%'\"]+)(?:\\^?([+-]?[0-9]{1,2})(?![0-9])|\\^\\(([+-]?[0-9]{1,2})\\))?"
            + "|([0-9]+)|([/*().\\s\u00A0])");
    private static final int MOST_FORMS = 8;

    /** Takes a cleaned unit expression apart. */
    static UnitText of(String text) {
        if (!text.contains("°") && !text.contains(".") && !text.contains("deg ") && !text.contains("degree")) {
            UnitText asItStands = new Parser(text).parse();
            if (asItStands.unknown.isEmpty()) {
                return asItStands;
            }
        }
        return inWords(text);
    }

    // Kept apart because most expressions need none of it, and reading the first file should not wait for it.
    private static UnitText inWords(String text) {
        String plain = text;
        for (int i = 0; i < Words.SEEN.length; i++) {
            plain = Words.SEEN[i].matcher(plain).replaceAll(Words.WORDS[i][1]);
        }
        return new Parser(plain).parse();
    }

    /** The one form of a unit of our own tables. */
    static String formOf(String symbol) {
        UnitText text = of(symbol);
        if (text.forms.size() != 1) {
            throw new IllegalStateException("unit " + symbol + " is not clear: " + text);
        }
        return text.forms.iterator().next();
    }

    /** Words and spellings that stand for something else, and what they stand for. */
    private static final class Words {
        static final String[][] WORDS = {
            {"(?i)\\bu\\.?s\\.? ?gal(?:lons?|s)?", "usgal"},
            {"(?i)\\b(?:imp(?:erial)?\\.?|u\\.?k\\.?) ?gal(?:lons?|s)?", "impgal"},
            {"(?i)\\b(?:imp(?:erial)?\\.?|u\\.?k\\.?) ?gpm", "impgpm"}, {"(?i)\\bu\\.?s\\.? ?gpm", "gpm"},
            {"(?i)\\b(?:square|sq\\.?) ?([a-z]+)", "$1^2"}, {"(?i)\\b(?:cubic|cu\\.?) ?([a-z]+)", "$1^3"},
            {"(?i) ?(?:\\bof\\b)? ?(?<=\\b|mm|cm|in|ft|m)(?:h2o|w\\.?c\\.?|w\\.?g\\.?)(?![a-z0-9])\\.?", " water"},
            {"(?i) ?(?:\\bof\\b)? ?\\bwater (?:column|gauge)\\b", " water"}, {"(?<=mm|cm|in)Hg\\b", " Hg"},
            {"(?i)\\bof\\b", " "}, {"(?i)\\bper\\b", "/"}, {"s\\^n\\b", "sn"},
            {"(?<=[A-Za-z])-(?=[A-Za-z])", " "}, {"\\*\\*", "^"}, {"° (?=[CF]\\b|B[xr])", "°"},
            {"(?i)\\bdeg(?:rees?)?\\.? ?(?=[CF]\\b)", "°"},
            {"(?i)\\bdeg\\.? brix\\b", "Bx"}
        };

        static final Pattern[] SEEN = Arrays.stream(WORDS).map(w -> Pattern.compile(w[0])).toArray(Pattern[]::new);
    }

    private static final class Parser {
        private final String text;
        private final int[] signs;
        private List<Map<String, Integer>> found = new ArrayList<>(List.of(new TreeMap<>()));
        private int depth;
        private int slashDepth = -1;
        private int sign = 1;
        private boolean expecting;

        Parser(String text) {
            this.text = text;
            this.signs = new int[text.length() + 1];
        }

        UnitText parse() {
            Matcher m = TOKEN.matcher(text);
            int at = 0;
            while (at < text.length()) {
                if (!m.find(at) || m.start() != at) {
                    return unknown(text.substring(at));
                }
                if (m.group(1) != null && !word(m.group(1), m.group(2) != null ? m.group(2) : m.group(3))) {
                    return unknown(m.group(1));
                }
                if (m.group(4) != null) {
                    number(m.group(4));
                }
                expecting &= m.group(5) != null;
                if (m.group(5) != null && !operator(m.group(5).charAt(0))) {
                    return unknown(text.substring(at));
                }
                at = m.end();
            }
            return depth == 0 && !expecting ? new UnitText(forms(), "") : unknown(text);
        }

        private static UnitText unknown(String word) {
            return new UnitText(Set.of(), word);
        }

        private boolean word(String name, String exponent) {
            int power = sign * (exponent == null ? 1 : Integer.parseInt(exponent));
            List<Map<String, Integer>> next = new ArrayList<>();
            for (Map<String, Integer> meaning : Atoms.of(name)) {
                for (Map<String, Integer> before : found) {
                    next.add(times(before, meaning, power));
                }
            }
            found = next;
            return !found.isEmpty() && found.size() <= MOST_FORMS;
        }

        private void number(String digits) {
            if (!digits.equals("1")) {
                found.replaceAll(before -> times(before, Map.of(digits, 1), sign));
            }
        }

        // A slash, a dot or an opening bracket promises something after it.
        private boolean operator(char c) {
            if (expecting && (c == '/' || c == '*' || c == ')')) {
                return false;
            }
            expecting |= c == '/' || c == '*' || c == '(';
            if (c == '/') {
                boolean nested = sign < 0 && depth > slashDepth;
                sign = -1;
                slashDepth = depth;
                return !nested;
            }
            if (c == '(') {
                signs[depth++] = sign;
            }
            if (c == ')') {
                depth--;
                if (depth >= 0) {
                    sign = Math.min(sign, signs[depth]);
                    slashDepth = Math.min(slashDepth, depth);
                }
            }
            return depth >= 0;
        }

        private static Map<String, Integer> times(Map<String, Integer> a, Map<String, Integer> b, int power) {
            Map<String, Integer> product = new TreeMap<>(a);
            b.forEach((name, p) -> product.merge(name, p * power, (x, y) -> x + y == 0 ? null : x + y));
            return product;
        }

        private Set<String> forms() {
            Set<String> forms = new LinkedHashSet<>();
            for (Map<String, Integer> powers : found) {
                forms.add(form(powers));
            }
            return forms;
        }

        // In a compound a Celsius degree can only be a difference, which is a kelvin.
        private static String form(Map<String, Integer> powers) {
            Map<String, Integer> own = new TreeMap<>(powers);
            if (own.size() > 1 && own.containsKey("degC")) {
                int power = own.remove("degC");
                own.merge("K", power, Integer::sum);
            }
            StringBuilder form = new StringBuilder();
            own.forEach((name, p) -> form.append(name).append('^').append(p).append(' '));
            return form.toString();
        }
    }
}
