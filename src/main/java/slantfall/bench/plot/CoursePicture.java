package slantfall.bench.plot;

import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Pane;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.declare.Assessment;
import slantfall.figure.Figures;
import slantfall.figure.Holds;
import slantfall.figure.Ink;
import slantfall.figure.Palette;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Rect;
import slantfall.figure.Scene;

/** The courses of the open set-up: readings against the distance from the inlet. */
public final class CoursePicture extends Pane {

    private final Desk desk;
    private final Theme theme;
    private final Canvas canvas = new Canvas();
    private final Holds holds = new Holds();
    private String arrangement = "";

    /** Follows a desk when told to. */
    public CoursePicture(Desk desk, Theme theme) {
        super();
        this.desk = desk;
        this.theme = theme;
        setId("courses");
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        getChildren().add(canvas);
        theme.darkProperty().addListener((o, a, b) -> renew());
    }

    @Override
    protected void layoutChildren() {
        if (canvas.getWidth() != getWidth() || canvas.getHeight() != getHeight()) {
            canvas.setWidth(getWidth());
            canvas.setHeight(getHeight());
            renew();
        }
    }

    /** Draws what the newest assessment says. */
    public void renew() {
        double w = canvas.getWidth();
        double h = canvas.getHeight();
        if (w < 50 || h < 50) {
            return;
        }
        Assessment assessment = desk.assessment();
        if (!assessment.declaration().key().equals(arrangement)) {
            arrangement = assessment.declaration().key();
            holds.clear();
        }
        holds.setDragging(desk.session().inGesture());
        Palette palette = theme.darkProperty().get() ? Palette.DARK : Palette.LIGHT;
        CanvasPen pen = new CanvasPen(canvas.getGraphicsContext2D(), palette.colours());
        pen.blank(w, h);
        if (assessment.profiles().courses().columns().isEmpty()) {
            pen.text(Lettering.of(Ink.FAINT, 0), words(assessment), w / 2, h / 2);
        } else {
            Figures.courses(pen, new Rect(8, 4, w - 16, h - 8),
                    new Scene(assessment, desk.unitsProperty().get(), holds, Double.NaN));
        }
        setAccessibleText("Courses from the inlet to the outlet.");
    }

    private static String words(Assessment assessment) {
        return assessment.declaration().name() + ": nothing changes from the inlet to the outlet once it is settled.";
    }
}
