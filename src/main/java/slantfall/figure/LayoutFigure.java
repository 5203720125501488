package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;

/** The incline at true scale and angle. The outlet stays where it is while the angle is dragged. */
final class LayoutFigure {

    private static final double PAD = 26;
    private static final double ARC = 0.3;

    private final Scene scene;
    private final Strip strip;
    private double pivotX;
    private double pivotY;
    private double scale;

    LayoutFigure(Scene scene, Strip strip) {
        this.scene = scene;
        this.strip = strip;
    }

    List<Handle> draw(Pen pen, Rect area) {
        place(area);
        pen.clip(area);
        ground(pen, area);
        liquid(pen);
        arc(pen);
        dimension(pen);
        gravity(pen, area);
        pen.unclip();
        return handles();
    }

    private void place(Rect area) {
        Span side = scene.holds().hold("layout.side", strip.angle() < 0 ? new Span(-1, 0) : new Span(0, 1));
        boolean both = side.low() < 0 && side.high() > 0;
        double tall = (both ? area.h() / 2 : area.h()) - 1.8 * PAD;
        double radius = Math.max(20, Math.min(area.w() - 3 * PAD, tall));
        double room = (area.w() - radius - 3 * PAD) / 2;
        pivotX = area.right() - PAD - Math.max(0, room);
        pivotY = both ? area.midY() : side.low() < 0 ? area.y() + 0.7 * PAD : area.bottom() - 1.1 * PAD;
        double thick = strip.filled() ? 2 * strip.deepest() : 0;
        scale = radius / scene.holds().hold("layout.length", new Span(0, strip.length() + thick)).high();
    }

    /** A point along the plate from the outlet and above it. */
    private double px(double up, double off) {
        return pivotX - up * Math.cos(strip.angle()) + off * Math.sin(strip.angle());
    }

    private double py(double up, double off) {
        return pivotY - up * Math.sin(strip.angle()) - off * Math.cos(strip.angle());
    }

    private double reach() {
        return strip.length() * scale;
    }

    private void ground(Pen pen, Rect area) {
        double far = pivotX - Math.max(reach(), 60);
        pen.line(Stroke.dashed(Ink.AXIS, 1), Math.max(area.x() + 4, far - 10), pivotY, pivotX, pivotY);
        pen.text(Lettering.of(Ink.FAINT, -1), "horizontal", Math.max(area.x() + 4, far - 10), pivotY + 14);
    }

    private void liquid(Pen pen) {
        double up = reach();
        double d1 = strip.filled() ? strip.inletDepth() * scale : 0;
        double d2 = strip.filled() ? strip.outletDepth() * scale : 0;
        boolean thin = Math.max(d1, d2) < 1.5;
        double a = thin ? 2 : d1;
        double b = thin ? 2 : d2;
        if (strip.filled()) {
            pen.area(Ink.LIQUID, 0.9, new double[] {px(up, 0), px(0, 0), px(0, b), px(up, a)}, new double[] {
                py(up, 0), py(0, 0), py(0, b), py(up, a)
            }, 4);
        }
        pen.line(Stroke.of(Ink.WALL, 3), px(up, -1.5), py(up, -1.5), px(0, -1.5), py(0, -1.5));
        if (strip.upper().wall()) {
            Ink ink = strip.upper().speed() == 0 ? Ink.WALL : Ink.MOVING_WALL;
            pen.line(Stroke.of(ink, 3), px(up, a + 1.5), py(up, a + 1.5), px(0, b + 1.5), py(0, b + 1.5));
        }
        pen.text(Lettering.of(Ink.FAINT, 0), "in", px(up + 13, 4), py(up + 13, 4) + 4);
        pen.text(Lettering.of(Ink.FAINT, 0), "out", px(-14, 4), py(-14, 4) + 4);
        if (thin && strip.filled()) {
            String what = strip.upper().wall() ? "gap" : "film";
            String note = what + " " + Show.value(strip.deepest(), Kind.LENGTH, scene.units(), 3) + ", drawn wider to be seen";
            pen.text(Lettering.of(Ink.FAINT, -1), note, Math.min(px(up, 0), pivotX - 120) - 6, pivotY + 26);
        }
    }

    private void arc(Pen pen) {
        double r = ARC * Math.max(reach(), 60);
        int n = 24;
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            double phi = strip.angle() * i / (n - 1);
            x[i] = pivotX - r * Math.cos(phi);
            y[i] = pivotY - r * Math.sin(phi);
        }
        pen.polyline(Stroke.of(Ink.HANDLE, 1.5), x, y, n);
        double mid = strip.angle() / 2;
        String text = Show.value(strip.angle(), Kind.ANGLE, scene.units(), 3);
        double out = r + 6;
        pen.text(Lettering.of(Ink.TEXT, 1).heavy(), text, pivotX - out * Math.cos(mid), pivotY - out * Math.sin(mid) + 4);
    }

    private void dimension(Pen pen) {
        double up = reach();
        double off = 20 + (strip.filled() ? Math.max(strip.inletDepth(), strip.outletDepth()) * scale : 0);
        pen.line(Stroke.of(Ink.FAINT, 1), px(up, off), py(up, off), px(0, off), py(0, off));
        for (double end : new double[] {0, up}) {
            pen.line(Stroke.of(Ink.FAINT, 1), px(end, off - 4), py(end, off - 4), px(end, off + 4), py(end, off + 4));
        }
        String text = Show.value(strip.length(), Kind.LENGTH, scene.units(), 3);
        pen.text(
                Lettering.of(Ink.TEXT, 0).turned(-Math.toDegrees(strip.angle())), text, px(up / 2, off + 6), py(up / 2, off + 6));
    }

    private void gravity(Pen pen, Rect area) {
        double x = area.x() + 16;
        double y = area.y() + 10;
        Arrow.draw(pen, Stroke.of(Ink.GRAVITY, 2), x, y, x, y + 34);
        pen.text(Lettering.of(Ink.GRAVITY, -1).heavy(), "g", x + 7, y + 22);
    }

    private List<Handle> handles() {
        List<Handle> list = new ArrayList<>();
        double grip = 0.6 * reach();
        boolean both = strip.grips().anyAngle();
        double least = both ? -Math.PI / 2 : 0;
        list.add(Handle.setting("angle", "Incline", px(grip, 0), py(grip, 0), (x, y) -> Math.max(
                least, Math.min(Math.PI / 2, Math.atan2(pivotY - y, Math.max(pivotX - x, 1e-9))))));
        list.add(Handle.setting("length", "Length", px(reach(), 0), py(reach(), 0), (x, y) -> Math.max(
                6, (pivotX - x) * Math.cos(strip.angle()) + (pivotY - y) * Math.sin(strip.angle())) / scale));
        return list;
    }
}
