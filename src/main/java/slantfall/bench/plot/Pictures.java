package slantfall.bench.plot;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.SnapshotParameters;
import javafx.scene.transform.Transform;
import javax.imageio.ImageIO;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.Node;
import javafx.scene.canvas.Canvas;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.Pane;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Theme;
import slantfall.bench.model.CursorWords;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.declare.Profile;
import slantfall.declare.Setting;
import slantfall.figure.Board;
import slantfall.figure.Handle;
import slantfall.figure.Holds;
import slantfall.figure.Palette;
import slantfall.figure.Rect;
import slantfall.figure.Scene;
import slantfall.figure.SvgPen;

/** The pictures of the open set-up: what can be dragged is dragged here, and the pointer reads the traverses. */
public final class Pictures extends Pane {

    private static final double REACH = 12;
    private static final int STEPS = 40;

    private final Desk desk;
    private final Theme theme;
    private final Canvas canvas = new Canvas();
    private final Holds holds = new Holds();
    private CanvasPen pen;
    private Board.Drawn drawn;
    private String arrangement = "";
    private String dragged;
    private Object gesture;

    /** Follows a desk. */
    public Pictures(Desk desk, Theme theme) {
        this.desk = desk;
        this.theme = theme;
        setId("pictures");
        getStyleClass().addAll(Mark.PART, "pictures");
        setMinSize(240, 200);
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        getChildren().add(canvas);
        theme.darkProperty().addListener((o, a, b) -> {
            takePen();
            draw();
        });
        takePen();
        desk.follow(this::changed);
        desk.session().onSettled(() -> changed(desk.assessment()));
        desk.cursorProperty().addListener((o, a, b) -> draw());
        wire();
    }

    private void takePen() {
        pen = new CanvasPen(
                canvas.getGraphicsContext2D(), (theme.darkProperty().get() ? Palette.DARK : Palette.LIGHT).colours());
    }

    @Override
    protected void layoutChildren() {
        if (canvas.getWidth() != getWidth() || canvas.getHeight() != getHeight()) {
            canvas.setWidth(getWidth());
            canvas.setHeight(getHeight());
            draw();
        }
    }

    /** A small picture of an arrangement in its initial state. */
    public Node card(Assessment assessment) {
        Canvas small = new Canvas(240, 130);
        Runnable paint = () -> {
            Palette palette = theme.darkProperty().get() ? Palette.DARK : Palette.LIGHT;
            CanvasPen own = new CanvasPen(small.getGraphicsContext2D(), palette.colours());
            own.blank(small.getWidth(), small.getHeight());
            Board.card(own, new Rect(0, 0, small.getWidth(), small.getHeight()),
                    Scene.still(assessment, desk.unitsProperty().get()));
        };
        theme.darkProperty().addListener((o, a, b) -> paint.run());
        paint.run();
        return small;
    }

