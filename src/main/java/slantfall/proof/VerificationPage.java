package slantfall.proof;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** The page docs/verification.md, made from the published values and what the program makes of them. */
public final class VerificationPage {

    /** Deviations below this are rounding, which differs between machines. */
    private static final double ROUNDING = 1e-12;

    private static final Map<String, String> SECTIONS = sections();

    private VerificationPage() {}

    /**
     * The page in Markdown.
     *
     * @param rows published values
     */
    public static String of(List<PublishedRow> rows) {
        ProofResult all = Prover.prove(rows);
        StringBuilder page = new StringBuilder();
        page.append("# Verification\n\n")
                .append("Generated; do not edit. Every published check value that the program carries, recomputed by the\n")
                .append("formulas that answer the user. The same table comes from `slantfall prove`. Deviations are\n")
                .append("relative, or absolute where the tolerance says so; below 1e-12 they are rounding. A value *from\n")
                .append("memory* was recalled and not read: its row shows that the formula is the remembered one, not\n")
                .append("that the memory is right. A value *derived and computed here* comes from an independent script,\n")
                .append("never from the program.\n\n")
                .append(all.rows().size() - all.failures()).append(" of ").append(all.rows().size())
                .append(" numbers reproduced.\n");
        SECTIONS.forEach((section, title) -> {
            List<PublishedRow> own = rows.stream().filter(r -> r.id().startsWith(section + ".")).toList();
            if (!own.isEmpty()) {
                table(page, title, own);
            }
        });
        return page.toString();
    }

    private static void table(StringBuilder page, String title, List<PublishedRow> rows) {
        page.append("\n## ").append(title).append("\n\n")
                .append("| id | quantity | source | mark | expected | obtained | deviation | tolerance | ok |\n")
                .append("|---|---|---|---|---|---|---|---|---|\n");
        for (PublishedRow row : rows) {
            for (ProofResult.Row result : Prover.prove(List.of(row)).rows()) {
                line(page, row, result);
            }
        }
    }

    private static void line(StringBuilder page, PublishedRow row, ProofResult.Row result) {
        String note = row.origin().note().isEmpty() ? "" : " (" + row.origin().note() + ")";
        String absolute = result.absolute() ? " absolute" : "";
        page.append("| ").append(result.id())
                .append(" | ").append(cell(result.quantity() + note))
                .append(" | ").append(cell(result.source()))
                .append(" | ").append(result.markInWords())
                .append(" | ").append(number(result.expected()))
                .append(" | ").append(result.reason().isEmpty() ? number(result.obtained()) : cell(result.reason()))
                .append(" | ").append(deviation(result.deviation()))
                .append(" | ").append(String.format(Locale.ROOT, "%.1e", result.tolerance())).append(absolute)
                .append(" | ").append(result.ok() ? "yes" : "**no**")
                .append(" |\n");
    }

    private static String number(double value) {
        return value == 0 || Math.abs(value) < ROUNDING ? "0" : String.format(Locale.ROOT, "%.8g", value);
    }

    private static String deviation(double value) {
        return value < ROUNDING ? "< 1e-12" : String.format(Locale.ROOT, "%.1e", value);
    }

    private static String cell(String text) {
        return text.replace("|", "\\|").replace('\n', ' ');
    }

    private static Map<String, String> sections() {
        Map<String, String> sections = new LinkedHashMap<>();
        sections.put("1", "Open film");
        sections.put("2", "Regimes and thickness of a film");
        sections.put("5", "Closed slot");
        sections.put("10", "Liquids");
        return sections;
    }
}
