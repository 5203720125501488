package slantfall.console;

import java.io.PrintWriter;
import java.util.List;
import slantfall.declare.Arrangement;
import slantfall.declare.Declaration;
import slantfall.declare.LiquidSettings;
import slantfall.declare.Setting;
import slantfall.declare.SetUp;
import slantfall.quantity.Show;
import slantfall.quantity.UnitSystem;
import slantfall.store.Presets;

/** What can be set, read and checked, as text for people. */
final class DescribeText {

    private final PrintWriter out;

    DescribeText(PrintWriter out) {
        this.out = out;
    }

    void print(List<Arrangement> arrangements, Presets presets) {
        arrangements.forEach(a -> arrangement(a.declare(SetUp.blank(a.key(), presets.initial()).structure())));
        out.println("Liquid, in every arrangement");
        Table liquid = new Table();
        LiquidSettings.list().forEach(s -> row(liquid, s));
        liquid.print(out, "  ");
        out.println();
        out.println("Presets");
        Table table = new Table();
        presets.all().forEach(p -> table.row(p.key(), p.name()));
        table.print(out, "  ");
    }

    private void arrangement(Declaration d) {
        out.println(d.key() + " — " + d.name() + ". " + d.summary());
        out.println("  Settings: key, symbol, initial, usual range, meaning");
        Table settings = new Table();
        d.settings().forEach(s -> row(settings, s));
        settings.print(out, "    ");
        d.choices().forEach(c -> {
            out.println("  Choice " + c.key() + ": " + c.help());
            Table options = new Table();
            c.options().forEach(o -> options.row(o.key(), o.name()));
            options.print(out, "    ");
        });
        out.println("  Readings");
        Table readings = new Table();
        d.readings().forEach(r -> readings.row(r.key(), r.symbol(), r.kind().si().symbol(), r.help()));
        readings.print(out, "    ");
        out.println("  Checks");
        Table checks = new Table();
        d.checks().forEach(c -> checks.row(c.key(), c.formula(), c.source().text()));
        checks.print(out, "    ");
        out.println();
    }

    private static void row(Table table, Setting s) {
        String use = s.question().isEmpty() ? "" : " (for the question " + s.question() + ")";
        table.row(s.key(), s.symbol(), show(s, s.initial()),
                show(s, s.usual().low()) + " to " + show(s, s.usual().high()), s.help() + use);
    }

    private static String show(Setting s, double value) {
        return Show.value(value, s.kind(), UnitSystem.TRADE, 4);
    }
}
