package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.Profile;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Display;
import slantfall.quantity.Kind;
import slantfall.quantity.Show;

/**
 * The liquid in plate coordinates: wall at the bottom, flow to the right, the whole length across and the thickness up, with
 * the stretch printed.
 */
final class CloseUpFigure {

    private static final int ARROWS = 9;

    private final Scene scene;
    private final Strip strip;
    private final Frame frame;

    CloseUpFigure(Scene scene, Strip strip, Rect area, Span up) {
        this.scene = scene;
        this.strip = strip;
        Span along = scene.holds().hold("closeup.length", new Span(0, strip.length()));
        this.frame = new Frame(area, along, up);
    }

    /** The stretch of the wall-normal axis that the liquid wants. */
    static Span wanted(Strip strip) {
        return Span.around(0, strip.filled() ? 1.2 * strip.deepest() : 1e-3);
    }

    List<Handle> draw(Pen pen) {
        Rect area = frame.area();
        frame.drawUp(pen, Display.unit(Kind.LENGTH, scene.units(), frame.up().high()), "from the wall");
        frame.drawAcross(pen, Display.unit(Kind.LENGTH, scene.units(), frame.across().high()), "along the flow");
        pen.clip(new Rect(area.x() - 1, area.y() - 10, area.w() + 2, area.h() + 20));
        liquid(pen);
        walls(pen);
        pen.unclip();
        if (strip.filled()) {
            velocity(pen);
            stresses(pen);
        } else {
            pen.text(Lettering.of(Ink.TEXT, 0), "no liquid to draw", area.midX(), area.midY());
        }
        gravity(pen);
        cursor(pen);
        return handles();
    }

    private double x(double part) {
        return frame.x(part * strip.length());
    }

    private double top(double part) {
        return frame.y(strip.depth(part));
    }

    private void liquid(Pen pen) {
        if (strip.filled()) {
            double bottom = frame.y(0);
            pen.area(Ink.LIQUID, 0.75, new double[] {x(0), x(1), x(1), x(0)}, new double[] {bottom, bottom, top(1), top(0)}, 4);
        }
    }

    private void walls(Pen pen) {
        hatch(pen, frame.y(0), frame.y(0), 1, Ink.WALL);
        if (!strip.filled()) {
            return;
        }
        if (strip.upper().wall()) {
            hatch(pen, top(0), top(1), -1, strip.upper().speed() == 0 ? Ink.WALL : Ink.MOVING_WALL);
        } else {
            pen.line(Stroke.of(Ink.LIQUID_EDGE, 2), x(0), top(0), x(1), top(1));
        }
    }

    /** A wall's face with short strokes behind it. */
    private void hatch(Pen pen, double y0, double y1, int below, Ink ink) {
        pen.line(Stroke.of(ink, 2.5), x(0), y0, x(1), y1);
        double from = x(0);
        double to = x(1);
        for (double px = from + 6; px < to; px += 11) {
            double y = y0 + (y1 - y0) * (px - from) / (to - from);
            pen.line(Stroke.of(ink, 1), px, y, px - 6, y + below * 7);
        }
    }

    private double speedScale() {
        Profile.Column u = scene.assessment().profiles().traverses().column("velocity").orElse(null);
        double largest = Math.abs(strip.upper().speed());
        if (u != null) {
            for (double v : u.values()) {
                largest = Math.max(largest, Double.isFinite(v) ? Math.abs(v) : 0);
            }
        }
        double held = scene.holds().hold("closeup.speed", new Span(0, Math.max(largest, 1e-12))).high();
        return 0.4 * frame.area().w() / held;
    }

    private void velocity(Pen pen) {
        Profile profile = scene.assessment().profiles().traverses();
        Profile.Column u = profile.column("velocity").orElse(null);
        if (u == null || Double.isNaN(u.values()[0])) {
            pen.text(Lettering.of(Ink.TEXT, 0), "profile unknown", x(0.5), (top(0.5) + frame.y(0)) / 2);
            return;
        }
        double scale = speedScale();
        double base = x(0.5);
        double[] y = profile.axis().values();
        double[] px = new double[y.length];
        double[] py = new double[y.length];
        boolean back = false;
        for (int i = 0; i < y.length; i++) {
            px[i] = base + scale * u.values()[i];
            py[i] = frame.y(y[i]);
        }
        pen.line(Stroke.dashed(Ink.VELOCITY, 1), base, frame.y(0), base, py[y.length - 1]);
        double forward = scene.assessment().declaration().reading("flow").isPresent()
                ? Math.signum(scene.assessment().value("flow")) : 1;
        for (int k = 1; k <= ARROWS; k++) {
            int i = k * (y.length - 1) / ARROWS;
            boolean against = u.values()[i] * (forward == 0 ? 1 : forward) < 0;
            back |= against;
            Arrow.draw(pen, Stroke.of(against ? Ink.REVERSED : Ink.VELOCITY, 1.3), base, py[i], px[i], py[i]);
        }
        pen.polyline(Stroke.of(Ink.VELOCITY, 2), px, py, y.length);
        if (back) {
            pen.text(Lettering.of(Ink.REVERSED, 1).heavy(), strip.upper().wall() ? "part runs back" : "surface runs uphill",
                    base - 8, frame.area().y() + 14);
        }
    }

