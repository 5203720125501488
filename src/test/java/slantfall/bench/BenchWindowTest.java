package slantfall.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Files;
import java.nio.file.Path;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.input.Clipboard;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.ApplicationExtension;
import org.testfx.framework.junit5.Start;
import slantfall.declare.Choice;
import slantfall.declare.Verdict;

/** The window driven with mouse and keyboard on a film. */
@ExtendWith(ApplicationExtension.class)
class BenchWindowTest {

    @TempDir
    private static Path folder;

    private BenchFixture bench;

    @Start
    void start(Stage stage) throws Exception {
        bench = new BenchFixture(stage, Files.createTempDirectory(folder, "home"), MemoryDisk.film(), 1440, 900);
    }

    private void press(FxRobot robot, KeyCode... keys) throws Exception {
        robot.press(keys).release(keys);
        BenchFixture.settle();
    }

    private void focusWindow() throws Exception {
        BenchFixture.onScreen(() -> {
            bench.window.requestFocus();
            return null;
        });
    }

    @Test
    void aTypedValueChangesTheReadings(FxRobot robot) throws Exception {
        String before = bench.reading("thickness");
        bench.type(robot, "feed", "0.2");
        assertThat(bench.reading("thickness")).isNotEqualTo(before);
        assertThat(bench.desk.setUp().values().get("feed").si()).isEqualTo(0.2);
    }

    @Test
    void aDraggedSliderChangesFieldAndReadingAndIsOneUndo(FxRobot robot) throws Exception {
        bench.reach("feed");
        String before = bench.reading("thickness");
        Bounds thumb = bench.slider("feed").lookup(".thumb").localToScreen(bench.slider("feed").lookup(".thumb").getBoundsInLocal());
        robot.moveTo(new Point2D(thumb.getCenterX(), thumb.getCenterY()))
                .press(MouseButton.PRIMARY)
                .moveBy(8, 0)
                .moveBy(9, 0)
                .moveBy(8, 0)
                .release(MouseButton.PRIMARY);
        BenchFixture.settle();
        assertThat(bench.desk.setUp().values().get("feed").si()).isGreaterThan(0.1);
        assertThat(bench.field("feed").getText()).isNotEqualTo("0.1");
        assertThat(bench.reading("thickness")).isNotEqualTo(before);
        BenchFixture.onScreen(() -> {
            bench.desk.session().undo();
            return null;
        });
        BenchFixture.settle();
        assertThat(bench.field("feed").getText()).isEqualTo("0.1");
        assertThat(bench.desk.canUndoProperty().get()).isFalse();
        assertThat(bench.reading("thickness")).isEqualTo(before);
    }

    @Test
    void aWrongEntryStaysWithItsReasonAndEscapeRestores(FxRobot robot) throws Exception {
        bench.type(robot, "feed", "much");
        assertThat(bench.field("feed").getText()).isEqualTo("much");
        assertThat(bench.node("problem-feed", Label.class).isVisible()).isTrue();
        assertThat(bench.node("problem-feed", Label.class).getText()).contains("much");
        bench.type(robot, "angle", "45");
        assertThat(bench.field("feed").getText()).isEqualTo("much");
        robot.clickOn(bench.field("feed"));
        press(robot, KeyCode.ESCAPE);
        assertThat(bench.field("feed").getText()).isEqualTo("0.1");
        assertThat(bench.node("problem-feed", Label.class).isVisible()).isFalse();
    }

    @Test
    void arrowKeysNudgeTheFieldAndTheSlider(FxRobot robot) throws Exception {
        bench.reach("angle");
        press(robot, KeyCode.UP);
        assertThat(bench.field("angle").getText()).isEqualTo("60.5");
        press(robot, KeyCode.SHIFT, KeyCode.DOWN);
        assertThat(bench.field("angle").getText()).isEqualTo("60");
        press(robot, KeyCode.SHIFT, KeyCode.DOWN);
        assertThat(bench.field("angle").getText()).isEqualTo("55");
        BenchFixture.onScreen(() -> {
            bench.slider("angle").requestFocus();
            return null;
        });
        press(robot, KeyCode.RIGHT);
        assertThat(bench.field("angle").getText()).isEqualTo("55.5");
    }

    @Test
    void leavingAFieldCommitsIt(FxRobot robot) throws Exception {
        bench.reach("length");
        robot.write("2.5");
        press(robot, KeyCode.TAB);
        assertThat(bench.desk.setUp().values().get("length").si()).isEqualTo(2.5);
    }

    @Test
    void undoAndRedoByKeys(FxRobot robot) throws Exception {
        bench.type(robot, "feed", "0.2");
        focusWindow();
        press(robot, KeyCode.CONTROL, KeyCode.Z);
        assertThat(bench.field("feed").getText()).isEqualTo("0.1");
        press(robot, KeyCode.CONTROL, KeyCode.Y);
        assertThat(bench.field("feed").getText()).isEqualTo("0.2");
    }

