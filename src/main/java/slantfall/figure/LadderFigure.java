package slantfall.figure;

import java.util.ArrayList;
import java.util.List;
import slantfall.declare.CheckResult;
import slantfall.declare.PanelResult;
import slantfall.figure.LadderAxis.Mode;
import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Display;
import slantfall.quantity.Show;
import slantfall.quantity.Unit;
import slantfall.quantity.UnitSystem;

/**
 * A panel of rules on one axis: each author's limit with its clear side, the set-up as a line across, the verdict as shape
 * and word. A rule outside its range is hollow and broken, an unknown one says why.
 */
public final class LadderFigure {

    private static final double ROW = 34;
    private static final double HEAD = 38;
    private static final double FOOT = 44;
    private static final double VERDICT = 92;
    private static final double NAMES = 0.4;
    private static final double MOST_NAMES = 240;
    private static final double MARK = 5;

    private final PanelResult panel;
    private final UnitSystem units;
    private final LadderAxis axis;

    /**
     * The ladder of a panel.
     *
     * @param panel rules with their results
     * @param units units of the labels
     */
    public LadderFigure(PanelResult panel, UnitSystem units) {
        this.panel = panel;
        this.units = units;
        this.axis = LadderAxis.of(panel.results());
    }

    /** Height that shows every rule [px]. */
    public double height() {
        return HEAD + ROW * Math.max(1, panel.results().size()) + FOOT;
    }

    /** Draws the ladder. */
    public void draw(Pen plain, Rect area) {
        TidyPen pen = TidyPen.on(plain, area).within(area);
        Lettering heavy = Lettering.of(Ink.TEXT, -1).heavy();
        Lettering phrase = Lettering.of(Ink.TEXT, 1);
        double room = area.w() - 24 - pen.width(phrase, panel.phrase());
        pen.text(phrase, panel.phrase(), area.right() - 6, area.y() + 15);
        pen.text(heavy, pen.fit(heavy, panel.panel().question(), room), area.x() + 6, area.y() + 15);
        double names = Math.min(MOST_NAMES, NAMES * area.w());
        Rect scale = area.inset(names + 12, HEAD, VERDICT, FOOT);
        boolean known = panel.results().stream().anyMatch(LadderAxis::known);
        if (known) {
            ticks(pen, scale);
        }
        double row = scale.h() / Math.max(1, panel.results().size());
        for (int i = 0; i < panel.results().size(); i++) {
            row(pen, new Rect(area.x(), scale.y() + i * row, area.w(), row), scale, panel.results().get(i));
        }
        if (known && axis.mode() == Mode.QUANTITY) {
            setUp(pen, scale);
        }
    }

    private double x(Rect scale, double at) {
        return scale.x() + scale.w() * axis.part(at);
    }

    private void ticks(TidyPen pen, Rect scale) {
        List<Double> at = new ArrayList<>();
        List<String> labels = new ArrayList<>();
        Unit unit = unit();
        if (axis.mode() == Mode.MARGIN) {
            Ticks ticks = Ticks.of(axis.low(), axis.high(), 5);
            for (int i = 0; i < ticks.count(); i++) {
                at.add(ticks.at(i));
                labels.add(ticks.label(i));
            }
        } else {
            double low = axis.mode() == Mode.RATIO ? axis.low() : unit.fromSi(axis.low());
            double high = axis.mode() == Mode.RATIO ? axis.high() : unit.fromSi(axis.high());
            for (double tick : LogTicks.of(low, high, (int) Math.max(2, scale.w() / 40))) {
                at.add(axis.mode() == Mode.RATIO ? tick : unit.toSi(tick));
                labels.add(LogTicks.label(tick));
            }
        }
        for (int i = 0; i < at.size(); i++) {
            double px = x(scale, at.get(i));
            pen.line(Stroke.of(Ink.GRID, 1), px, scale.y(), px, scale.bottom());
            pen.text(Lettering.of(Ink.FAINT, 0), labels.get(i), px, scale.bottom() + 15);
        }
        pen.line(Stroke.of(Ink.AXIS, 1), scale.x(), scale.bottom(), scale.right(), scale.bottom());
        Lettering name = Lettering.of(Ink.TEXT, 0);
        pen.note(name, pen.fit(name, words(unit), scale.w() + VERDICT), scale.midX(), scale.bottom() + 29);
    }

    private Unit unit() {
        return Display.unit(axis.kind(), units, Math.sqrt(Math.abs(axis.low() * axis.high())));
    }

    private String words(Unit unit) {
        switch (axis.mode()) {
            case QUANTITY:
                return axis.kind().words() + (unit.label().isEmpty() ? "" : ", " + unit.label());
            case RATIO:
                return "value over limit";
            default:
                return "margin, 0 at the limit, clear to the right" + (axis.full() ? "; ends mean more" : "");
        }
    }

    private void row(TidyPen pen, Rect row, Rect scale, CheckResult r) {
        Ink ink = r.inRange() ? Ink.TEXT : Ink.FAINT;
        Lettering name = Lettering.of(ink, -1);
        double room = scale.x() - row.x() - 18;
        pen.text(name, pen.fit(name, r.info().name(), room), row.x() + 6, row.midY() - 2);
        Lettering small = Lettering.of(Ink.FAINT, -1);
        String second = r.inRange() ? r.info().formula() : "outside its range; " + r.info().formula();
        pen.text(small, pen.fit(small, second, room), row.x() + 6, row.midY() + 12);
        pen.line(Stroke.of(Ink.GRID, 1), row.x() + 6, row.bottom(), row.right() - 6, row.bottom());
        Lettering verdict = r.inRange() ? Lettering.of(Inks.of(r.verdict()), -1).heavy() : small;
        pen.text(verdict, r.verdict().shape() + " " + r.verdict().word(), scale.right() + 12, row.midY() + 4);
        if (LadderAxis.known(r)) {
            rule(pen, row, scale, r);
        } else {
            pen.text(small, pen.fit(small, r.note(), scale.w() - 8), scale.x() + 4, row.midY() + 4);
        }
    }

    private void rule(TidyPen pen, Rect row, Rect scale, CheckResult r) {
        double limit = x(scale, axis.limit(r));
        double far = axis.clearOnTheLeft(r) ? scale.x() : scale.right();
        double top = row.y() + 5;
        double bottom = row.bottom() - 5;
        if (r.inRange()) {
            pen.area(Ink.CLEAR, 0.14, new double[] {limit, far, far, limit}, new double[] {top, top, bottom, bottom}, 4);
            pen.line(Stroke.of(Ink.TEXT, 2.5), limit, top, limit, bottom);
        } else {
            pen.line(Stroke.dashed(Ink.FAINT, 1), limit, top, far, top);
            pen.line(Stroke.dashed(Ink.FAINT, 1), limit, bottom, far, bottom);
            pen.line(Stroke.dashed(Ink.FAINT, 1.5), limit, top, limit, bottom);
        }
        Inks.mark(pen, r.verdict(), r.inRange(), new double[] {x(scale, axis.value(r)), row.midY(), MARK});
    }

    /** The set-up as one line across all rules, with its number at the top. */
    private void setUp(TidyPen pen, Rect scale) {
        CheckResult first = panel.results().stream().filter(LadderAxis::known).findFirst().orElseThrow();
        double at = axis.value(first);
        double px = x(scale, at);
        pen.line(Stroke.of(Ink.CURSOR, 1.5), px, scale.y(), px, scale.bottom());
        String text = "this set-up " + Show.value(at, axis.kind(), units, 3);
        pen.note(Lettering.of(Ink.TEXT, 0).heavy(), text, px, scale.y() - 4);
    }
}
