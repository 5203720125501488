package slantfall.bench.form;

import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.geometry.Side;
import javafx.scene.AccessibleAttribute;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ContextMenu;
import javafx.scene.control.Label;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.quantity.Need;
import slantfall.quantity.Unit;

/** One number: name and standing, slider, field, unit, and below them what was understood or what is wrong. */
final class FieldView extends VBox {

    private static final double FIELD = 122;
    private static final double UNIT = 78;

    private final FieldModel model;
    private final Slider slider = new Slider(0, 1, 0);
    private final TextField field = new TextField();
    private final Button unit = new Button();
    private final Button back = new Button("↺");
    private final Label badge = Parts.label("", Mark.BADGE);
    private Object gesture;
    private boolean showing;

    FieldView(FieldModel model) {
        super(2);
        this.model = model;
        getStyleClass().add("field-row");
        getChildren().addAll(head(), controls(), Parts.line(model.echoProperty(), Mark.ECHO), wrong());
        wireSlider();
        wireField();
        wireUnit();
        model.standingProperty().addListener((o, a, b) -> showStanding());
        showStanding();
        String key = model.setting().key();
        setId("row-" + key);
        slider.setId("slider-" + key);
        field.setId("field-" + key);
        unit.setId("unit-" + key);
        back.setId("back-" + key);
    }

    /** Puts the keyboard into the field. */
    void focusField() {
        field.requestFocus();
        field.selectAll();
    }

    FieldModel model() {
        return model;
    }

    private HBox head() {
        Label name = Parts.label(model.setting().name(), Mark.NAME);
        name.setLabelFor(field);
        Parts.tip(name, () -> model.setting().help());
        badge.textProperty().bind(model.badgeProperty());
        Parts.tip(badge, () -> model.originProperty().get());
        back.setOnAction(e -> model.release());
        back.getStyleClass().addAll("flat", "back");
        back.setAccessibleText("Give " + model.setting().name() + " back to its default or correlation");
        Parts.tip(back, () -> "Back to its default or correlation");
        HBox head = new HBox(5, name, Parts.symbol(model.setting().symbol()), Parts.spring(), badge, back);
        head.setAlignment(Pos.BASELINE_LEFT);
        return head;
    }

    private HBox controls() {
        HBox.setHgrow(slider, Priority.ALWAYS);
        slider.setMinWidth(60);
        field.setPrefWidth(FIELD);
        field.setMinWidth(FIELD);
        field.getStyleClass().add("number-field");
        unit.setPrefWidth(UNIT);
        unit.setMinWidth(UNIT);
        HBox controls = new HBox(6, slider, field, unit);
        controls.setAlignment(Pos.CENTER_LEFT);
        return controls;
    }

    private Label wrong() {
        Label wrong = Parts.line(model.problemProperty(), Mark.PROBLEM);
        wrong.setId("problem-" + model.setting().key());
        wrong.setMinHeight(Region.USE_PREF_SIZE);
        model.problemProperty().addListener((o, a, text) -> {
            field.pseudoClassStateChanged(Mark.WRONG, !text.isEmpty());
            field.notifyAccessibleAttributeChanged(AccessibleAttribute.TEXT);
        });
        return wrong;
    }

    private void showStanding() {
        Standing standing = model.standingProperty().get();
        boolean hollow = standing == Standing.DEFAULT || standing == Standing.MISSING || standing == Standing.UNUSED;
        for (Node node : List.of(field, slider, badge)) {
            for (Standing each : Standing.values()) {
                node.pseudoClassStateChanged(Mark.state(each.style()), each == standing);
            }
            node.pseudoClassStateChanged(Mark.HOLLOW, hollow);
        }
        back.setVisible(!model.released());
        back.setManaged(!model.released());
        slider.setDisable(standing == Standing.MISSING || standing == Standing.UNUSED);
    }

