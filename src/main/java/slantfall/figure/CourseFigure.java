package slantfall.figure;

import slantfall.declare.Profile;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Display;
import slantfall.quantity.Kind;
import slantfall.quantity.Unit;

/** A course along the length: one reading against the distance from the inlet. */
final class CourseFigure {

    private final Scene scene;

    CourseFigure(Scene scene) {
        this.scene = scene;
    }

    void draw(Pen pen, Rect area, Profile.Column column) {
        Profile profile = scene.assessment().profiles().courses();
        double[] x = profile.axis().values();
        double[] values = column.values();
        double least = Double.POSITIVE_INFINITY;
        double largest = Double.NEGATIVE_INFINITY;
        for (double v : values) {
            if (!Double.isFinite(v)) {
                return;
            }
            least = Math.min(least, v);
            largest = Math.max(largest, v);
        }
        Span up = scene.holds().hold("course." + column.key(), stretch(column.kind(), least, largest));
        Rect own = area.inset(58, 8, 10, 34);
        Frame frame = new Frame(own, new Span(0, x[x.length - 1]), up);
        Unit unit = Display.unit(column.kind(), scene.units(), up.high());
        frame.drawUp(pen, unit, column.name());
        frame.drawAcross(pen, Display.unit(Kind.LENGTH, scene.units(), x[x.length - 1]), "from the inlet");
        double[] px = new double[x.length];
        double[] py = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            px[i] = frame.x(x[i]);
            py[i] = frame.y(values[i]);
        }
        pen.polyline(Stroke.of(Ink.PRESSURE, 2), px, py, x.length);
    }

    /** An absolute pressure is not drawn from zero, its changes would be lost; at least 100 Pa high. */
    private static Span stretch(Kind kind, double least, double largest) {
        if (kind != Kind.PRESSURE_ABSOLUTE) {
            return Span.around(least, largest);
        }
        double air = Math.max(0.08 * (largest - least), 50);
        return new Span(least - air, largest + air);
    }
}
