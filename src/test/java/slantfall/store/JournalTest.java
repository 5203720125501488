package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.declare.SetUp;
import slantfall.declare.Value;

/** What a crash leaves can be taken up again. */
class JournalTest {

    @TempDir
    Path folder;

    private final SetUp first = SetUp.blank("inclined-film", Presets.load().initial()).titled("first\nline");
    private final SetUp second = first.titled("second").with("feed", Value.of(0.123456789));

    private Path crashed(SetUp... setUps) throws IOException {
        Journal journal = Journal.begin(folder.resolve("journal"));
        for (SetUp setUp : setUps) {
            journal.add(setUp, folder.resolve("plant.json"));
        }
        journal.release();
        return journal.file();
    }

    @Test
    void theLastSetUpComesBack() throws IOException {
        crashed(first, second);
        Journal.Recovered recovered = Journal.leftOver(folder.resolve("journal")).get(0);
        assertThat(recovered.setUp().title()).isEqualTo("second");
        assertThat(recovered.setUp().values().get("feed").si()).isEqualTo(0.123456789);
        assertThat(recovered.file()).isEqualTo(folder.resolve("plant.json").toString());
        Journal.discard(recovered.journal());
        assertThat(Journal.leftOver(folder.resolve("journal"))).isEmpty();
    }

    @Test
    void whereverTheLastLineIsCutOffTheOneBeforeComesBack() throws IOException {
        Path journal = crashed(first, second);
        byte[] whole = Files.readAllBytes(journal);
        int firstLine = new String(whole, java.nio.charset.StandardCharsets.UTF_8).indexOf('\n') + 1;
        for (int length = firstLine; length < whole.length; length += 17) {
            Files.write(journal, java.util.Arrays.copyOf(whole, length));
            assertThat(Journal.last(journal).orElseThrow().setUp().title()).isEqualTo("first\nline");
        }
    }

    @Test
    void garbledLinesArePassedOver() throws IOException {
        Path journal = crashed(first);
        Files.write(journal, new byte[500], StandardOpenOption.APPEND);
        Files.writeString(journal, "\n{\"at\": \"yesterday\"}\n\n", StandardOpenOption.APPEND);
        assertThat(Journal.last(journal).orElseThrow().setUp()).isEqualTo(first);
    }

    @Test
    void aJournalWithNothingWholeGivesNothing() throws IOException {
        Path journal = crashed();
        assertThat(Journal.last(journal)).isEmpty();
        Files.writeString(journal, "{\"at\"");
        assertThat(Journal.last(journal)).isEmpty();
        assertThat(Journal.leftOver(folder.resolve("journal"))).isEmpty();
    }

    @Test
    void aProperEndLeavesNothing() throws IOException {
        Journal journal = Journal.begin(folder);
        journal.add(first, null);
        assertThat(Journal.leftOver(folder)).as("a journal in use is not left over").isEmpty();
        journal.close();
        assertThat(journal.file()).doesNotExist();
    }

    @Test
    void itStaysShort() throws IOException {
        SetUp long_ = first.withRemarks(new SetUp.Remarks("x".repeat(100_000), java.util.Map.of()));
        Journal journal = Journal.begin(folder);
        for (int i = 0; i < 40; i++) {
            journal.add(long_.titled("t" + i), null);
            assertThat(Files.size(journal.file())).isLessThan(2 << 20);
            assertThat(Journal.last(journal.file()).orElseThrow().setUp().title()).isEqualTo("t" + i);
        }
        journal.close();
    }

    @Test
    void aFolderThatCannotBeMadeIsTold() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "x");
        assertThatThrownBy(() -> Journal.begin(file.resolve("journal")))
                .isInstanceOf(StoreProblem.class)
                .hasMessageContaining("journal that keeps your work")
                .hasMessageContaining("Save your work to a file");
    }
}
