package slantfall.bench.shell;

import java.util.function.Consumer;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Headline;
import slantfall.declare.Verdict;

/** The sentence over everything; a click opens the row that it is about. */
final class HeadlineView extends HBox {

    private final Label verdict = Parts.label("", "verdict");
    private final Label sentence = Parts.label("");
    private String about = "";

    HeadlineView(Desk desk, Consumer<String> open) {
        super(10);
        setId("headline");
        setAlignment(Pos.CENTER_LEFT);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.BUTTON);
        getStyleClass().add(Mark.HEADLINE);
        verdict.setMinWidth(USE_PREF_SIZE);
        sentence.setWrapText(true);
        sentence.setId("headline-sentence");
        HBox.setHgrow(sentence, Priority.ALWAYS);
        getChildren().addAll(verdict, sentence);
        setOnMouseClicked(e -> open(open));
        setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.ENTER || e.getCode() == KeyCode.SPACE) {
                open(open);
                e.consume();
            }
        });
        desk.follow(this::show);
    }

    private void open(Consumer<String> open) {
        if (!about.isEmpty()) {
            open.accept(about);
        }
    }

    private void show(Assessment assessment) {
        Headline headline = Headline.of(assessment);
        about = headline.about();
        verdict.setText(headline.verdict().shape() + " " + headline.verdict().word());
        for (Verdict v : Verdict.values()) {
            verdict.pseudoClassStateChanged(Mark.state(v.word()), v == headline.verdict());
            pseudoClassStateChanged(Mark.state(v.word()), v == headline.verdict());
        }
        sentence.setText(headline.sentence());
        setAccessibleText(headline.verdict().word() + ". " + headline.sentence());
    }
}
