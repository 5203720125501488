package slantfall.session;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;

class SchedulerTest {

    @Test
    void onlyTheNewestRequestOfAQuestionIsDelivered() throws InterruptedException {
        BackgroundScheduler scheduler = new BackgroundScheduler(Runnable::run);
        CountDownLatch started = new CountDownLatch(1);
        CountDownLatch go = new CountDownLatch(1);
        CountDownLatch done = new CountDownLatch(1);
        List<Integer> delivered = Collections.synchronizedList(new ArrayList<>());
        scheduler.request("window", () -> {
            started.countDown();
            await(go);
            return 1;
        }, delivered::add, e -> delivered.add(-1));
        await(started);
        scheduler.request("window", () -> 2, delivered::add, e -> delivered.add(-2));
        scheduler.request("window", () -> 3, d -> {
            delivered.add(d);
            done.countDown();
        }, e -> delivered.add(-3));
        go.countDown();
        await(done);
        assertThat(delivered).containsExactly(3);
        scheduler.close();
    }

    @Test
    void questionsDoNotOvertakeEachOther() throws InterruptedException {
        BackgroundScheduler scheduler = new BackgroundScheduler(Runnable::run);
        CountDownLatch done = new CountDownLatch(2);
        List<String> delivered = Collections.synchronizedList(new ArrayList<>());
        for (String question : List.of("leeway", "window")) {
            scheduler.request(question, () -> question, d -> {
                delivered.add(d);
                done.countDown();
            }, e -> delivered.add("failed"));
        }
        await(done);
        assertThat(delivered).containsExactlyInAnyOrder("leeway", "window");
        scheduler.close();
    }

    @Test
    void whatGoesWrongIsDeliveredAndNotSwallowed() {
        List<String> got = new ArrayList<>();
        new DirectScheduler().request("q", () -> {
            throw new IllegalStateException("no root");
        }, d -> got.add("result"), e -> got.add(e.getMessage()));
        assertThat(got).containsExactly("no root");
    }

    private static void await(CountDownLatch latch) {
        try {
            if (!latch.await(10, TimeUnit.SECONDS)) {
                throw new AssertionError("waited too long");
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new AssertionError(e);
        }
    }
}
