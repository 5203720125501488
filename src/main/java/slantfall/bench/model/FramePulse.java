package slantfall.bench.model;

import javafx.animation.AnimationTimer;

/** The pulse of the screen: what was asked for runs once, before the next frame is laid out and drawn. */
public final class FramePulse implements Pulse {

    private Runnable waiting;

    private final AnimationTimer timer = new AnimationTimer() {
        @Override
        public void handle(long now) {
            stop();
            Runnable task = waiting;
            waiting = null;
            task.run();
        }
    };

    @Override
    public void request(Runnable task) {
        if (waiting == null) {
            waiting = task;
            timer.start();
        }
    }
}
