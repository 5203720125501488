package slantfall.store;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import slantfall.declare.SetUp;

/** Set-ups in files {@code *.slantfall.json}; the format is described in docs/file-format.md. */
public final class ProjectFile {

    /** How a file's name should end. */
    public static final String ENDING = ".slantfall.json";

    private ProjectFile() {}

    /**
     * A set-up from a file.
     *
     * @param setUp the set-up
     * @param reports what its reader should know: keys that were not understood and kept, values that have no effect
     * @param stamp the file as it was read, null if it came from a text
     */
    public record Opened(SetUp setUp, List<String> reports, FileStamp stamp) {

        public Opened {
            reports = List.copyOf(reports);
        }
    }

    /**
     * Reads a file.
     *
     * @throws StoreProblem with place and remedy if it cannot be read or something in it is refused
     */
    public static Opened read(Path path) {
        byte[] bytes = TextFile.bytes(path);
        String name = TextFile.name(path);
        Opened opened = read(TextFile.text(bytes, name), name);
        return new Opened(opened.setUp(), opened.reports(), FileStamp.of(path, bytes));
    }

    /**
     * Reads a text.
     *
     * @param name what to call it in messages
     */
    public static Opened read(String text, String name) {
        return read(text, name, Presets.load());
    }

    /** Reads a text with given presets. */
    static Opened read(String text, String name, Presets presets) {
        if (text.length() > TextFile.LARGEST) {
            throw new StoreProblem(Place.of(name), "is larger than 4 MB", "A set-up needs a few kB; check what wrote it");
        }
        String bare = text.startsWith("\uFEFF") ? text.substring(1) : text;
        SetUpReader.Result result = SetUpReader.read(NodeReader.read(bare, name), presets);
        return new Opened(result.setUp(), result.reports(), null);
    }

    /** A set-up as the text of a file. */
    public static String write(SetUp setUp) {
        return NodeWriter.pretty(SetUpWriter.node(setUp));
    }

    /**
     * Writes a set-up over whatever the file holds; the former content stays as NAME~.
     *
     * @return the file as it is now
     * @throws StoreProblem if it cannot be written; the former content is then untouched
     */
    public static FileStamp save(Path path, SetUp setUp) {
        return saveThrough(path, setUp, AtomicFile.real());
    }

    /**
     * Writes a set-up unless somebody else has changed the file meanwhile.
     *
     * @param expected the file as it was last read or written; null for a file that must not be there yet
     * @return the file as it is now
     * @throws StoreProblem if it has changed, or cannot be written; its content is then untouched
     */
    public static FileStamp save(Path path, SetUp setUp, FileStamp expected) {
        boolean there = Files.exists(path) && !Files.isDirectory(path);
        Place place = Place.of(TextFile.name(path));
        if (there && expected == null) {
            throw new StoreProblem(place, "a file of this name exists already", "Overwrite it or choose another name");
        }
        if (there && !FileStamp.of(path).sameContent(expected)) {
            throw new StoreProblem(place, "somebody else has changed the file since it was opened; nothing was written",
                    "Save under another name, open the file again, or overwrite it");
        }
        return save(path, setUp);
    }

    /** Writes through the given way to the disk. */
    static FileStamp saveThrough(Path path, SetUp setUp, AtomicFile file) {
        byte[] content = write(setUp).getBytes(StandardCharsets.UTF_8);
        file.write(path, content, true);
        return FileStamp.of(path, content);
    }
}
