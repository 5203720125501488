package slantfall.figure;

import java.util.ArrayList;
import java.util.List;

/** Remembers what was drawn. */
final class RecordingPen implements Pen {

    final List<double[]> points = new ArrayList<>();
    final List<String> texts = new ArrayList<>();
    final List<double[]> textBoxes = new ArrayList<>();
    int clips;

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        points.add(new double[] {x1, y1});
        points.add(new double[] {x2, y2});
    }

    @Override
    public void polyline(Stroke stroke, double[] x, double[] y, int n) {
        for (int i = 0; i < n; i++) {
            points.add(new double[] {x[i], y[i]});
        }
    }

    @Override
    public void area(Ink ink, double opacity, double[] x, double[] y, int n) {
        polyline(null, x, y, n);
    }

    @Override
    public void disc(Ink ink, double x, double y, double radius, boolean filled) {
        points.add(new double[] {x, y});
    }

    @Override
    public void text(Lettering lettering, String text, double x, double y) {
        texts.add(text);
        points.add(new double[] {x, y});
    }

    @Override
    public double width(Lettering lettering, String text) {
        return text.length() * 6;
    }

    @Override
    public void clip(Rect rect) {
        clips++;
    }

    @Override
    public void unclip() {
        clips--;
    }
}
