package slantfall.store;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Reads a file as UTF-8 text, or says why it cannot be. */
final class TextFile {

    /** Largest file that is read [bytes]. */
    static final int LARGEST = 4 * 1024 * 1024;

    private TextFile() {}

    /** The bytes of a file of reasonable size. */
    static byte[] bytes(Path path) {
        Place place = Place.of(name(path));
        if (Files.isDirectory(path)) {
            throw new StoreProblem(place, "is a folder, not a file", "Name a file in it, such as plant.slantfall.json");
        }
        try (InputStream in = Files.newInputStream(path)) {
            byte[] bytes = in.readNBytes(LARGEST + 1);
            if (bytes.length > LARGEST) {
                throw new StoreProblem(place, "is larger than 4 MB", "A set-up needs a few kB; check what wrote this file");
            }
            return bytes;
        } catch (NoSuchFileException e) {
            throw new StoreProblem(place, "there is no such file", "Check the name and the folder " + folder(path), e);
        } catch (AccessDeniedException e) {
            throw new StoreProblem(place, "may not be read", "Ask for the permission to read it, or copy it", e);
        } catch (IOException e) {
            throw new StoreProblem(place, "could not be read: " + reason(e), "Check the name and the disk", e);
        }
    }

    /** The text of a file. */
    static String read(Path path) {
        return text(bytes(path), name(path));
    }

    /** The text of bytes in UTF-8; the byte order mark that some editors put before it is dropped. */
    static String text(byte[] bytes, String file) {
        Place place = Place.of(file);
        if (wide(bytes)) {
            throw new StoreProblem(place, "is encoded as UTF-16 or UTF-32", "Save it as UTF-8");
        }
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(in, out, true);
        if (result.isError()) {
            throw notUtf8(bytes, in.position(), file);
        }
        String text = out.flip().toString();
        return text.startsWith("\uFEFF") ? text.substring(1) : text;
    }

    // A byte order mark of UTF-16, or a zero byte, which no text in UTF-8 holds.
    private static boolean wide(byte[] bytes) {
        boolean mark = bytes.length >= 2
                && ((bytes[0] & 0xFF) == 0xFE && (bytes[1] & 0xFF) == 0xFF
                        || (bytes[0] & 0xFF) == 0xFF && (bytes[1] & 0xFF) == 0xFE);
        for (int i = 0; i < Math.min(4, bytes.length) && !mark; i++) {
            mark = bytes[i] == 0;
        }
        return mark;
    }

    private static StoreProblem notUtf8(byte[] bytes, int at, String file) {
        int line = 1;
        int column = 1;
        for (int i = 0; i < at; i++) {
            boolean newLine = bytes[i] == '\n';
            line += newLine ? 1 : 0;
            column = newLine ? 1 : column + 1;
        }
        return new StoreProblem(
                new Place(file, line, column, ""),
                String.format("byte 0x%02X is no UTF-8", bytes[at] & 0xFF),
                "Save the file as UTF-8");
    }

    /** The name of a file for messages. */
    static String name(Path path) {
        return path.getFileName() == null ? path.toString() : path.getFileName().toString();
    }

    /** The folder that a file lies in. */
    static Path folder(Path path) {
        Path parent = path.toAbsolutePath().getParent();
        return parent == null ? path.toAbsolutePath() : parent;
    }

    /** What the system says, without repeating the file's name. */
    static String reason(IOException e) {
        if (e instanceof java.nio.file.FileSystemException f && f.getReason() != null) {
            return f.getReason();
        }
        return e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
    }
}
