package slantfall.bench.look;

import java.util.function.Supplier;
import javafx.scene.Node;
import javafx.scene.control.TitledPane;

/** A folded part whose content is made when it is first unfolded, so that what nobody looks at costs nothing. */
public final class LazyPane extends TitledPane {

    private final Supplier<Node> content;

    /**
     * A folded part.
     *
     * @param content makes the content, once after each {@link #forget}
     */
    public LazyPane(String title, Supplier<Node> content) {
        super(title, null);
        this.content = content;
        setExpanded(false);
        setAnimated(false);
        getStyleClass().addAll("dense", "more");
        expandedProperty().addListener((o, a, open) -> fill());
    }

    /** Makes the content anew: now if it is unfolded, else when it is next. */
    public void forget() {
        setContent(null);
        fill();
    }

    private void fill() {
        if (isExpanded() && getContent() == null) {
            setContent(content.get());
        }
    }
}
