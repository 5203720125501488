package slantfall.store;

import java.util.List;
import java.util.NoSuchElementException;

/** Example set-ups that come with the program. Their scenario is invented, and they say so. */
public final class Examples {

    private static final String FOLDER = "/examples/";

    private Examples() {}

    /** Names of the examples, the one to begin with first. */
    public static List<String> list() {
        Node index = NodeReader.read(Presets.Resource.text(FOLDER + "index.json"), "examples/index.json");
        return Fields.list(index.get("examples"), "").stream().map(Node::text).toList();
    }

    /** The text of an example. */
    public static String text(String name) {
        if (!list().contains(name)) {
            throw new NoSuchElementException("no example " + name + "; one of " + String.join(", ", list()));
        }
        return Presets.Resource.text(FOLDER + name);
    }

    /** Opens an example. */
    public static ProjectFile.Opened open(String name) {
        return ProjectFile.read(text(name), name);
    }
}
