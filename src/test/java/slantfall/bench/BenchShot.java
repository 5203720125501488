package slantfall.bench;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import javafx.application.Platform;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.stage.Stage;
import javax.imageio.ImageIO;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.bench.shell.Chooser;
import slantfall.bench.shell.FileDesk;
import slantfall.bench.shell.StoreDesk;
import slantfall.session.DirectScheduler;
import slantfall.session.Session;

/**
 * Writes pictures of the window in its sizes and looks, to be looked at by a person. Arguments: a folder, and
 * {@code guide} for those of the user guide alone: the film in light, the slot in dark looks.
 */
public final class BenchShot {

    private static final int[][] SIZES = {{1440, 900}, {1100, 720}, {960, 600}};

    private static final Chooser NOBODY = new Chooser() {
        @Override
        public Optional<Path> open() {
            return Optional.empty();
        }

        @Override
        public Optional<Path> save(String suggestedName) {
            return Optional.empty();
        }
    };

    private BenchShot() {}

    /** Entry point. */
    public static void main(String[] args) throws Exception {
        Path folder = Files.createDirectories(Path.of(args[0]));
        FileDesk disk = new StoreDesk(folder);
        Platform.startup(() -> Platform.setImplicitExit(false));
        boolean guide = args.length > 1 && args[1].equals("guide");
        for (String example : disk.examples().subList(0, 2)) {
            for (boolean dark : new boolean[] {false, true}) {
                for (int[] size : SIZES) {
                    boolean film = example.equals(disk.examples().get(0));
                    if (guide && dark == film) {
                        continue;
                    }
                    onScreen(() -> shot(folder, disk, example, dark, size));
                }
            }
        }
        Platform.exit();
    }

    private static void onScreen(Runnable task) throws InterruptedException {
        CountDownLatch done = new CountDownLatch(1);
        Throwable[] wrong = new Throwable[1];
        Platform.runLater(() -> {
            try {
                task.run();
            } catch (Throwable e) {
                wrong[0] = e;
            }
            done.countDown();
        });
        if (!done.await(60, TimeUnit.SECONDS) || wrong[0] != null) {
            throw new IllegalStateException("no picture", wrong[0]);
        }
    }

    private static void shot(Path folder, FileDesk disk, String example, boolean dark, int[] size) {
        Theme theme = new Theme();
        theme.darkProperty().set(dark);
        Desk desk = new Desk(new Session(disk.example(example).setUp()), Pulse.atOnce());
        desk.open(disk.example(example).setUp(), null, null);
        BenchWindow window = new BenchWindow(desk, disk, NOBODY, theme, new DirectScheduler());
        Stage stage = new Stage();
        Scene scene = window.scene(size[0], size[1], theme);
        stage.setScene(scene);
        stage.setWidth(size[0]);
        stage.setHeight(size[1]);
        stage.show();
        for (int i = 0; i < 3; i++) {
            window.applyCss();
            window.layout();
        }
        WritableImage image = scene.snapshot(null);
        stage.hide();
        String name = example.replaceAll("[^a-z]", "-") + "-" + size[0] + (dark ? "-dark" : "-light") + ".png";
        try {
            ImageIO.write(SwingFXUtils.fromFXImage(image, null), "png", folder.resolve(name).toFile());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
