package slantfall.quantity;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;

/** The published factors of published.csv, and compounds worked out from them without the program's own parser. */
final class Published {

    /** One row: the factor as printed, and how far the truth may be from it. */
    record Row(String unit, String kind, double factor, double relativeDoubt, String source) {
    }

    /** A factor worked out from rows, with the doubt that their rounding leaves. */
    record Worked(double factor, double relativeDoubt) {
    }

    private static final double ROUNDING = 2e-15;

    private Published() {
    }

    static List<Row> rows() {
        List<Row> rows = new ArrayList<>();
        for (String line : lines("published.csv")) {
            String[] cell = line.split(",");
            if (!cell[0].equals("unit")) {
                BigDecimal printed = new BigDecimal(cell[2]);
                double halfDigit = cell[3].equals("exact") ? 0 : printed.ulp().doubleValue() / 2;
                double factor = printed.doubleValue();
                rows.add(new Row(cell[0], cell[1], factor, halfDigit / factor + ROUNDING, cell[4]));
            }
        }
        return rows;
    }

    static List<String> lines(String resource) {
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                Objects.requireNonNull(Published.class.getResourceAsStream(resource), resource),
                StandardCharsets.UTF_8))) {
            return reader.lines().filter(line -> !line.isBlank() && !line.startsWith("#")).toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** A compound such as lb/(h ft) from the published factors of its words; null where one is not published. */
    static Worked worked(String symbol) {
        Map<String, Row> words = new HashMap<>();
        rows().forEach(row -> words.putIfAbsent(row.unit(), row));
        if (words.containsKey(symbol)) {
            return new Worked(words.get(symbol).factor(), words.get(symbol).relativeDoubt());
        }
        int slash = symbol.indexOf('/');
        String top = slash < 0 ? symbol : symbol.substring(0, slash);
        String bottom = slash < 0 ? "" : symbol.substring(slash + 1).replaceAll("[()]", "");
        Worked over = product(top, words);
        Worked under = product(bottom, words);
        return over == null || under == null ? null
                : new Worked(over.factor() / under.factor(), over.relativeDoubt() + under.relativeDoubt());
    }

    private static Worked product(String parts, Map<String, Row> words) {
        double factor = 1;
        double doubt = ROUNDING;
        for (String part : parts.isEmpty() ? new String[0] : parts.split(" ")) {
            if (part.matches("[0-9]+")) {
                factor *= Double.parseDouble(part);
                continue;
            }
            int power = part.matches(".*[a-zA-Z][23]") ? part.charAt(part.length() - 1) - '0' : 1;
            String word = power == 1 ? part.replace("s^n", "s") : part.substring(0, part.length() - 1);
            Row row = words.get(word);
            if (row == null) {
                return null;
            }
            factor *= Math.pow(row.factor(), power);
            doubt += power * row.relativeDoubt();
        }
        return new Worked(factor, doubt);
    }
}
