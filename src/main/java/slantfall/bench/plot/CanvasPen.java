package slantfall.bench.plot;

import java.util.EnumMap;
import java.util.Map;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;
import slantfall.figure.Ink;
import slantfall.figure.Pen;
import slantfall.figure.Rect;

/** Draws a figure on the screen. */
final class CanvasPen implements Pen {

    private static final double[] BROKEN = {4, 3};
    private static final String FAMILY = Font.getDefault().getFamily();

    private final GraphicsContext g;
    private final Map<Ink, Color> colours = new EnumMap<>(Ink.class);
    private final Text measure = new Text();

    /**
     * A pen.
     *
     * @param palette a colour for every ink
     */
    CanvasPen(GraphicsContext g, Map<Ink, String> palette) {
        this.g = g;
        palette.forEach((ink, colour) -> colours.put(ink, Color.web(colour)));
        g.setLineCap(StrokeLineCap.BUTT);
        g.setLineJoin(StrokeLineJoin.ROUND);
    }

    /** Begins a picture anew. */
    void blank(double width, double height) {
        g.setFill(colours.get(Ink.PAPER));
        g.fillRect(0, 0, width, height);
    }

    private void take(Stroke stroke) {
        g.setStroke(colours.get(stroke.ink()));
        g.setLineWidth(stroke.width());
        g.setLineDashes(stroke.dashed() ? BROKEN : null);
    }

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        take(stroke);
        boolean sharp = stroke.width() <= 1;
        if (sharp && x1 == x2) {
            double x = Math.floor(x1) + 0.5;
            g.strokeLine(x, y1, x, y2);
        } else if (sharp && y1 == y2) {
            double y = Math.floor(y1) + 0.5;
            g.strokeLine(x1, y, x2, y);
        } else {
            g.strokeLine(x1, y1, x2, y2);
        }
    }

    @Override
    public void polyline(Stroke stroke, double[] x, double[] y, int n) {
        take(stroke);
        g.strokePolyline(x, y, n);
    }

    @Override
    public void area(Ink ink, double opacity, double[] x, double[] y, int n) {
        g.setGlobalAlpha(opacity);
        g.setFill(colours.get(ink));
        g.fillPolygon(x, y, n);
        g.setGlobalAlpha(1);
    }

    @Override
    public void disc(Ink ink, double x, double y, double radius, boolean filled) {
        g.setFill(colours.get(filled ? ink : Ink.PAPER));
        g.setStroke(colours.get(filled ? Ink.PAPER : ink));
        g.setLineWidth(1.5);
        g.setLineDashes((double[]) null);
        g.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
        g.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
    }

    @Override
    public void text(Lettering l, String text, double x, double y) {
        g.setFont(font(l));
        g.setFill(colours.get(l.ink()));
        g.setTextAlign(l.anchor() < 0 ? TextAlignment.LEFT : l.anchor() > 0 ? TextAlignment.RIGHT : TextAlignment.CENTER);
        if (l.turn() == 0) {
            g.fillText(text, x, y);
            return;
        }
        g.save();
        g.translate(x, y);
        g.rotate(-l.turn());
        g.fillText(text, 0, 0);
        g.restore();
    }

    @Override
    public double width(Lettering l, String text) {
        measure.setFont(font(l));
        measure.setText(text);
        return measure.getLayoutBounds().getWidth();
    }

    private static Font font(Lettering l) {
        return Font.font(FAMILY, l.bold() ? FontWeight.BOLD : FontWeight.NORMAL, l.size());
    }

    @Override
    public void clip(Rect rect) {
        g.save();
        g.beginPath();
        g.rect(rect.x(), rect.y(), rect.w(), rect.h());
        g.clip();
    }

    @Override
    public void unclip() {
        g.restore();
    }
}
