package slantfall.session;

import java.util.HashMap;
import java.util.Map;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Supplier;

/** Runs work in one background thread and delivers through the executor of the screen. */
public final class BackgroundScheduler implements Scheduler {

    private final ExecutorService worker;
    private final Executor screen;
    private final Map<String, Long> newest = new HashMap<>();

    /**
     * Starts the thread.
     *
     * @param screen runs deliveries on the screen thread
     */
    public BackgroundScheduler(Executor screen) {
        this.screen = screen;
        worker = Executors.newSingleThreadExecutor(r -> {
            Thread thread = new Thread(r, "slantfall-work");
            thread.setDaemon(true);
            return thread;
        });
    }

    @Override
    public <T> void request(String question, Supplier<T> work, Consumer<T> deliver, Consumer<RuntimeException> failed) {
        long ticket = ticket(question);
        worker.execute(() -> {
            if (!wanted(question, ticket)) {
                return;
            }
            try {
                T result = work.get();
                deliverIfWanted(question, ticket, () -> deliver.accept(result));
            } catch (RuntimeException e) {
                deliverIfWanted(question, ticket, () -> failed.accept(e));
            }
        });
    }

    private void deliverIfWanted(String question, long ticket, Runnable delivery) {
        screen.execute(() -> {
            if (wanted(question, ticket)) {
                delivery.run();
            }
        });
    }

    private synchronized long ticket(String question) {
        return newest.merge(question, 1L, Long::sum);
    }

    private synchronized boolean wanted(String question, long ticket) {
        return newest.getOrDefault(question, 0L) == ticket;
    }

    @Override
    public void close() {
        worker.shutdownNow();
    }
}
