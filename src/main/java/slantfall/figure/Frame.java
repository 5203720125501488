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
    void drawAcross(Pen pen, Unit unit, String name) {
        Ticks ticks = Ticks.of(unit.fromSi(across.low()), unit.fromSi(across.high()), (int) Math.max(2, area.w() / 55));
        Lettering small = Lettering.of(Ink.FAINT, 0);
        for (int i = 0; i < ticks.count(); i++) {
            double px = x(unit.toSi(ticks.at(i)));
            pen.line(Stroke.of(Ink.GRID, 1), px, area.y(), px, area.bottom());
            pen.text(small, ticks.label(i), px, area.bottom() + 13);
        }
        pen.line(Stroke.of(Ink.AXIS, 1), area.x(), area.bottom(), area.right(), area.bottom());
        pen.text(Lettering.of(Ink.TEXT, 0), fit(pen, name + ", " + unit.label(), area.w() + 20), area.midX(), area.bottom() + 27);
    }

    /** Grid lines of the vertical axis, and its labels on the left if there is room for them. */
    void drawUp(Pen pen, Unit unit, String name) {
        Ticks ticks = Ticks.of(unit.fromSi(up.low()), unit.fromSi(up.high()), (int) Math.max(2, area.h() / 34));
        for (int i = 0; i < ticks.count(); i++) {
            double py = y(unit.toSi(ticks.at(i)));
            pen.line(Stroke.of(Ink.GRID, 1), area.x(), py, area.right(), py);
            if (!name.isEmpty()) {
                pen.text(Lettering.of(Ink.FAINT, 1), ticks.label(i), area.x() - 5, py + 4);
            }
        }
        if (!name.isEmpty()) {
            Lettering upright = Lettering.of(Ink.TEXT, 0).turned(90);
            pen.text(upright, fit(pen, name + ", " + unit.label(), area.h() + 10), area.x() - 38, area.midY());
        }
    }

    private static String fit(Pen pen, String text, double room) {
        Lettering plain = Lettering.of(Ink.TEXT, 0);
        String cut = text;
        while (cut.length() > 4 && pen.width(plain, cut) > room) {
            cut = cut.substring(0, cut.length() - 2).stripTrailing() + "…";
        }
        return cut;
    }
}
