package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;

/**
 * The incline at true scale and angle, as large as the room allows. While something is dragged the outlet stays where it is
 * and the scale only gives way when the plate would leave the picture.
 */
final class LayoutFigure {

    private static final double SIDE = 46;
    private static final double ABOVE = 34;
    private static final double UNDER = 38;
    private static final double DIMENSION = 18;
    private static final double ARC = 0.3;
    private static final double LARGEST_ARC = 70;
    /** Depth from which liquid is drawn true to scale; below it a band of this width says that something is there [px]. */
    private static final double VISIBLE = 1.5;
    private static final double LEAST_LENGTH = 6;
    private static final double NARROW = Math.toRadians(14);

    private final Scene scene;
    private final Strip strip;
    private final Rect area;
    private final double cos;
    private final double sin;
    private double pivotX;
    private double pivotY;
    private double scale;

    LayoutFigure(Scene scene, Strip strip, Rect area) {
        this.scene = scene;
        this.strip = strip;
        this.area = area;
        this.cos = Math.cos(strip.angle());
        this.sin = Math.sin(strip.angle());
        place();
    }

    List<Handle> draw(Pen plain) {
        TidyPen pen = TidyPen.on(plain, area).within(area);
        pen.clip(area);
        gravity(pen);
        liquid(pen);
        arc(pen);
        dimension(pen);
        ground(pen);
        words(pen);
        pen.unclip();
        return handles();
    }

    private void place() {
        double length = strip.length();
        double depth = strip.filled() ? strip.deepest() : 0;
        double wide = length * cos + depth * Math.abs(sin);
        double tall = length * Math.abs(sin) + depth * cos;
        double room = area.w() - 2 * SIDE;
        Span side = scene.holds().hold("layout.side", strip.angle() < 0 ? new Span(-1, 0) : new Span(0, 1));
        boolean both = side.low() < 0 && side.high() > 0;
        pivotY = both ? area.midY() : side.low() < 0 ? area.y() + ABOVE : area.bottom() - UNDER;
        double height = Math.max(20, both ? area.h() / 2 - UNDER : area.h() - ABOVE - UNDER);
        double free = Math.max(wide / Math.max(20, room), tall / height);
        pivotX = scene.holds().still("layout.pivot", area.midX() + 0.5 * (length * cos - depth * sin) / free);
        pivotX = Math.min(area.right() - SIDE, Math.max(area.x() + SIDE + 20, pivotX));
        double left = Math.max(20, pivotX - area.x() - SIDE);
        scale = 1 / scene.holds().growing("layout.scale", Math.max(free, length * cos / left));
    }

    /** A point along the plate from the outlet and above it [px]. */
    private double px(double up, double off) {
        return pivotX - up * cos + off * sin;
    }

    private double py(double up, double off) {
        return pivotY - up * sin - off * cos;
    }

    private double reach() {
        return strip.length() * scale;
    }

    private boolean thin() {
        return strip.deepest() * scale < VISIBLE;
    }

    /** Depth as it is drawn [px]. */
    private double drawn(double depth) {
        return !strip.filled() ? 0 : thin() ? 2 : depth * scale;
    }

    private double arcRadius() {
        return Math.max(24, Math.min(LARGEST_ARC, ARC * reach()));
    }

    private void liquid(TidyPen pen) {
        double up = reach();
        double a = drawn(strip.inletDepth());
        double b = drawn(strip.outletDepth());
        if (strip.filled()) {
            pen.area(Ink.LIQUID, 0.9, new double[] {px(up, 0), px(0, 0), px(0, b), px(up, a)}, new double[] {
                py(up, 0), py(0, 0), py(0, b), py(up, a)
            }, 4);
        }
        pen.line(Stroke.of(Ink.WALL, 3), px(up, -1.5), py(up, -1.5), px(0, -1.5), py(0, -1.5));
        if (strip.upper().wall()) {
            Ink ink = strip.upper().speed() == 0 ? Ink.WALL : Ink.MOVING_WALL;
            pen.line(Stroke.of(ink, 3), px(up, a + 1.5), py(up, a + 1.5), px(0, b + 1.5), py(0, b + 1.5));
        } else if (strip.filled()) {
            pen.line(Stroke.of(Ink.LIQUID_EDGE, 1), px(up, a), py(up, a), px(0, b), py(0, b));
        }
        int lines = (int) Math.min(8, 1 + Math.max(a, b) / 8);
        for (int i = 0; i <= lines; i++) {
            double part = (double) i / lines;
            pen.blockLine(px(up, part * a), py(up, part * a), px(0, part * b), py(0, part * b), 4);
        }
        for (Handle h : handles()) {
            pen.block(new Rect(h.x() - 8, h.y() - 8, 16, 16));
        }
    }

