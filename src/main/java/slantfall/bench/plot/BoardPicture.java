package slantfall.bench.plot;

import java.util.function.Consumer;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Pane;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Setting;
import slantfall.declare.Value;
import slantfall.figure.Board;
import slantfall.figure.Handle;
import slantfall.figure.Holds;
import slantfall.figure.Palette;
import slantfall.figure.Rect;
import slantfall.figure.Scene;
import slantfall.session.Hold;

/** The board on a canvas: draws each assessment, lets handles be dragged and reads values under the pointer. */
final class BoardPicture extends Pane {

    private static final double REACH = 11;

    private final Canvas canvas = new Canvas();
    private final CanvasPen pen = new CanvasPen(canvas.getGraphicsContext2D());
    private final Holds holds = new Holds();
    private final Desk desk;
    private final Consumer<String> tell;
    private Palette palette = Palette.LIGHT;
    private double cursor = Double.NaN;
    private Board.Drawn drawn;
    private Handle dragged;
    private Object gesture;
    private String arrangement = "";

    /**
     * A board of a desk.
     *
     * @param tell receives what a drag means or why it cannot be followed; empty when there is nothing to say
     */
    BoardPicture(Desk desk, Consumer<String> tell) {
        super();
        this.desk = desk;
        this.tell = tell;
        setId("board");
        setMinSize(200, 160);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        getChildren().add(canvas);
        canvas.widthProperty().bind(widthProperty());
        canvas.heightProperty().bind(heightProperty());
        canvas.widthProperty().addListener((o, a, b) -> draw());
        canvas.heightProperty().addListener((o, a, b) -> draw());
        setOnMouseMoved(this::moved);
        setOnMouseExited(e -> read(Double.NaN));
        setOnMousePressed(this::pressed);
        setOnMouseDragged(this::drag);
        setOnMouseReleased(e -> release());
    }

    /** Draws what an assessment says. */
    void show(Assessment assessment) {
        if (!assessment.setUp().arrangement().equals(arrangement)) {
            arrangement = assessment.setUp().arrangement();
            holds.clear();
        }
        draw();
    }

    /** Takes the colours of a palette. */
    void colour(Palette changed) {
        palette = changed;
        pen.colour(changed);
        draw();
    }

    /** The colours it is drawn in. */
    Palette palette() {
        return palette;
    }

    /** The scene as it is shown now, for saving. */
    Scene scene() {
        return new Scene(desk.assessment(), desk.unitsProperty().get(), holds, cursor);
    }

    /** What was drawn last, for tests and for the keyboard. */
    Board.Drawn drawn() {
        return drawn;
    }

    private void draw() {
        double w = canvas.getWidth();
        double h = canvas.getHeight();
        if (w < 10 || h < 10) {
            return;
        }
        pen.clear(w, h);
        drawn = Board.draw(pen, new Rect(0, 0, w, h), scene());
        setAccessibleText(Board.words(scene()));
    }

    private void moved(MouseEvent e) {
        Handle over = drawn == null ? null : drawn.at(e.getX(), e.getY(), REACH);
        setCursor(over == null ? Cursor.DEFAULT : Cursor.OPEN_HAND);
        tell.accept(over == null ? "" : "Drag: " + over.name());
        boolean inside = drawn != null && drawn.reading() != null && drawn.reading().contains(e.getX(), e.getY());
        read(inside ? drawn.frame().distance(e.getY()) : Double.NaN);
    }

    private void read(double at) {
        if (Double.compare(at, cursor) != 0) {
            cursor = at;
            draw();
        }
    }

    private void pressed(MouseEvent e) {
        requestFocus();
        dragged = drawn == null ? null : drawn.at(e.getX(), e.getY(), REACH);
        if (dragged != null) {
            gesture = new Object();
            holds.setDragging(true);
            setCursor(Cursor.CLOSED_HAND);
        }
    }

    private void drag(MouseEvent e) {
        if (dragged == null) {
            return;
        }
        // The handle's own picture moves with the drag; what a position means is taken from the newest one.
        Handle now = drawn.handles().stream()
                .filter(h -> h.key().equals(dragged.key()) && h.by().equals(dragged.by()))
                .findFirst()
                .orElse(dragged);
        double value = now.value().at(e.getX(), e.getY());
        String key = now.dragsReading() ? now.by() : now.key();
        double answer = now.dragsReading()
                ? Hold.solve(desk.session().arrangement(), desk.session().current(), now.key(), value, now.by())
                : value;
        if (Double.isNaN(answer)) {
            tell.accept(now.name() + " cannot be put there by " + key + " alone.");
            return;
        }
        set(key, answer, now.name());
    }

    private void set(String key, double value, String name) {
        Setting setting = desk.declaration().setting(key).orElse(null);
        if (setting == null) {
            return;
        }
        double clamped = setting.possible().clamp(value);
        boolean open = setting.possible().lowOpen() && clamped <= setting.possible().low();
        if (open) {
            tell.accept(name + " must be more than that.");
            return;
        }
        tell.accept("");
        desk.session().set(key, Value.of(Snap.of(setting, desk.unit(setting, clamped), clamped)), gesture);
    }

    private void release() {
        if (dragged != null) {
            dragged = null;
            holds.setDragging(false);
            desk.session().endGesture();
            setCursor(Cursor.DEFAULT);
            draw();
        }
    }
}
