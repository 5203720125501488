package slantfall.bench.shell;

import java.util.function.Consumer;
import javafx.geometry.Orientation;
import javafx.scene.Node;
import javafx.scene.control.SplitPane;
import javafx.scene.control.Tab;
import javafx.scene.control.TabPane;
import javafx.scene.layout.BorderPane;

/**
 * The parts side by side: three columns where there is room, two with the ledger below the pictures, or one tabbed column
 * beside the pictures.
 */
final class Columns extends BorderPane {

    static final double THREE = 1200;
    static final double TWO = 1000;
    private static final double RAIL = 344;
    private static final double LEDGER = 404;

    private final Node rail;
    private final Node pictures;
    private final Node ledger;
    private final Consumer<Layout> told;
    private TabPane tabs;
    private Layout layout;

    /** How the parts stand. */
    enum Layout {
        THREE_COLUMNS,
        TWO_COLUMNS,
        TABBED
    }

    Columns(Node rail, Node pictures, Node ledger, Consumer<Layout> told) {
        this.rail = rail;
        this.pictures = pictures;
        this.ledger = ledger;
        this.told = told;
        widthProperty().addListener((o, a, width) -> fit(width.doubleValue()));
    }

    /** Brings a part to the front where parts share a place. */
    void reveal(Node part) {
        if (layout == Layout.TABBED && part != pictures) {
            tabs.getSelectionModel().select(part == rail ? 0 : 1);
        }
    }

    Layout currentLayout() {
        return layout;
    }

    private void fit(double width) {
        if (width <= 0) {
            return;
        }
        Layout wanted = width >= THREE ? Layout.THREE_COLUMNS : width >= TWO ? Layout.TWO_COLUMNS : Layout.TABBED;
        if (wanted != layout) {
            layout = wanted;
            release();
            setCenter(switch (wanted) {
                case THREE_COLUMNS -> three(width);
                case TWO_COLUMNS -> two(width);
                case TABBED -> tabbed(width);
            });
            told.accept(wanted);
        }
    }

    private void release() {
        setCenter(null);
        if (tabs != null) {
            tabs.getTabs().forEach(t -> t.setContent(null));
            tabs = null;
        }
    }

    private Node three(double width) {
        SplitPane split = new SplitPane(rail, pictures, ledger);
        split.setDividerPositions(RAIL / width, 1 - LEDGER / width);
        keep(rail);
        keep(ledger);
        return split;
    }

    private Node two(double width) {
        SplitPane right = new SplitPane(pictures, ledger);
        right.setOrientation(Orientation.VERTICAL);
        right.setDividerPositions(0.62);
        SplitPane split = new SplitPane(rail, right);
        split.setDividerPositions(RAIL / width);
        keep(rail);
        return split;
    }

    private Node tabbed(double width) {
        tabs = new TabPane(tab("Settings", rail), tab("Readings and checks", ledger));
        tabs.setId("tabs");
        SplitPane split = new SplitPane(tabs, pictures);
        split.setDividerPositions(LEDGER / width);
        keep(tabs);
        return split;
    }

    private static Tab tab(String title, Node content) {
        Tab tab = new Tab(title, content);
        tab.setClosable(false);
        return tab;
    }

    private static void keep(Node node) {
        SplitPane.setResizableWithParent(node, false);
    }
}
