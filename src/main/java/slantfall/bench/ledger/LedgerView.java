package slantfall.bench.ledger;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import javafx.collections.ListChangeListener;
import javafx.collections.ObservableList;
import javafx.geometry.Insets;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.ToggleButton;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import slantfall.bench.look.Mark;
import slantfall.bench.look.Parts;
import slantfall.bench.look.Theme;
import slantfall.bench.model.Desk;
import slantfall.bench.plot.LadderPicture;

/** Readings, the user's own rules, questions with their authors, cautions and notices. */
public final class LedgerView extends ScrollPane {

    /** Questions shown where there is little room. */
    private static final int BRIEF = 3;

    private final Desk desk;
    private final Theme theme;
    private final LedgerModel model;
    private final Map<String, LadderPicture> ladders = new HashMap<>();
    private final VBox readings = new VBox();
    private final VBox checks = new VBox(2);
    private final VBox words = new VBox(6);
    private final VBox content = new VBox(10);
    private final Map<String, Opening> rows = new HashMap<>();

    /** A ledger. */
    public LedgerView(Desk desk, LedgerModel model, Theme theme) {
        this.desk = desk;
        this.theme = theme;
        this.model = model;
        setId("ledger");
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        getStyleClass().addAll(Mark.PART, "ledger");
        setAccessibleText("Readings and checks");
        content.setPadding(new Insets(10, 14, 16, 14));
        setContent(content);
        model.readings().addListener((ListChangeListener<ReadingRow>) c -> buildReadings());
        model.own().addListener((ListChangeListener<CheckRow>) c -> buildChecks());
        model.panels().addListener((ListChangeListener<PanelRow>) c -> buildChecks());
        model.cautions().addListener((ListChangeListener<String>) c -> buildWords());
        model.notices().addListener((ListChangeListener<String>) c -> buildWords());
        model.briefProperty().addListener((o, a, b) -> arrange());
        buildReadings();
        buildChecks();
        buildWords();
        arrange();
        desk.follow(a -> {
            rows.values().forEach(Opening::renew);
            ladders.values().forEach(LadderPicture::renew);
        });
    }

    /** Opens the row of a reading, check or panel and puts the keyboard there; false if there is none. */
    public boolean open(String key) {
        String panel = panelOf(key);
        if (!panel.isEmpty()) {
            model.briefProperty().set(false);
            rows.get(panel).open();
        }
        Opening row = rows.get(key);
        if (row == null) {
            return false;
        }
        row.open();
        row.head().requestFocus();
        show(row);
        return true;
    }

    /** Puts the keyboard into the first row. */
    public void focusFirst() {
        if (!model.readings().isEmpty()) {
            rows.get(model.readings().get(0).reading().key()).head().requestFocus();
        }
    }

    private String panelOf(String check) {
        return model.panels().stream()
                .filter(p -> p.authors().stream().anyMatch(a -> a.key().equals(check)))
                .map(p -> p.panel().key())
                .findFirst()
                .orElse("");
    }

    private void show(Node node) {
        applyCss();
        layout();
        double y = node.localToScene(0, 0).getY() - content.localToScene(0, 0).getY();
        double room = content.getHeight() - getViewportBounds().getHeight();
        setVvalue(room <= 0 ? 0 : Math.max(0, Math.min(1, (y - 40) / room)));
    }

    private void arrange() {
        VBox readingGroup = group("Readings", new VBox(2, readings, atCursor()), copy());
        VBox checkGroup = group("Checks, tightest first", checks, briefButton());
        boolean brief = model.briefProperty().get();
        content.getChildren().setAll(brief ? List.of(checkGroup, readingGroup, words)
                : List.of(readingGroup, checkGroup, words));
        buildChecks();
    }

    private static VBox group(String title, Node inside, Node tool) {
        Label head = Parts.label(title, Mark.GROUP);
        HBox bar = new HBox(6, head, Parts.spring(), tool);
        bar.setAlignment(Pos.CENTER_LEFT);
        bar.getStyleClass().add("group-bar");
        return new VBox(4, bar, inside);
    }

    private Label atCursor() {
        Label line = Parts.line(model.atCursorProperty(), "at-cursor");
        line.setId("at-cursor");
        return line;
    }

