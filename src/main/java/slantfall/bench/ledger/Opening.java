package slantfall.bench.ledger;

import java.util.function.Supplier;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** A row that a click or the space bar opens; what is inside is made when it opens. */
final class Opening extends VBox {

    private final Region head;
    private final Supplier<Node> inside;
    private final boolean numbers;

    /**
     * A row.
     *
     * @param numbers whether the inside holds numbers that are written anew when they change
     */
    Opening(Region head, boolean numbers, Supplier<Node> inside) {
        super(4, head);
        this.head = head;
        this.numbers = numbers;
        this.inside = inside;
        head.setFocusTraversable(true);
        head.setAccessibleRole(AccessibleRole.BUTTON);
        head.getStyleClass().add("opening");
        head.setOnMouseClicked(e -> {
            if (e.getButton() == MouseButton.PRIMARY && e.isStillSincePress()) {
                head.requestFocus();
                toggle();
            }
        });
        head.setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.SPACE || e.getCode() == KeyCode.ENTER) {
                toggle();
                e.consume();
            }
        });
    }

    boolean isOpen() {
        return getChildren().size() > 1;
    }

    void toggle() {
        if (isOpen()) {
            getChildren().remove(1);
        } else {
            getChildren().add(inside.get());
        }
    }

    void open() {
        if (!isOpen()) {
            toggle();
        }
    }

    /** Makes the inside anew while it is open: its numbers have changed. */
    void renew() {
        if (numbers && isOpen()) {
            getChildren().set(1, inside.get());
        }
    }

    Region head() {
        return head;
    }
}
