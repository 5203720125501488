package slantfall.bench.form;

import java.util.Optional;
import javafx.scene.control.ComboBox;
import javafx.scene.layout.VBox;
import slantfall.bench.look.LazyPane;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.liquid.Preset;

/** Chooses the liquid. */
final class LiquidView extends VBox {

    LiquidView(LiquidModel model) {
        super(4);
        ComboBox<Optional<Preset>> combo = new ComboBox<>();
        combo.setId("liquid");
        combo.setMaxWidth(Double.MAX_VALUE);
        combo.setAccessibleText("Liquid");
        combo.setConverter(Words.of(p -> p.map(Preset::name).orElse("Measured values alone")));
        combo.getItems().setAll(model.options());
        combo.setOnShowing(e -> {
            Optional<Preset> chosen = combo.getValue();
            if (!combo.getItems().equals(model.options())) {
                combo.getItems().setAll(model.options());
                combo.setValue(chosen);
            }
        });
        combo.valueProperty().bindBidirectional(model.presetProperty());
        LazyPane points = new LazyPane("Viscosity measured at several temperatures", () -> new PointsView(model));
        points.setId("more-points");
        getChildren().addAll(combo, Parts.line(model.noteProperty(), Mark.MUTED), points);
    }
}
