package slantfall.bench;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import javafx.animation.AnimationTimer;
import javafx.application.Platform;

/**
 * Measures the start for docs/performance.md: with the system property {@code slantfall.firstPaint} naming a file, the time
 * from process start to the first painted frame is written there in milliseconds and the window closes.
 */
final class StartClock extends AnimationTimer {

    private static final String WANTED = "slantfall.firstPaint";

    /** The first call comes before the frame is painted, the second after it. */
    private static final int PAINTED = 2;

    private final Path file;
    private int frames;

    private StartClock(Path file) {
        super();
        this.file = file;
    }

    /** Starts the clock if it is wanted. */
    static void maybe() {
        String wanted = System.getProperty(WANTED);
        if (wanted != null) {
            new StartClock(Path.of(wanted)).start();
        }
    }

    @Override
    public void handle(long now) {
        frames++;
        if (frames < PAINTED) {
            return;
        }
        stop();
        Instant started = ProcessHandle.current().info().startInstant().orElse(Instant.now());
        try {
            Files.writeString(file, Long.toString(Duration.between(started, Instant.now()).toMillis()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        Platform.exit();
    }
}
