package slantfall.bench.plot;

import javafx.beans.property.BooleanProperty;
import javafx.scene.Node;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.figure.Board;
import slantfall.figure.Palette;
import slantfall.figure.Rect;
import slantfall.figure.Scene;
import slantfall.figure.SvgPen;
import slantfall.quantity.UnitSystem;

/** The middle of the window: the board of the open set-up, and a line that says what a drag does. */
public final class Pictures extends VBox {

    private final BoardPicture board;
    private final BooleanProperty dark;

    /** Follows a desk and the looks. */
    public Pictures(Desk desk, BooleanProperty dark) {
        super(2);
        this.dark = dark;
        setId("pictures");
        getStyleClass().addAll(Mark.PART, "pictures");
        Label hint = new Label();
        hint.setId("board-hint");
        hint.getStyleClass().add(Mark.MUTED);
        board = new BoardPicture(desk, hint::setText);
        VBox.setVgrow(board, Priority.ALWAYS);
        getChildren().addAll(board, hint);
        dark.addListener((o, a, b) -> board.colour(palette()));
        board.colour(palette());
        desk.follow(board::show);
    }

    private Palette palette() {
        return dark.get() ? Palette.DARK : Palette.LIGHT;
    }

    /** A small picture of an arrangement in its initial state. */
    public Node card(Assessment assessment) {
        Canvas canvas = new Canvas(250, 150);
        CanvasPen pen = new CanvasPen(canvas.getGraphicsContext2D());
        pen.colour(palette());
        pen.clear(250, 150);
        Board.card(pen, new Rect(0, 0, 250, 150), Scene.still(assessment, UnitSystem.SI));
        StackPane pane = new StackPane(canvas);
        pane.setMouseTransparent(true);
        return pane;
    }

    /** The board as it stands, as SVG in the colours of paper. */
    public String svg() {
        SvgPen pen = new SvgPen(board.getWidth(), board.getHeight(), Palette.PAPER.colours());
        Board.draw(pen, new Rect(0, 0, board.getWidth(), board.getHeight()), board.scene());
        return pen.text();
    }

    /** Puts the keyboard into the board. */
    public void focusFirst() {
        board.requestFocus();
    }
}
