package slantfall.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;

/**
 * Undo and redo without limit. Steps of one gesture (a drag, a run of arrow keys) collapse into one.
 *
 * @param <T> immutable state
 */
public final class History<T> {

    private final List<T> states = new ArrayList<>();
    private int now;
    private Object gesture;

    /** Begins with a state. */
    public History(T first) {
        states.add(Objects.requireNonNull(first, "first"));
    }

    /** The current state. */
    public T current() {
        return states.get(now);
    }

    /**
     * Records a new state; what was undone before is dropped.
     *
     * @param gestureId equal ids in a row make one step, null is always a step of its own
     */
    public void record(T state, Object gestureId) {
        boolean same = gestureId != null && gestureId.equals(gesture) && now == states.size() - 1 && now > 0;
        if (same) {
            states.set(now, state);
            return;
        }
        states.subList(now + 1, states.size()).clear();
        states.add(state);
        now++;
        gesture = gestureId;
    }

    /** Ends a gesture, so that the next change is a step of its own. */
    public void endGesture() {
        gesture = null;
    }

    /** Whether there is something to undo. */
    public boolean canUndo() {
        return now > 0;
    }

    /** Whether there is something to redo. */
    public boolean canRedo() {
        return now < states.size() - 1;
    }

    /** One step back. */
    public T undo() {
        gesture = null;
        now = Math.max(0, now - 1);
        return current();
    }

    /** One step forward. */
    public T redo() {
        gesture = null;
        now = Math.min(states.size() - 1, now + 1);
        return current();
    }

    /** Forgets everything but a new first state. */
    public void restart(T first) {
        states.clear();
        states.add(first);
        now = 0;
        gesture = null;
    }
}
