package slantfall.bench.shell;

import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;

/** The message over the parts, with its answers. */
final class NoticeStrip extends HBox {

    NoticeStrip(Notices notices) {
        super(8);
        setId("notice");
        setAlignment(Pos.CENTER_LEFT);
        getStyleClass().add(Mark.STRIP);
        notices.currentProperty().addListener((o, a, n) -> show(notices, n));
        show(notices, notices.currentProperty().get());
    }

    private void show(Notices notices, Notices.Notice notice) {
        setVisible(notice != null);
        setManaged(notice != null);
        getChildren().clear();
        if (notice == null) {
            return;
        }
        pseudoClassStateChanged(Mark.WRONG, notice.problem());
        Label text = Parts.label((notice.problem() ? "⚠ " : "") + notice.text());
        text.setWrapText(true);
        text.setId("notice-text");
        HBox.setHgrow(text, Priority.ALWAYS);
        text.setMaxWidth(Double.MAX_VALUE);
        getChildren().add(text);
        for (Notices.Answer answer : notice.answers()) {
            getChildren().add(button(answer.words(), answer.action()));
        }
        Button close = button("✕", notices::dismiss);
        close.setAccessibleText("Dismiss the message");
        close.getStyleClass().add("flat");
        getChildren().add(close);
    }

    private static Button button(String words, Runnable action) {
        Button button = new Button(words);
        button.setMinWidth(USE_PREF_SIZE);
        button.getStyleClass().add("small");
        button.setOnAction(e -> action.run());
        return button;
    }
}
