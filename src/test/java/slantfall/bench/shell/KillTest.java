package slantfall.bench.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.declare.SetUp;
import slantfall.store.ProjectFile;

/**
 * The program is killed at random moments while it edits and saves; every edit that was committed is found afterwards. The
 * number of kills is the system property {@code slantfall.kills}, 6 by default.
 */
class KillTest {

    private static final int KILLS = Integer.getInteger("slantfall.kills", 6);

    @TempDir
    Path folder;

    @Test
    void noCommittedEditIsLost() throws Exception {
        Random random = new Random(20);
        for (int kill = 0; kill < KILLS; kill++) {
            Path home = Files.createDirectories(folder.resolve("home" + kill));
            long told = editUntilKilled(home, 5 + random.nextInt(400));
            assertThat(told).as("edits before the kill").isPositive();
            assertThat(found(home)).as("kill " + kill + " after edit " + told).isGreaterThanOrEqualTo(told);
        }
    }

    /** Runs the loop, kills it after a number of edits and some odd time, and gives the last edit that was told. */
    private static long editUntilKilled(Path home, int edits) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-XX:TieredStopAtLevel=1",
                        "-cp",
                        System.getProperty("java.class.path"),
                        EditLoop.class.getName(),
                        home.toString())
                .redirectError(ProcessBuilder.Redirect.DISCARD)
                .start();
        long told = 0;
        try (BufferedReader out =
                new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8))) {
            String line = out.readLine();
            while (line != null) {
                told = line.matches("\\d+") ? Long.parseLong(line) : told;
                if (told >= edits && process.isAlive()) {
                    process.toHandle().destroyForcibly();
                }
                line = out.readLine();
            }
        }
        assertThat(process.waitFor(20, TimeUnit.SECONDS)).isTrue();
        return told;
    }

    /** The last edit that the next start finds, in the journal or in the saved file. */
    private static long found(Path home) {
        Optional<FileDesk.Found> kept = new StoreDesk(home).found();
        Path file = home.resolve("work.slantfall.json");
        SetUp setUp = kept.isPresent() ? kept.get().setUp() : ProjectFile.read(file).setUp();
        return Math.round((setUp.values().get("length").si() - 1) * 1e6);
    }
}
