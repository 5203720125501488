package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Assessment;

/** Every example opens without a complaint, is computed, says that it is invented and is laid out as a save would. */
class ExamplesTest {

    static Stream<String> names() {
        return Examples.list().stream();
    }

    @Test
    void everyFileIsListed() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("examples"))) {
            assertThat(files.map(f -> f.getFileName().toString()).filter(f -> f.endsWith(ProjectFile.ENDING)))
                    .containsExactlyInAnyOrderElementsOf(Examples.list());
        }
        assertThat(Examples.list().stream().map(n -> Examples.open(n).setUp().arrangement()))
                .contains("inclined-film", "closed-slot");
    }

    @ParameterizedTest
    @MethodSource("names")
    void opensAndComputes(String name) {
        ProjectFile.Opened opened = Examples.open(name);
        assertThat(opened.reports()).isEmpty();
        assertThat(opened.setUp().title()).contains("invented");
        assertThat(opened.setUp().remarks().notes()).startsWith("Invented");
        Assessment a = Catalogue.named(opened.setUp().arrangement()).assess(opened.setUp());
        assertThat(a.readings()).filteredOn(r -> Double.isNaN(r.value())).hasSizeLessThanOrEqualTo(1);
        assertThat(a.checks()).anyMatch(c -> c.binding());
    }

    @ParameterizedTest
    @MethodSource("names")
    void isLaidOutAsASaveWould(String name) {
        assertThat(ProjectFile.write(Examples.open(name).setUp())).isEqualTo(Examples.text(name));
    }

    @Test
    void theAwkwardOneIsUnderstood() {
        var values = Examples.open("starch-chute.slantfall.json").setUp().values();
        double width = 0.8001;
        assertThat(values.get("width").si()).isEqualTo(width);
        assertThat(values.get("angle").si()).isEqualTo(Math.atan(1 / 12.0));
        assertThat(values.get("feed").si()).isCloseTo(1050 * 1.5 / 3600 / width, org.assertj.core.api.Assertions.within(1e-12));
        assertThat(values.get("liquid.viscosity").si()).isCloseTo(45e-6 * 1050, org.assertj.core.api.Assertions.within(1e-12));
        assertThat(values.get("liquid.temperature").si()).isCloseTo(293.15, org.assertj.core.api.Assertions.within(1e-9));
        // 1 lb = 0.45359237 kg and 1 ft = 0.3048 m (NIST SP 811, appendix B.8).
        assertThat(values.get("feed").known().high() - values.get("feed").si())
                .isCloseTo(20 * 0.45359237 / 3600 / 0.3048, org.assertj.core.api.Assertions.within(1e-12));
    }

    @Test
    void theFirstVersionStillOpens() throws IOException {
        Path file = Path.of("src/test/resources/slantfall/store/version-1.slantfall.json");
        ProjectFile.Opened opened = ProjectFile.read(file);
        assertThat(opened.reports()).isEmpty();
        assertThat(opened.setUp().title()).isEqualTo("Saved by format 1");
        assertThat(opened.setUp().values()).hasSize(10);
        assertThat(opened.setUp().values().get("gap").si()).isEqualTo(8e-4);
        assertThat(opened.setUp().values().get("pressureDrop").known().high()).isEqualTo(22000);
        assertThat(opened.setUp().houseRules()).containsKey("entry");
        assertThat(opened.setUp().requirements()).hasSize(1);
        assertThat(opened.setUp().correlations()).hasSize(1);
        assertThat(opened.setUp().base().points().points()).hasSize(3);
        assertThat(ProjectFile.write(opened.setUp())).isEqualTo(Files.readString(file));
    }
}
