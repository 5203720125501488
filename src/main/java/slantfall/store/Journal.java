package slantfall.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import slantfall.declare.SetUp;

/**
 * Remembers work that is on no file yet, so that a crash or a power cut costs nothing: whole set-ups, one line of JSON
 * each, only ever added at the end and flushed to the device. One journal per running program; it is locked while in use
 * and deleted at a proper end, so that what is left over is what was lost.
 */
public final class Journal implements AutoCloseable {

    private static final String ENDING = ".slantfall-journal";
    private static final long LONGEST = 1 << 20;

    private final Path file;
    private final FileChannel channel;
    private final FileLock lock;

    private Journal(Path file, FileChannel channel, FileLock lock) {
        this.file = file;
        this.channel = channel;
        this.lock = lock;
    }

    /**
     * What a journal held.
     *
     * @param setUp the last whole set-up in it
     * @param at when it was written
     * @param file where it was last saved, empty if nowhere
     * @param journal the journal itself, to be discarded once the work is taken over
     */
    public record Recovered(SetUp setUp, Instant at, String file, Path journal) {}

    /**
     * Begins a journal of its own in a folder, which is made if missing.
     *
     * @throws StoreProblem if it cannot be written
     */
    public static Journal begin(Path folder) {
        Path file = folder.resolve(ProcessHandle.current().pid() + "-" + Long.toHexString(System.nanoTime()) + ENDING);
        try {
            Files.createDirectories(folder);
            FileChannel channel =
                    FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE, StandardOpenOption.READ);
            return new Journal(file, channel, channel.lock());
        } catch (IOException e) {
            throw failed(file, e);
        }
    }

    /** Where it is. */
    public Path file() {
        return file;
    }

    /**
     * Adds a set-up and waits until the device has it.
     *
     * @param savedTo where it was last saved, null if nowhere
     * @throws StoreProblem if it cannot be written; what was there before stays
     */
    public void add(SetUp setUp, Path savedTo) {
        Node entry = Node.object()
                .put("at", Instant.now().toString())
                .put("file", savedTo == null ? "" : savedTo.toAbsolutePath().toString())
                .put("setUp", SetUpWriter.node(setUp));
        byte[] line = (NodeWriter.compact(entry) + "\n").getBytes(StandardCharsets.UTF_8);
        try {
            long end = channel.size();
            append(end, line);
            if (end > LONGEST) {
                compact(end, line);
            }
        } catch (IOException e) {
            throw failed(file, e);
        }
    }

    // A half-written last line would be read together with the next one, so it begins on a line of its own.
    private void append(long end, byte[] line) throws IOException {
        boolean torn = end > 0 && last(end) != '\n';
        channel.position(end);
        if (torn) {
            write(new byte[] {'\n'});
        }
        write(line);
        channel.force(false);
    }

    private byte last(long end) throws IOException {
        ByteBuffer one = ByteBuffer.allocate(1);
        channel.read(one, end - 1);
        return one.get(0);
    }

    // The newest line goes to the front only when it already stands whole at the end, and the end is cut off only when
    // the front is whole: whatever moment the power fails, one of the two can be read.
    private void compact(long end, byte[] line) throws IOException {
        if (line.length > end) {
            return;
        }
        channel.position(0);
        write(line);
        channel.force(false);
        channel.truncate(line.length);
        channel.force(true);
    }

    private void write(byte[] bytes) throws IOException {
        ByteBuffer rest = ByteBuffer.wrap(bytes);
        while (rest.hasRemaining()) {
            channel.write(rest);
        }
    }

    /** Ends properly: nothing is left to recover. */
    @Override
    public void close() {
        try {
            release();
            Files.deleteIfExists(file);
        } catch (IOException e) {
            throw failed(file, e);
        }
    }

    /** Lets go of the file and leaves it, as a crash does. */
    void release() throws IOException {
        if (lock.isValid()) {
            lock.release();
        }
        channel.close();
    }

    /** What journals of programs that no longer run hold, the newest first; those with nothing whole are passed over. */
    public static List<Recovered> leftOver(Path folder) {
        List<Recovered> all = new ArrayList<>();
        for (Path journal : journals(folder)) {
            if (!inUse(journal)) {
                last(journal).ifPresent(all::add);
            }
        }
        all.sort((a, b) -> b.at().compareTo(a.at()));
        return all;
    }

    /** Deletes a journal whose work has been taken over or is not wanted. */
    public static void discard(Path journal) {
        try {
            Files.deleteIfExists(journal);
        } catch (IOException e) {
            throw failed(journal, e);
        }
    }

    private static List<Path> journals(Path folder) {
        List<Path> files = new ArrayList<>();
        if (!Files.isDirectory(folder)) {
            return files;
        }
        try (DirectoryStream<Path> stream = Files.newDirectoryStream(folder, "*" + ENDING)) {
            stream.forEach(files::add);
        } catch (IOException e) {
            throw failed(folder, e);
        }
        Collections.sort(files);
        return files;
    }

    private static boolean inUse(Path journal) {
        try (FileChannel channel = FileChannel.open(journal, StandardOpenOption.WRITE);
                FileLock lock = channel.tryLock()) {
            return lock == null;
        } catch (OverlappingFileLockException e) {
            return true;
        } catch (IOException e) {
            throw failed(journal, e);
        }
    }

    /** The last whole set-up of a journal; lines that a crash cut off or garbled are passed over. */
    public static Optional<Recovered> last(Path journal) {
        String text;
        try {
            text = new String(Files.readAllBytes(journal), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw failed(journal, e);
        }
        int end = text.lastIndexOf('\n');
        while (end > 0) {
            int start = text.lastIndexOf('\n', end - 1);
            Optional<Recovered> recovered = line(text.substring(start + 1, end), journal);
            if (recovered.isPresent()) {
                return recovered;
            }
            end = start;
        }
        return Optional.empty();
    }

    private static Optional<Recovered> line(String line, Path journal) {
        try {
            Fields fields = new Fields(NodeReader.read(line, TextFile.name(journal)), "an entry");
            Instant at = Instant.parse(fields.text("at", ""));
            SetUp setUp = ProjectFile.read(NodeWriter.compact(fields.need("setUp", "")), TextFile.name(journal)).setUp();
            return Optional.of(new Recovered(setUp, at, fields.text("file", ""), journal));
        } catch (StoreProblem | DateTimeParseException e) {
            return Optional.empty();
        }
    }

    private static StoreProblem failed(Path file, IOException e) {
        return new StoreProblem(Place.of(TextFile.name(file)), "the journal that keeps your work could not be used: "
                + TextFile.reason(e), "Save your work to a file; check the disk and " + TextFile.folder(file), e);
    }
}