    private void arc(TidyPen pen) {
        double r = arcRadius();
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
        pen.blockLine(pivotX, pivotY, pivotX - r - 30, pivotY, 1);
        String text = Show.value(strip.angle(), Kind.ANGLE, scene.units(), 3);
        // Between a plate that is nearly level and the horizontal there is no room: below them then.
        boolean narrow = Math.abs(strip.angle()) < NARROW;
        double base = narrow ? pivotY + 15 : pivotY - (r + 7) * Math.sin(mid) + 4;
        pen.note(Lettering.of(Ink.TEXT, 1).heavy(), text, pivotX - (r + 7) * Math.cos(mid), base);
    }

    private void ground(TidyPen pen) {
        double far = Math.max(area.x() + 2, pivotX - Math.max(reach() * cos, arcRadius() + 40));
        pen.line(Stroke.dashed(Ink.AXIS, 1), far, pivotY, pivotX, pivotY);
        pen.blockLine(far, pivotY, pivotX, pivotY, 1);
        pen.note(Lettering.of(Ink.FAINT, -1), "horizontal", far, pivotY + (strip.angle() < 0 ? -6 : 14));
    }

    private void dimension(TidyPen pen) {
        double up = reach();
        double off = DIMENSION + Math.max(drawn(strip.inletDepth()), drawn(strip.outletDepth()));
        pen.line(Stroke.of(Ink.FAINT, 1), px(up, off), py(up, off), px(0, off), py(0, off));
        pen.blockLine(px(up, off), py(up, off), px(0, off), py(0, off), 1);
        for (double end : new double[] {0, up}) {
            pen.line(Stroke.of(Ink.FAINT, 1), px(end, off - 4), py(end, off - 4), px(end, off + 4), py(end, off + 4));
        }
        String text = Show.value(strip.length(), Kind.LENGTH, scene.units(), 3);
        Lettering along = Lettering.of(Ink.TEXT, 0).turned(-Math.toDegrees(strip.angle()));
        pen.note(along, text, px(up / 2, off + 5), py(up / 2, off + 5));
    }

    private void words(TidyPen pen) {
        double up = reach();
        pen.beside(Lettering.of(Ink.FAINT, 1), "in", px(up + 9, 4), py(up + 9, 4) + 4);
        pen.beside(Lettering.of(Ink.FAINT, -1), "out", px(-9, 4), py(-9, 4) + 4);
        if (strip.filled()) {
            String what = (strip.upper().wall() ? "gap " : "film ")
                    + Show.value(strip.deepest(), Kind.LENGTH, scene.units(), 3)
                    + (thin() ? ", drawn wider to be seen" : ", true to scale");
            boolean below = strip.angle() >= 0;
            pen.note(Lettering.of(Ink.FAINT, 0), what, px(up / 2, 0), below ? pivotY + 28 : area.y() + 24);
        }
    }

    private void gravity(TidyPen pen) {
        double x = area.x() + 14;
        double y = area.y() + 8;
        Arrow.draw(pen, Stroke.of(Ink.GRAVITY, 2), x, y, x, y + 32);
        pen.block(new Rect(x - 5, y, 10, 32));
        pen.text(Lettering.of(Ink.GRAVITY, -1).heavy(), "g", x + 8, y + 20);
    }

    List<Handle> handles() {
        List<Handle> list = new ArrayList<>();
        double grip = 0.6 * reach();
        double least = strip.grips().anyAngle() ? -Math.PI / 2 : 0;
        list.add(Handle.setting("angle", "Incline", px(grip, 0), py(grip, 0), (x, y) -> Math.max(
                least, Math.min(Math.PI / 2, Math.atan2(pivotY - y, Math.max(pivotX - x, 1e-9))))));
        list.add(Handle.setting("length", "Length", px(reach(), 0), py(reach(), 0), (x, y) -> Math.max(
                LEAST_LENGTH, (pivotX - x) * cos + (pivotY - y) * sin) / scale));
        return list;
    }
}