    @Test
    void anotherThicknessLawChangesTheReading(FxRobot robot) throws Exception {
        String before = bench.reading("thickness");
        @SuppressWarnings("unchecked")
        ComboBox<Choice.Option> law = bench.node("choice-thicknessLaw", ComboBox.class);
        BenchFixture.onScreen(() -> {
            law.setValue(law.getItems().stream().filter(o -> o.key().contains("kapitza")).findFirst().orElseThrow());
            return null;
        });
        BenchFixture.settle();
        assertThat(bench.reading("thickness")).isNotEqualTo(before);
        assertThat(bench.desk.setUp().choices()).containsKey("thicknessLaw");
    }

    @Test
    void aLiquidIsChosenFromTheList(FxRobot robot) throws Exception {
        robot.clickOn(bench.node("liquid", ComboBox.class));
        robot.clickOn("Glycerol in water");
        BenchFixture.settle();
        assertThat(bench.desk.assessment().liquid().name()).isEqualTo("Glycerol in water");
        assertThat(bench.has("field-liquid.strength")).isTrue();
    }

    @Test
    void unitsAndLooksSwitchWithoutChangingAValue(FxRobot robot) throws Exception {
        double before = bench.desk.assessment().value("thickness");
        robot.clickOn("#units-us");
        BenchFixture.settle();
        assertThat(bench.node("reading-wallShear", Label.class).getParent().toString()).isNotEmpty();
        assertThat(bench.node("unit-length", javafx.scene.control.Button.class).getText()).isEqualTo("ft");
        robot.clickOn("#dark");
        BenchFixture.settle();
        assertThat(bench.window.getStyleClass()).contains("dark-theme");
        assertThat(bench.desk.assessment().value("thickness")).isEqualTo(before);
        assertThat(bench.desk.dirtyProperty().get()).isFalse();
        robot.clickOn("#dark");
        assertThat(bench.window.getStyleClass()).doesNotContain("dark-theme");
    }

    @Test
    void theFinderJumpsToASetting(FxRobot robot) throws Exception {
        press(robot, KeyCode.CONTROL, KeyCode.F);
        robot.write("gas dr");
        press(robot, KeyCode.ENTER);
        assertThat(bench.stage.getScene().getFocusOwner()).isSameAs(bench.field("interfacialShear"));
    }

    @Test
    void theFinderOpensACheck(FxRobot robot) throws Exception {
        press(robot, KeyCode.CONTROL, KeyCode.F);
        robot.write("Benjamin");
        press(robot, KeyCode.ENTER);
        assertThat(bench.has("row-onset-benjamin-1957-yih-1963")).isTrue();
        assertThat(bench.stage.getScene().getFocusOwner().getAccessibleText()).contains("Benjamin 1957");
    }

    @Test
    void aReadingOpensItsWorkingAndCopiesIt(FxRobot robot) throws Exception {
        robot.clickOn(bench.node("reading-thickness", Label.class));
        BenchFixture.settle();
        assertThat(bench.has("working-thickness")).isTrue();
        robot.clickOn(bench.node("copy-working-thickness", javafx.scene.control.Button.class));
        String copied = BenchFixture.onScreen(() -> Clipboard.getSystemClipboard().getString());
        assertThat(copied).contains("Film thickness: h = ").contains("with ");
    }

    @Test
    void anOpenWorkingFollowsTheNumbers(FxRobot robot) throws Exception {
        robot.clickOn(bench.node("reading-thickness", Label.class));
        String before = texts("working-thickness");
        bench.type(robot, "feed", "0.3");
        assertThat(texts("working-thickness")).isNotEqualTo(before);
    }

    private String texts(String id) {
        StringBuilder text = new StringBuilder();
        bench.node(id, javafx.scene.Node.class).lookupAll(".label").forEach(l -> text.append(((Label) l).getText()));
        return text.toString();
    }

    @Test
    void aRequirementIsAddedTypedAndJudged(FxRobot robot) throws Exception {
        BenchFixture.onScreen(() -> {
            bench.window.focusSetting("interfacialShear");
            return null;
        });
        BenchFixture.onScreen(() -> {
            var menu = bench.node("add-requirement", javafx.scene.control.MenuButton.class);
            menu.getOnShowing().handle(null);
            menu.getItems().stream().filter(i -> i.getText().equals("Mean velocity")).findFirst().orElseThrow().fire();
            var most = bench.node("most-meanVelocity", javafx.scene.control.TextField.class);
            most.setText("0.2 m/s");
            most.getOnAction().handle(null);
            return null;
        });
        BenchFixture.settle();
        assertThat(bench.desk.assessment().check("requirement.meanVelocity").orElseThrow().verdict())
                .isEqualTo(Verdict.CROSSED);
        assertThat(bench.node("headline-sentence", Label.class).getText()).contains("1 of your 2 rules crossed");
    }

