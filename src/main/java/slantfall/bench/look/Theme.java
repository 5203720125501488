package slantfall.bench.look;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.util.Objects;
import javafx.application.Application;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.scene.Scene;

/** Light or dark. Colours stand in the style sheet by role; nothing in the code names one. */
public final class Theme {

    private static final String SHEET = "/slantfall/bench/bench.css";
    private static final String DARK = "dark-theme";

    private final BooleanProperty dark = new SimpleBooleanProperty();

    /** Whether the dark looks are on. */
    public BooleanProperty darkProperty() {
        return dark;
    }

    /** Dresses a scene, now and whenever the looks change. */
    public void dress(Scene scene) {
        scene.getStylesheets().add(Objects.requireNonNull(Theme.class.getResource(SHEET), SHEET).toExternalForm());
        dark.addListener((o, a, b) -> show(scene));
        show(scene);
    }

    private void show(Scene scene) {
        Application.setUserAgentStylesheet(
                dark.get() ? new PrimerDark().getUserAgentStylesheetBSS() : new PrimerLight().getUserAgentStylesheetBSS());
        scene.getRoot().getStyleClass().remove(DARK);
        if (dark.get()) {
            scene.getRoot().getStyleClass().add(DARK);
        }
    }
}
