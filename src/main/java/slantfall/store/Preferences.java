package slantfall.store;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import slantfall.quantity.UnitSystem;

/**
 * What the program remembers of its user from one start to the next.
 *
 * @param recent files opened lately, the latest first
 * @param last the file that was open at the end, empty if none
 * @param units units that numbers are shown in
 * @param words anything else that is one word or text, by key, such as the theme
 */
public record Preferences(List<String> recent, String last, UnitSystem units, Map<String, String> words) {

    private static final String THEME = "theme";

    /** Files that are remembered. */
    public static final int MOST_RECENT = 12;

    public Preferences {
        recent = recent.stream().distinct().limit(MOST_RECENT).toList();
        words = Collections.unmodifiableMap(new TreeMap<>(words));
    }

    /** Those of a first start. */
    public static Preferences initial() {
        return new Preferences(List.of(), "", UnitSystem.SI, Map.of());
    }

    /** Preferences with what was wrong with their file. */
    public record Opened(Preferences preferences, List<String> reports) {}

    /** The same with a file as the latest. */
    public Preferences opened(Path file) {
        List<String> files = new ArrayList<>(List.of(file.toAbsolutePath().toString()));
        files.addAll(recent);
        return new Preferences(files, files.get(0), units, words);
    }

    /** The same in other units. */
    public Preferences in(UnitSystem system) {
        return new Preferences(recent, last, system, words);
    }

    /** The same with a word remembered. */
    public Preferences with(String key, String word) {
        Map<String, String> changed = new TreeMap<>(words);
        changed.put(key, word);
        return new Preferences(recent, last, units, changed);
    }

    /** The look, empty for the standard one. */
    public String theme() {
        return words.getOrDefault(THEME, "");
    }

    /** Reads a file; what is wrong with it is told and replaced by the initial preferences, for nobody's work hangs on it. */
    public static Opened read(Path file) {
        if (!Files.exists(file)) {
            return new Opened(initial(), List.of());
        }
        try {
            String name = TextFile.name(file);
            return new Opened(of(new Fields(NodeReader.read(TextFile.read(file), name), "preferences")), List.of());
        } catch (StoreProblem e) {
            return new Opened(initial(), List.of("Your preferences were set back: " + e.getMessage()));
        }
    }

    private static Preferences of(Fields fields) {
        List<String> recent = fields.list("recent", "Write [\"…\"]").stream().map(Fields::text).toList();
        Node units = fields.take("units");
        Map<String, String> words = new TreeMap<>();
        Node given = fields.take("words");
        if (given != null) {
            new Fields(given, "\"words\"").node().members().forEach((key, word) -> words.put(key, Fields.text(word)));
        }
        return new Preferences(recent, fields.text("last", ""), units == null ? UnitSystem.SI : system(units), words);
    }

    private static UnitSystem system(Node node) {
        for (UnitSystem system : UnitSystem.values()) {
            if (system.name().equals(Fields.text(node))) {
                return system;
            }
        }
        throw node.problem("there are no units \"" + Place.shortened(node.text()) + "\"", "Write SI, TRADE or US");
    }

    /**
     * Writes a file whole or not at all.
     *
     * @throws StoreProblem if it cannot be written
     */
    public void write(Path file) {
        Node remembered = Node.object();
        words.forEach(remembered::put);
        Node node = Node.object()
                .put("recent", Node.texts(recent))
                .put("last", last)
                .put("units", units.name())
                .put("words", remembered);
        AtomicFile.real().write(file, NodeWriter.pretty(node).getBytes(StandardCharsets.UTF_8), false);
    }
}
