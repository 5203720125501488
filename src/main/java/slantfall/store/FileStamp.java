package slantfall.store;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * What a file was like when it was read or written, so that a change by somebody else is noticed.
 *
 * @param size size [bytes]
 * @param modified time of the last change [ms since 1970]
 * @param sha256 SHA-256 of the content in hexadecimal; also printed on sheets
 */
public record FileStamp(long size, long modified, String sha256) {

    /**
     * The stamp of a file as it is now.
     *
     * @throws StoreProblem if it cannot be read
     */
    public static FileStamp of(Path path) {
        return of(path, TextFile.bytes(path));
    }

    /** The stamp of a file whose content is known. */
    static FileStamp of(Path path, byte[] content) {
        try {
            return new FileStamp(content.length, Files.getLastModifiedTime(path).toMillis(), sha256(content));
        } catch (IOException e) {
            throw new StoreProblem(Place.of(TextFile.name(path)), "could not be read: " + TextFile.reason(e),
                    "Check that nobody moves it meanwhile", e);
        }
    }

    /** Whether the content is the same; a file that was merely touched has not changed. */
    public boolean sameContent(FileStamp other) {
        return size == other.size && sha256.equals(other.sha256);
    }

    private static String sha256(byte[] content) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
