package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.DeserializationFeature;
import java.util.List;
import org.junit.jupiter.api.Test;
import slantfall.declare.SetUp;
import slantfall.declare.Value;

/** What is not understood is told and comes back as it was. */
class UnknownKeysTest {

    private static final ObjectMapper JSON =
            new ObjectMapper().enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS);

    private static final String FILE = """
            {
              "slantfall": 1,
              "title": "t",
              "arrangement": "inclined-film",
              "liquid": {"preset": "water", "ph": 7.10, "temperature": {"value": "20 degC", "by": "A. N. Other"},
                         "rheology": {"model": "newtonian", "since": 1e2}},
              "settings": {"anlge": "3 deg", "a/b~c": [1, {"x": null}], "feed": {"value": "0.2 kg/(m s)", "plusMinus": "5 %",
                                                       "shape": "uniform", "meter": {"tag": "FT-1"}}},
              "requirements": [{"reading": "thickness", "atMost": "1 mm", "owner": "me"}],
              "houseRules": {"regime": {"rule": "regime.brauer-1956-turbulent", "since": 12345678901234567890}},
              "plot": {"zoom": 1.0E+2, "on": true, "text": "\\u0001\\ud83d\\udca7"}
            }
            """;

    private final ProjectFile.Opened opened = ProjectFile.read(FILE, "f.json");

    @Test
    void eachIsToldWithItsPlace() {
        assertThat(opened.reports()).contains(
                "unknown key settings.anlge was kept (line 7, column 16); did you mean \"angle\"?",
                "unknown key liquid.ph was kept (line 5, column 33)");
        assertThat(String.join("\n", opened.reports())).contains(
                "liquid.temperature.by", "settings.feed.meter", "requirements[0].owner", "houseRules.regime.since", "plot");
        assertThat(opened.reports()).noneMatch(r -> r.contains("rheology"));
    }

    @Test
    void eachComesBackWhereItWas() throws Exception {
        JsonNode before = JSON.readTree(FILE);
        JsonNode after = JSON.readTree(ProjectFile.write(opened.setUp()));
        for (String pointer : List.of("/liquid/ph", "/liquid/temperature/by", "/liquid/rheology", "/settings/anlge",
                "/settings/a~1b~0c", "/settings/feed/meter", "/requirements/0/owner", "/houseRules/regime/since", "/plot")) {
            assertThat(after.at(pointer).isMissingNode()).as(pointer).isFalse();
            assertThat(after.at(pointer)).as(pointer).isEqualTo(before.at(pointer));
        }
        assertThat(ProjectFile.read(ProjectFile.write(opened.setUp()), "x").setUp()).isEqualTo(opened.setUp());
    }

    @Test
    void numbersKeepTheirCharacters() {
        assertThat(ProjectFile.write(opened.setUp())).contains("7.10", "1.0E+2", "12345678901234567890", "1e2");
    }

    @Test
    void whatLostItsPlaceIsKeptApart() throws Exception {
        SetUp without = opened.setUp().without("feed").withRequirements(List.of());
        JsonNode after = JSON.readTree(ProjectFile.write(without));
        assertThat(after.at("/unplaced/~1settings~1feed~1meter/tag").asText()).isEqualTo("FT-1");
        assertThat(after.at("/unplaced/~1requirements~10~1owner").asText()).isEqualTo("me");
        SetUp again = ProjectFile.read(ProjectFile.write(without), "x").setUp();
        assertThat(JSON.readTree(ProjectFile.write(again))).isEqualTo(after);
    }

    @Test
    void aValueFromASliderKeepsItsCompanion() throws Exception {
        SetUp moved = opened.setUp().with("feed", Value.of(0.3));
        JsonNode after = JSON.readTree(ProjectFile.write(moved));
        assertThat(after.at("/settings/feed/meter/tag").asText()).isEqualTo("FT-1");
        assertThat(ProjectFile.read(after.toString(), "x").setUp().values().get("feed").si()).isEqualTo(0.3);
    }

    @Test
    void manyAreCountedNotListed() {
        StringBuilder text = new StringBuilder("{\"slantfall\": 1, \"arrangement\": \"inclined-film\"");
        for (int i = 0; i < 1000; i++) {
            text.append(", \"later").append(i).append("\": ").append(i);
        }
        ProjectFile.Opened many = ProjectFile.read(text + "}", "x");
        assertThat(many.reports()).hasSize(21).last().asString().contains("981 more");
        assertThat(many.setUp().remarks().unknown()).hasSize(1000);
    }
}
