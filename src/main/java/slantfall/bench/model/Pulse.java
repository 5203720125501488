package slantfall.bench.model;

/** Runs something at most once per frame, however often it was asked for. */
public interface Pulse {

    /** Asks for the task; asking again before it ran changes nothing. */
    void request(Runnable task);

    /** The pulse of a test: at once. */
    static Pulse atOnce() {
        return Runnable::run;
    }
}
