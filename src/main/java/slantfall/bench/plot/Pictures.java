package slantfall.bench.plot;

import java.util.List;
import javafx.scene.Node;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.quantity.UnitSystem;

/** The pictures of the open set-up, one above the other. */
public final class Pictures extends VBox {

    private final List<Picture> pictures;

    /** Follows a desk. */
    public Pictures(Desk desk) {
        super(6);
        setId("pictures");
        getStyleClass().addAll(Mark.PART, "pictures");
        pictures = List.of(new TraversePicture());
        for (Picture picture : pictures) {
            VBox.setVgrow(picture.node(), Priority.ALWAYS);
            getChildren().add(picture.node());
        }
        desk.follow(a -> pictures.forEach(p -> p.show(a, desk.unitsProperty().get())));
    }

    /** A small picture of an arrangement in its initial state. */
    public Node card(Assessment assessment) {
        Picture picture = new TraversePicture();
        Region node = picture.node();
        node.setPrefSize(250, 150);
        node.setMouseTransparent(true);
        picture.show(assessment, UnitSystem.SI);
        return node;
    }

    /** Puts the keyboard into the first picture. */
    public void focusFirst() {
        pictures.get(0).node().requestFocus();
    }
}
