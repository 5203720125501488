package slantfall.session;

import java.util.function.Consumer;
import java.util.function.Supplier;

/**
 * Runs work that may take longer than a frame. For each question only the newest request counts: an older one that waits
 * is dropped, and the result of one that was overtaken is not delivered.
 */
public interface Scheduler {

    /**
     * Asks for work.
     *
     * @param question which question; a newer request for the same one replaces it
     * @param work what to compute, without touching the screen
     * @param deliver receives the result on the screen thread, if it is still wanted
     * @param failed receives what went wrong, on the screen thread
     */
    <T> void request(String question, Supplier<T> work, Consumer<T> deliver, Consumer<RuntimeException> failed);

    /** Stops accepting and running work. */
    void close();
}
