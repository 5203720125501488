package slantfall.figure;

/**
 * A place in a picture that can be dragged.
 *
 * @param key setting that follows the drag, or the reading that is wanted
 * @param by setting that answers where a reading is dragged, empty otherwise
 * @param name words for people
 * @param x where it lies [px]
 * @param y where it lies [px]
 * @param value what a pointer position means [px to SI]
 */
public record Handle(String key, String by, String name, double x, double y, Reach value) {

    /** What a pointer position means. */
    @FunctionalInterface
    public interface Reach {

        /** The value at a position [SI]. */
        double at(double px, double py);
    }

    /** A handle of a setting. */
    static Handle setting(String key, String name, double x, double y, Reach value) {
        return new Handle(key, "", name, x, y, value);
    }

    /** Whether it drags a reading. */
    public boolean dragsReading() {
        return !by.isEmpty();
    }
}
