package slantfall.figure;

import slantfall.figure.Pen.Lettering;
import slantfall.figure.Pen.Stroke;
import slantfall.quantity.Unit;

/**
 * A plot area with two linear axes.
 *
 * @param area where it lies
 * @param across stretch of the horizontal axis [SI]
 * @param up stretch of the vertical axis [SI]
 */
record Frame(Rect area, Span across, Span up) {

    /** Room that the horizontal axis needs below the area, with its name on two lines [px]. */
    static final double BELOW = 46;

    private static final double TICK_LINE = 17;
    private static final double NAME_LINE = 31;
    private static final double UNIT_LINE = 43;

    double x(double value) {
        return area.x() + area.w() * (value - across.low()) / across.length();
    }

    double y(double value) {
        return area.bottom() - area.h() * (value - up.low()) / up.length();
    }

    double valueX(double px) {
        return across.low() + (px - area.x()) / area.w() * across.length();
    }

    double valueY(double py) {
        return up.low() + (area.bottom() - py) / area.h() * up.length();
    }

    /** Grid lines and labels of the horizontal axis, with its name below. */
    void drawAcross(TidyPen pen, Unit unit, String name) {
        Ticks ticks = Ticks.of(unit.fromSi(across.low()), unit.fromSi(across.high()), (int) Math.max(3, area.w() / 48));
        Lettering small = Lettering.of(Ink.FAINT, 0);
        for (int i = 0; i < ticks.count(); i++) {
            double px = x(unit.toSi(ticks.at(i)));
            pen.line(Stroke.of(Ink.GRID, 1), px, area.y(), px, area.bottom());
            pen.text(small, ticks.label(i), px, area.bottom() + TICK_LINE);
        }
        pen.line(Stroke.of(Ink.AXIS, 1), area.x(), area.bottom(), area.right(), area.bottom());
        drawName(pen, name, unit.label());
    }

    /** The name of the horizontal axis, its unit on a second line where one is too long. */
    void drawName(TidyPen pen, String name, String unit) {
        Lettering plain = Lettering.of(Ink.TEXT, 0);
        String whole = unit.isEmpty() ? name : name + ", " + unit;
        if (unit.isEmpty() || pen.width(plain, whole) <= area.w() + 8) {
            pen.note(plain, pen.fit(plain, whole, area.w() + 8), area.midX(), area.bottom() + NAME_LINE);
        } else {
            pen.note(plain, pen.fit(plain, name, area.w() + 8), area.midX(), area.bottom() + NAME_LINE);
            pen.text(plain, unit, area.midX(), area.bottom() + UNIT_LINE);
        }
    }

    /** The name with its unit; where there is no room the name is cut and the unit kept. */
    private String withUnit(TidyPen pen, String name, String unit) {
        Lettering plain = Lettering.of(Ink.TEXT, 0);
        String end = unit.isEmpty() ? "" : ", " + unit;
        double room = area.h() + 20;
        return pen.fit(plain, name, room - pen.width(plain, end)) + end;
    }

    /** Grid lines of the vertical axis, and its labels on the left if there is room for them. */
    void drawUp(TidyPen pen, Unit unit, String name) {
        Ticks ticks = Ticks.of(unit.fromSi(up.low()), unit.fromSi(up.high()), (int) Math.max(3, area.h() / 30));
        Lettering small = Lettering.of(Ink.FAINT, 1);
        double widest = 28;
        for (int i = 0; i < ticks.count(); i++) {
            double py = y(unit.toSi(ticks.at(i)));
            pen.line(Stroke.of(Ink.GRID, 1), area.x(), py, area.right(), py);
            if (!name.isEmpty()) {
                pen.text(small, ticks.label(i), area.x() - 5, py + 4);
                widest = Math.max(widest, pen.width(small, ticks.label(i)));
            }
        }
        if (!name.isEmpty()) {
            Lettering upright = Lettering.of(Ink.TEXT, 0).turned(90);
            pen.text(upright, withUnit(pen, name, unit.label()), area.x() - widest - 11, area.midY());
        }
    }
}
