package slantfall.figure;

import slantfall.declare.Verdict;
import slantfall.figure.Pen.Stroke;

/** Verdicts as ink and shape; the shape alone tells them apart. */
final class Inks {

    private static final int ARC = 12;

    private Inks() {}

    static Ink of(Verdict verdict) {
        switch (verdict) {
            case CLEAR:
                return Ink.CLEAR;
            case NEAR:
                return Ink.NEAR;
            case CROSSED:
                return Ink.CROSSED;
            default:
                return Ink.UNKNOWN;
        }
    }

    /**
     * Draws a verdict: disc, half disc, cross, ring.
     *
     * @param full false where the rule lies outside its range: the shape stays hollow
     * @param place x, y, radius [px]
     */
    static void mark(Pen pen, Verdict verdict, boolean full, double[] place) {
        Ink ink = full ? of(verdict) : Ink.FAINT;
        double x = place[0];
        double y = place[1];
        double r = place[2];
        if (verdict == Verdict.CROSSED) {
            double width = full ? 2.5 : 1;
            pen.line(Stroke.of(ink, width), x - r, y - r, x + r, y + r);
            pen.line(Stroke.of(ink, width), x - r, y + r, x + r, y - r);
            return;
        }
        pen.disc(ink, x, y, r, full && verdict == Verdict.CLEAR);
        if (full && verdict == Verdict.NEAR) {
            double[] px = new double[ARC + 1];
            double[] py = new double[ARC + 1];
            for (int i = 0; i <= ARC; i++) {
                double phi = Math.PI * (0.5 + (double) i / ARC);
                px[i] = x + r * Math.cos(phi);
                py[i] = y + r * Math.sin(phi);
            }
            pen.area(ink, 1, px, py, ARC + 1);
        }
    }
}
