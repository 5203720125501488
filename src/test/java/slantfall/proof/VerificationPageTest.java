package slantfall.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import slantfall.store.ProofRows;

/** docs/verification.md is the generated page; {@code -Dverification.write=true} writes it. */
class VerificationPageTest {

    private static final Path PAGE = Path.of("docs", "verification.md");
    private static final String HOW = "docs/verification.md is not what the program computes now. Look at the difference,"
            + " then regenerate: mvn -B test -Dtest=VerificationPageTest -Dverification.write=true";

    @Test
    void theCommittedPageIsTheGeneratedOne() throws IOException {
        String page = VerificationPage.of(ProofRows.shipped());
        if (Boolean.getBoolean("verification.write")) {
            Files.writeString(PAGE, page);
        }
        String committed = Files.readString(PAGE);
        assertThat(committed.equals(page)).as(HOW + firstDifference(committed, page)).isTrue();
    }

    private static String firstDifference(String committed, String page) {
        List<String> was = committed.lines().toList();
        List<String> is = page.lines().toList();
        for (int i = 0; i < Math.min(was.size(), is.size()); i++) {
            if (!was.get(i).equals(is.get(i))) {
                return "\nline " + (i + 1) + " was: " + was.get(i) + "\nis now: " + is.get(i);
            }
        }
        return "\nlines: " + was.size() + " committed, " + is.size() + " now";
    }

    @Test
    void everyNumberHasItsLine() {
        List<PublishedRow> rows = ProofRows.shipped();
        String page = VerificationPage.of(rows);
        List<String> ids = Prover.prove(rows).rows().stream().map(ProofResult.Row::id).collect(Collectors.toList());
        assertThat(ids).allSatisfy(id -> assertThat(page).contains("| " + id + " |"));
    }

    @Test
    void aValueFromMemorySaysSo() {
        String page = VerificationPage.of(ProofRows.shipped());
        assertThat(page.lines().filter(l -> l.startsWith("| 5.Le.10[0] |")))
                .singleElement()
                .asString()
                .contains("| from memory |");
    }
}
