package slantfall.bench;

import java.nio.file.Path;
import java.util.List;
import javafx.application.Application;
import javafx.stage.Stage;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.model.FramePulse;
import slantfall.bench.shell.BenchWindow;
import slantfall.bench.shell.FileDesk;
import slantfall.bench.shell.StageChooser;
import slantfall.bench.shell.StoreDesk;
import slantfall.quantity.UnitSystem;
import slantfall.session.Session;

/** The window as an application of the toolkit. */
public final class BenchApp extends Application {

    private static final double WIDTH = 1440;
    private static final double HEIGHT = 900;
    private static final String DARK = "dark";
    private static final String UNITS = "units";

    @Override
    public void start(Stage stage) {
        FileDesk disk = new StoreDesk();
        Theme theme = new Theme();
        disk.remembered(DARK).ifPresent(w -> theme.darkProperty().set(Boolean.parseBoolean(w)));
        Desk desk = new Desk(new Session(disk.example(disk.examples().get(0)).setUp()), new FramePulse());
        disk.remembered(UNITS).ifPresent(w -> desk.unitsProperty().set(units(w)));
        BenchWindow window = new BenchWindow(desk, disk, new StageChooser(stage), theme);
        theme.darkProperty().addListener((o, a, dark) -> disk.remember(DARK, String.valueOf(dark)));
        desk.unitsProperty().addListener((o, a, units) -> disk.remember(UNITS, units.name()));
        stage.titleProperty().bind(desk.titleProperty());
        stage.focusedProperty().addListener((o, a, focused) -> {
            if (focused) {
                window.files().look();
            }
        });
        stage.setMinWidth(720);
        stage.setMinHeight(480);
        stage.setScene(window.scene(WIDTH, HEIGHT, theme));
        stage.show();
        openFirst(window);
    }

    private void openFirst(BenchWindow window) {
        List<String> files = getParameters().getUnnamed();
        if (files.isEmpty()) {
            window.files().start();
        } else {
            window.files().open(Path.of(files.get(0)));
        }
    }

    private static UnitSystem units(String word) {
        for (UnitSystem system : UnitSystem.values()) {
            if (system.name().equals(word)) {
                return system;
            }
        }
        return UnitSystem.SI;
    }
}
