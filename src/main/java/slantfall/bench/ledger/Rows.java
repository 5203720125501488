package slantfall.bench.ledger;

import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.declare.Verdict;

/** How rows of the ledger look. */
final class Rows {

    private static final double NUMBER = 74;
    private static final double UNIT = 58;
    private static final double VERDICT = 80;

    private Rows() {}

    static HBox reading(ReadingRow row) {
        Label name = Parts.label(Parts.pretty(row.reading().name()), Mark.NAME);
        name.setMinWidth(40);
        name.setWrapText(true);
        HBox.setHgrow(name, Priority.SOMETIMES);
        Label number = fixed(row.numberProperty(), NUMBER, Pos.CENTER_RIGHT, Mark.VALUE);
        number.setId("reading-" + row.reading().key());
        Label unit = fixed(row.unitProperty(), UNIT, Pos.CENTER_LEFT, Mark.UNIT);
        HBox head = new HBox(6, name, Parts.symbol(row.reading().symbol()), Parts.spring(), number, unit);
        head.setAlignment(Pos.CENTER_LEFT);
        head.getStyleClass().add(Mark.ROW);
        Runnable speak = () -> head.setAccessibleText(row.reading().name() + " " + row.numberProperty().get() + " "
                + row.unitProperty().get() + ", opens its working");
        row.numberProperty().addListener((o, a, b) -> speak.run());
        speak.run();
        return head;
    }

    static Label verdict(ObservableValue<Verdict> verdict) {
        Label label = Parts.label("", "verdict");
        label.setMinWidth(VERDICT);
        label.setPrefWidth(VERDICT);
        show(label, verdict.getValue());
        verdict.addListener((o, a, v) -> show(label, v));
        return label;
    }

    private static void show(Label label, Verdict verdict) {
        label.setText(verdict.shape() + " " + verdict.word());
        for (Verdict v : Verdict.values()) {
            label.pseudoClassStateChanged(Mark.state(v.word()), v == verdict);
        }
    }

    /**
     * A check.
     *
     * @param regime whether crossing it is a change of manner and no failure
     */
    static VBox check(CheckRow row, boolean regime) {
        Label name = Parts.label("", Mark.NAME);
        name.textProperty().bind(row.nameProperty());
        name.setWrapText(true);
        Label margin = Parts.label("", "margin");
        margin.textProperty().bind(row.marginProperty());
        margin.setMinWidth(Region.USE_PREF_SIZE);
        Label verdict = verdict(row.verdictProperty());
        verdict.pseudoClassStateChanged(Mark.state("regime"), regime);
        HBox first = new HBox(6, verdict, name, Parts.spring(), margin);
        first.setAlignment(Pos.BASELINE_LEFT);
        Label compared = Parts.oneLine(row.comparedProperty(), "compared");
        VBox below = new VBox(1, compared, Parts.line(row.noteProperty(), Mark.MUTED));
        below.getStyleClass().add("below-verdict");
        VBox box = new VBox(1, first, below);
        box.getStyleClass().add(Mark.ROW);
        Runnable speak = () -> box.setAccessibleText(row.nameProperty().get() + ": "
                + row.verdictProperty().get().word() + ", " + row.comparedProperty().get() + ", "
                + row.marginProperty().get());
        row.comparedProperty().addListener((o, a, b) -> speak.run());
        speak.run();
        return box;
    }

    static VBox panel(PanelRow row) {
        Label question = Parts.label(row.panel().question(), Mark.NAME);
        question.setWrapText(true);
        Label verdict = verdict(row.verdictProperty());
        verdict.pseudoClassStateChanged(Mark.state("regime"), row.regime());
        HBox first = new HBox(6, verdict, question);
        first.setAlignment(Pos.BASELINE_LEFT);
        Label phrase = Parts.oneLine(row.phraseProperty(), "phrase");
        Label margin = Parts.oneLine(row.marginProperty(), "margin");
        VBox below = new VBox(1, phrase, margin);
        below.getStyleClass().add("below-verdict");
        VBox box = new VBox(1, first, below);
        box.getStyleClass().add(Mark.ROW);
        Runnable speak = () -> box.setAccessibleText(row.panel().question() + " " + row.phraseProperty().get() + ", "
                + row.marginProperty().get() + ". Opens the authors.");
        row.phraseProperty().addListener((o, a, b) -> speak.run());
        speak.run();
        return box;
    }

    private static Label fixed(ObservableValue<String> text, double width, Pos at, String style) {
        Label label = Parts.label("", style);
        label.textProperty().bind(text);
        label.setMinWidth(width);
        label.setPrefWidth(width);
        label.setAlignment(at);
        return label;
    }
}
