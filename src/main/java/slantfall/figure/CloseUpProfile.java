package slantfall.figure;

import slantfall.declare.Profile;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;

/** The velocity profile in its place in the close-up, with the part that runs backwards filled and named. */
final class CloseUpProfile {

    private static final int ARROWS = 9;

    private final Scene scene;
    private final Strip strip;
    private final Frame frame;
    private final double scale;

    /**
     * A profile in the middle of the length.
     *
     * @param scale pixels per speed
     */
    CloseUpProfile(Scene scene, Strip strip, Frame frame, double scale) {
        this.scene = scene;
        this.strip = strip;
        this.frame = frame;
        this.scale = scale;
    }

    void draw(TidyPen pen) {
        Profile profile = scene.assessment().profiles().traverses();
        Profile.Column u = profile.column("velocity").orElse(null);
        if (u == null || Double.isNaN(u.values()[0])) {
            double middle = (frame.y(strip.depth(0.5)) + frame.y(0)) / 2;
            pen.note(Lettering.of(Ink.TEXT, 0), "profile unknown", frame.x(0.5 * strip.length()), middle);
            return;
        }
        Backflow back = Backflow.of(profile.axis().values(), u.values(), scene.forward());
        curve(pen, profile.axis().values(), u.values(), back);
        if (back.any()) {
            String what = strip.upper().wall() ? "part runs back" : "surface runs uphill";
            double y = frame.y(back.middle()) + 4;
            boolean left = scene.forward() > 0;
            double base = frame.x(0.5 * strip.length());
            pen.slip(Lettering.of(Ink.REVERSED, left ? 1 : -1).heavy(), what, base + (left ? -8 : 8), y + 12);
        }
    }

    private void curve(TidyPen pen, double[] y, double[] u, Backflow back) {
        double base = frame.x(0.5 * strip.length());
        double[] px = new double[y.length];
        double[] py = new double[y.length];
        for (int i = 0; i < y.length; i++) {
            px[i] = base + scale * u[i];
            py[i] = frame.y(y[i]);
        }
        back.fill(pen, v -> base + scale * v, frame::y);
        pen.line(Stroke.dashed(Ink.VELOCITY, 1), base, frame.y(0), base, py[y.length - 1]);
        for (int k = 1; k <= ARROWS; k++) {
            int i = k * (y.length - 1) / ARROWS;
            Ink ink = back.against(u[i]) ? Ink.REVERSED : Ink.VELOCITY;
            Arrow.draw(pen, Stroke.of(ink, 1.3), base, py[i], px[i], py[i]);
            pen.block(new Rect(Math.min(base, px[i]), py[i] - 2, Math.abs(px[i] - base), 4));
        }
        pen.polyline(Stroke.of(Ink.VELOCITY, 2), px, py, y.length);
    }
}
