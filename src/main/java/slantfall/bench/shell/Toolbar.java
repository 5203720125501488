package slantfall.bench.shell;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuButton;
import javafx.scene.control.MenuItem;
import javafx.scene.control.SeparatorMenuItem;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.ToggleGroup;
import javafx.scene.input.KeyCombination;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import slantfall.bench.look.Parts;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.quantity.UnitSystem;

/** Files, undo, units, looks, finder, in one row. */
final class Toolbar extends HBox {

    private final Desk desk;
    private final FileLife files;
    private final Actions actions;

    /** What the window does on a key or a button. */
    record Actions(Runnable create, Runnable find, Runnable savePicture) {}

    Toolbar(Desk desk, FileLife files, Theme theme, Actions actions) {
        super(8);
        this.desk = desk;
        this.files = files;
        this.actions = actions;
        setId("toolbar");
        setAlignment(Pos.CENTER_LEFT);
        getStyleClass().add("bench-toolbar");
        getChildren().addAll(
                button("New", "new", "Ctrl+N", actions.create()),
                fileMenu(),
                button("Save", "save", "Ctrl+S", files::save),
                undo(),
                redo(),
                title(),
                units(),
                dark(theme),
                button("Find", "find", "Ctrl+F", actions.find()));
    }

    private static Button button(String words, String id, String keys, Runnable action) {
        Button button = new Button(words);
        button.setId(id);
        button.setMinWidth(USE_PREF_SIZE);
        button.setOnAction(e -> action.run());
        Parts.tip(button, () -> words + " (" + keys + ")");
        button.setAccessibleText(words);
        return button;
    }

    private Node undo() {
        Button undo = button("↶", "undo", "Ctrl+Z", desk.session()::undo);
        undo.setAccessibleText("Undo");
        Parts.tip(undo, () -> "Undo (Ctrl+Z)");
        undo.disableProperty().bind(desk.canUndoProperty().not());
        return undo;
    }

    private Node redo() {
        Button redo = button("↷", "redo", "Ctrl+Y", desk.session()::redo);
        redo.setAccessibleText("Redo");
        Parts.tip(redo, () -> "Redo (Ctrl+Y)");
        redo.disableProperty().bind(desk.canRedoProperty().not());
        return redo;
    }

    private MenuButton fileMenu() {
        MenuButton menu = new MenuButton("File");
        menu.setId("file");
        menu.setMinWidth(USE_PREF_SIZE);
        menu.getItems().add(new MenuItem(""));
        menu.setOnShowing(e -> menu.getItems().setAll(fileItems()));
        return menu;
    }

    private List<MenuItem> fileItems() {
        List<MenuItem> items = new ArrayList<>();
        items.add(item("New …", "Ctrl+N", actions.create()));
        items.add(item("Open …", "Ctrl+O", files::open));
        Menu recent = new Menu("Recent");
        for (Path path : files.recent()) {
            recent.getItems().add(item(path.getFileName() + "  –  " + path.getParent(), "", () -> files.open(path)));
        }
        recent.setDisable(recent.getItems().isEmpty());
        Menu examples = new Menu("Examples");
        files.examples().forEach(name -> examples.getItems().add(item(name, "", () -> files.example(name))));
        items.add(recent);
        items.add(examples);
        items.add(new SeparatorMenuItem());
        items.add(item("Save", "Ctrl+S", files::save));
        items.add(item("Save as …", "Ctrl+Shift+S", files::saveAs));
        items.add(item("Save picture …", "", actions.savePicture()));
        return items;
    }

    private static MenuItem item(String words, String keys, Runnable action) {
        MenuItem item = new MenuItem(words);
        item.setMnemonicParsing(false);
        item.setOnAction(e -> action.run());
        if (!keys.isEmpty()) {
            item.setAccelerator(KeyCombination.valueOf(keys));
        }
        return item;
    }

    /** The name of the set-up, edited in place. */
    private TextField title() {
        TextField title = new TextField();
        title.setId("title");
        title.setPromptText("Name of this set-up");
        title.setAccessibleText("Name of this set-up");
        title.setMaxWidth(Double.MAX_VALUE);
        title.setMinWidth(60);
        HBox.setHgrow(title, Priority.ALWAYS);
        title.getStyleClass().add("title-field");
        desk.follow(a -> {
            if (!title.isFocused()) {
                title.setText(a.setUp().title());
            }
        });
        Runnable commit = () ->
                desk.session().change(desk.session().current().titled(title.getText().strip()), null);
        title.setOnAction(e -> commit.run());
        title.focusedProperty().addListener((o, a, focused) -> {
            if (!focused) {
                commit.run();
            }
        });
        return title;
    }

    private Node units() {
        ToggleGroup group = new ToggleGroup();
        HBox box = new HBox();
        box.setAlignment(Pos.CENTER_LEFT);
        List<String> names = List.of("SI", "Trade", "US");
        for (UnitSystem system : UnitSystem.values()) {
            ToggleButton button = new ToggleButton(names.get(system.ordinal()));
            button.setId("units-" + system.name().toLowerCase(java.util.Locale.ROOT));
            button.setToggleGroup(group);
            button.setMinWidth(USE_PREF_SIZE);
            button.setAccessibleText("Show numbers in " + system.words() + " units");
            Parts.tip(button, () -> "Show numbers in " + system.words() + " units; no value changes");
            button.getStyleClass().add(switch (system) {
                case SI -> "left-pill";
                case TRADE -> "center-pill";
                case US -> "right-pill";
            });
            button.setOnAction(e -> {
                button.setSelected(true);
                desk.unitsProperty().set(system);
            });
            button.setSelected(desk.unitsProperty().get() == system);
            desk.unitsProperty().addListener((o, a, now) -> button.setSelected(now == system));
            box.getChildren().add(button);
        }
        return box;
    }

    private static ToggleButton dark(Theme theme) {
        ToggleButton dark = new ToggleButton("Dark");
        dark.setId("dark");
        dark.setMinWidth(USE_PREF_SIZE);
        dark.setAccessibleText("Dark looks");
        dark.selectedProperty().bindBidirectional(theme.darkProperty());
        return dark;
    }
}
