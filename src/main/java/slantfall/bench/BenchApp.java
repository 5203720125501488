package slantfall.bench;

import java.nio.file.Path;
import java.util.List;
import javafx.application.Application;
import javafx.application.Platform;
import javafx.geometry.Rectangle2D;
import javafx.stage.Screen;
import javafx.stage.Stage;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.FramePulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.bench.shell.FileDesk;
import slantfall.bench.shell.FileLife;
import slantfall.bench.shell.StageChooser;
import slantfall.bench.shell.StoreDesk;
import slantfall.session.BackgroundScheduler;
import slantfall.session.Session;

/** The window as an application of the toolkit. */
public final class BenchApp extends Application {

    private static final double WIDTH = 1440;
    private static final double HEIGHT = 900;
    private static final double SMALLEST_WIDTH = 720;
    private static final double SMALLEST_HEIGHT = 480;
    private static final String THEME = "theme";
    private static final String DARK = "dark";

    private FileLife files;

    @Override
    public void start(Stage stage) {
        FileDesk disk = StoreDesk.ofUser();
        Theme theme = new Theme();
        theme.darkProperty().set(DARK.equals(disk.preferences().theme()));
        Desk desk = new Desk(new Session(disk.example(disk.examples().get(0)).setUp()), new FramePulse());
        desk.unitsProperty().set(disk.preferences().units());
        BenchWindow window = new BenchWindow(
                desk, disk, new StageChooser(stage), theme, new BackgroundScheduler(Platform::runLater));
        files = window.files();
        theme.darkProperty().addListener((o, a, dark) ->
                files.prefer(files.preferences().with(THEME, dark ? DARK : "light")));
        desk.unitsProperty().addListener((o, a, units) -> files.prefer(files.preferences().in(units)));
        stage.titleProperty().bind(desk.titleProperty());
        stage.focusedProperty().addListener((o, a, focused) -> {
            if (focused) {
                files.look();
            }
        });
        stage.setScene(window.scene(WIDTH, HEIGHT, theme));
        fit(stage);
        openFirst();
        stage.setOnShown(e -> Platform.runLater(() -> settle(stage)));
        stage.show();
        StartClock.maybe();
    }

    @Override
    public void stop() {
        files.end();
    }

    /** As large as wished, where the screen has room for it. */
    private static void fit(Stage stage) {
        Rectangle2D room = Screen.getPrimary().getVisualBounds();
        stage.setWidth(Math.min(WIDTH, room.getWidth()));
        stage.setHeight(Math.min(HEIGHT, room.getHeight()));
    }

    /**
     * Says the size once more when the window stands: some window managers open it at its smallest and tell nobody, and a
     * size that does not change is not sent.
     */
    private static void settle(Stage stage) {
        double width = stage.getWidth();
        double height = stage.getHeight();
        stage.setMinWidth(SMALLEST_WIDTH);
        stage.setMinHeight(SMALLEST_HEIGHT);
        stage.setWidth(width - 1);
        stage.setHeight(height - 1);
        Platform.runLater(() -> {
            stage.setWidth(width);
            stage.setHeight(height);
        });
    }

    private void openFirst() {
        List<String> named = getParameters().getUnnamed();
        if (named.isEmpty()) {
            files.start();
        } else {
            files.open(Path.of(named.get(0)));
        }
    }
}
