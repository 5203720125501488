package slantfall.quantity;

import java.util.Map;

/** Text as people type it, brought to a few plain characters, and shortened where it is quoted back. */
final class Cleaned {

    /** Marks a space that groups digits: no-break, narrow no-break, thin and figure space. */
    static final char GROUPING = '\u00A0';
    private static final int LONGEST_ENTRY = 200;
    private static final int LONGEST_QUOTE = 40;
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String LOWERED = "₀₁₂₃₄₅₆₇₈₉";
    private static final Map<Character, String> PLAIN = Map.ofEntries(
            Map.entry('\u2212', "-"), Map.entry('\u2010', "-"), Map.entry('\u2011', "-"), Map.entry('\u2012', "-"),
            Map.entry('\u2013', "-"), Map.entry('\uFE63', "-"), Map.entry('\uFF0D', "-"),
            Map.entry('\u00B5', "u"), Map.entry('\u03BC', "u"), Map.entry('\u00B7', "*"), Map.entry('\u22C5', "*"),
            Map.entry('\u2219', "*"), Map.entry('\u2022', "*"), Map.entry('\u00D7', "*"), Map.entry('\u2215', "/"),
            Map.entry('\u2044', "/"), Map.entry('\u00F7', "/"), Map.entry('\u2032', "'"), Map.entry('\u2019', "'"),
            Map.entry('\u2033', "\""), Map.entry('\u201D', "\""), Map.entry('\u201C', "\""),
            Map.entry('\u00BA', "°"), Map.entry('\u02DA', "°"), Map.entry('\u2103', "°C"), Map.entry('\u2109', "°F"),
            Map.entry('\u2202', "d"), Map.entry('\u2113', "L"), Map.entry('\u212A', "K"), Map.entry('\uFF05', "%"),
            Map.entry('\u2236', ":"), Map.entry('\t', " "), Map.entry('\u2002', " "), Map.entry('\u2003', " "),
            Map.entry('\u202F', "\u00A0"), Map.entry('\u2009', "\u00A0"), Map.entry('\u2007', "\u00A0"),
            Map.entry('\u200A', "\u00A0"), Map.entry('\u207F', "^n"), Map.entry('é', "e"), Map.entry('É', "E"));

    private Cleaned() {
    }

    /** The entry in plain characters without outer blanks; refuses what no quantity can look like. */
    static String entry(String text) {
        if (text == null) {
            throw QuantityProblem.plain("Nothing was entered", "Type a number and a unit");
        }
        String bare = text.strip();
        if (bare.isEmpty()) {
            throw QuantityProblem.plain("Nothing was entered", "Type a number and a unit");
        }
        if (bare.length() > LONGEST_ENTRY) {
            throw QuantityProblem.plain(quote(bare) + " is longer than " + LONGEST_ENTRY + " characters",
                    "Type one number and its unit");
        }
        if (bare.chars().anyMatch(Cleaned::invisible)) {
            throw QuantityProblem.plain(quote(bare) + " holds invisible characters", "Type one number and its unit");
        }
        return trimmed(plain(bare));
    }

    private static boolean invisible(int c) {
        int type = Character.getType(c);
        return c != '\t' && Character.isISOControl(c) || type == Character.FORMAT || type == Character.LINE_SEPARATOR
                || type == Character.PARAGRAPH_SEPARATOR;
    }

    /** The text quoted for a message: one line, shortened, nothing unprintable. */
    static String quote(String text) {
        StringBuilder out = new StringBuilder("\"");
        int end = Math.min(text.length(), LONGEST_QUOTE);
        for (int i = 0; i < end; i++) {
            char c = text.charAt(i);
            boolean odd = c == '\t' || invisible(c) || Character.isSurrogate(c);
            out.append(odd ? '?' : c);
        }
        return out.append(text.length() > end ? "…\"" : "\"").toString();
    }

    private static String plain(String text) {
        StringBuilder out = new StringBuilder();
        boolean raised = false;
        for (char c : text.toCharArray()) {
            boolean nowRaised = RAISED.indexOf(c) >= 0 || c == '⁻' || c == '⁺';
            if (nowRaised && !raised) {
                out.append('^');
            }
            raised = nowRaised;
            out.append(plain(c));
        }
        return out.toString();
    }

    private static String plain(char c) {
        int digit = Math.max(RAISED.indexOf(c), LOWERED.indexOf(c));
        if (digit >= 0) {
            return String.valueOf(digit);
        }
        if (c == '⁻') {
            return "-";
        }
        return c == '⁺' ? "" : PLAIN.getOrDefault(c, String.valueOf(c));
    }

    /** Without outer blanks, the grouping space included. */
    static String trimmed(String text) {
        int from = 0;
        int to = text.length();
        while (from < to && blank(text.charAt(from))) {
            from++;
        }
        while (to > from && blank(text.charAt(to - 1))) {
            to--;
        }
        return text.substring(from, to);
    }

    private static boolean blank(char c) {
        return c == GROUPING || Character.isWhitespace(c);
    }
}
