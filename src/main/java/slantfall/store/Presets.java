package slantfall.store;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import slantfall.declare.LiquidBase;
import slantfall.liquid.Preset;

/**
 * Liquids to choose from: those that come with the program, then the files in the user's own folder. A broken file of the
 * user's is told and left out.
 */
public final class Presets {

    /** System property that names the user's folder. */
    public static final String PROPERTY = "slantfall.presets";

    /** Environment variable that names the user's folder, if the property does not. */
    public static final String VARIABLE = "SLANTFALL_PRESETS";

    private static final int MOST = 500;

    private final List<Preset> all;
    private final List<String> problems;

    private Presets(List<Preset> all, List<String> problems) {
        this.all = List.copyOf(all);
        this.problems = List.copyOf(problems);
    }

    /** Reads the shipped ones and those in the user's folder. */
    public static Presets load() {
        String named = System.getProperty(PROPERTY, System.getenv(VARIABLE));
        Path folder = named == null
                ? Path.of(System.getProperty("user.home", "."), ".slantfall", "presets")
                : Path.of(named);
        List<String> problems = new ArrayList<>();
        if (named != null && !Files.isDirectory(folder)) {
            problems.add("The folder of your own liquids, " + Place.shortened(named) + ", is missing.");
        }
        return load(folder, problems);
    }

    /** Reads the shipped ones and those in a folder. */
    public static Presets load(Path folder) {
        return load(folder, new ArrayList<>());
    }

    private static Presets load(Path folder, List<String> problems) {
        List<Preset> all = new ArrayList<>(Shipped.ALL);
        for (Path file : files(folder, problems)) {
            try {
                add(all, PresetJson.read(TextFile.read(file), TextFile.name(file), problems), file);
            } catch (StoreProblem e) {
                problems.add(e.getMessage());
            }
        }
        return new Presets(all, problems);
    }

    private static void add(List<Preset> all, Preset preset, Path file) {
        if (all.stream().anyMatch(p -> p.key().equals(preset.key()))) {
            throw new StoreProblem(Place.of(TextFile.name(file)), "the key " + preset.key() + " belongs to another liquid",
                    "Choose another key; files that name the liquid rely on it");
        }
        all.add(preset);
    }

    private static List<Path> files(Path folder, List<String> problems) {
        List<Path> files = new ArrayList<>();
        if (!Files.isDirectory(folder)) {
            return files;
        }
        try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, "*.json")) {
            stream.forEach(files::add);
        } catch (IOException e) {
            problems.add("The folder of your own liquids could not be read: " + TextFile.reason(e) + ".");
        }
        Collections.sort(files);
        if (files.size() > MOST) {
            problems.add("Only the first " + MOST + " files of your own liquids were read.");
        }
        return files.subList(0, Math.min(MOST, files.size()));
    }

    /** All of them, the shipped ones first. */
    public List<Preset> all() {
        return all;
    }

    /** The liquid of a key, if there is one. */
    public Optional<Preset> find(String key) {
        return all.stream().filter(p -> p.key().equals(key)).findFirst();
    }

    /** What a new set-up begins with. */
    public LiquidBase initial() {
        return LiquidBase.of(all.get(0));
    }

    /** What was wrong with the user's own files, one sentence each. */
    public List<String> problems() {
        return problems;
    }

    /** Read once: they cannot change while the program runs. */
    private static final class Shipped {

        static final List<Preset> ALL = all();

        private static List<Preset> all() {
            List<Preset> presets = new ArrayList<>();
            List<String> problems = new ArrayList<>();
            Node index = NodeReader.read(Resource.text("/presets/index.json"), "presets/index.json");
            for (Node name : Fields.list(index.get("presets"), "")) {
                presets.add(PresetJson.read(Resource.text("/presets/" + name.text()), "presets/" + name.text(), problems));
            }
            if (!problems.isEmpty()) {
                throw new IllegalStateException("shipped presets: " + problems);
            }
            return List.copyOf(presets);
        }
    }

    /** Texts inside the program. */
    static final class Resource {

        private Resource() {}

        /** The text of a file that the program carries. */
        static String text(String name) {
            try (InputStream in = Presets.class.getResourceAsStream(name)) {
                if (in == null) {
                    throw new IllegalStateException("the program lacks its own file " + name);
                }
                return TextFile.text(in.readAllBytes(), name);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }
}
