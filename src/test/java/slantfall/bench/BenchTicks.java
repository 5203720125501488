package slantfall.bench;

import com.sun.javafx.tk.Toolkit;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.shape.Rectangle;
import javafx.stage.Stage;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.bench.shell.Chooser;
import slantfall.declare.Setting;
import slantfall.session.DirectScheduler;
import slantfall.session.Scheduler;
import slantfall.session.Session;

/**
 * Times one slider tick at 1440 x 900: the change, everything computed, every label set, pictures drawn, styled and laid
 * out on the screen thread; and the same until the renderer has the frame done, which a picture of one pixel waits for.
 */
public final class BenchTicks {

    private static final int WARM = 400;
    private static final int RUNS = 600;

    private BenchTicks() {}

    /** Entry point. */
    public static void main(String[] args) throws Exception {
        CountDownLatch done = new CountDownLatch(1);
        Platform.startup(() -> {
            run("slot", "gap");
            run("film", "feed");
            done.countDown();
        });
        done.await();
        Platform.exit();
    }

    private static void run(String example, String key) {
        Theme theme = new Theme();
        Desk desk = new Desk(new Session(example.equals("film") ? MemoryDisk.film() : MemoryDisk.slot()), Pulse.atOnce());
        Scheduler nothing = new DirectScheduler();
        BenchWindow window = new BenchWindow(desk, new MemoryDisk(), nobody(), theme, nothing);
        Stage stage = new Stage();
        Scene scene = window.scene(1440, 900, theme);
        stage.setScene(scene);
        stage.setWidth(1440);
        stage.setHeight(900);
        stage.show();
        window.applyCss();
        window.layout();
        Setting setting = desk.declaration().setting(key).orElseThrow();
        double[] thread = new double[RUNS];
        double[] whole = new double[RUNS];
        WritableImage image = new WritableImage(1, 1);
        Rectangle pixel = new Rectangle(1, 1);
        for (int i = -WARM; i < RUNS; i++) {
            long start = System.nanoTime();
            desk.moveNear(setting, setting.initial() * (1 + 0.01 * ((i + WARM) % 97)), "drag");
            Toolkit.getToolkit().firePulse();
            long laid = System.nanoTime();
            pixel.snapshot(null, image);
            if (i >= 0) {
                thread[i] = (laid - start) / 1e6;
                whole[i] = (System.nanoTime() - start) / 1e6;
            }
        }
        print(example + " " + key + ", screen thread", thread);
        print(example + " " + key + ", until rendered", whole);
        stage.hide();
    }

    static Chooser nobody() {
        return new Chooser() {
            @Override
            public Optional<Path> open() {
                return Optional.empty();
            }

            @Override
            public Optional<Path> save(String suggestedName) {
                return Optional.empty();
            }
        };
    }

    private static void print(String what, double[] ms) {
        double[] sorted = ms.clone();
        Arrays.sort(sorted);
        System.out.printf("%-44s median %.2f ms, 95th percentile %.2f ms%n", what, sorted[RUNS / 2], sorted[RUNS * 95 / 100]);
    }
}
