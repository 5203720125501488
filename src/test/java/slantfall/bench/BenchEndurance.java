package slantfall.bench;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import javafx.animation.AnimationTimer;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.stage.Stage;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.FramePulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.declare.Scale;
import slantfall.declare.Setting;
import slantfall.session.DirectScheduler;
import slantfall.session.Session;

/**
 * Drags sliders at random, one tick a frame, for some minutes and prints heap in use after a collection, heap taken and
 * resident memory every minute. Arguments: minutes.
 */
public final class BenchEndurance {

    private static final long MINUTE = 60_000_000_000L;

    private BenchEndurance() {}

    /** Entry point. */
    public static void main(String[] args) {
        int minutes = Integer.parseInt(args[0]);
        Platform.startup(() -> begin(minutes));
    }

    private static void begin(int minutes) {
        Theme theme = new Theme();
        Desk desk = new Desk(new Session(MemoryDisk.film()), new FramePulse());
        BenchWindow window = new BenchWindow(desk, new MemoryDisk(), BenchTicks.nobody(), theme, new DirectScheduler());
        Stage stage = new Stage();
        Scene scene = window.scene(1440, 900, theme);
        stage.setScene(scene);
        stage.show();
        new Drags(desk, minutes).start();
    }

    private static final class Drags extends AnimationTimer {

        private final Desk desk;
        private final int minutes;
        private final Random random = new Random(1);
        private final long started = System.nanoTime();
        private int told;
        private long ticks;
        private int left;
        private Setting setting;
        private Object gesture;
        private double place;

        Drags(Desk desk, int minutes) {
            super();
            this.desk = desk;
            this.minutes = minutes;
        }

        @Override
        public void handle(long now) {
            ticks++;
            if (left-- <= 0) {
                next();
            }
            place = Math.max(0, Math.min(1, place + 0.04 * (random.nextDouble() - 0.5)));
            double low = setting.usual().low();
            double high = setting.usual().high();
            double value = setting.scale() == Scale.LOG ? low * Math.pow(high / low, place) : low + place * (high - low);
            desk.moveNear(setting, value, gesture);
            int minute = (int) ((System.nanoTime() - started) / MINUTE);
            if (minute > told) {
                told = minute;
                tell(minute);
            }
            if (minute >= minutes) {
                stop();
                Platform.exit();
            }
        }

        private void next() {
            desk.session().endGesture();
            if (random.nextInt(8) == 0) {
                desk.session().undo();
            }
            List<Setting> all = desk.declaration().coordinates();
            setting = all.get(random.nextInt(all.size()));
            gesture = new Object();
            left = 30 + random.nextInt(60);
            place = random.nextDouble();
        }

        private void tell(int minute) {
            Runtime runtime = Runtime.getRuntime();
            long taken = runtime.totalMemory() >> 20;
            System.gc();
            long used = runtime.totalMemory() - runtime.freeMemory() >> 20;
            System.out.println("minute " + minute + ": " + ticks + " ticks, heap in use " + used + " MB, heap taken " + taken
                    + " MB, resident " + resident());
        }

        private static String resident() {
            try {
                return Files.readAllLines(Path.of("/proc/self/status")).stream()
                        .filter(l -> l.startsWith("VmRSS"))
                        .findFirst()
                        .map(l -> l.replaceAll("\\D+", ""))
                        .map(kb -> Long.parseLong(kb) / 1024 + " MB")
                        .orElse("unknown");
            } catch (java.io.IOException e) {
                return "unknown (" + e.getMessage() + ")";
            }
        }
    }
}
