package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import slantfall.liquid.Liquid;
import slantfall.liquid.LiquidState;
import slantfall.liquid.Preset;
import slantfall.liquid.Property;

/** Liquids come from files alone. */
class PresetsTest {

    private static final String SYRUP = """
            {"preset": 1, "key": "plant-syrup", "name": "Plant syrup",
             "temperature": ["15 degC", "60 degC"],
             "properties": {
               "density": {"value": "1320 kg/m3", "at": "20 degC",
                           "source": {"key": "lab", "citation": "own laboratory", "mark": "U"}},
               "viscosity": {"points": [["20 degC", "7.5 Pa s"], ["60 degC", "300 cP"]]}},
             "cautions": ["Slippery."], "note": "Invented."}
            """;

    @TempDir
    Path folder;

    @AfterEach
    void forget() {
        System.clearProperty(Presets.PROPERTY);
    }

    @Test
    void theShippedOnesAreThere() {
        Presets presets = Presets.load(folder);
        assertThat(presets.all()).extracting(Preset::key)
                .contains("water", "glycerol-water", "sucrose-water", "sodium-chloride-water");
        assertThat(presets.initial().preset().key()).isEqualTo("water");
        assertThat(presets.problems()).isEmpty();
    }

    @Test
    void everyFileInPresetsIsListed() throws IOException {
        try (var files = Files.list(Path.of("presets"))) {
            long liquids = files.filter(f -> !f.endsWith("index.json")).count();
            assertThat(Presets.load(folder).all()).hasSize((int) liquids);
        }
    }

    @Test
    void aFileInTheUsersFolderAppearsWithoutCode() throws IOException {
        Files.writeString(folder.resolve("syrup.json"), SYRUP);
        System.setProperty(Presets.PROPERTY, folder.toString());
        Preset syrup = Presets.load().find("plant-syrup").orElseThrow();
        Liquid liquid = Liquid.of(syrup, Set.of(), null);
        LiquidState state = new LiquidState();
        Set<Property> used = Set.of(Property.DENSITY, Property.VISCOSITY);
        assertThat(liquid.coordinates(used)).containsExactly("temperature");
        liquid.evaluator(used).at(new double[] {293.15}, 0, state);
        assertThat(state.density).isEqualTo(1320);
        assertThat(state.viscosity).isCloseTo(7.5, org.assertj.core.api.Assertions.within(1e-9));
        assertThat(syrup.cautions()).containsExactly("Slippery.");
        String file = "{\"slantfall\": 1, \"arrangement\": \"closed-slot\", \"liquid\": {\"preset\": \"plant-syrup\"}}";
        assertThat(ProjectFile.read(file, "x").setUp().base().preset().name()).isEqualTo("Plant syrup");
    }

    @Test
    void brokenOnesAreToldAndTheOthersLoad() throws IOException {
        Files.writeString(folder.resolve("a.json"), "{\"preset\": 1, ");
        Files.writeString(folder.resolve("b.json"), SYRUP);
        Files.writeString(folder.resolve("c.json"), SYRUP.replace("plant-syrup", "water"));
        Files.writeString(folder.resolve("d.json"), SYRUP.replace("plant-syrup", "Plant Syrup"));
        Files.writeString(folder.resolve("e.json"), SYRUP.replace("plant-syrup", "e").replace("1320 kg/m3", "-1 kg/m3"));
        Files.writeString(folder.resolve("f.json"), SYRUP.replace("plant-syrup", "f").replace("\"mark\": \"U\"", "\"mark\": \"Z\""));
        Files.writeString(folder.resolve("g.json"), SYRUP.replace("plant-syrup", "g").replace("\"note\"", "\"nota\""));
        Files.writeString(folder.resolve("h.json"), SYRUP.replace("plant-syrup", "h")
                .replace("\"points\": [[\"20 degC\", \"7.5 Pa s\"], [\"60 degC\", \"300 cP\"]]",
                        "\"correlation\": \"cheng-2008-viscosity\""));
        Files.createDirectory(folder.resolve("i.json"));
        Presets presets = Presets.load(folder);
        assertThat(presets.all()).extracting(Preset::key).contains("water", "plant-syrup", "g").doesNotContain("e", "f", "h");
        assertThat(presets.problems()).hasSize(8);
        List.of("a.json, line 1", "c.json: the key water belongs", "d.json, line 1, column", "must be more than 0",
                        "there is no mark \"Z\"", "unknown key nota was passed over", "names no solute", "is a folder")
                .forEach(p -> assertThat(presets.problems()).anyMatch(told -> told.contains(p)));
    }

    @Test
    void aFolderThatIsNamedAndMissingIsTold() {
        System.setProperty(Presets.PROPERTY, folder.resolve("none").toString());
        assertThat(Presets.load().problems()).singleElement().asString().contains("none", "missing");
    }
}
