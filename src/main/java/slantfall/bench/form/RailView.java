package slantfall.bench.form;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import javafx.geometry.Insets;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import slantfall.bench.look.LazyPane;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.declare.Choice;
import slantfall.liquid.Preset;

/** The settings rail: liquid, geometry, duty and limits, generated from the declaration. */
public final class RailView extends ScrollPane {

    private final RailModel model;
    private final VBox content = new VBox(10);
    private final Map<String, FieldView> views = new HashMap<>();
    private final Map<String, LazyPane> folded = new HashMap<>();
    private final LiquidView liquid;
    private final LimitsView limits;

    /**
     * A rail.
     *
     * @param presets liquids that can be chosen, looked up whenever the list opens
     */
    public RailView(RailModel model, Supplier<List<Preset>> presets) {
        this.model = model;
        liquid = new LiquidView(new LiquidModel(model.desk(), presets));
        limits = new LimitsView(new LimitsModel(model.desk()));
        setId("rail");
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        getStyleClass().addAll(Mark.PART, "rail");
        content.setPadding(new Insets(10, 14, 16, 14));
        setContent(content);
        setAccessibleText("Settings");
        model.editionProperty().addListener((o, a, b) -> build());
        model.startingProperty().addListener((o, a, b) -> build());
        build();
    }

    /** Puts the keyboard into the field of a setting; false if there is none. */
    public boolean focus(String key) {
        if (!views.containsKey(key) && !folded.containsKey(key)) {
            model.startingProperty().set(false);
        }
        if (folded.containsKey(key)) {
            folded.get(key).setExpanded(true);
        }
        FieldView view = views.get(key);
        if (view == null) {
            return false;
        }
        applyCss();
        layout();
        show(view);
        view.focusField();
        return true;
    }

    /** Puts the keyboard into the first field. */
    public void focusFirst() {
        (model.startingProperty().get() ? model.essentials() : model.fields(RailModel.Group.GEOMETRY)).stream()
                .findFirst()
                .ifPresent(f -> focus(f.setting().key()));
    }

    private void show(Node node) {
        double y = node.localToScene(0, 0).getY() - content.localToScene(0, 0).getY();
        double room = content.getHeight() - getViewportBounds().getHeight();
        setVvalue(room <= 0 ? 0 : Math.max(0, Math.min(1, (y - getViewportBounds().getHeight() / 3) / room)));
    }

    private void build() {
        views.clear();
        folded.clear();
        if (model.startingProperty().get()) {
            content.getChildren().setAll(group("To begin with", box(liquid, rows(model.essentials()), all())));
            return;
        }
        content.getChildren().setAll(
                group("Liquid", box(liquid, rows(RailModel.Group.LIQUID), more(RailModel.Group.PROPERTIES))),
                group("Geometry", rows(RailModel.Group.GEOMETRY)),
                group("Duty", box(rows(RailModel.Group.DUTY), choices(), more(RailModel.Group.QUESTIONS))),
                group("Limits", limits));
    }

    private static VBox group(String title, Node content) {
        Label head = Parts.label(title, Mark.GROUP);
        head.setMaxWidth(Double.MAX_VALUE);
        return new VBox(6, head, content);
    }

    private static VBox box(Node... nodes) {
        VBox box = new VBox(8);
        for (Node node : nodes) {
            if (!(node instanceof VBox inner) || !inner.getChildren().isEmpty() || inner == nodes[0]) {
                box.getChildren().add(node);
            }
        }
        return box;
    }

    private Button all() {
        Button all = new Button("All settings");
        all.setId("all-settings");
        all.setMaxWidth(Double.MAX_VALUE);
        all.setOnAction(e -> model.startingProperty().set(false));
        return all;
    }

    private VBox rows(RailModel.Group group) {
        return rows(model.fields(group));
    }

    private VBox rows(List<FieldModel> fields) {
        VBox box = new VBox(8);
        for (FieldModel field : fields) {
            FieldView view = new FieldView(field);
            views.put(field.setting().key(), view);
            box.getChildren().add(view);
        }
        return box;
    }

    private Node more(RailModel.Group group) {
        List<FieldModel> fields = model.fields(group);
        if (fields.isEmpty()) {
            return new VBox();
        }
        LazyPane pane = new LazyPane(group.title(), () -> rows(fields));
        pane.setId("more-" + group.name().toLowerCase(java.util.Locale.ROOT));
        fields.forEach(f -> folded.put(f.setting().key(), pane));
        return pane;
    }

    private VBox choices() {
        VBox box = new VBox(8);
        model.choices().forEach(c -> box.getChildren().add(choice(c)));
        return box;
    }

    private static Node choice(ChoiceModel own) {
        Choice choice = own.choice();
        ComboBox<Choice.Option> combo = new ComboBox<>();
        combo.setId("choice-" + choice.key());
        combo.setMaxWidth(Double.MAX_VALUE);
        combo.getItems().setAll(choice.options());
        combo.setConverter(Words.of(Choice.Option::name));
        combo.setAccessibleText(choice.name());
        Label name = Parts.label(choice.name(), Mark.NAME);
        name.setLabelFor(combo);
        Parts.tip(name, () -> choice.help());
        combo.valueProperty().bindBidirectional(own.optionProperty());
        Label badge = Parts.label("", Mark.BADGE);
        badge.textProperty().bind(own.badgeProperty());
        HBox head = new HBox(5, name, Parts.spring(), badge);
        return new VBox(2, head, combo);
    }
}
