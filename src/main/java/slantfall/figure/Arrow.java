package slantfall.figure;

import slantfall.figure.Pen.Stroke;

/** Arrows. */
final class Arrow {

    private Arrow() {}

    /** A shaft with a filled head of about six pixels; nothing if shorter than two. */
    static void draw(Pen pen, Stroke stroke, double x1, double y1, double x2, double y2) {
        double dx = x2 - x1;
        double dy = y2 - y1;
        double length = Math.hypot(dx, dy);
        if (!(length >= 2)) {
            return;
        }
        double head = Math.min(6 + stroke.width(), length);
        double ux = dx / length;
        double uy = dy / length;
        double bx = x2 - head * ux;
        double by = y2 - head * uy;
        double half = head * 0.42;
        pen.line(stroke, x1, y1, bx, by);
        pen.area(stroke.ink(), 1, new double[] {x2, bx - half * uy, bx + half * uy}, new double[] {
            y2, by + half * ux, by - half * ux
        }, 3);
    }
}
