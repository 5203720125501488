package slantfall.figure;

/**
 * A rectangle, y downwards.
 *
 * @param x left [px]
 * @param y top [px]
 * @param w width [px]
 * @param h height [px]
 */
public record Rect(double x, double y, double w, double h) {

    double right() {
        return x + w;
    }

    double bottom() {
        return y + h;
    }

    double midX() {
        return x + w / 2;
    }

    double midY() {
        return y + h / 2;
    }

    /** The rectangle less a border. */
    Rect inset(double left, double top, double rightSide, double below) {
        return new Rect(x + left, y + top, Math.max(1, w - left - rightSide), Math.max(1, h - top - below));
    }

    /** Whether two rectangles cover each other. */
    boolean meets(Rect other) {
        return x < other.right() && other.x < right() && y < other.bottom() && other.y < bottom();
    }

    Rect moved(double dx, double dy) {
        return new Rect(x + dx, y + dy, w, h);
    }

    /** Whether a point lies inside. */
    public boolean contains(double px, double py) {
        return px >= x && px <= right() && py >= y && py <= bottom();
    }
}