    @Test
    void saveAndOpenBringTheSameBack(FxRobot robot) throws Exception {
        bench.type(robot, "feed", "0.3 kg/(m s)");
        bench.chosen = folder.resolve("kept.slantfall.json");
        robot.clickOn("#save");
        BenchFixture.settle();
        assertThat(bench.chosen).content().contains("0.3 kg/(m s)");
        assertThat(bench.desk.dirtyProperty().get()).isFalse();
        press(robot, KeyCode.CONTROL, KeyCode.N);
        robot.clickOn("#new-closed-slot");
        BenchFixture.settle();
        assertThat(bench.desk.setUp().arrangement()).isEqualTo("closed-slot");
        press(robot, KeyCode.CONTROL, KeyCode.O);
        assertThat(bench.desk.setUp().values().get("feed").si()).isEqualTo(0.3);
    }

    @Test
    void savingTakesWhatIsBeingTyped(FxRobot robot) throws Exception {
        bench.chosen = folder.resolve("typing.slantfall.json");
        bench.reach("length");
        robot.write("3 m");
        press(robot, KeyCode.CONTROL, KeyCode.S);
        assertThat(bench.chosen).content().contains("3 m");
    }

    @Test
    void f6GoesRoundTheParts(FxRobot robot) throws Exception {
        bench.reach("angle");
        press(robot, KeyCode.F6);
        assertThat(bench.stage.getScene().getFocusOwner().getId()).isEqualTo("pictures");
        press(robot, KeyCode.F6);
        assertThat(bench.stage.getScene().getFocusOwner().getAccessibleText()).contains("Film thickness");
        press(robot, KeyCode.F6);
        assertThat(bench.stage.getScene().getFocusOwner().getId()).isEqualTo("new");
        press(robot, KeyCode.F6);
        assertThat(bench.stage.getScene().getFocusOwner().getId()).isEqualTo("field-angle");
    }

    @Test
    void theSurfaceIsDraggedAndTheFeedFollows(FxRobot robot) throws Exception {
        dragHandle(robot, "thickness", 0, -20);
        assertThat(bench.desk.setUp().values().get("feed").si()).isGreaterThan(0.1);
        undoOnce();
        assertThat(bench.desk.setUp().values().get("feed").si()).isEqualTo(0.1);
    }

    @Test
    void theInclineIsDraggedAndIsOneUndo(FxRobot robot) throws Exception {
        dragHandle(robot, "angle", -40, 30);
        assertThat(bench.desk.setUp().values().get("angle").si()).isNotCloseTo(Math.toRadians(60), within(1e-3));
        undoOnce();
        assertThat(bench.desk.setUp().values().get("angle").si()).isEqualTo(Math.toRadians(60));
        assertThat(bench.desk.canUndoProperty().get()).isFalse();
    }

    private void dragHandle(FxRobot robot, String key, double dx, double dy) throws Exception {
        BenchFixture.settle();
        var pictures = bench.node("pictures", slantfall.bench.plot.Pictures.class);
        var handle = pictures.drawn().handles().stream().filter(h -> h.key().equals(key)).findFirst().orElseThrow();
        Point2D at = pictures.localToScreen(handle.x(), handle.y());
        robot.moveTo(at)
                .press(MouseButton.PRIMARY)
                .moveBy(dx / 2, dy / 2)
                .moveBy(dx / 2, dy / 2)
                .release(MouseButton.PRIMARY);
        BenchFixture.settle();
    }

    private void undoOnce() throws Exception {
        BenchFixture.onScreen(() -> {
            bench.desk.session().undo();
            return null;
        });
        BenchFixture.settle();
    }

    @Test
    void thePointerReadsTheTraversesInTheLedger(FxRobot robot) throws Exception {
        BenchFixture.settle();
        var pictures = bench.node("pictures", slantfall.bench.plot.Pictures.class);
        var area = pictures.drawn().reading();
        robot.moveTo(pictures.localToScreen(area.x() + area.w() / 2, area.y() + area.h() * 0.8));
        BenchFixture.settle();
        String line = bench.node("at-cursor", Label.class).getText();
        assertThat(line).contains("from the wall").contains("velocity").contains("shear stress");
    }

    @Test
    void everyControlSaysItselfToAScreenReader() {
        bench.window.lookupAll("*").stream()
                .filter(n -> n.isFocusTraversable() && n instanceof javafx.scene.control.Control)
                .filter(n -> n.getId() != null)
                .forEach(n -> {
                    boolean words = n instanceof javafx.scene.control.Labeled labeled && !labeled.getText().isBlank();
                    boolean spoken = n.getAccessibleText() != null && !n.getAccessibleText().isBlank();
                    assertThat(words || spoken).as(n.getId() + " has words").isTrue();
                });
    }
}
