package slantfall.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;

/** Where bytes go. A test puts a full disk in its place. */
interface Disk {

    /** Writes a new file and waits until the device has it. */
    void write(Path fresh, byte[] content) throws IOException;

    /** The real one. */
    static Disk real() {
        return (fresh, content) -> {
            try (FileChannel channel =
                    FileChannel.open(fresh, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
                ByteBuffer rest = ByteBuffer.wrap(content);
                while (rest.hasRemaining()) {
                    channel.write(rest);
                }
                channel.force(true);
            }
        };
    }
}
