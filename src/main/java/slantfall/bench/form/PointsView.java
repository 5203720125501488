package slantfall.bench.form;

import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextArea;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.quantity.Kind;
import slantfall.quantity.Need;
import slantfall.quantity.Unit;

/** Takes viscosities measured at several temperatures, pasted from a table, and says which law runs through them. */
final class PointsView extends VBox {

    private final LiquidModel model;
    private final TextArea table = new TextArea();
    private final ComboBox<Unit> temperature = units(Kind.TEMPERATURE, "degC");
    private final ComboBox<Unit> viscosity = units(Kind.VISCOSITY, "mPa s");
    private final Label problem = Parts.label("", Mark.PROBLEM);

    PointsView(LiquidModel model) {
        super(6);
        this.model = model;
        setId("points");
        table.setId("points-table");
        table.setPrefRowCount(5);
        table.setPromptText("20 °C   7.5 Pa s\n40 °C   1.2 Pa s");
        table.setAccessibleText("Measured points: temperature and viscosity, one point a line");
        table.setText(model.pointsAsTyped());
        Button take = new Button("Take these points");
        take.setId("points-take");
        take.setOnAction(e -> take());
        Button drop = new Button("Drop the points");
        drop.setId("points-drop");
        drop.setOnAction(e -> {
            model.dropPoints();
            table.clear();
            say("");
        });
        problem.setWrapText(true);
        problem.setId("points-problem");
        say("");
        HBox columns = new HBox(6, Parts.label("without a unit:", Mark.MUTED), temperature, viscosity);
        columns.setAlignment(Pos.CENTER_LEFT);
        getChildren().addAll(table, columns, new HBox(6, take, drop), problem, Parts.line(model.fitProperty(), Mark.ECHO));
    }

    private void take() {
        try {
            model.takePoints(table.getText(), temperature.getValue().symbol(), viscosity.getValue().symbol());
            say("");
        } catch (RuntimeException e) {
            say(e.getMessage());
        }
    }

    private void say(String text) {
        problem.setText(text);
        problem.setManaged(!text.isEmpty());
        problem.setVisible(!text.isEmpty());
    }

    private static ComboBox<Unit> units(Kind kind, String first) {
        ComboBox<Unit> combo = new ComboBox<>();
        combo.setConverter(Words.of(Unit::label));
        kind.units().stream().filter(u -> u.need() == Need.NONE).forEach(combo.getItems()::add);
        combo.setValue(kind.unit(first));
        combo.setAccessibleText("Unit of a " + kind.words() + " that brings none");
        return combo;
    }
}
