package slantfall.bench.shell;

import java.nio.file.Path;
import java.util.Optional;

/** Asks for a file. */
public interface Chooser {

    /** A file to open; empty if the user thought better of it. */
    Optional<Path> open();

    /** Where to save; empty if the user thought better of it. */
    Optional<Path> save(String suggestedName);

    /** Where to save a picture, as SVG or PNG by the name's ending; empty if the user thought better of it. */
    default Optional<Path> picture(String suggestedName) {
        return save(suggestedName);
    }
}
