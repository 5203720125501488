package slantfall.bench.look;

import java.util.function.Supplier;
import javafx.beans.value.ObservableValue;
import javafx.event.EventHandler;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.input.MouseEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;

/** Small pieces that every part is made of. */
public final class Parts {

    private Parts() {}

    /** A label of some style classes. */
    public static Label label(String text, String... styles) {
        Label label = new Label(text);
        label.getStyleClass().addAll(styles);
        return label;
    }

    /** Words with a formula in them, set as far as plain letters can: u_m as uₘ, ν^{4/3} as ν^(4/3). */
    public static String pretty(String words) {
        return words.replace("_m", "ₘ").replace("_s", "ₛ").replace("^{", "^(").replace("}", ")");
    }

    /** A label that wraps and takes no room while it is empty. */
    public static Label line(ObservableValue<String> text, String... styles) {
        Label label = label("", styles);
        label.setWrapText(true);
        label.setMaxWidth(Double.MAX_VALUE);
        label.textProperty().bind(text);
        label.managedProperty().bind(label.textProperty().isNotEmpty());
        label.visibleProperty().bind(label.managedProperty());
        return label;
    }

    /** A label of one line that takes no room while it is empty. */
    public static Label oneLine(ObservableValue<String> text, String... styles) {
        Label label = line(text, styles);
        label.setWrapText(false);
        label.setMinWidth(0);
        return label;
    }

    /**
     * Words that appear while the pointer rests on a control. The little window is made when the pointer first comes, for
     * dozens of them made at the start would hold it up.
     */
    public static void tip(Control control, Supplier<String> words) {
        EventHandler<MouseEvent> first = new EventHandler<>() {
            @Override
            public void handle(MouseEvent e) {
                control.removeEventHandler(MouseEvent.MOUSE_ENTERED, this);
                Tooltip tip = new Tooltip(words.get());
                tip.setWrapText(true);
                tip.setMaxWidth(360);
                tip.setOnShowing(shown -> tip.setText(words.get()));
                control.setTooltip(tip);
            }
        };
        control.addEventHandler(MouseEvent.MOUSE_ENTERED, first);
    }

    /** Takes the room that is left in a row. */
    public static Node spring() {
        Region spring = new Region();
        HBox.setHgrow(spring, Priority.ALWAYS);
        return spring;
    }

    /** A symbol such as τ_w set with its subscript lowered. */
    public static HBox symbol(String symbol) {
        HBox box = new HBox();
        box.getStyleClass().add(Mark.SYMBOL);
        int cut = symbol.indexOf('_');
        Label base = label(cut < 0 ? symbol : symbol.substring(0, cut), "symbol-base");
        box.getChildren().add(base);
        if (cut >= 0) {
            Label sub = label(symbol.substring(cut + 1), "symbol-sub");
            sub.setTranslateY(3);
            box.getChildren().add(sub);
        }
        box.setMinWidth(Region.USE_PREF_SIZE);
        return box;
    }
}
