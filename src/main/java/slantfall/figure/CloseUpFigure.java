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

    /** Part of the length at which the stresses are drawn, on the side that the velocity profile leaves free. */
    private static final double STRESS_AT = 0.25;
    private static final double GRIP = 0.1;
    private static final double FILM_GRIP = 0.22;
    private static final double GRAVITY = 22;
    /** Longest velocity arrow as a part of the width. */
    private static final double LONGEST = 0.4;

    private final Scene scene;
    private final Strip strip;
    private final Frame frame;
    private final double speedScale;

    CloseUpFigure(Scene scene, Strip strip, Rect area, Span up) {
        this.scene = scene;
        this.strip = strip;
        Span along = scene.holds().hold("closeup.length", new Span(0, strip.length()));
        this.frame = new Frame(area, along, up);
        this.speedScale = speedScale();
    }

    /** The stretch of the wall-normal axis that the liquid wants. */
    static Span wanted(Strip strip) {
        return Span.around(0, strip.filled() ? 1.2 * strip.deepest() : 1e-3);
    }

    List<Handle> draw(Pen plain) {
        Rect area = frame.area();
        Rect whole = new Rect(area.x() - 52, area.y() - 18, area.w() + 60, area.h() + 18 + Frame.BELOW);
        TidyPen pen = TidyPen.on(plain, whole);
        List<Handle> handles = handles();
        frame.drawUp(pen, Display.unit(Kind.LENGTH, scene.units(), frame.up().high()), "from the wall");
        frame.drawAcross(pen, Display.unit(Kind.LENGTH, scene.units(), frame.across().high()), "along the flow");
        pen.clip(new Rect(area.x() - 1, area.y() - 10, area.w() + 2, area.h() + 20));
        pen = pen.within(new Rect(area.x() + 1, area.y() - 10, area.w() - 2, area.h() + 10));
        liquid(pen);
        walls(pen);
        for (Handle h : handles) {
            pen.block(new Rect(h.x() - 7, h.y() - 7, 14, 14));
        }
        cursor(pen);
        gravity(pen);
        if (strip.filled()) {
            new CloseUpProfile(scene, strip, frame, speedScale).draw(pen);
            stresses(pen);
            wallSpeed(pen);
        } else {
            pen.note(Lettering.of(Ink.TEXT, 0), "no liquid to draw", area.midX(), area.midY());
        }
        pen.unclip();
        return handles;
    }

    private double x(double part) {
        return frame.x(part * strip.length());
    }

    private double top(double part) {
        return frame.y(strip.depth(part));
    }

    private void liquid(TidyPen pen) {
        if (strip.filled()) {
            double bottom = frame.y(0);
            pen.area(Ink.LIQUID, 0.75, new double[] {x(0), x(1), x(1), x(0)}, new double[] {bottom, bottom, top(1), top(0)}, 4);
        }
    }

    private void walls(TidyPen pen) {
        hatch(pen, frame.y(0), frame.y(0), 1, Ink.WALL);
        if (!strip.filled()) {
            return;
        }
        if (strip.upper().wall()) {
            hatch(pen, top(0), top(1), -1, strip.upper().speed() == 0 ? Ink.WALL : Ink.MOVING_WALL);
        } else {
            pen.line(Stroke.of(Ink.LIQUID_EDGE, 2), x(0), top(0), x(1), top(1));
        }
        pen.blockLine(x(0), top(0), x(1), top(1), 2);
    }

    /** A wall's face with short strokes behind it. */
    private void hatch(TidyPen pen, double y0, double y1, int below, Ink ink) {
        pen.line(Stroke.of(ink, 2.5), x(0), y0, x(1), y1);
        double from = x(0);
        double to = x(1);
        for (double px = from + 6; px < to; px += 11) {
            double y = y0 + (y1 - y0) * (px - from) / (to - from);
            pen.line(Stroke.of(ink, 1), px, y, px - 6, y + below * 7);
        }
    }

    /** Pixels per speed; the fastest arrow takes two fifths of the width, less where a sloping wall would be crossed. */
    private double speedScale() {
        Profile.Column u = scene.assessment().profiles().traverses().column("velocity").orElse(null);
        double largest = Math.abs(strip.upper().speed());
        if (u != null) {
            for (double v : u.values()) {
                largest = Math.max(largest, Double.isFinite(v) ? Math.abs(v) : 0);
            }
        }
        double held = scene.holds().hold("closeup.speed", new Span(0, Math.max(largest, 1e-12))).high();
        return LONGEST * frame.area().w() * (u == null ? 1 : inside(u.values(), LONGEST / held)) / held;
    }

    /** By which factor arrows must be shorter to end before a wall that slopes; not for a wall that moves, nor below a half. */
    private double inside(double[] u, double perSpeed) {
        double slope = strip.outletDepth() - strip.inletDepth();
        if (slope == 0 || strip.upper().speed() != 0) {
            return 1;
        }
        double[] y = scene.assessment().profiles().traverses().axis().values();
        double factor = 1;
        for (int i = 0; i < y.length; i++) {
            double free = (y[i] - strip.depth(0.5)) / slope;
            if (u[i] * free > 0) {
                factor = Math.min(factor, free / (u[i] * perSpeed));
            }
        }
        return Math.max(0.5, factor);
    }

    private void stresses(TidyPen pen) {
        double lower = strip.stresses().lower();
        double upper = strip.stresses().upper();
        double largest = Math.max(Double.isNaN(lower) ? 0 : Math.abs(lower), Double.isNaN(upper) ? 0 : Math.abs(upper));
        if (!(largest > 0)) {
            return;
        }
        String most = strip.inletDepth() == strip.outletDepth() ? "" : "up to ";
        double at = profileToTheLeft() ? 1 - STRESS_AT : STRESS_AT;
        if (!Double.isNaN(lower)) {
            stress(pen, "drag " + most, lower, largest, new double[] {at, frame.y(0) - 7, -7});
        }
        if (!Double.isNaN(upper)) {
            // On a wall above, the liquid's drag is the negative of μ du/dy; on a surface the gas drags the liquid.
            boolean wall = strip.upper().wall();
            double y = top(at) + (wall ? 9 + Math.abs(top(1) - top(0)) * 0.1 : -8);
            stress(pen, wall ? "drag " + most : "gas drag ", wall ? -upper : upper, largest, new double[] {at, y, wall ? 15 : -7});
        }
    }

    private boolean profileToTheLeft() {
        double sum = strip.upper().speed();
        for (Profile.Column u : scene.assessment().profiles().traverses().columns()) {
            if (u.key().equals("velocity")) {
                for (double v : u.values()) {
                    sum += v;
                }
            }
        }
        return sum < 0;
    }

    /** An arrow of the drag and its value; the place is part of the length, height and how far below its text lies [px]. */
    private void stress(TidyPen pen, String name, double value, double largest, double[] place) {
        double from = x(place[0]);
        double y = place[1];
        double reach = 0.2 * frame.area().w() * value / largest;
        Arrow.draw(pen, Stroke.of(Ink.STRESS, 2), from - reach / 2, y, from + reach / 2, y);
        pen.block(new Rect(from - Math.abs(reach) / 2, y - 4, Math.abs(reach), 8));
        Lettering lettering = Lettering.of(Ink.STRESS, 0);
        String number = Show.value(value, Kind.STRESS, scene.units(), 3);
        String brief = (strip.inletDepth() == strip.outletDepth() ? "" : "max ") + number;
        boolean written = pen.beside(lettering, name + number, from, y + place[2]) || pen.beside(lettering, brief, from, y + place[2]);
        if (!written) {
            pen.note(lettering, brief, from, y + place[2]);
        }
    }

    /** Height of the arrow that is the wall's speed, above its hatching. */
    private double speedLine() {
        return Math.max(frame.area().y() - 4, top(0.5) - 14);
    }

    private void wallSpeed(TidyPen pen) {
        double speed = strip.upper().speed();
        if (speed == 0) {
            return;
        }
        double y = speedLine();
        Arrow.draw(pen, Stroke.of(Ink.MOVING_WALL, 2.5), x(0.5), y, x(0.5) + speedScale * speed, y);
        pen.block(new Rect(Math.min(x(0.5), x(0.5) + speedScale * speed), y - 4, Math.abs(speedScale * speed), 8));
        String text = "wall moves " + Show.value(speed, Kind.VELOCITY, scene.units(), 3);
        pen.note(Lettering.of(Ink.MOVING_WALL, 0).heavy(), text, x(0.5), y - 7);
    }

    /** Gravity turned into plate coordinates, in the free corner above the inlet. */
    private void gravity(TidyPen pen) {
        double cx = frame.area().x() + 12;
        double cy = frame.area().y() + 4;
        double gx = Math.sin(strip.angle());
        double gy = Math.cos(strip.angle());
        double sideways = gx < 0 ? -GRAVITY * gx : 0;
        double tipX = cx + sideways + GRAVITY * gx;
        double tipY = cy + GRAVITY * gy;
        pen.disc(Ink.GRAVITY, cx + sideways, cy, 2.5, true);
        Arrow.draw(pen, Stroke.of(Ink.GRAVITY, 2), cx + sideways, cy, tipX, tipY);
        pen.blockLine(cx + sideways, cy, tipX, tipY, 3);
        pen.note(Lettering.of(Ink.GRAVITY, -1).heavy(), "g", Math.max(cx + sideways, tipX) + 7, (cy + tipY) / 2 + 4);
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

    private void cursor(TidyPen pen) {
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
            list.add(new Handle(grips.depth(), grips.depthBy(), "Film surface", x(FILM_GRIP), top(FILM_GRIP),
                    (px, py) -> Math.max(least, frame.valueY(py))));
            return list;
        }
        list.add(Handle.setting(grips.depth(), "Gap", x(GRIP), top(GRIP),
                (px, py) -> Math.max(least, face(frame.valueY(py), strip.outletDepth()))));
        list.add(Handle.setting(grips.outlet(), "Gap at the outlet", x(1 - GRIP), top(1 - GRIP),
                (px, py) -> Math.max(least, face(frame.valueY(py), strip.inletDepth()))));
        list.add(Handle.setting(grips.speed(), "Wall speed", x(0.5) + speedScale * strip.upper().speed(), speedLine(),
                (px, py) -> Math.abs(px - x(0.5)) < 4 ? 0 : (px - x(0.5)) / speedScale));
        return list;
    }

    /** Depth at one end from the depth seen at the grip near it, the other end standing still. */
    private static double face(double seen, double other) {
        return (seen - GRIP * other) / (1 - GRIP);
    }
}