    private void wireSlider() {
        slider.setValue(model.positionProperty().get());
        model.positionProperty().addListener((o, a, position) -> {
            showing = true;
            slider.setValue(position.doubleValue());
            showing = false;
        });
        slider.addEventFilter(MouseEvent.MOUSE_PRESSED, e -> gesture = new Object());
        slider.addEventFilter(MouseEvent.MOUSE_RELEASED, e -> {
            model.endGesture();
            gesture = null;
            slider.setValue(model.positionProperty().get());
        });
        slider.valueProperty().addListener((o, a, value) -> {
            if (!showing && gesture != null) {
                model.slide(value.doubleValue(), gesture);
            }
        });
        slider.addEventFilter(KeyEvent.KEY_PRESSED, e -> nudge(e, true));
        slider.focusedProperty().addListener((o, a, focused) -> endRun(focused));
        slider.accessibleTextProperty().bind(model.spokenProperty());
    }

    private void wireField() {
        field.textProperty().bindBidirectional(model.textProperty());
        field.setOnAction(e -> {
            model.commit();
            field.selectAll();
        });
        field.addEventFilter(KeyEvent.KEY_PRESSED, e -> {
            nudge(e, false);
            if (e.getCode() == KeyCode.ESCAPE) {
                model.restore();
                field.selectAll();
                e.consume();
            }
        });
        field.focusedProperty().addListener((o, a, focused) -> {
            endRun(focused);
            if (!focused) {
                model.commit();
            }
        });
        field.accessibleTextProperty().bind(model.spokenProperty());
        field.accessibleHelpProperty().bind(model.problemProperty());
        field.setPromptText("not known");
        Parts.tip(field, model::exact);
    }

    private void endRun(boolean focused) {
        if (!focused) {
            model.endGesture();
        }
    }

    private void nudge(KeyEvent e, boolean sideways) {
        int direction = switch (e.getCode()) {
            case UP -> 1;
            case DOWN -> -1;
            case RIGHT -> sideways ? 1 : 0;
            case LEFT -> sideways ? -1 : 0;
            default -> 0;
        };
        if (direction == 0 || e.isShortcutDown()) {
            return;
        }
        double factor = e.isShiftDown() ? 10 : e.isAltDown() ? 0.1 : 1;
        model.nudge(direction, factor, "keys " + model.setting().key());
        e.consume();
    }

    private void wireUnit() {
        model.unitProperty().addListener((o, a, u) -> showUnit(u));
        showUnit(model.unitProperty().get());
        unit.getStyleClass().add("unit-button");
        unit.setGraphic(Parts.label("▾", Mark.MUTED));
        unit.setVisible(model.setting().kind().units().size() > 1);
        unit.setOnAction(e -> openUnits());
    }

    /** The menu is made when it is asked for: one for each field at the start would hold it up. */
    private void openUnits() {
        ContextMenu menu = new ContextMenu();
        menu.getItems().setAll(meanings());
        menu.show(unit, Side.BOTTOM, 0, 0);
    }

    private void showUnit(Unit u) {
        unit.setText(u.label());
        unit.setAccessibleText("Unit of " + model.setting().name() + ": " + u.label() + ". Opens other units.");
    }

    private List<MenuItem> meanings() {
        List<MenuItem> items = new ArrayList<>();
        String kind = model.setting().kind().words();
        for (Unit other : model.setting().kind().units()) {
            if (other.need() != Need.NONE || other.symbol().equals(model.unitProperty().get().symbol())) {
                continue;
            }
            String words = other.label() + (other.note().isEmpty() ? "" : " (" + other.note() + ")");
            MenuItem show = new MenuItem("show in " + other.label() + " (same " + kind + ")");
            show.setOnAction(e -> model.showIn(other));
            MenuItem meant = new MenuItem("I meant " + other.label() + " (same number)");
            meant.setOnAction(e -> model.meant(other));
            Menu menu = new Menu(words, null, show, meant);
            items.add(menu);
        }
        return items;
    }
}
