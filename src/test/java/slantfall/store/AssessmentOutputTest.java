package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Assessment;
import slantfall.declare.CheckResult;
import slantfall.declare.LiquidSettings;
import slantfall.liquid.Property;

/** Assessments and descriptions for programs; read back by a parser that is not ours. */
class AssessmentOutputTest {

    private static final ObjectMapper JSON = new ObjectMapper();

    static List<String> names() {
        return Examples.list();
    }

    private static Assessment assess(String name) {
        ProjectFile.Opened opened = Examples.open(name);
        return Catalogue.named(opened.setUp().arrangement()).assess(opened.setUp());
    }

    @ParameterizedTest
    @MethodSource("names")
    void everyNumberOfTheAssessmentIsThereBitForBit(String name) throws Exception {
        Assessment a = assess(name);
        String text = AssessmentJson.text(a, List.of("a report"), Set.of("traverses", "courses", "working"));
        JsonNode json = JSON.readTree(text);
        assertThat(text).doesNotContain("NaN").doesNotContain("Infinity");
        assertThat(json.get("arrangement").asText()).isEqualTo(a.setUp().arrangement());
        assertThat(json.get("readings")).hasSize(a.readings().size());
        for (Assessment.ReadingValue r : a.readings()) {
            JsonNode reading = json.get("readings").get(r.reading().key());
            same(reading.get("value"), r.value());
            assertThat(reading.get("unit").asText()).isEqualTo(r.reading().kind().si().symbol());
            assertThat(reading.get("name").asText()).isEqualTo(r.reading().name());
        }
        assertThat(json.get("checks")).hasSize(a.checks().size());
        for (int i = 0; i < a.checks().size(); i++) {
            check(json.get("checks").get(i), a.checks().get(i));
        }
        for (Property p : Property.values()) {
            assertThat(json.get("liquid").has(p.key())).isTrue();
        }
        a.liquid().properties().forEach(p -> same(json.get("liquid").get(p.property().key()), p.value()));
        assertThat(json.get("notices").get(json.get("notices").size() - 1).asText()).isEqualTo("a report");
        assertThat(json.get("notices")).hasSize(a.notices().size() + 1);
        assertThat(json.get("cautions")).hasSize(a.cautions().size());
    }

    private static void check(JsonNode json, CheckResult c) {
        List<String> keys = new ArrayList<>();
        json.fieldNames().forEachRemaining(keys::add);
        assertThat(keys).contains("key", "panel", "question", "kind", "unit", "verdict", "value", "limit", "margin", "source",
                "inRange");
        assertThat(json.get("key").asText()).isEqualTo(c.info().key());
        assertThat(json.get("verdict").asText()).isEqualTo(c.verdict().word());
        assertThat(json.get("question").asText()).isNotEmpty();
        same(json.get("value"), c.value());
        same(json.get("limit"), c.limit());
        same(json.get("margin"), c.margin());
    }

    private static void same(JsonNode json, double value) {
        if (Double.isFinite(value)) {
            assertThat(json.doubleValue()).isEqualTo(value);
        } else {
            assertThat(json.isNull()).isTrue();
        }
    }

    @ParameterizedTest
    @MethodSource("names")
    void profilesAndWorkingComeOnDemand(String name) throws Exception {
        Assessment a = assess(name);
        JsonNode bare = JSON.readTree(AssessmentJson.text(a, List.of(), Set.of()));
        assertThat(List.of(bare.has("traverses"), bare.has("courses"), bare.has("working"))).containsOnly(false);
        JsonNode json = JSON.readTree(AssessmentJson.text(a, List.of(), Set.of("traverses", "working")));
        assertThat(json.has("courses")).isFalse();
        JsonNode traverses = json.get("traverses");
        assertThat(traverses.get("at").isNumber()).isTrue();
        assertThat(traverses.get("y").get("unit").asText()).isEqualTo("m");
        double[] velocity = a.profiles().traverses().column("velocity").orElseThrow().values();
        assertThat(traverses.get("velocity").get("values")).hasSize(velocity.length);
        same(traverses.get("velocity").get("values").get(1), velocity[1]);
        a.workings().forEach(w -> {
            JsonNode steps = json.get("working").get(w.about());
            same(steps.get(steps.size() - 1).get("result"), w.last().result());
        });
    }

    @Test
    void theTableHasARowPerReadingAndCheck() {
        Assessment a = assess("rinse-wall.slantfall.json");
        List<String> lines = AssessmentCsv.text(a).lines().toList();
        assertThat(lines).hasSize(1 + a.readings().size() + a.checks().size());
        assertThat(lines.get(0)).startsWith("part,key,name,value,unit");
        assertThat(lines.get(1)).startsWith("reading,thickness,Film thickness," + a.value("thickness") + ",m");
    }

    @ParameterizedTest
    @CsvSource(quoteCharacter = '`', value = {
        "plain,plain", "=1+1,'=1+1", "+1,'+1", "-1,'-1", "@x,'@x", "`a,b`,`\"a,b\"`", "a\"b,`\"a\"\"b\"`", "`=a,b`,`\"'=a,b\"`"
    })
    void noTextIsAFormula(String text, String cell) {
        assertThat(AssessmentCsv.cell(text)).isEqualTo(cell);
    }

    @Test
    void theDescriptionNamesEverything() throws Exception {
        Presets presets = Presets.load();
        JsonNode json = JSON.readTree(DescribeJson.text(Catalogue.all(), presets));
        assertThat(json.get("arrangements")).hasSize(Catalogue.all().size());
        for (JsonNode arrangement : json.get("arrangements")) {
            List<String> keys = arrangement.get("settings").findValuesAsText("key");
            assertThat(keys).contains("angle", "width").containsAll(LiquidSettings.list().stream().map(s -> s.key()).toList());
            for (JsonNode setting : arrangement.get("settings")) {
                for (String field : List.of("key", "name", "symbol", "kind", "unit", "default", "possible", "usual", "scale", "help", "question")) {
                    assertThat(setting.has(field)).as(field).isTrue();
                }
                assertThat(setting.get("usual").get(0).doubleValue()).isLessThan(setting.get("usual").get(1).doubleValue());
            }
            assertThat(arrangement.get("readings")).isNotEmpty();
            assertThat(arrangement.get("checks")).isNotEmpty();
        }
        assertThat(json.get("liquids").findValuesAsText("key")).contains("water", "glycerol-water");
    }
}
