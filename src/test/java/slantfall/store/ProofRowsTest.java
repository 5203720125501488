package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import slantfall.proof.ProofResult;
import slantfall.proof.Prover;
import slantfall.proof.PublishedRow;

/** Rows files, good and hostile. */
class ProofRowsTest {

    private static final String GOOD = "{\"id\": \"5.taper.beq\", \"quantity\": \"gap\", \"inputs\": {\"b1\": 0.001, \"b2\":"
            + " 0.001}, \"expected\": 0.001, \"rel_tol\": 1e-9, \"source\": \"s\", \"mark\": \"C\", \"note\": \"\"}";

    @TempDir
    Path folder;

    @Test
    void aBadRowKeepsItsReasonAndTheOthersAreProved() throws IOException {
        ProofResult result = prove("[" + GOOD + ", 7, {\"quantity\": \"x\"}, " + with("\"b1\": 0.001", "\"b1\": \"wide\"")
                + ", " + GOOD.replace("beq", "beq.2") + "]");
        assertThat(result.rows()).extracting(ProofResult.Row::ok).containsExactly(true, false, false, false, true);
        assertThat(result.rows().get(1).reason()).contains("row 2 is a number");
        assertThat(result.rows().get(2).reason()).contains("row 3 has no id");
        assertThat(result.rows().get(3).reason()).contains("b1 is text");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "\"b1\": 0.001      | \"b1\": null               | input b1 is null",
        "\"b1\": 0.001      | \"b1\": [0.001, 0.002]     | input b1 is a list of 2",
        "\"b1\": 0.001      | \"b1\": {\"x\": 1}         | input b1 is a table",
        "\"b1\": 0.001      | \"b1\": true               | input b1 is true or false",
        "\"b1\": 0.001      | \"b1\": 1e999              | input b1 is Infinity",
        "\"b1\": 0.001      | \"b1\": []                 | input b1 is an empty list",
        "\"b1\": 0.001      | \"b0\": 1                  | input b1 is missing; given are b0, b2",
        "\"b1\": 0.001      | \"b1\": 0                  | must be above 0",
        "\"expected\": 0.001 | \"expected\": \"x\"       | expected is text",
        "\"expected\": 0.001 | \"expected\": null        | expected is null",
        "\"expected\": 0.001 | \"expected\": []          | expected holds no number",
        "\"expected\": 0.001 | \"expected\": [1, [2]]    | expected[1] is a list",
        "\"expected\": 0.001 | \"expected\": 1e999       | too large",
        "\"expected\": 0.001 | \"x\": 0.001              | expected is missing",
        "\"rel_tol\": 1e-9  | \"rel_tol\": -1            | rel_tol is -1",
        "\"rel_tol\": 1e-9  | \"rel_tol\": \"loose\"     | rel_tol is text",
        "\"rel_tol\": 1e-9  | \"x\": 1                   | no tolerance",
        "\"inputs\": {\"b1\": 0.001, \"b2\": 0.001} | \"inputs\": 3 | inputs is a number"
    })
    void everyFaultOfARowIsNamed(String from, String to, String reason) throws IOException {
        ProofResult result = prove("[" + with(from, to) + "]");
        assertThat(result.rows()).singleElement().satisfies(row -> {
            assertThat(row.ok()).isFalse();
            assertThat(row.reason()).contains(reason);
        });
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "", "   ", "[", "[{\"id\": ", "{}", "7", "null", "\"text\"", "[] []", "[{\"id\": \"a\", \"id\": \"b\"}]",
        "[{\"id\": NaN}]", "not json", "<rows/>"
    })
    void aFileThatIsNoListOfRowsIsRefusedWithItsName(String text) throws IOException {
        Path file = Files.writeString(folder.resolve("rows.json"), text);
        assertThatThrownBy(() -> ProofRows.read(file))
                .hasMessageContaining("rows.json")
                .satisfies(e -> assertThat(e.getMessage()).hasSizeLessThan(1000));
    }

    @Test
    void aTruncatedFileNamesItsLine() throws IOException {
        Path file = Files.writeString(folder.resolve("cut.json"), "[\n" + GOOD + ",\n" + GOOD.substring(0, 40));
        assertThatThrownBy(() -> ProofRows.read(file)).hasMessageContaining("cut.json, line 3");
    }

    @Test
    void wrongPlacesAreRefused() {
        assertThatThrownBy(() -> ProofRows.read(folder)).hasMessageContaining("is a directory");
        assertThatThrownBy(() -> ProofRows.read(folder.resolve("none.json"))).hasMessageContaining("does not exist");
    }

    @Test
    void otherEncodingsAndDeepOrHugeFilesAreRefused() throws IOException {
        Path latin = Files.write(
                folder.resolve("latin.json"), GOOD.replace("\"s\"", "\"Génotelle\"").getBytes(StandardCharsets.ISO_8859_1));
        assertThatThrownBy(() -> ProofRows.read(latin)).hasMessageContaining("latin.json");
        Path deep = Files.writeString(folder.resolve("deep.json"), "[".repeat(100_000));
        assertThatThrownBy(() -> ProofRows.read(deep)).hasMessageContaining("deep.json");
        Path large = folder.resolve("large.json");
        try (java.io.RandomAccessFile f = new java.io.RandomAccessFile(large.toFile(), "rw")) {
            f.setLength(50L << 20);
        }
        assertThatThrownBy(() -> ProofRows.read(large)).hasMessageContaining("50 MB").hasMessageContaining("at most 16 MB");
    }

    @Test
    void theResultAsJsonHoldsNoNumberThatDoesNotExist() throws IOException {
        String unknown = GOOD.replace("5.taper.beq", "77.unknown");
        ProofResult result = prove("[" + GOOD + ", " + with("\"b1\": 0.001", "\"b1\": null") + ", " + unknown + "]");
        JsonNode json = new ObjectMapper().readTree(ProofRows.json(result));
        assertThat(json.path("unknown").get(0).asText()).isEqualTo("77.unknown");
        JsonNode good = json.path("rows").get(0);
        assertThat(good.path("id").asText()).isEqualTo("5.taper.beq");
        assertThat(good.path("obtained").doubleValue()).isEqualTo(result.rows().get(0).obtained());
        assertThat(good.path("ok").booleanValue()).isTrue();
        assertThat(good.path("absolute").isBoolean()).isTrue();
        for (String key : List.of("quantity", "source", "mark", "expected", "deviation", "tolerance")) {
            assertThat(good.has(key)).as(key).isTrue();
        }
        JsonNode bad = json.path("rows").get(1);
        assertThat(bad.path("obtained").isNull()).isTrue();
        assertThat(bad.path("deviation").isNull()).isTrue();
        assertThat(bad.path("reason").asText()).contains("b1");
    }

    @Test
    void aListAndATableKeepTheirPlaces() throws IOException {
        Path file = Files.writeString(folder.resolve("rows.json"), "[" + with("\"expected\": 0.001",
                "\"expected\": [1, 2]") + ", " + with("\"expected\": 0.001", "\"expected\": {\"p\": 1, \"q\": 2}") + "]");
        List<PublishedRow> rows = ProofRows.read(file);
        assertThat(rows.get(0).expected()).extracting(PublishedRow.Expected::place).containsExactly("0", "1");
        assertThat(rows.get(1).expected()).extracting(PublishedRow.Expected::place).containsExactly("p", "q");
    }

    private ProofResult prove(String text) throws IOException {
        Path file = Files.writeString(folder.resolve("rows.json"), text);
        return Prover.prove(ProofRows.read(file));
    }

    private static String with(String from, String to) {
        assertThat(GOOD).contains(from);
        return GOOD.replace(from, to);
    }
}