    /**
     * Saves what is shown: as SVG in the colours of paper, or as PNG at twice the size if the name ends so.
     *
     * @throws UncheckedIOException if it cannot be written
     */
    public void save(Path path) {
        try {
            if (path.toString().toLowerCase(Locale.ROOT).endsWith(".png")) {
                SnapshotParameters twice = new SnapshotParameters();
                twice.setTransform(Transform.scale(2, 2));
                BufferedImage image = SwingFXUtils.fromFXImage(canvas.snapshot(twice, null), null);
                ImageIO.write(image, "png", path.toFile());
            } else {
                SvgPen svg = new SvgPen(canvas.getWidth(), canvas.getHeight(), Palette.PAPER.colours());
                Board.draw(svg, area(), scene());
                Files.writeString(path, svg.text());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(path.getFileName() + " cannot be written; choose another folder.", e);
        }
    }

    private Rect area() {
        return new Rect(8, 4, canvas.getWidth() - 16, canvas.getHeight() - 12);
    }

    private Scene scene() {
        return new Scene(desk.assessment(), desk.unitsProperty().get(), holds, desk.cursorProperty().get());
    }

    /** Puts the keyboard here. */
    public void focusFirst() {
        requestFocus();
    }

    /** What was drawn last. */
    public Board.Drawn drawn() {
        return drawn;
    }

    private void changed(Assessment assessment) {
        if (!arrangement.equals(assessment.declaration().key())) {
            arrangement = assessment.declaration().key();
            holds.clear();
        }
        // A slider of the rail that is dragged holds the axes still as a handle does.
        holds.setDragging(dragged != null || desk.session().inGesture());
        draw();
    }

    private void draw() {
        double w = canvas.getWidth();
        double h = canvas.getHeight();
        if (w < 50 || h < 50) {
            return;
        }
        pen.blank(w, h);
        drawn = Board.draw(pen, area(), scene());
        setAccessibleText("Layout, close-up and traverses. " + CursorWords.of(desk));
    }

    private void wire() {
        addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> {
            if (dragged == null) {
                desk.cursorProperty().set(Double.NaN);
            }
        });
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, this::drag);
        addEventHandler(MouseEvent.MOUSE_RELEASED, e -> release());
        addEventHandler(KeyEvent.KEY_PRESSED, this::key);
    }

    private void hover(MouseEvent e) {
        Handle handle = drawn == null ? null : drawn.at(e.getX(), e.getY(), REACH);
        setCursor(handle == null ? Cursor.DEFAULT : Cursor.OPEN_HAND);
        read(e.getX(), e.getY());
    }

    private void read(double x, double y) {
        boolean inside = drawn != null && drawn.reading() != null && drawn.reading().contains(x, y);
        desk.cursorProperty().set(inside ? drawn.frame().distance(y) : Double.NaN);
    }

    private void press(MouseEvent e) {
        requestFocus();
        Handle handle = drawn == null ? null : drawn.at(e.getX(), e.getY(), REACH);
        if (handle != null) {
            dragged = handle.key();
            gesture = new Object();
            holds.setDragging(true);
            desk.cursorProperty().set(Double.NaN);
            setCursor(Cursor.CLOSED_HAND);
        }
    }

    private void drag(MouseEvent e) {
        if (dragged == null) {
            read(e.getX(), e.getY());
            return;
        }
        drawn.handles().stream()
                .filter(h -> h.key().equals(dragged))
                .findFirst()
                .ifPresent(h -> pull(h, h.value().at(e.getX(), e.getY())));
    }

    private void pull(Handle handle, double value) {
        String key = handle.dragsReading() ? handle.by() : handle.key();
        Setting setting = desk.declaration().setting(key).orElseThrow();
        double wanted = handle.dragsReading()
                ? Pull.answer(desk, handle.key(), value, setting).orElse(Double.NaN)
                : setting.possible().clamp(value);
        if (!Double.isNaN(wanted)) {
            desk.moveNear(setting, wanted, gesture);
        }
    }

    private void release() {
        if (dragged != null) {
            dragged = null;
            gesture = null;
            holds.setDragging(false);
            desk.session().endGesture();
            setCursor(Cursor.DEFAULT);
            draw();
        }
    }

    /** Up and down move the reading line; Escape takes it away. */
    private void key(KeyEvent e) {
        Profile profile = desk.assessment().profiles().traverses();
        if (e.getCode() == KeyCode.ESCAPE) {
            desk.cursorProperty().set(Double.NaN);
        } else if ((e.getCode() == KeyCode.UP || e.getCode() == KeyCode.DOWN) && !profile.columns().isEmpty()) {
            double[] y = profile.axis().values();
            double top = y[y.length - 1];
            double now = desk.cursorProperty().get();
            double step = (e.getCode() == KeyCode.UP ? top : -top) / STEPS * (e.isShiftDown() ? 10 : 1);
            double next = Double.isNaN(now) ? top / 2 : Math.max(0, Math.min(top, now + step));
            desk.cursorProperty().set(next);
            e.consume();
        }
    }
}
