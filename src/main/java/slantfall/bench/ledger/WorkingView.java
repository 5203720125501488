package slantfall.bench.ledger;

import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.declare.Working;
import slantfall.quantity.UnitSystem;

/** The steps behind a number, opened below it. */
final class WorkingView extends VBox {

    WorkingView(Working working, UnitSystem units) {
        super(6);
        getStyleClass().add(Mark.WORKING);
        setId("working-" + working.about());
        for (WorkingText.Lines step : WorkingText.of(working, units)) {
            VBox lines = new VBox(1,
                    wrapped(step.name(), Mark.MUTED),
                    wrapped(step.formula(), "formula"),
                    wrapped("with " + step.terms(), "terms"),
                    wrapped(step.source(), Mark.MUTED));
            getChildren().add(lines);
        }
        Button copy = new Button("Copy working");
        copy.getStyleClass().addAll("small");
        copy.setId("copy-working-" + working.about());
        copy.setOnAction(e -> put(WorkingText.text(working, units)));
        getChildren().add(copy);
    }

    /** Puts text on the clipboard. */
    static void put(String text) {
        ClipboardContent content = new ClipboardContent();
        content.putString(text);
        Clipboard.getSystemClipboard().setContent(content);
    }

    private static Label wrapped(String text, String style) {
        Label label = Parts.label(text, style);
        label.setWrapText(true);
        return label;
    }
}