    private void stresses(Pen pen) {
        double lower = strip.stresses().lower();
        double upper = strip.stresses().upper();
        double largest = Math.max(Math.abs(lower), Double.isNaN(upper) ? 0 : Math.abs(upper));
        if (!(largest > 0)) {
            return;
        }
        stress(pen, "wall ", lower, largest, frame.y(0) - 7, frame.y(0) - 12);
        if (!Double.isNaN(upper)) {
            // On a wall above, the liquid's drag is the negative of μ du/dy; on a surface the gas drags the liquid.
            double seen = strip.upper().wall() ? -upper : upper;
            stress(pen, strip.upper().wall() ? "wall " : "gas ", seen, largest, top(0.3) + 8, top(0.3) + 22);
        }
        double speed = strip.upper().speed();
        if (speed != 0) {
            double y = Math.max(frame.area().y() + 2, top(0.5) - 9);
            Arrow.draw(pen, Stroke.of(Ink.MOVING_WALL, 2.5), x(0.5), y, x(0.5) + speedScale() * speed, y);
            pen.text(Lettering.of(Ink.MOVING_WALL, 0).heavy(),
                    "wall " + Show.value(speed, Kind.VELOCITY, scene.units(), 3), x(0.5), y - 5);
        }
    }

    private void stress(Pen pen, String name, double value, double largest, double y, double textY) {
        double from = x(0.3);
        double reach = 0.16 * frame.area().w() * value / largest;
        Arrow.draw(pen, Stroke.of(Ink.STRESS, 2), from - reach / 2, y, from + reach / 2, y);
        pen.text(Lettering.of(Ink.STRESS, 0), name + Show.value(value, Kind.STRESS, scene.units(), 3), from, textY);
    }

    private void gravity(Pen pen) {
        double cx = frame.area().x() + 30;
        double cy = frame.area().y() + 20;
        double reach = 26;
        double gx = Math.sin(strip.angle());
        double gy = Math.cos(strip.angle());
        pen.disc(Ink.GRAVITY, cx, cy, 2.5, true);
        Arrow.draw(pen, Stroke.of(Ink.GRAVITY, 2), cx, cy, cx + reach * gx, cy + reach * gy);
        pen.text(Lettering.of(Ink.GRAVITY, 0).heavy(), "g", cx + (reach + 9) * gx, cy + (reach + 9) * gy + 4);
    }

    /** How the picture is stretched, in words. */
    String stretch() {
        double vertical = frame.area().h() / frame.up().length();
        double horizontal = frame.area().w() / frame.across().length();
        double factor = vertical / horizontal;
        return factor >= 1
                ? "drawn " + Show.number(factor, 2) + " × too thick"
                : "drawn " + Show.number(1 / factor, 2) + " × too long";
    }

    private void cursor(Pen pen) {
        if (scene.cursor() >= 0 && scene.cursor() <= frame.up().high()) {
            double y = frame.y(scene.cursor());
            pen.line(Stroke.dashed(Ink.CURSOR, 1), frame.area().x(), y, frame.area().right(), y);
        }
    }

    private List<Handle> handles() {
        List<Handle> list = new ArrayList<>();
        Strip.Grips grips = strip.grips();
        if (!strip.filled()) {
            return list;
        }
        double least = frame.up().high() / 200;
        if (!grips.depthBy().isEmpty()) {
            list.add(new Handle(grips.depth(), grips.depthBy(), "Film surface", x(0.22), top(0.22),
                    (px, py) -> Math.max(least, frame.valueY(py))));
            return list;
        }
        list.add(Handle.setting(grips.depth(), "Gap", x(0.1), top(0.1),
                (px, py) -> Math.max(least, face(frame.valueY(py), strip.outletDepth(), 0.1))));
        list.add(Handle.setting(grips.outlet(), "Gap at the outlet", x(0.9), top(0.9),
                (px, py) -> Math.max(least, face(frame.valueY(py), strip.inletDepth(), 0.1))));
        double y = Math.max(frame.area().y() + 2, top(0.5) - 9);
        double scale = speedScale();
        list.add(Handle.setting(grips.speed(), "Wall speed", x(0.5) + scale * strip.upper().speed(), y,
                (px, py) -> Math.abs(px - x(0.5)) < 4 ? 0 : (px - x(0.5)) / scale));
        return list;
    }

    /** Depth at one end from the depth seen at a part of the way to the other. */
    private static double face(double seen, double other, double part) {
        return (seen - part * other) / (1 - part);
    }
}
