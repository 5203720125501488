package slantfall.figure;

/** Draws a figure. One implementation for the screen, one for files. Coordinates in pixels, y downwards. */
public interface Pen {

    /** A straight line. */
    void line(Stroke stroke, double x1, double y1, double x2, double y2);

    /** A line through the first n points. */
    void polyline(Stroke stroke, double[] x, double[] y, int n);

    /** A filled area through the first n points. */
    void area(Ink ink, double opacity, double[] x, double[] y, int n);

    /** A disc, filled with its ink and edged with paper, or hollow. */
    void disc(Ink ink, double x, double y, double radius, boolean filled);

    /**
     * A line of text.
     *
     * @param x where the anchor lies
     * @param y the base line
     */
    void text(Lettering lettering, String text, double x, double y);

    /** Width of a text [px]. */
    double width(Lettering lettering, String text);

    /** Everything drawn until {@link #unclip} stays inside. */
    void clip(Rect rect);

    /** Ends the last clip. */
    void unclip();

    /**
     * A stroke.
     *
     * @param ink what it means
     * @param width [px]
     * @param dashed whether it is broken
     */
    record Stroke(Ink ink, double width, boolean dashed) {

        /** A full stroke. */
        public static Stroke of(Ink ink, double width) {
            return new Stroke(ink, width, false);
        }

        /** A broken stroke. */
        public static Stroke dashed(Ink ink, double width) {
            return new Stroke(ink, width, true);
        }
    }

    /**
     * How text is set.
     *
     * @param ink what it means
     * @param size height [px]
     * @param bold heavy
     * @param anchor which part of the text lies at x: −1 its start, 0 its middle, 1 its end
     * @param turn rotation about the anchor, counter-clockwise [degrees]
     */
    record Lettering(Ink ink, double size, boolean bold, int anchor, double turn) {

        /** Small plain text. */
        public static Lettering of(Ink ink, int anchor) {
            return new Lettering(ink, 11, false, anchor, 0);
        }

        /** The same, heavy. */
        public Lettering heavy() {
            return new Lettering(ink, size, true, anchor, turn);
        }

        /** The same, turned. */
        public Lettering turned(double degrees) {
            return new Lettering(ink, size, bold, anchor, degrees);
        }
    }
}
