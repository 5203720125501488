package slantfall.figure;

import java.util.List;
import java.util.Locale;
import slantfall.declare.Profile;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Display;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;

/** Traverses side by side against the distance from the wall, which stands upright and is shared. */
final class TraverseFigure {

    /** Room on the left for the labels of the wall-normal axis [px]. */
    static final double LEFT = 54;

    private static final List<Ink> INKS = List.of(Ink.VELOCITY, Ink.STRESS, Ink.RATE);
    private static final double GAP = 16;

    private final Scene scene;
    private final Profile profile;
    private final Span up;

    TraverseFigure(Scene scene, Span up) {
        this.scene = scene;
        this.profile = scene.assessment().profiles().traverses();
        this.up = up;
    }

    void draw(TidyPen pen, Rect area, boolean labels) {
        int n = profile.columns().size();
        if (n == 0) {
            String reason = scene.reasonOfFirst();
            pen.paragraph(Lettering.of(Ink.TEXT, 0), reason.isEmpty() ? "nothing flows" : reason, area.inset(8, area.h() / 3, 8, 0));
            return;
        }
        double left = labels ? LEFT : 0;
        double each = (area.w() - left - GAP * (n - 1)) / n;
        for (int i = 0; i < n; i++) {
            Rect own = new Rect(area.x() + left + i * (each + GAP), area.y(), each, area.h());
            column(pen, own, profile.columns().get(i), INKS.get(i % INKS.size()), labels && i == 0);
        }
    }

    private void column(TidyPen pen, Rect own, Profile.Column column, Ink ink, boolean labels) {
        double least = 0;
        double largest = 0;
        boolean known = true;
        for (double v : column.values()) {
            known &= Double.isFinite(v);
            least = Math.min(least, v);
            largest = Math.max(largest, v);
        }
        Span across = known ? scene.holds().hold("traverse." + column.key(), Span.around(least, largest)) : new Span(0, 1);
        Frame frame = new Frame(own, across, up);
        frame.drawUp(pen, Display.unit(profile.axis().kind(), scene.units(), up.high()), labels ? "from the wall" : "");
        if (!known) {
            unknown(pen, frame, column);
            return;
        }
        Unit unit = Display.unit(column.kind(), scene.units(), Math.max(-across.low(), across.high()));
        frame.drawAcross(pen, unit, column.name());
        curve(pen, frame, column.values(), ink);
        if (column.key().equals("velocity")) {
            backflow(pen, frame, column.values());
        }
        cursor(pen, frame, column, ink);
    }

    private void unknown(TidyPen pen, Frame frame, Profile.Column column) {
        Rect own = frame.area();
        pen.line(Stroke.of(Ink.AXIS, 1), own.x(), own.bottom(), own.right(), own.bottom());
        frame.drawName(pen, column.name(), "");
        pen.text(Lettering.of(Ink.UNKNOWN, 0).heavy(), "○ unknown", own.midX(), own.y() + 24);
        pen.paragraph(Lettering.of(Ink.FAINT, -1), scene.reason(column.kind()), own.inset(2, 32, 2, 4));
    }

    private void curve(TidyPen pen, Frame frame, double[] values, Ink ink) {
        double[] y = profile.axis().values();
        int n = y.length;
        double[] px = new double[n + 2];
        double[] py = new double[n + 2];
        for (int i = 0; i < n; i++) {
            px[i] = frame.x(values[i]);
            py[i] = frame.y(y[i]);
        }
        double zero = frame.x(0);
        pen.line(Stroke.of(Ink.AXIS, 1), zero, frame.area().y(), zero, frame.area().bottom());
        px[n] = zero;
        py[n] = py[n - 1];
        px[n + 1] = zero;
        py[n + 1] = py[0];
        pen.area(ink, 0.13, px, py, n + 2);
        pen.polyline(Stroke.of(ink, 2), px, py, n);
    }

    private void backflow(TidyPen pen, Frame frame, double[] values) {
        Backflow back = Backflow.of(profile.axis().values(), values, scene.forward());
        back.fill(pen, frame::x, frame::y);
        if (back.any()) {
            Rect own = frame.area();
            pen.slip(Lettering.of(Ink.REVERSED, 0).heavy(), "runs back", own.midX(), Math.max(own.y() + 12, frame.y(back.middle()) + 4));
        }
    }

    private void cursor(TidyPen pen, Frame frame, Profile.Column column, Ink ink) {
        double at = scene.cursor();
        double[] y = profile.axis().values();
        if (!(at >= y[0] && at <= y[y.length - 1])) {
            return;
        }
        double value = interpolate(y, column.values(), at);
        double py = frame.y(at);
        Rect own = frame.area();
        pen.line(Stroke.dashed(Ink.CURSOR, 1), own.x(), py, own.right(), py);
        pen.disc(ink, frame.x(value), py, 4, true);
        String text = Show.value(value, column.kind(), scene.units(), 3);
        pen.slip(Lettering.of(Ink.TEXT, 0).heavy(), text, own.midX(), Math.max(own.y() + 12, py - 7));
    }

    /** Linear interpolation on an increasing axis. */
    static double interpolate(double[] axis, double[] values, double at) {
        int i = 1;
        while (i < axis.length - 1 && axis[i] < at) {
            i++;
        }
        double part = (at - axis[i - 1]) / (axis[i] - axis[i - 1]);
        return values[i - 1] + part * (values[i] - values[i - 1]);
    }

    /** The traverse in words, for readers who cannot see it. */
    String words() {
        StringBuilder words = new StringBuilder();
        for (Profile.Column c : profile.columns()) {
            double wall = c.values()[0];
            double end = c.values()[c.values().length - 1];
            words.append(c.name().toLowerCase(Locale.ROOT)).append(" from ")
                    .append(Show.value(wall, c.kind(), scene.units(), 3)).append(" at the wall to ")
                    .append(Show.value(end, c.kind(), scene.units(), 3)).append("; ");
        }
        return words.toString();
    }
}
