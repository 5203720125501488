package slantfall.figure;

import java.util.ArrayList;
import java.util.List;

/**
 * Keeps texts apart and inside the picture. A plain text stays where it belongs or is left out, as a label on an axis must;
 * a note may step aside.
 */
final class TidyPen implements Pen {

    /** Steps that a note tries, in widths of one line: up, down, further, then to the sides. */
    private static final double[][] STEPS = {
        {0, 0}, {0, -1}, {0, 1}, {0, -2}, {0, 2}, {-3, 0}, {3, 0}, {-3, -1}, {3, -1}, {-3, 1}, {3, 1}, {0, -3}, {0, 3}, {-6, 0},
        {6, 0}, {-6, 1}, {6, 1}, {-6, -1}, {6, -1}, {-10, 0}, {10, 0}
    };

    /** How many of the steps keep a note beside the thing it names. */
    private static final int NEARBY = 5;
    private static final double LINE = 14;
    private static final double ABOVE = 0.76;
    private static final double BELOW = 0.24;

    private final Pen pen;
    private final Rect area;
    private final List<Rect> taken;

    /**
     * Writes into an area.
     *
     * @param area no text leaves it
     */
    TidyPen(Pen pen, Rect area) {
        this(pen, area, new ArrayList<>());
    }

    private TidyPen(Pen pen, Rect area, List<Rect> taken) {
        this.pen = pen;
        this.area = area;
        this.taken = taken;
    }

    /** A pen on which nothing is written yet, or the same one if it is tidy already. */
    static TidyPen on(Pen pen, Rect area) {
        return pen instanceof TidyPen ? (TidyPen) pen : new TidyPen(pen, area);
    }

    /** The same sheet, with texts kept inside a part of it. */
    TidyPen within(Rect part) {
        return new TidyPen(pen, part, taken);
    }

    /** Keeps texts out of a rectangle. */
    void block(Rect rect) {
        taken.add(rect);
    }

    /** Keeps texts off a line. */
    void blockLine(double x1, double y1, double x2, double y2, double half) {
        int n = (int) Math.max(1, Math.min(200, Math.hypot(x2 - x1, y2 - y1) / 6));
        for (int i = 0; i <= n; i++) {
            double x = x1 + (x2 - x1) * i / n;
            double y = y1 + (y2 - y1) * i / n;
            taken.add(new Rect(x - half, y - half, 2 * half, 2 * half));
        }
    }

    /** Writes exactly here, or not at all where something stands already. */
    @Override
    public void text(Lettering lettering, String text, double x, double y) {
        write(lettering, text, x, y, false);
    }

    /**
     * Writes here or beside it.
     *
     * @return whether there was room
     */
    boolean note(Lettering lettering, String text, double x, double y) {
        return note(lettering, text, x, y, new Trial(STEPS.length, false));
    }

    /** A note on a slip of paper, so that it can be read on top of a curve. */
    boolean slip(Lettering lettering, String text, double x, double y) {
        return note(lettering, text, x, y, new Trial(STEPS.length, true));
    }

    /** A note that would mislead further away. */
    boolean beside(Lettering lettering, String text, double x, double y) {
        return note(lettering, text, x, y, new Trial(NEARBY, false));
    }

    private boolean note(Lettering lettering, String text, double x, double y, Trial trial) {
        double inX = x;
        double inY = y;
        if (lettering.turn() == 0) {
            double w = width(lettering, text);
            double left = x - (lettering.anchor() + 1) * w / 2;
            inX += Math.max(0, area.x() - left) - Math.max(0, left + w - area.right());
            inY = Math.min(Math.max(y, area.y() + ABOVE * lettering.size()), area.bottom() - BELOW * lettering.size());
        }
        for (int i = 0; i < trial.steps(); i++) {
            if (write(lettering, text, inX + STEPS[i][0] * LINE, inY + STEPS[i][1] * LINE, trial.slip())) {
                return true;
            }
        }
        return false;
    }

    /**
     * How a note is placed.
     *
     * @param steps how many places are tried
     * @param slip whether it stands on a slip of paper
     */
    private record Trial(int steps, boolean slip) {}

