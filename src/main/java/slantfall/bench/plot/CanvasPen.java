package slantfall.bench.plot;

import java.util.EnumMap;
import java.util.Map;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;
import slantfall.figure.Ink;
import slantfall.figure.Palette;
import slantfall.figure.Pen;
import slantfall.figure.Rect;

/** Draws figures on a canvas. */
final class CanvasPen implements Pen {

    private static final double[] DASHES = {4, 3};

    private final GraphicsContext g;
    private final Map<Ink, Color> colours = new EnumMap<>(Ink.class);
    private final Map<Long, Font> fonts = new java.util.HashMap<>();
    private final Text ruler = new Text();

    CanvasPen(GraphicsContext g) {
        this.g = g;
        g.setLineJoin(StrokeLineJoin.ROUND);
        g.setTextBaseline(VPos.BASELINE);
        colour(Palette.LIGHT);
    }

    /** Takes the colours of a palette. */
    void colour(Palette palette) {
        palette.colours().forEach((ink, web) -> colours.put(ink, Color.web(web)));
    }

    /** Clears a picture to paper. */
    void clear(double width, double height) {
        g.setFill(colours.get(Ink.PAPER));
        g.fillRect(0, 0, width, height);
    }

    private void take(Stroke stroke) {
        g.setStroke(colours.get(stroke.ink()));
        g.setLineWidth(stroke.width());
        g.setLineDashes(stroke.dashed() ? DASHES : null);
    }

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        take(stroke);
        // An upright or level hair line is set on the pixel grid, so that it stays sharp.
        boolean hair = stroke.width() <= 1 && (x1 == x2 || y1 == y2);
        double shift = hair ? 0.5 : 0;
        g.strokeLine(snap(x1, hair) + shift, snap(y1, hair) + shift, snap(x2, hair) + shift, snap(y2, hair) + shift);
    }

    private static double snap(double v, boolean on) {
        return on ? Math.floor(v) : v;
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
        g.fillOval(x - radius, y - radius, 2 * radius, 2 * radius);
        g.setStroke(colours.get(filled ? Ink.PAPER : ink));
        g.setLineWidth(1.5);
        g.setLineDashes((double[]) null);
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

    private Font font(Lettering l) {
        long key = Math.round(l.size() * 10) * 2 + (l.bold() ? 1 : 0);
        return fonts.computeIfAbsent(
                key, k -> Font.font("System", l.bold() ? FontWeight.BOLD : FontWeight.NORMAL, l.size()));
    }

    @Override
    public double width(Lettering l, String text) {
        ruler.setFont(font(l));
        ruler.setText(text);
        return ruler.getLayoutBounds().getWidth();
    }

    @Override
    public void clip(Rect r) {
        g.save();
        g.beginPath();
        g.rect(r.x(), r.y(), r.w(), r.h());
        g.clip();
    }

    @Override
    public void unclip() {
        g.restore();
    }
}
