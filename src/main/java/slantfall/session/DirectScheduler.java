package slantfall.session;

import java.util.function.Consumer;
import java.util.function.Supplier;

/** The headless twin: does everything at once, in the calling thread. */
public final class DirectScheduler implements Scheduler {

    @Override
    public <T> void request(String question, Supplier<T> work, Consumer<T> deliver, Consumer<RuntimeException> failed) {
        T result;
        try {
            result = work.get();
        } catch (RuntimeException e) {
            failed.accept(e);
            return;
        }
        deliver.accept(result);
    }

    @Override
    public void close() {
        // nothing runs beyond the call
    }
}
