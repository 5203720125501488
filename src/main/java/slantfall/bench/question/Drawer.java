package slantfall.bench.question;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.HBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.bench.model.Desk;

/**
 * The questions as a row of buttons at the foot of the window; the one that is asked opens above its button and takes at
 * most 45 % of the window's height.
 */
public final class Drawer extends BorderPane {

    private static final double HEIGHT = 240;
    private static final double MOST = 0.45;

    private final Desk desk;
    private final BorderPane answer = new BorderPane();
    private Question asked;

    /** A drawer of questions. */
    public Drawer(Desk desk, List<Question> questions) {
        super();
        this.desk = desk;
        setId("drawer");
        getStyleClass().addAll(Mark.PART, "drawer");
        HBox bar = new HBox(6, Parts.label("Ask:", Mark.MUTED));
        bar.setAlignment(Pos.CENTER_LEFT);
        bar.getStyleClass().add("drawer-bar");
        for (Question question : questions) {
            ToggleButton button = new ToggleButton(question.words());
            button.setId("ask-" + question.key());
            button.getStyleClass().addAll("small", "flat");
            button.setAccessibleText("Ask: " + question.words());
            button.selectedProperty().addListener((o, a, on) -> ask(on ? question : null, question));
            bar.getChildren().add(button);
        }
        setBottom(bar);
        desk.follow(a -> {
            if (asked != null) {
                asked.show(a);
            }
        });
    }

    private void ask(Question next, Question toggled) {
        if (next == null && asked != toggled) {
            return;
        }
        asked = next;
        if (next == null) {
            setCenter(null);
            return;
        }
        double room = getScene() == null ? HEIGHT : MOST * getScene().getHeight();
        answer.setPrefHeight(Math.min(HEIGHT, room));
        answer.setCenter(next.node());
        setCenter(answer);
        next.show(desk.assessment());
    }
}
