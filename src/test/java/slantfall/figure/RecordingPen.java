package slantfall.figure;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/** Remembers everything that was drawn. */
final class RecordingPen implements Pen {

    final List<Mark> marks = new ArrayList<>();
    final List<Said> said = new ArrayList<>();
    final List<String> texts = new ArrayList<>();
    final List<double[]> points = new ArrayList<>();
    int clips;
    private final Deque<Rect> open = new ArrayDeque<>();
    private final SvgPen ruler = new SvgPen(1, 1, Palette.LIGHT.colours());

    /** A point that was drawn, with the clip it was drawn under, null if none. */
    record Mark(String what, Ink ink, double x, double y, Rect clip) {

        /** Whether it can be seen outside a rectangle by more than a pixel. */
        boolean outside(Rect area) {
            boolean shown = clip == null || clip.contains(x, y);
            return shown && !new Rect(area.x() - 1, area.y() - 1, area.w() + 2, area.h() + 2).contains(x, y);
        }
    }

    /** A text with the rectangle its letters fill; turned by a quarter or not at all. */
    record Said(String text, Ink ink, Rect box, double turn) {

        boolean meets(Said other) {
            return box.x() < other.box.right() && other.box.x() < box.right()
                    && box.y() < other.box.bottom() && other.box.y() < box.bottom();
        }
    }

    private void mark(String what, Ink ink, double x, double y) {
        points.add(new double[] {x, y});
        marks.add(new Mark(what, ink, x, y, open.peek()));
    }

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        mark("line", stroke.ink(), x1, y1);
        mark("line", stroke.ink(), x2, y2);
    }

    @Override
    public void polyline(Stroke stroke, double[] x, double[] y, int n) {
        for (int i = 0; i < n; i++) {
            mark("polyline", stroke.ink(), x[i], y[i]);
        }
    }

    @Override
    public void area(Ink ink, double opacity, double[] x, double[] y, int n) {
        for (int i = 0; i < n; i++) {
            mark("area", ink, x[i], y[i]);
        }
    }

    @Override
    public void disc(Ink ink, double x, double y, double radius, boolean filled) {
        mark("disc", ink, x, y);
        mark("disc", ink, x + radius, y + radius);
        mark("disc", ink, x - radius, y - radius);
    }

    @Override
    public void text(Lettering l, String text, double x, double y) {
        texts.add(text);
        double w = width(l, text);
        double from = l.anchor() < 0 ? 0 : l.anchor() > 0 ? -w : -w / 2;
        double cos = Math.cos(Math.toRadians(-l.turn()));
        double sin = Math.sin(Math.toRadians(-l.turn()));
        double[] px = new double[4];
        double[] py = new double[4];
        double[] ends = {from, from + w};
        // Capitals and figures stand 0.72 of the size above the base line, tails hang 0.2 below it.
        double[] lines = {-0.72 * l.size(), 0.2 * l.size()};
        for (int i = 0; i < 4; i++) {
            px[i] = x + ends[i / 2] * cos - lines[i % 2] * sin;
            py[i] = y + ends[i / 2] * sin + lines[i % 2] * cos;
            mark("text " + text, l.ink(), px[i], py[i]);
        }
        double left = Math.min(Math.min(px[0], px[1]), Math.min(px[2], px[3]));
        double top = Math.min(Math.min(py[0], py[1]), Math.min(py[2], py[3]));
        double right = Math.max(Math.max(px[0], px[1]), Math.max(px[2], px[3]));
        double bottom = Math.max(Math.max(py[0], py[1]), Math.max(py[2], py[3]));
        said.add(new Said(text, l.ink(), new Rect(left, top, right - left, bottom - top), l.turn()));
    }

    @Override
    public double width(Lettering lettering, String text) {
        return ruler.width(lettering, text);
    }

    @Override
    public void clip(Rect rect) {
        open.push(rect);
        clips++;
    }

    @Override
    public void unclip() {
        open.pop();
        clips--;
    }
}