    /** Lines of words below each other, as many as fit; the first base line lies at y. */
    void paragraph(Lettering lettering, String text, Rect room) {
        List<String> lines = wrap(lettering, text, room.w());
        double x = lettering.anchor() < 0 ? room.x() : room.midX();
        for (int i = 0; i < lines.size() && (i + 1) * LINE <= room.h(); i++) {
            boolean cut = (i + 2) * LINE > room.h() && i < lines.size() - 1;
            write(lettering, cut ? lines.get(i) + " …" : lines.get(i), x, room.y() + (i + 1) * LINE - 3, false);
        }
    }

    private List<String> wrap(Lettering lettering, String text, double room) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : text.split(" ")) {
            String longer = line.length() == 0 ? word : line + " " + word;
            if (line.length() > 0 && width(lettering, longer) > room) {
                lines.add(line.toString());
                line = new StringBuilder(word);
            } else {
                line = new StringBuilder(longer);
            }
        }
        lines.add(line.toString());
        return lines;
    }

    /** The text, or its beginning with an ellipsis where it is too wide. */
    String fit(Lettering lettering, String text, double room) {
        String cut = text;
        while (cut.length() > 4 && width(lettering, cut) > room) {
            cut = cut.substring(0, cut.length() - 2).stripTrailing() + "…";
        }
        return cut;
    }

    private boolean write(Lettering lettering, String text, double x, double y, boolean slip) {
        List<Rect> boxes = boxes(lettering, text, x, y);
        for (Rect box : boxes) {
            if (box.x() < area.x() || box.right() > area.right() || box.y() < area.y() || box.bottom() > area.bottom()) {
                return false;
            }
            for (Rect other : taken) {
                if (box.meets(other)) {
                    return false;
                }
            }
        }
        taken.addAll(boxes);
        if (slip) {
            Rect b = boxes.get(0);
            pen.area(Ink.PAPER, 0.8, new double[] {b.x() - 2, b.right() + 2, b.right() + 2, b.x() - 2}, new double[] {
                b.y(), b.y(), b.bottom(), b.bottom()
            }, 4);
        }
        pen.text(lettering, text, x, y);
        return true;
    }

    /** Rectangles that cover a text: one if it stands straight, a chain if it runs along a slope. */
    private List<Rect> boxes(Lettering l, String text, double x, double y) {
        double w = width(l, text);
        double from = -(l.anchor() + 1) * w / 2;
        double cos = Math.cos(Math.toRadians(l.turn()));
        double sin = -Math.sin(Math.toRadians(l.turn()));
        int parts = l.turn() % 90 == 0 ? 1 : (int) Math.max(1, Math.ceil(w / l.size()));
        List<Rect> boxes = new ArrayList<>(parts);
        for (int i = 0; i < parts; i++) {
            boxes.add(box(new double[] {from + w * i / parts, from + w * (i + 1) / parts}, l.size(), cos, sin).moved(x, y));
        }
        return boxes;
    }

    private static Rect box(double[] ends, double size, double cos, double sin) {
        double left = Double.POSITIVE_INFINITY;
        double top = left;
        double right = Double.NEGATIVE_INFINITY;
        double bottom = right;
        for (double along : ends) {
            for (double off : new double[] {-ABOVE * size, BELOW * size}) {
                double px = along * cos - off * sin;
                double py = along * sin + off * cos;
                left = Math.min(left, px);
                right = Math.max(right, px);
                top = Math.min(top, py);
                bottom = Math.max(bottom, py);
            }
        }
        return new Rect(left, top, right - left, bottom - top);
    }

    @Override
    public void line(Stroke stroke, double x1, double y1, double x2, double y2) {
        pen.line(stroke, x1, y1, x2, y2);
    }

    @Override
    public void polyline(Stroke stroke, double[] x, double[] y, int n) {
        pen.polyline(stroke, x, y, n);
    }

    @Override
    public void area(Ink ink, double opacity, double[] x, double[] y, int n) {
        pen.area(ink, opacity, x, y, n);
    }

    @Override
    public void disc(Ink ink, double x, double y, double radius, boolean filled) {
        pen.disc(ink, x, y, radius, filled);
    }

    @Override
    public double width(Lettering lettering, String text) {
        return pen.width(lettering, text);
    }

    @Override
    public void clip(Rect rect) {
        pen.clip(rect);
    }

    @Override
    public void unclip() {
        pen.unclip();
    }
}
