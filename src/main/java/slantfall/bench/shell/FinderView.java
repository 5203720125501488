package slantfall.bench.shell;

import java.util.function.Consumer;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;

/** Ctrl+F: type a part of a name, press Enter, be there. */
final class FinderView extends VBox {

    private final TextField text = new TextField();
    private final ListView<FinderModel.Hit> hits = new ListView<>();
    private final Consumer<FinderModel.Hit> go;

    FinderView(FinderModel model, Consumer<FinderModel.Hit> go) {
        super(6);
        this.go = go;
        getStyleClass().add(Mark.FINDER);
        setId("finder");
        text.setId("finder-text");
        text.setPromptText("Find a setting, reading or check");
        text.setAccessibleText("Find a setting, reading or check");
        hits.setId("finder-hits");
        hits.setPrefHeight(260);
        hits.setCellFactory(v -> new HitCell());
        hits.setAccessibleText("What was found");
        setMaxSize(460, Region.USE_PREF_SIZE);
        text.textProperty().addListener((o, a, typed) -> {
            hits.getItems().setAll(model.find(typed));
            hits.getSelectionModel().selectFirst();
        });
        addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        hits.setOnMouseClicked(e -> goTo());
        getChildren().addAll(text, hits);
        hits.getItems().setAll(model.find(""));
        close();
    }

    void open() {
        setVisible(true);
        setManaged(true);
        text.setText("");
        text.requestFocus();
    }

    void close() {
        setVisible(false);
        setManaged(false);
    }

    private void key(KeyEvent e) {
        if (e.getCode() == KeyCode.ESCAPE) {
            close();
            e.consume();
        } else if (e.getCode() == KeyCode.ENTER) {
            goTo();
            e.consume();
        } else if (e.getCode() == KeyCode.DOWN || e.getCode() == KeyCode.UP) {
            int step = e.getCode() == KeyCode.DOWN ? 1 : -1;
            int next = hits.getSelectionModel().getSelectedIndex() + step;
            hits.getSelectionModel().select(Math.max(0, Math.min(hits.getItems().size() - 1, next)));
            hits.scrollTo(hits.getSelectionModel().getSelectedIndex());
            e.consume();
        }
    }

    private void goTo() {
        FinderModel.Hit hit = hits.getSelectionModel().getSelectedItem();
        if (hit != null) {
            close();
            go.accept(hit);
        }
    }

    /** Name, symbol, and what it is. */
    private static final class HitCell extends ListCell<FinderModel.Hit> {

        @Override
        protected void updateItem(FinderModel.Hit hit, boolean empty) {
            super.updateItem(hit, empty);
            if (empty || hit == null) {
                setGraphic(null);
                setText(null);
                return;
            }
            Label sort = Parts.label(hit.sort().word(), Mark.MUTED);
            setGraphic(new HBox(6, Parts.label(hit.name()), Parts.symbol(hit.symbol()), Parts.spring(), sort));
            setAccessibleText(hit.name() + ", " + hit.sort().word());
        }
    }
}
