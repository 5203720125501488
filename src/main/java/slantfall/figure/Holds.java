package slantfall.figure;

import java.util.HashMap;
import java.util.Map;

/**
 * Keeps axes still. While something is dragged an axis only widens when the data leave it; at rest it also shrinks when
 * the data fill less than a third of it. Used from one thread.
 */
public final class Holds {

    private static final double ROOM = 3;

    private final Map<String, Span> spans = new HashMap<>();
    private boolean dragging;

    /** Says whether something is being dragged. */
    public void setDragging(boolean now) {
        dragging = now;
    }

    /** Whether something is being dragged. */
    public boolean isDragging() {
        return dragging;
    }

    /** Forgets every axis, for another set-up. */
    public void clear() {
        spans.clear();
    }

    /** A place or scale that follows at rest and stands still while something is dragged. */
    double still(String name, double wanted) {
        Span held = spans.get(name);
        if (dragging && held != null) {
            return held.high();
        }
        spans.put(name, new Span(0, wanted));
        return wanted;
    }

    /** A scale that follows at rest and only grows while something is dragged. */
    double growing(String name, double wanted) {
        Span held = spans.get(name);
        double next = dragging && held != null ? Math.max(held.high(), wanted) : wanted;
        spans.put(name, new Span(0, next));
        return next;
    }

    /** The stretch to draw for an axis whose data want another one. */
    Span hold(String axis, Span wanted) {
        Span held = spans.get(axis);
        if (held != null && held.holds(wanted) && (dragging || held.length() <= ROOM * wanted.length())) {
            return held;
        }
        Span next = held != null && dragging
                ? new Span(Math.min(held.low(), 1.3 * Math.min(0, wanted.low())), Math.max(held.high(), 1.3 * wanted.high()))
                : wanted;
        spans.put(axis, next);
        return next;
    }
}
