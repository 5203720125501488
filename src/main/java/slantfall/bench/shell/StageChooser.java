package slantfall.bench.shell;

import java.io.File;
import java.nio.file.Path;
import java.util.Optional;
import javafx.stage.FileChooser;
import javafx.stage.Stage;

/** The desktop's own file dialog. */
public final class StageChooser implements Chooser {

    private final Stage stage;
    private File folder;

    /** A dialog of a window. */
    public StageChooser(Stage stage) {
        this.stage = stage;
    }

    @Override
    public Optional<Path> open() {
        return path(chooser("Open a set-up").showOpenDialog(stage));
    }

    @Override
    public Optional<Path> save(String suggestedName) {
        FileChooser chooser = chooser("Save the set-up");
        chooser.setInitialFileName(suggestedName);
        return path(chooser.showSaveDialog(stage));
    }

    @Override
    public Optional<Path> picture(String suggestedName) {
        FileChooser chooser = chooser("Save the picture");
        chooser.getExtensionFilters().setAll(
                new FileChooser.ExtensionFilter("Drawing, SVG", "*.svg"), new FileChooser.ExtensionFilter("Picture, PNG", "*.png"));
        chooser.setInitialFileName(suggestedName);
        return path(chooser.showSaveDialog(stage));
    }

    private FileChooser chooser(String title) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("Slantfall set-up", "*.slantfall.json"));
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("Any file", "*"));
        if (folder != null && folder.isDirectory()) {
            chooser.setInitialDirectory(folder);
        }
        return chooser;
    }

    private Optional<Path> path(File chosen) {
        if (chosen != null) {
            folder = chosen.getParentFile();
        }
        return Optional.ofNullable(chosen).map(File::toPath);
    }
}