    private Button copy() {
        Button copy = new Button("Copy table");
        copy.setId("copy-table");
        copy.getStyleClass().addAll("small", "flat");
        copy.setOnAction(e -> WorkingView.put(model.table()));
        copy.setAccessibleText("Copy readings and checks as a table");
        return copy;
    }

    private ToggleButton briefButton() {
        ToggleButton brief = new ToggleButton("Tightest three");
        brief.setId("brief");
        brief.getStyleClass().addAll("small", "flat");
        brief.setSelected(model.briefProperty().get());
        brief.setOnAction(e -> model.briefProperty().set(brief.isSelected()));
        return brief;
    }

    private void buildReadings() {
        List<Node> nodes = new ArrayList<>();
        for (ReadingRow row : model.readings()) {
            Opening opening = new Opening(Rows.reading(row), true, () -> inside(row));
            opening.setId("row-" + row.reading().key());
            rows.put(row.reading().key(), opening);
            nodes.add(opening);
        }
        readings.getChildren().setAll(nodes);
    }

    private Node inside(ReadingRow row) {
        VBox box = new VBox(4, Parts.line(row.whyProperty(), "why"), wrapped(row.reading().help()));
        model.working(row.reading().key())
                .ifPresent(w -> box.getChildren().add(new WorkingView(w, model.units())));
        return box;
    }

    private void buildChecks() {
        List<Node> nodes = new ArrayList<>();
        model.own().forEach(row -> nodes.add(check(row, false)));
        for (PanelRow row : model.panels()) {
            Opening opening = known(row.panel().key(), row, () -> new Opening(Rows.panel(row), false, () -> authors(row)));
            nodes.add(opening);
        }
        boolean brief = model.briefProperty().get();
        int own = model.own().size();
        checks.getChildren().setAll(brief ? nodes.subList(0, Math.min(nodes.size(), Math.max(own, BRIEF))) : nodes);
    }

    private Opening known(String key, Object row, Supplier<Opening> make) {
        Opening old = rows.get(key);
        if (old != null && old.getUserData() == row) {
            return old;
        }
        Opening made = make.get();
        made.setUserData(row);
        made.setId("row-" + key.replace('.', '-'));
        rows.put(key, made);
        return made;
    }

    private Opening check(CheckRow row, boolean regime) {
        return known(row.key(), row, () -> new Opening(Rows.check(row, regime), true, () -> criterion(row)));
    }

    private Node authors(PanelRow row) {
        VBox box = new VBox(2);
        box.getStyleClass().add("authors");
        if (row.authors().size() > 1) {
            LadderPicture ladder = new LadderPicture(desk, theme, row.panel().key());
            ladders.put(row.panel().key(), ladder);
            box.getChildren().add(ladder);
        }
        row.authors().forEach(author -> box.getChildren().add(check(author, row.regime())));
        return box;
    }

    private Node criterion(CheckRow row) {
        VBox box = new VBox(2,
                wrapped("Criterion: " + row.result().info().formula()),
                wrapped("Tested for: " + row.result().info().range()),
                wrapped("Source: " + row.sourceProperty().get()));
        box.getStyleClass().add(Mark.WORKING);
        model.working(row.key()).ifPresent(w -> box.getChildren().add(new WorkingView(w, model.units())));
        return box;
    }

    /** Labels stay where only their text is another: new ones would have to be styled within the frame. */
    private void buildWords() {
        List<String> cautions = model.cautions();
        List<String> notices = model.notices();
        int wanted = cautions.size() + notices.size() + 1;
        while (words.getChildren().size() > wanted) {
            words.getChildren().remove(0);
        }
        while (words.getChildren().size() < wanted) {
            words.getChildren().add(0, styled("", Mark.MUTED));
        }
        for (int i = 0; i < wanted; i++) {
            boolean caution = i < cautions.size();
            boolean last = i == wanted - 1;
            String text = caution ? "⚠ " + cautions.get(i) : last ? model.general()
                    : "Note: " + notices.get(i - cautions.size());
            Label label = (Label) words.getChildren().get(i);
            label.setText(text);
            String style = caution ? "caution" : last ? Mark.MUTED : "notice";
            if (!label.getStyleClass().contains(style)) {
                label.getStyleClass().setAll("label", style);
            }
        }
    }

    private static Label wrapped(String text) {
        return styled(text, Mark.MUTED);
    }

    private static Label styled(String text, String style) {
        Label label = Parts.label(text, style);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        return label;
    }
}
