package slantfall.console;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ConsoleTest {

    private static final ObjectMapper JSON = new ObjectMapper();

    private static final String FILM = "{\"slantfall\": 1, \"title\": \"t\", \"arrangement\": \"inclined-film\","
            + " \"liquid\": {\"preset\": \"water\", \"temperature\": \"20 degC\"},"
            + " \"settings\": {\"angle\": \"90 deg\", \"feed\": \"0.1 kg/(m s)\", \"length\": \"2 m\"}}";

    @TempDir
    Path folder;

    private record Run(int status, String out, String err) {}

    private static Run run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = Console.run(args, new PrintWriter(out), new PrintWriter(err));
        return new Run(status, out.toString(), err.toString());
    }

    private Path file(String text) throws IOException {
        return Files.writeString(folder.resolve("a.slantfall.json"), text);
    }

    private static void refused(Run run, String... words) {
        assertThat(run.status()).as(run.err()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err()).isNotBlank().hasSizeLessThan(1200).doesNotContain("\tat ", "Exception");
        for (String word : words) {
            assertThat(run.err()).contains(word);
        }
    }

    @Test
    void assessWritesTheContractsJson() throws IOException {
        Run run = run("assess", file(FILM).toString(), "--as", "json", "--with", "traverses,working");
        assertThat(run.status()).isZero();
        assertThat(run.err()).isEmpty();
        JsonNode root = JSON.readTree(run.out());
        assertThat(root.get("arrangement").asText()).isEqualTo("inclined-film");
        JsonNode thickness = root.get("readings").get("thickness");
        assertThat(thickness.get("value").asDouble()).isCloseTo(0.3133e-3, within(0.00005e-3));
        assertThat(thickness.get("unit").asText()).isEqualTo("m");
        assertThat(root.get("liquid").get("viscosity").asDouble()).isCloseTo(1.0016e-3, within(1e-6));
        assertThat(root.get("liquid").get("contactAngle").isNull()).isTrue();
        assertThat(root.get("traverses").get("velocity").get("values")).hasSize(41);
        for (JsonNode check : root.get("checks")) {
            for (String field : List.of("key", "panel", "question", "kind", "unit", "verdict", "value", "limit", "margin",
                    "source", "inRange")) {
                assertThat(check.has(field)).as(field).isTrue();
            }
        }
        assertThat(run.out()).doesNotContain("NaN", "Infinity");
    }

    @Test
    void textSaysWhatThePeopleNeed() throws IOException {
        Run run = run("assess", file(FILM).toString());
        assertThat(run.status()).isZero();
        assertThat(run.out())
                .contains("Film thickness", "0.313 mm", "Is the film laminar or turbulent?", "Brauer 1956", "from memory",
                        "untouched default")
                .doesNotContain("NaN", "null", "safe");
    }

    @Test
    void setChangesASettingInAnyUnit() throws IOException {
        Path file = file(FILM);
        Run run = run("assess", file.toString(), "--as", "json", "--set", "angle=60 deg from vertical", "--set",
                "feed=25 L/(min m)", "--set", "thicknessLaw=nusselt");
        assertThat(run.status()).as(run.err()).isZero();
        JsonNode readings = JSON.readTree(run.out()).get("readings");
        double expected = Math.cbrt(3 * 1.0016e-3 * (25e-3 / 60) / (998.2 * 9.80665 * 0.5));
        assertThat(readings.get("thickness").get("value").asDouble()).isCloseTo(expected, within(1e-4 * expected));
        assertThat(Files.readString(file)).isEqualTo(FILM);
    }

    @Test
    void overridingAPropertyMakesItMeasured() throws IOException {
        Run run = run("assess", file(FILM).toString(), "--as", "json", "--set", "liquid.viscosity=50 cP");
        JsonNode root = JSON.readTree(run.out());
        assertThat(root.get("liquid").get("viscosity").asDouble()).isEqualTo(0.05);
        assertThat(root.get("liquid").get("origins").get("viscosity").asText()).isEqualTo("measured");
    }

    @ParameterizedTest
    @ValueSource(strings = {
        "angle", "=3 mm", "angle=", "angle=banana", "angle=5 kg", "angle=120 deg", "feed=-1 kg/(m s)", "width=0 m", "width=1,234 m",
        "angle=1 in 4", "length=NaN m", "length=1e999 m", "thicknessLaw=mine", "liquid.colour=red", "fed=1 kg/(m s)", "feed=5"
    })
    void nonsenseInSetIsRefusedWithAReason(String change) throws IOException {
        refused(run("assess", file(FILM).toString(), "--set", change));
    }

    @Test
    void anUnknownKeyInAFileIsReportedButNoError() throws IOException {
        Run run = run("assess", file(FILM.replace("\"length\"", "\"lenght\"")).toString(), "--as", "json");
        assertThat(run.status()).isZero();
        assertThat(JSON.readTree(run.out()).get("notices").toString()).contains("lenght");
    }

    @Test
    void missingFileFolderAndBadOptionsAreRefused() {
        refused(run("assess", folder.resolve("none.json").toString()), "none.json");
        refused(run("assess", folder.toString()));
        refused(run("assess"));
        refused(run("asses", "x"));
        refused(run("assess", "x", "--as", "xml"));
        refused(run("describe", "inclined-flim"), "inclined-film");
        refused(run("prove", "--rows", folder.resolve("none.json").toString()));
    }

    @Test
    void strictTurnsACrossedRequirementIntoStatusOne() throws IOException {
        String crossed = FILM.replace("\"settings\"",
                "\"requirements\": [{\"reading\": \"thickness\", \"atMost\": \"0.3 mm\"}], \"settings\"");
        assertThat(run("assess", file(crossed).toString()).status()).isZero();
        assertThat(run("assess", file(crossed).toString(), "--strict").status()).isEqualTo(1);
        String met = crossed.replace("0.3 mm", "0.4 mm");
        assertThat(run("assess", file(met).toString(), "--strict").status()).isZero();
    }

    @Test
    void strictHonoursAHouseRuleWithItsMargin() throws IOException {
        String house = FILM.replace("\"settings\"", "\"houseRules\": {\"regime\": {\"rule\":"
                + " \"regime.brauer-1956-turbulent\", \"margin\": \"400 %\"}}, \"settings\"");
        assertThat(run("assess", file(house).toString(), "--strict").status()).isEqualTo(1);
        assertThat(run("assess", file(house.replace("400", "25")).toString(), "--strict").status()).isZero();
    }

    @Test
    void describeListsKeysOfTheContract() throws IOException {
        JsonNode root = JSON.readTree(run("describe", "--as", "json").out());
        List<String> keys = new ArrayList<>();
        for (JsonNode arrangement : root.get("arrangements")) {
            for (JsonNode setting : arrangement.get("settings")) {
                keys.add(arrangement.get("key").asText() + "/" + setting.get("key").asText());
                assertThat(setting.has("kind") && setting.has("unit") && setting.has("default") && setting.has("possible")
                        && setting.has("usual") && setting.has("scale")).isTrue();
            }
        }
        assertThat(keys).contains("inclined-film/angle", "inclined-film/feed", "inclined-film/interfacialShear",
                "inclined-film/inletDisturbance", "inclined-film/visibleGrowth", "closed-slot/gap", "closed-slot/gapOutlet",
                "closed-slot/pressureDrop", "closed-slot/outletPressure", "closed-slot/wallSpeed");
        assertThat(root.get("liquids").toString()).contains("water", "glycerol-water");
        assertThat(run("describe").out()).contains("inclined-film", "Settings");
    }

    @Test
    void proveReproducesEverythingItCarriesAndFailsOnATamperedRow() throws IOException {
        Run run = run("prove", "--as", "json");
        assertThat(run.status()).isZero();
        assertThat(JSON.readTree(run.out()).get("rows").size()).isGreaterThan(200);
        Path rows = Files.writeString(folder.resolve("rows.json"), "[{\"id\": \"1.N.h\", \"quantity\": \"h\", \"inputs\":"
                + " {\"rho\": 1000, \"mu\": 0.001, \"beta_deg_from_horizontal\": 30, \"g\": 9.80665, \"Gamma\": 0.05},"
                + " \"expected\": 0.0004, \"rel_tol\": 1e-6, \"source\": \"tampered\", \"mark\": \"C\"}]");
        Run tampered = run("prove", "--rows", rows.toString(), "--as", "json");
        assertThat(tampered.status()).isEqualTo(3);
        assertThat(JSON.readTree(tampered.out()).get("rows").get(0).get("ok").asBoolean()).isFalse();
    }

    @Test
    void csvKeepsNumbersAndDefusesFormulas() throws IOException {
        String evil = FILM.replace("\"title\": \"t\"", "\"title\": \"=cmd|' /C calc'!A0\"");
        Run run = run("assess", file(evil).toString(), "--as", "csv");
        assertThat(run.status()).isZero();
        assertThat(run.out().lines()).noneMatch(l -> l.startsWith("=") || l.contains(",=") || l.contains("\"="));
        assertThat(run.out()).contains("thickness");
    }

    @Test
    void helpAndVersionWork() {
        assertThat(run("--help").out()).contains("assess", "describe", "prove");
        assertThat(run("assess", "--help").out()).contains("--set");
        assertThat(run("--version").status()).isZero();
    }

    @Test
    void resultsGoToStandardOutputInUtf8() throws IOException {
        Run run = run("assess", file(FILM).toString());
        assertThat(new String(run.out().getBytes(StandardCharsets.UTF_8), StandardCharsets.UTF_8)).contains("Γ/μ");
    }
}
