package slantfall.bench.form;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.CheckInfo;
import slantfall.declare.HouseRule;
import slantfall.declare.Panel;
import slantfall.declare.SetUp;
import slantfall.quantity.QuantityProblem;

/** The check of one panel that the user designs by, with the margin kept. */
public final class HouseRuleModel {

    private final Desk desk;
    private final Panel panel;
    private final ObjectProperty<Optional<CheckInfo>> rule = new SimpleObjectProperty<>(Optional.empty());
    private final StringProperty margin = new SimpleStringProperty("");
    private final StringProperty problem = new SimpleStringProperty("");
    private boolean showing;

    HouseRuleModel(Desk desk, Panel panel) {
        this.desk = desk;
        this.panel = panel;
        refresh(desk.assessment());
        rule.addListener((o, a, chosen) -> commit());
    }

    /** The question that the rule answers. */
    public Panel panel() {
        return panel;
    }

    /** Rules to choose from, the empty one for none. */
    public List<Optional<CheckInfo>> options() {
        List<Optional<CheckInfo>> options = new java.util.ArrayList<>(List.of(Optional.empty()));
        desk.declaration().checks().stream()
                .filter(c -> c.panel().equals(panel.key()))
                .forEach(c -> options.add(Optional.of(c)));
        return options;
    }

    /** The rule chosen; setting it changes the set-up. */
    public ObjectProperty<Optional<CheckInfo>> ruleProperty() {
        return rule;
    }

    /** Margin kept, as typed. */
    public StringProperty marginProperty() {
        return margin;
    }

    /** Why the margin is wrong, empty if it is not. */
    public StringProperty problemProperty() {
        return problem;
    }

    void refresh(Assessment assessment) {
        HouseRule chosen = assessment.setUp().houseRules().get(panel.key());
        showing = true;
        rule.set(chosen == null ? Optional.empty() : options().stream()
                .filter(c -> c.filter(i -> i.key().equals(chosen.rule())).isPresent())
                .findFirst()
                .orElse(Optional.empty()));
        if (problem.get().isEmpty()) {
            margin.set(chosen == null ? "" : chosen.typedMargin());
        }
        showing = false;
    }

    /** Makes rule and margin part of the set-up; a wrong margin stays, with the reason. */
    public void commit() {
        if (showing || rule.get() == null) {
            return;
        }
        SetUp now = desk.session().current();
        Map<String, HouseRule> rules = new LinkedHashMap<>(now.houseRules());
        try {
            double kept = Share.read(margin.get());
            if (rule.get().isPresent()) {
                rules.put(panel.key(), new HouseRule(panel.key(), rule.get().get().key(), kept, typed()));
            } else {
                rules.remove(panel.key());
            }
            problem.set("");
            desk.session().change(now.withHouseRules(rules), null);
        } catch (QuantityProblem | IllegalArgumentException e) {
            problem.set(e.getMessage());
        }
    }

    private String typed() {
        String text = margin.get().strip();
        return text.isEmpty() || text.endsWith("%") ? text : text + " %";
    }
}
