package slantfall.console;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import slantfall.check.Cautions;
import slantfall.declare.Assessment;
import slantfall.declare.CheckResult;
import slantfall.declare.Headline;
import slantfall.declare.LiquidReport;
import slantfall.declare.LiquidSettings;
import slantfall.declare.MarginWords;
import slantfall.declare.Notice;
import slantfall.declare.PanelResult;
import slantfall.declare.Profile;
import slantfall.declare.Setting;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;
import slantfall.declare.Working;
import slantfall.quantity.Display;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;
import slantfall.quantity.UnitSystem;

/** An assessment as text for people. */
final class AssessmentText {

    private static final int DIGITS = 3;

    private final PrintWriter out;
    private final UnitSystem units;

    AssessmentText(PrintWriter out, UnitSystem units) {
        this.out = out;
        this.units = units;
    }

    void print(Assessment a, List<String> reports, Set<String> parts) {
        String title = a.setUp().title().isEmpty() ? "Untitled" : a.setUp().title();
        out.println(title + " — " + a.declaration().name());
        Headline headline = Headline.of(a);
        out.println(headline.verdict().shape() + " " + headline.sentence());
        settings(a);
        liquid(a);
        readings(a);
        ownRules(a);
        panels(a);
        profile(parts.contains("traverses"), "Traverses", a.profiles().traverses());
        profile(parts.contains("courses"), "Courses", a.profiles().courses());
        if (parts.contains("working")) {
            workings(a);
        }
        notices(a, reports);
    }

    private String show(double value, Kind kind) {
        return Double.isNaN(value) ? "unknown" : Show.value(value, kind, units, DIGITS);
    }

    private void heading(String text) {
        out.println();
        out.println(text);
    }

    private void settings(Assessment a) {
        heading("Settings");
        Table table = new Table();
        for (Setting s : a.declaration().coordinates()) {
            double value = a.setUp().value(s);
            table.row(s.name(), s.symbol(), show(value, s.kind()), origin(a.setUp().values().get(s.key())));
        }
        a.declaration().choices().forEach(c -> {
            String key = a.setUp().structure().choice(c);
            String name = c.options().stream().filter(o -> o.key().equals(key)).findFirst().orElseThrow().name();
            table.row(c.name(), "", name, a.setUp().choices().containsKey(c.key()) ? "" : "untouched default");
        });
        table.print(out, "  ");
    }

    private static String origin(Value given) {
        if (given == null) {
            return "untouched default";
        }
        String typed = given.typed().isEmpty() ? "" : "from " + given.typed();
        List<String> known = given.tolerance().map(Tolerance::typed).orElse(List.of());
        if (known.isEmpty()) {
            return typed;
        }
        return known.size() == 1 ? typed + " ± " + known.get(0) : "unknown, within " + String.join(" to ", known);
    }

    private void liquid(Assessment a) {
        heading("Liquid: " + a.liquid().name());
        Table table = new Table();
        for (LiquidReport.Row row : a.liquid().properties()) {
            Setting setting = LiquidSettings.of(row.property().key());
            table.row(setting.name(), setting.symbol(), show(row.value(), setting.kind()), row.origin());
        }
        table.print(out, "  ");
    }

    private void readings(Assessment a) {
        heading("Readings");
        Table table = new Table();
        a.readings().forEach(r ->
                table.row(r.reading().name(), r.reading().symbol(), show(r.value(), r.reading().kind())));
        table.print(out, "  ");
    }

    private void ownRules(Assessment a) {
        Table table = new Table();
        a.checks().stream().filter(CheckResult::binding).forEach(c -> row(table, c));
        if (!table.isEmpty()) {
            heading("Your rules");
            table.print(out, "  ");
        }
    }

    private void panels(Assessment a) {
        heading("Panels of rules");
        for (PanelResult panel : a.panels()) {
            out.println("  " + panel.panel().question() + " — " + panel.phrase());
            Table table = new Table();
            panel.results().forEach(c -> row(table, c));
            table.print(out, "    ");
        }
    }

    private void row(Table table, CheckResult c) {
        table.row(
                c.verdict().shape() + " " + c.verdict().word() + (c.inRange() ? "" : ", out of range"),
                c.info().name(),
                show(c.value(), c.info().kind()) + " " + c.info().side().words() + " " + show(c.limit(), c.info().kind()),
                MarginWords.of(c),
                c.info().source().text());
    }

    private void profile(boolean wanted, String name, Profile profile) {
        if (!wanted || profile.columns().isEmpty()) {
            return;
        }
        heading(name + (Double.isNaN(profile.place()) ? "" : ", " + show(profile.place(), Kind.LENGTH) + " from the inlet"));
        List<Profile.Column> columns = new ArrayList<>(List.of(profile.axis()));
        columns.addAll(profile.columns());
        List<Unit> columnUnits = columns.stream().map(this::unit).toList();
        Table table = new Table();
        table.row(columns.stream().map(Profile.Column::name).toArray(String[]::new));
        for (int i = 0; i < profile.axis().values().length; i++) {
            String[] cells = new String[columns.size()];
            for (int j = 0; j < cells.length; j++) {
                double value = columns.get(j).values()[i];
                cells[j] = Double.isNaN(value)
                        ? "unknown"
                        : Show.value(value, columns.get(j).kind(), columnUnits.get(j), DIGITS);
            }
            table.row(cells);
        }
        table.print(out, "  ");
    }

    /** One unit for a whole column, the one that suits its largest number. */
    private Unit unit(Profile.Column column) {
        double largest = 0;
        for (double v : column.values()) {
            largest = Double.isNaN(v) ? largest : Math.max(largest, Math.abs(v));
        }
        return Display.unit(column.kind(), units, largest);
    }

    private void workings(Assessment a) {
        heading("Working");
        for (Working working : a.workings()) {
            out.println("  " + working.about());
            for (Working.Step step : working.steps()) {
                out.println("    " + step.symbol() + " = " + step.formula() + " = "
                        + Show.value(step.result(), step.kind(), UnitSystem.SI, 6));
                StringBuilder terms = new StringBuilder("      with ");
                for (Working.Term term : step.terms()) {
                    terms.append(term.symbol()).append(" = ")
                            .append(Show.value(term.value(), term.kind(), UnitSystem.SI, 6)).append("; ");
                }
                out.println(terms.append(step.source().text()).append("; holds for: ").append(step.range()));
            }
        }
    }

    private void notices(Assessment a, List<String> reports) {
        heading("Notes");
        reports.forEach(r -> out.println("  - " + r));
        a.notices().stream().map(Notice::text).distinct().forEach(t -> out.println("  - " + t));
        a.cautions().forEach(c -> out.println("  ! " + c));
        out.println("  " + Cautions.general());
    }
}
