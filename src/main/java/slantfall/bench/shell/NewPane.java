package slantfall.bench.shell;

import java.util.function.Consumer;
import java.util.function.Function;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Declaration;

/** The arrangements as pictures; a click begins a set-up, with nothing more to confirm. */
final class NewPane extends VBox {

    private static final double WIDTH = 280;

    private final FlowPane cards = new FlowPane(16, 16);

    /**
     * A choice of arrangements.
     *
     * @param picture draws an arrangement in its initial state
     */
    NewPane(Function<Arrangement, Node> picture, Function<Arrangement, Declaration> declared, Consumer<String> begin) {
        super(14);
        setId("new-pane");
        getStyleClass().add("new-pane");
        setMaxSize(2 * WIDTH + 90, Region.USE_PREF_SIZE);
        cards.setAlignment(Pos.TOP_LEFT);
        for (Arrangement arrangement : Catalogue.all()) {
            cards.getChildren().add(card(arrangement, declared.apply(arrangement), picture.apply(arrangement), begin));
        }
        getChildren().addAll(Parts.label("What does the liquid run along?", Mark.GROUP), cards);
        addEventFilter(KeyEvent.KEY_PRESSED, e -> {
            if (e.getCode() == KeyCode.ESCAPE) {
                close();
                e.consume();
            }
        });
        close();
    }

    void open() {
        setVisible(true);
        setManaged(true);
        cards.getChildren().get(0).requestFocus();
    }

    void close() {
        setVisible(false);
        setManaged(false);
    }

    private Button card(Arrangement arrangement, Declaration declaration, Node picture, Consumer<String> begin) {
        Label summary = Parts.label(declaration.summary(), Mark.MUTED);
        summary.setWrapText(true);
        VBox inside = new VBox(6, picture, Parts.label(declaration.name(), "card-title"), summary);
        Button card = new Button();
        card.setGraphic(inside);
        card.setPrefWidth(WIDTH);
        card.setId("new-" + arrangement.key());
        card.getStyleClass().add(Mark.CARD);
        card.setAccessibleText(declaration.name() + ". " + declaration.summary());
        card.setOnAction(e -> {
            close();
            begin.accept(arrangement.key());
        });
        return card;
    }
}
