package slantfall.store;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Assessment;
import slantfall.declare.CheckResult;

/** Readings and checks as one table for spreadsheets: comma, double quotes, point as decimal sign, SI units. */
public final class AssessmentCsv {

    private static final List<String> HEAD =
            List.of("part", "key", "name", "value", "unit", "limit", "margin", "verdict", "in range", "source", "note");
    private static final String DANGEROUS = "=+-@\t\r\n";

    private AssessmentCsv() {}

    /** The table; what is unknown is an empty cell. */
    public static String text(Assessment assessment) {
        StringBuilder out = new StringBuilder();
        row(out, HEAD);
        for (Assessment.ReadingValue r : assessment.readings()) {
            row(out, List.of("reading", cell(r.reading().key()), cell(r.reading().name()), cell(r.value()),
                    cell(r.reading().kind().si().symbol()), "", "", "", "", "", ""));
        }
        assessment.checks().forEach(c -> row(out, check(c)));
        return out.toString();
    }

    private static List<String> check(CheckResult c) {
        List<String> cells = new ArrayList<>(List.of("check", cell(c.info().key()), cell(c.info().name())));
        cells.addAll(List.of(cell(c.value()), cell(c.info().kind().si().symbol()), cell(c.limit()), cell(c.margin())));
        cells.addAll(List.of(cell(c.verdict().word()), c.inRange() ? "yes" : "no", cell(c.info().source().text()),
                cell(c.note())));
        return cells;
    }

    private static void row(StringBuilder out, List<String> cells) {
        out.append(String.join(",", cells)).append('\n');
    }

    private static String cell(double number) {
        return Double.isFinite(number) ? Double.toString(number) : "";
    }

    /** A text that no spreadsheet takes for a formula, quoted where it must be. */
    static String cell(String text) {
        boolean dangerous = !text.isEmpty() && DANGEROUS.indexOf(text.charAt(0)) >= 0;
        String harmless = dangerous ? "'" + text : text;
        boolean quoted = harmless.chars().anyMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r' || c == ';');
        return quoted ? '"' + harmless.replace("\"", "\"\"") + '"' : harmless;
    }
}
