package slantfall.bench.ledger;

/** The ledger as lines with tabs, as a spreadsheet or a mail takes them. */
final class TableText {

    private TableText() {}

    static String of(LedgerModel model, String title) {
        StringBuilder text = new StringBuilder();
        if (!title.isBlank()) {
            text.append(title).append('\n');
        }
        text.append("Reading\tSymbol\tValue\tUnit\n");
        for (ReadingRow row : model.readings()) {
            line(text, row.reading().name(), row.reading().symbol(), row.numberProperty().get(), row.unitProperty().get());
        }
        text.append("\nCheck\tVerdict\tValue and limit\tMargin\tSource\n");
        model.own().forEach(row -> check(text, "", row));
        for (PanelRow panel : model.panels()) {
            line(text, panel.panel().question(), panel.phraseProperty().get());
            panel.authors().forEach(row -> check(text, "  ", row));
        }
        model.cautions().forEach(c -> text.append("! ").append(c).append('\n'));
        return text.append(model.general()).append('\n').toString();
    }

    private static void check(StringBuilder text, String indent, CheckRow row) {
        line(text, indent + row.nameProperty().get(), row.verdictProperty().get().word(), row.comparedProperty().get(),
                row.marginProperty().get(), row.sourceProperty().get());
    }

    private static void line(StringBuilder text, String... cells) {
        text.append(String.join("\t", cells)).append('\n');
    }
}
