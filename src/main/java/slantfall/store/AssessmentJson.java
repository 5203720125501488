package slantfall.store;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import slantfall.declare.Assessment;
import slantfall.declare.CheckResult;
import slantfall.declare.LiquidReport;
import slantfall.declare.Notice;
import slantfall.declare.Panel;
import slantfall.declare.PanelResult;
import slantfall.declare.Profile;
import slantfall.declare.Working;
import slantfall.liquid.Property;
import slantfall.quantity.Kind;

/** An assessment for programs: full digits, coherent SI units, null where something is unknown. */
public final class AssessmentJson {

    private AssessmentJson() {}

    /**
     * An assessment as JSON text.
     *
     * @param reports what reading the file had to tell; stands among the notices
     * @param with any of {@code traverses}, {@code courses}, {@code working}
     */
    public static String text(Assessment assessment, List<String> reports, Set<String> with) {
        Node root = Node.object()
                .put("title", assessment.setUp().title())
                .put("arrangement", assessment.setUp().arrangement())
                .put("readings", readings(assessment))
                .put("checks", checks(assessment))
                .put("panels", panels(assessment))
                .put("liquid", liquid(assessment.liquid()))
                .put("cautions", Node.texts(assessment.cautions()))
                .put("notices", Node.texts(notices(assessment, reports)));
        if (with.contains("traverses")) {
            root.put("traverses", profile(assessment.profiles().traverses()));
        }
        if (with.contains("courses")) {
            root.put("courses", profile(assessment.profiles().courses()));
        }
        if (with.contains("working")) {
            root.put("working", workings(assessment));
        }
        return NodeWriter.pretty(root).stripTrailing();
    }

    private static Node readings(Assessment assessment) {
        Node node = Node.object();
        assessment.readings().forEach(r -> node.put(
                r.reading().key(), quantity(r.value(), r.reading().kind()).put("name", r.reading().name())));
        return node;
    }

    private static Node quantity(double value, Kind kind) {
        return Node.object().put("value", value).put("unit", kind.si().symbol());
    }

    private static Node checks(Assessment assessment) {
        Node list = Node.list();
        for (CheckResult check : assessment.checks()) {
            list.add(Node.object()
                    .put("key", check.info().key())
                    .put("panel", check.info().panel())
                    .put("question", question(assessment, check))
                    .put("name", check.info().name())
                    .put("kind", kind(check.info().kind()))
                    .put("unit", check.info().kind().si().symbol())
                    .put("verdict", check.verdict().word())
                    .put("side", check.info().side().words())
                    .put("value", check.value())
                    .put("limit", check.limit())
                    .put("margin", check.margin())
                    .put("source", check.info().source().text())
                    .put("inRange", Node.word(check.inRange()))
                    .put("range", check.info().range())
                    .put("note", check.note()));
        }
        return list;
    }

    /** A Reynolds number says its definition, any other kind its key. */
    static String kind(Kind kind) {
        return kind.key().startsWith("reynolds") ? kind.words() : kind.key();
    }

    private static String question(Assessment assessment, CheckResult check) {
        return assessment.declaration().panels().stream()
                .filter(p -> p.key().equals(check.info().panel()))
                .map(Panel::question)
                .findFirst()
                .orElse("Is your own requirement met?");
    }

    private static Node panels(Assessment assessment) {
        Node list = Node.list();
        for (PanelResult panel : assessment.panels()) {
            list.add(Node.object()
                    .put("key", panel.panel().key())
                    .put("question", panel.panel().question())
                    .put("phrase", panel.phrase()));
        }
        return list;
    }

    private static Node liquid(LiquidReport liquid) {
        Node node = Node.object()
                .put("name", liquid.name())
                .put("temperature", liquid.temperature())
                .put("strength", liquid.strength());
        Node origins = Node.object();
        for (Property property : Property.values()) {
            node.put(property.key(), Double.NaN);
        }
        for (LiquidReport.Row row : liquid.properties()) {
            node.put(row.property().key(), row.value());
            origins.put(row.property().key(), row.origin());
        }
        return node.put("origins", origins);
    }

    private static List<String> notices(Assessment assessment, List<String> reports) {
        List<String> all = new ArrayList<>();
        for (Notice notice : assessment.notices()) {
            all.add(notice.about().isEmpty() ? notice.text() : notice.about() + ": " + notice.text());
        }
        all.addAll(reports);
        return all;
    }

    private static Node profile(Profile profile) {
        Node node = Node.object();
        if (!Double.isNaN(profile.place())) {
            node.put("at", profile.place());
        }
        if (profile.axis().values().length > 0) {
            node.put(profile.axis().key(), column(profile.axis()));
        }
        profile.columns().forEach(c -> node.put(c.key(), column(c)));
        return node;
    }

    private static Node column(Profile.Column column) {
        Node values = Node.list();
        for (double value : column.values()) {
            values.add(Node.number(value));
        }
        return Node.object()
                .put("unit", column.kind().si().symbol())
                .put("name", column.name())
                .put("values", values);
    }

    private static Node workings(Assessment assessment) {
        Node node = Node.object();
        for (Working working : assessment.workings()) {
            Node steps = Node.list();
            working.steps().forEach(s -> steps.add(step(s)));
            node.put(working.about(), steps);
        }
        return node;
    }

    private static Node step(Working.Step step) {
        Node terms = Node.list();
        step.terms().forEach(t -> terms.add(Node.object()
                .put("symbol", t.symbol())
                .put("value", t.value())
                .put("unit", t.kind().si().symbol())));
        return Node.object()
                .put("name", step.name())
                .put("symbol", step.symbol())
                .put("formula", step.formula())
                .put("terms", terms)
                .put("result", step.result())
                .put("unit", step.kind().si().symbol())
                .put("source", step.source().text())
                .put("range", step.range());
    }
}
