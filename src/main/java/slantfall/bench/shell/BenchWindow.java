package slantfall.bench.shell;

import java.util.List;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.DragEvent;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.BorderPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import slantfall.bench.form.RailModel;
import slantfall.bench.form.RailView;
import slantfall.bench.ledger.LedgerModel;
import slantfall.bench.ledger.LedgerView;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.plot.Pictures;
import slantfall.bench.question.AlongTheWay;
import slantfall.bench.question.Drawer;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.session.Scheduler;

/** The parts put together. */
public final class BenchWindow extends StackPane {

    private final Desk desk;
    private final FileLife files;
    private final RailModel railModel;
    private final RailView rail;
    private final LedgerView ledger;
    private final Pictures pictures;
    private final Toolbar toolbar;
    private final Columns columns;
    private final FinderView finder;
    private final NewPane newPane;

    /** A window on a desk. */
    public BenchWindow(Desk desk, FileDesk disk, Chooser chooser, Theme theme, Scheduler work) {
        this.desk = desk;
        Notices notices = new Notices();
        files = new FileLife(desk, disk, chooser, notices, work);
        railModel = new RailModel(desk);
        rail = new RailView(railModel, disk::presets);
        LedgerModel ledgerModel = new LedgerModel(desk);
        ledger = new LedgerView(desk, ledgerModel, theme);
        pictures = new Pictures(desk, theme);
        columns = new Columns(rail, pictures, ledger,
                layout -> ledgerModel.briefProperty().set(layout == Columns.Layout.TWO_COLUMNS));
        finder = new FinderView(new FinderModel(desk), this::go);
        newPane = new NewPane(
                a -> pictures.card(a.assess(SetUp.blank(a.key(), base(disk)))),
                a -> a.declare(SetUp.blank(a.key(), base(disk)).structure()),
                this::begin);
        toolbar = new Toolbar(desk, files, theme, new Toolbar.Actions(this::create, this::find, () -> files.savePicture(pictures::save)));
        BorderPane frame = new BorderPane(columns);
        frame.setBottom(new Drawer(desk, List.of(new AlongTheWay(desk, theme))));
        frame.setTop(new VBox(toolbar, new HeadlineView(desk, this::openRow), new NoticeStrip(notices)));
        getChildren().add(frame);
        StackPane.setAlignment(finder, Pos.TOP_CENTER);
        StackPane.setMargin(finder, new Insets(56, 0, 0, 0));
        addEventFilter(KeyEvent.KEY_PRESSED, this::key);
        setOnDragOver(this::dragOver);
        setOnDragDropped(this::dropped);
    }

    /** The life of the set-up on disk. */
    public FileLife files() {
        return files;
    }

    /** Puts the keyboard into the field of a setting; false if there is none. */
    public boolean focusSetting(String key) {
        columns.reveal(rail);
        return rail.focus(key);
    }

    private static LiquidBase base(FileDesk disk) {
        return disk.presets().stream().findFirst().map(LiquidBase::of).orElseGet(LiquidBase::measured);
    }

    private void begin(String arrangement) {
        files.blank(arrangement);
        columns.reveal(rail);
        if (desk.setUp().values().isEmpty() && desk.setUp().arrangement().equals(arrangement)) {
            railModel.startingProperty().set(true);
            rail.focusFirst();
        }
    }

    private void create() {
        attach(newPane);
        newPane.open();
    }

    private void find() {
        attach(finder);
        finder.open();
    }

    /** What covers the window joins it when it is first wanted, so that the start need not dress it. */
    private void attach(Node cover) {
        if (!getChildren().contains(cover)) {
            getChildren().add(cover);
        }
    }

    /** Opens the row of a reading or check. */
    public void openRow(String key) {
        columns.reveal(ledger);
        ledger.open(key);
    }

    private void go(FinderModel.Hit hit) {
        if (hit.sort() == FinderModel.Sort.SETTING) {
            focusSetting(hit.key());
        } else {
            openRow(hit.key());
        }
    }

    private void key(KeyEvent e) {
        if (e.getCode() == KeyCode.F6) {
            nextPart(e.isShiftDown() ? -1 : 1);
            e.consume();
            return;
        }
        for (Shortcut shortcut : shortcuts()) {
            if (shortcut.keys().match(e)) {
                shortcut.action().run();
                e.consume();
                return;
            }
        }
    }

    /** A key combination and what it does. */
    private record Shortcut(KeyCombination keys, Runnable action) {

        static Shortcut of(KeyCode code, Runnable action) {
            return new Shortcut(new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN), action);
        }

        static Shortcut shifted(KeyCode code, Runnable action) {
            return new Shortcut(
                    new KeyCodeCombination(code, KeyCombination.SHORTCUT_DOWN, KeyCombination.SHIFT_DOWN), action);
        }
    }

    private List<Shortcut> shortcuts() {
        return List.of(
                Shortcut.of(KeyCode.N, this::create),
                Shortcut.of(KeyCode.O, files::open),
                Shortcut.of(KeyCode.S, this::save),
                Shortcut.shifted(KeyCode.S, files::saveAs),
                Shortcut.of(KeyCode.Z, desk.session()::undo),
                Shortcut.shifted(KeyCode.Z, desk.session()::redo),
                Shortcut.of(KeyCode.Y, desk.session()::redo),
                Shortcut.of(KeyCode.F, this::find));
    }

    /** What is being typed counts before it is saved. */
    private void save() {
        Node focused = getScene().getFocusOwner();
        if (focused instanceof TextInputControl) {
            requestFocus();
        }
        files.save();
        if (focused != null) {
            focused.requestFocus();
        }
    }

    private void nextPart(int step) {
        List<Node> parts = List.of(rail, pictures, ledger, toolbar);
        Node focused = getScene().getFocusOwner();
        int now = 0;
        for (int i = 0; i < parts.size(); i++) {
            for (Node n = focused; n != null; n = n.getParent()) {
                now = n == parts.get(i) ? i : now;
            }
        }
        Node next = parts.get(Math.floorMod(now + step, parts.size()));
        columns.reveal(next);
        if (next == rail) {
            rail.focusFirst();
        } else if (next == ledger) {
            ledger.focusFirst();
        } else if (next == pictures) {
            pictures.focusFirst();
        } else {
            toolbar.getChildren().get(0).requestFocus();
        }
    }

    private void dragOver(DragEvent e) {
        if (e.getDragboard().hasFiles()) {
            e.acceptTransferModes(TransferMode.COPY);
            e.consume();
        }
    }

    private void dropped(DragEvent e) {
        if (e.getDragboard().hasFiles()) {
            files.open(e.getDragboard().getFiles().get(0).toPath());
            e.setDropCompleted(true);
            e.consume();
        }
    }

    /** Dresses the window and puts it into a scene. */
    public Scene scene(double width, double height, Theme theme) {
        Scene scene = new Scene(this, width, height);
        theme.dress(scene);
        return scene;
    }
}
