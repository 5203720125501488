package slantfall.build;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Declaration;
import slantfall.declare.Panel;
import slantfall.declare.SetUp;
import slantfall.liquid.Correlation;
import slantfall.liquid.Correlations;
import slantfall.store.Presets;

/** The documents keep up with the program. */
class DocsTest {

    private static String all(String folder) throws IOException {
        try (Stream<Path> walk = Files.walk(Path.of(folder))) {
            return walk.filter(p -> p.toString().endsWith(".md")).map(DocsTest::read).collect(Collectors.joining("\n"));
        }
    }

    private static String read(Path path) {
        try {
            return Files.readString(path);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    @Test
    void everyArrangementHasItsTheoryPageAndEveryPanelItsPlace() throws IOException {
        String theory = all("docs/theory");
        for (Arrangement a : Catalogue.all()) {
            assertThat(Path.of("docs/theory", a.key() + ".md")).exists();
            Declaration d = a.declare(SetUp.blank(a.key(), Presets.load().initial()).structure());
            assertThat(d.panels().stream().map(Panel::key).filter(k -> !theory.contains("`" + k + "`"))).isEmpty();
        }
    }

    @Test
    void everyCorrelationIsDocumented() throws IOException {
        String theory = all("docs/theory");
        assertThat(Correlations.all().stream().map(Correlation::key).filter(k -> !theory.contains(k))).isEmpty();
    }

    @Test
    void linksInTheDocumentsLeadSomewhere() throws IOException {
        List<String> broken = new ArrayList<>();
        List<Path> pages = new ArrayList<>(List.of(Path.of("README.md"), Path.of("DEVELOPERS.md")));
        try (Stream<Path> walk = Files.walk(Path.of("docs"))) {
            walk.filter(p -> p.toString().endsWith(".md")).forEach(pages::add);
        }
        for (Path page : pages) {
            Matcher link = Pattern.compile("\\]\\(([^)#\\s]+)\\)").matcher(read(page));
            while (link.find()) {
                Path target = (page.getParent() == null ? Path.of("") : page.getParent()).resolve(link.group(1));
                if (!link.group(1).contains("://") && !Files.exists(target)) {
                    broken.add(page + " -> " + link.group(1));
                }
            }
        }
        assertThat(broken).isEmpty();
    }

    @Test
    void theReadmeNamesTheCommandThatCiRuns() throws IOException {
        String ci = Files.readString(Path.of(".ci/run"));
        assertThat(ci).contains("mvn -B").contains("verify");
        assertThat(Files.readString(Path.of("README.md"))).contains("mvn -B verify");
    }
}
