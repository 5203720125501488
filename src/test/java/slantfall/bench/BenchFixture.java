package slantfall.bench;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.TextField;
import javafx.stage.Stage;
import org.testfx.api.FxRobot;
import org.testfx.util.WaitForAsyncUtils;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.FramePulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.bench.shell.Chooser;
import slantfall.bench.shell.StoreDesk;
import slantfall.declare.SetUp;
import slantfall.session.BackgroundScheduler;
import slantfall.session.Session;

/** The whole window over real files in a folder of the test, driven like a person does. */
final class BenchFixture implements Chooser {

    final Desk desk;
    final StoreDesk disk;
    final BenchWindow window;
    final Theme theme = new Theme();
    final Stage stage;
    Path chosen;

    BenchFixture(Stage stage, Path home, SetUp setUp, double width, double height) {
        this.stage = stage;
        disk = new StoreDesk(home);
        desk = new Desk(new Session(setUp), new FramePulse());
        window = new BenchWindow(desk, disk, this, theme, new BackgroundScheduler(Platform::runLater));
        stage.setScene(window.scene(width, height, theme));
        stage.setWidth(width);
        stage.setHeight(height);
        stage.setX(0);
        stage.setY(0);
        stage.show();
        stage.toFront();
    }

    @Override
    public Optional<Path> open() {
        return Optional.ofNullable(chosen);
    }

    @Override
    public Optional<Path> save(String suggestedName) {
        return Optional.ofNullable(chosen);
    }

    /** The node of an id; keys hold dots, which a selector would read as classes. */
    <T extends Node> T node(String id, Class<T> type) {
        return type.cast(find(window, id).orElseThrow(() -> new AssertionError("no node " + id)));
    }

    boolean has(String id) {
        return find(window, id).isPresent();
    }

    private static Optional<Node> find(Node root, String id) {
        return root.lookupAll("*").stream().filter(n -> id.equals(n.getId())).findFirst();
    }

    TextField field(String key) {
        return node("field-" + key, TextField.class);
    }

    Slider slider(String key) {
        return node("slider-" + key, Slider.class);
    }

    String reading(String key) {
        return node("reading-" + key, Label.class).getText();
    }

    /** Brings a setting into view and puts the keyboard into its field. */
    void reach(String key) throws Exception {
        onScreen(() -> window.focusSetting(key));
        settle();
    }

    /** Types into the field of a setting and commits. */
    void type(FxRobot robot, String key, String text) throws Exception {
        reach(key);
        robot.clickOn(field(key));
        onScreen(() -> {
            field(key).selectAll();
            return null;
        });
        robot.write(text);
        robot.type(javafx.scene.input.KeyCode.ENTER);
        settle();
    }

    static <T> T onScreen(Callable<T> task) throws Exception {
        return WaitForAsyncUtils.asyncFx(task).get();
    }

    /** Waits until what was asked for is drawn. */
    static void settle() throws Exception {
        WaitForAsyncUtils.waitForFxEvents();
        java.util.concurrent.CountDownLatch frames = new java.util.concurrent.CountDownLatch(3);
        Platform.runLater(() -> new javafx.animation.AnimationTimer() {
            @Override
            public void handle(long now) {
                frames.countDown();
                if (frames.getCount() == 0) {
                    stop();
                }
            }
        }.start());
        frames.await(5, java.util.concurrent.TimeUnit.SECONDS);
        WaitForAsyncUtils.waitForFxEvents();
    }
}
