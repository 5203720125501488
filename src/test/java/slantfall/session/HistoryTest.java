package slantfall.session;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class HistoryTest {

    @Test
    void undoAndRedoWalkEveryStep() {
        History<Integer> h = new History<>(0);
        for (int i = 1; i <= 1000; i++) {
            h.record(i, null);
        }
        for (int i = 999; i >= 0; i--) {
            assertThat(h.undo()).isEqualTo(i);
        }
        assertThat(h.canUndo()).isFalse();
        assertThat(h.undo()).isZero();
        for (int i = 1; i <= 1000; i++) {
            assertThat(h.redo()).isEqualTo(i);
        }
        assertThat(h.canRedo()).isFalse();
    }

    @Test
    void oneDragIsOneStep() {
        History<Integer> h = new History<>(0);
        Object drag = new Object();
        h.record(1, drag);
        h.record(2, drag);
        h.record(3, drag);
        assertThat(h.undo()).isZero();
        assertThat(h.redo()).isEqualTo(3);
    }

    @Test
    void twoDragsAreTwoSteps() {
        History<Integer> h = new History<>(0);
        h.record(1, "drag");
        h.endGesture();
        h.record(2, "drag");
        assertThat(h.undo()).isEqualTo(1);
    }

    @Test
    void aGestureAfterUndoDoesNotOverwriteWhatCameBefore() {
        History<Integer> h = new History<>(0);
        h.record(1, "drag");
        h.undo();
        h.record(5, "drag");
        assertThat(h.undo()).isZero();
    }

    @Test
    void aNewChangeDropsWhatWasUndone() {
        History<Integer> h = new History<>(0);
        h.record(1, null);
        h.undo();
        h.record(2, null);
        assertThat(h.canRedo()).isFalse();
        assertThat(h.current()).isEqualTo(2);
    }
}
