package slantfall.bench.plot;

import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.layout.Pane;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.declare.PanelResult;
import slantfall.figure.LadderFigure;
import slantfall.figure.Palette;
import slantfall.figure.Rect;

/** The rules of one panel on one axis, with the set-up across them. */
public final class LadderPicture extends Pane {

    private final Desk desk;
    private final Theme theme;
    private final String panel;
    private final Canvas canvas = new Canvas();

    /** The ladder of a panel. */
    public LadderPicture(Desk desk, Theme theme, String panel) {
        super();
        this.desk = desk;
        this.theme = theme;
        this.panel = panel;
        setId("ladder-" + panel);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        getChildren().add(canvas);
        setMinWidth(120);
        theme.darkProperty().addListener((o, a, b) -> renew());
        renew();
    }

    @Override
    protected void layoutChildren() {
        if (canvas.getWidth() != getWidth()) {
            renew();
        }
    }

    /** Draws what the newest assessment says; nothing while it is on no screen. */
    public void renew() {
        PanelResult result = desk.assessment().panels().stream()
                .filter(p -> p.panel().key().equals(panel))
                .findFirst()
                .orElse(null);
        if (result == null) {
            return;
        }
        LadderFigure ladder = new LadderFigure(result, desk.unitsProperty().get());
        setPrefHeight(ladder.height());
        setMinHeight(ladder.height());
        setAccessibleText(result.panel().question() + " " + result.phrase());
        if (getScene() == null || getWidth() < 60) {
            return;
        }
        canvas.setWidth(getWidth());
        canvas.setHeight(ladder.height());
        Palette palette = theme.darkProperty().get() ? Palette.DARK : Palette.LIGHT;
        CanvasPen pen = new CanvasPen(canvas.getGraphicsContext2D(), palette.colours());
        pen.blank(getWidth(), ladder.height());
        ladder.draw(pen, new Rect(0, 0, getWidth(), ladder.height()));
    }
}
