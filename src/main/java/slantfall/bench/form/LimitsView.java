package slantfall.bench.form;

import java.util.Optional;
import javafx.beans.property.StringProperty;
import javafx.collections.ListChangeListener;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.TextField;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import slantfall.bench.look.LazyPane;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.declare.CheckInfo;

/** The user's own rules: bounds on readings, and a rule to design by for each question. */
final class LimitsView extends VBox {

    private final LimitsModel model;
    private final VBox requirements = new VBox(8);
    private final LazyPane house = new LazyPane("Rules to design by", this::houseRules);

    LimitsView(LimitsModel model) {
        super(8);
        this.model = model;
        MenuButton add = new MenuButton("Require of a reading …");
        add.setId("add-requirement");
        add.setMaxWidth(Double.MAX_VALUE);
        add.getItems().add(new MenuItem(""));
        add.setOnShowing(e -> add.getItems().setAll(model.free().stream().map(r -> {
            MenuItem item = new MenuItem(r.name());
            item.setOnAction(a -> model.add(r));
            return item;
        }).toList()));
        house.setId("house-rules");
        getChildren().addAll(requirements, add, house);
        model.requirements().addListener((ListChangeListener<RequirementModel>) c -> buildRequirements());
        model.houseRules().addListener((ListChangeListener<HouseRuleModel>) c -> house.forget());
        buildRequirements();
    }

    private void buildRequirements() {
        requirements.getChildren().setAll(model.requirements().stream().map(this::requirement).toList());
        requirements.setManaged(!model.requirements().isEmpty());
    }

    private VBox houseRules() {
        VBox box = new VBox(8);
        box.getChildren().setAll(model.houseRules().stream().map(LimitsView::house).toList());
        return box;
    }

    private Node requirement(RequirementModel r) {
        String name = r.reading().name();
        String key = r.reading().key();
        Button remove = new Button("✕");
        remove.getStyleClass().addAll("flat", "small");
        remove.setId("remove-" + key);
        remove.setAccessibleText("Drop the requirement on " + name);
        remove.setOnAction(e -> model.remove(r));
        HBox head = new HBox(5, Parts.label(name, Mark.NAME), Parts.symbol(r.reading().symbol()), Parts.spring(), remove);
        head.setAlignment(Pos.CENTER_LEFT);
        String unit = r.unit().label();
        HBox bounds = new HBox(6,
                field(r.atLeastProperty(), "at least, " + unit, name + " at least", "least-" + key, r::commit),
                field(r.atMostProperty(), "at most, " + unit, name + " at most", "most-" + key, r::commit));
        HBox more = new HBox(6,
                field(r.marginProperty(), "margin, %", "Margin kept on " + name, "margin-" + key, r::commit),
                field(r.reasonProperty(), "why", "Reason of the requirement on " + name, "reason-" + key, r::commit));
        VBox box = new VBox(4, head, bounds, more, Parts.line(r.problemProperty(), Mark.PROBLEM));
        box.getStyleClass().add("requirement");
        box.setId("requirement-" + key);
        return box;
    }

    private static Node house(HouseRuleModel h) {
        ComboBox<Optional<CheckInfo>> combo = new ComboBox<>();
        combo.setId("house-" + h.panel().key());
        combo.setMaxWidth(Double.MAX_VALUE);
        combo.setMinWidth(80);
        combo.setConverter(Words.of(c -> c.map(CheckInfo::name).orElse("none chosen")));
        combo.getItems().setAll(h.options());
        combo.setAccessibleText("Rule to design by: " + h.panel().question());
        combo.valueProperty().bindBidirectional(h.ruleProperty());
        HBox.setHgrow(combo, Priority.ALWAYS);
        TextField margin = field(h.marginProperty(), "margin, %", "Margin kept: " + h.panel().question(),
                "house-margin-" + h.panel().key(), h::commit);
        margin.setPrefWidth(84);
        margin.setMinWidth(84);
        HBox.setHgrow(margin, Priority.NEVER);
        HBox row = new HBox(6, combo, margin);
        return new VBox(3, Parts.label(h.panel().question(), Mark.NAME), row, Parts.line(h.problemProperty(), Mark.PROBLEM));
    }

    private static TextField field(StringProperty text, String prompt, String spoken, String id, Runnable commit) {
        TextField field = new TextField();
        field.setId(id);
        field.setPromptText(prompt);
        field.setAccessibleText(spoken);
        field.textProperty().bindBidirectional(text);
        field.setOnAction(e -> commit.run());
        field.focusedProperty().addListener((o, a, focused) -> {
            if (!focused) {
                commit.run();
            }
        });
        HBox.setHgrow(field, Priority.ALWAYS);
        field.setPrefWidth(100);
        return field;
    }
}
