package slantfall.bench.shell;

import java.nio.file.Path;
import slantfall.declare.SetUp;

/** Keeps unsaved work in order: an older state that was on its way behind the screen never overwrites a newer one. */
final class Keeper {

    private final FileDesk disk;
    private long newest = -1;

    Keeper(FileDesk disk) {
        this.disk = disk;
    }

    /**
     * Keeps a state unless a newer one is kept already.
     *
     * @param version counts up with every change
     * @param setUp what is not saved, null if everything is
     * @param file where it is saved otherwise, null if nowhere
     */
    synchronized void keep(long version, SetUp setUp, Path file) {
        if (version <= newest) {
            return;
        }
        newest = version;
        if (setUp == null) {
            disk.forget();
        } else {
            disk.keep(setUp, file);
        }
    }
}
