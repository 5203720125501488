package slantfall.figure;

import java.util.List;
import slantfall.declare.Profile;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Display;
import slantfall.quantity.Kind;
import slantfall.quantity.Unit;

/** Courses along the length, side by side, each against the distance from the inlet; one that does not change is left out. */
final class CourseFigure {

    /** Room on the left for the labels of the upright axis [px]. */
    private static final double LEFT = 60;
    private static final double RIGHT = 24;
    private static final double ABOVE = 8;
    /** Change of a reading along the length, as a part of it, below which its course tells nothing. */
    private static final double LEAST_CHANGE = 1e-6;
    /** An absolute pressure that hardly changes is drawn at least so high, above and below [Pa]. */
    private static final double LEAST_PRESSURE = 50;

    private final Scene scene;
    private final Profile profile;

    CourseFigure(Scene scene) {
        this.scene = scene;
        this.profile = scene.assessment().profiles().courses();
    }

    void draw(TidyPen pen, Rect area) {
        List<Profile.Column> shown = profile.columns().stream().filter(CourseFigure::tells).toList();
        double each = area.w() / Math.max(1, shown.size());
        for (int i = 0; i < shown.size(); i++) {
            Rect own = new Rect(area.x() + i * each, area.y(), each, area.h()).inset(LEFT, ABOVE, RIGHT, Frame.BELOW - 6);
            column(pen, own, shown.get(i));
        }
    }

    /** Pressure always tells something; a gap only where it changes. */
    private static boolean tells(Profile.Column column) {
        if (column.kind() == Kind.PRESSURE_ABSOLUTE) {
            return true;
        }
        double first = column.values()[0];
        for (double v : column.values()) {
            if (!(Math.abs(v - first) <= LEAST_CHANGE * Math.abs(first))) {
                return true;
            }
        }
        return false;
    }

    private void column(TidyPen pen, Rect own, Profile.Column column) {
        double[] x = profile.axis().values();
        double least = Double.POSITIVE_INFINITY;
        double largest = Double.NEGATIVE_INFINITY;
        for (double v : column.values()) {
            if (!Double.isFinite(v)) {
                pen.note(Lettering.of(Ink.UNKNOWN, 0).heavy(), "○ unknown", own.midX(), own.midY());
                new Frame(own, new Span(0, 1), new Span(0, 1)).drawName(pen, column.name() + " along the length", "");
                return;
            }
            least = Math.min(least, v);
            largest = Math.max(largest, v);
        }
        Span up = scene.holds().hold("course." + column.key(), stretch(column.kind(), least, largest));
        Frame frame = new Frame(own, new Span(0, x[x.length - 1]), up);
        Unit unit = Display.unit(column.kind(), scene.units(), up.high());
        frame.drawUp(pen, unit, column.name());
        frame.drawAcross(pen, Display.unit(Kind.LENGTH, scene.units(), x[x.length - 1]), "from the inlet");
        curve(pen, frame, x, column);
    }

    private static void curve(TidyPen pen, Frame frame, double[] x, Profile.Column column) {
        double[] px = new double[x.length];
        double[] py = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            px[i] = frame.x(x[i]);
            py[i] = frame.y(column.values()[i]);
        }
        Ink ink = column.kind() == Kind.PRESSURE_ABSOLUTE ? Ink.PRESSURE : Ink.WALL;
        pen.polyline(Stroke.of(ink, 2), px, py, x.length);
    }

    /** An absolute pressure is not drawn from zero, its changes would be lost. */
    private static Span stretch(Kind kind, double least, double largest) {
        if (kind != Kind.PRESSURE_ABSOLUTE) {
            return Span.around(least, largest);
        }
        double air = Math.max(0.08 * (largest - least), LEAST_PRESSURE);
        return new Span(least - air, largest + air);
    }
}
