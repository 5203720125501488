package slantfall.store;

import java.io.File;
import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;

/**
 * Writes a file so that at every moment either the old or the new content is there whole: into a new file beside it,
 * flushed to the device, then renamed. The former content stays as NAME~.
 */
final class AtomicFile {

    private static final boolean WINDOWS =
            System.getProperty("os.name", "").startsWith("Windows");

    /** How the name of a new file ends: after the file's own, or its backup's. */
    private static final String FRESH = "~?\\.[0-9a-f]{1,16}\\.tmp";

    private static final long LEFT_BEHIND = 10 * 60 * 1000L;

    private final Disk disk;

    AtomicFile(Disk disk) {
        this.disk = disk;
    }

    /** One that writes to the real disk. */
    static AtomicFile real() {
        return new AtomicFile(Disk.real());
    }

    /**
     * Writes a file.
     *
     * @param path which; a link is followed, so that the file it points to is replaced and not the link
     * @param backup whether the former content is kept as NAME~
     * @return whether the folder's device confirmed the new name as well; some file systems have no way to ask
     * @throws StoreProblem if it cannot be written; the former content is then untouched
     */
    boolean write(Path path, byte[] content, boolean backup) {
        refuseFolders(path);
        try {
            Path target = Files.exists(path) ? path.toRealPath() : path.toAbsolutePath();
            if (Files.exists(target) && !Files.isWritable(target)) {
                throw new AccessDeniedException(path.toString());
            }
            sweep(target);
            if (backup && Files.exists(target)) {
                replace(target.resolveSibling(TextFile.name(target) + "~"), Files.readAllBytes(target), target);
            }
            replace(target, content, target);
            return force(TextFile.folder(target));
        } catch (AccessDeniedException e) {
            throw new StoreProblem(Place.of(TextFile.name(path)), "may not be written here, nothing was changed",
                    "Save it in another folder, or ask for the permission to write to " + TextFile.folder(path), e);
        } catch (IOException e) {
            throw new StoreProblem(Place.of(TextFile.name(path)),
                    "could not be written: " + TextFile.reason(e) + "; the former file is unchanged",
                    "Make room on the disk or save it elsewhere", e);
        }
    }

    private static void refuseFolders(Path path) {
        Place place = Place.of(TextFile.name(path));
        if (Files.isDirectory(path)) {
            throw new StoreProblem(place, "is a folder, a file cannot be written over it", "Choose another name");
        }
        Path folder = TextFile.folder(path);
        if (Files.exists(folder) && !Files.isDirectory(folder)) {
            throw new StoreProblem(place, folder + " is a file, not a folder", "Save it in a folder");
        }
        if (!Files.exists(folder)) {
            throw new StoreProblem(place, "the folder " + folder + " is missing", "Make it first, or save elsewhere");
        }
    }

    // What a program that was killed while writing left behind; younger ones may be somebody's at work.
    private static void sweep(Path target) {
        String prefix = "." + TextFile.name(target);
        long old = System.currentTimeMillis() - LEFT_BEHIND;
        File[] left = TextFile.folder(target)
                .toFile()
                .listFiles(f -> f.getName().startsWith(prefix)
                        && f.getName().substring(prefix.length()).matches(FRESH)
                        && f.lastModified() < old);
        for (File file : left == null ? new File[0] : left) {
            file.delete();
        }
    }

    private void replace(Path target, byte[] content, Path likeWhich) throws IOException {
        Path fresh = target.resolveSibling("." + TextFile.name(target) + "." + Long.toHexString(System.nanoTime()) + ".tmp");
        try {
            disk.write(fresh, content);
            samePermissions(likeWhich, fresh);
            rename(fresh, target);
        } finally {
            Files.deleteIfExists(fresh);
        }
    }

    private static void samePermissions(Path from, Path to) throws IOException {
        PosixFileAttributeView view = Files.getFileAttributeView(to, PosixFileAttributeView.class);
        if (view != null && Files.exists(from)) {
            view.setPermissions(Files.getPosixFilePermissions(from));
        }
    }

    private static void rename(Path fresh, Path target) throws IOException {
        try {
            Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            // Some network drives cannot rename in one step; theirs is the next best.
            Files.move(fresh, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    // A rename is only certain after a power cut once the folder itself is on the device; Windows opens no folders.
    private static boolean force(Path folder) {
        if (WINDOWS) {
            return false;
        }
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
            return true;
        } catch (IOException e) {
            return false;
        }
    }
}
