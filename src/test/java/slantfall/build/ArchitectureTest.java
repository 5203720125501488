package slantfall.build;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.ImportOption;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;

/** The walls between packages, read from the one table in DEVELOPERS.md. */
class ArchitectureTest {

    private static final String ROOT = "slantfall.";

    private final JavaClasses classes =
            new ClassFileImporter().withImportOption(new ImportOption.DoNotIncludeTests()).importPackages("slantfall");

    @Test
    void everyPackageImportsOnlyWhatTheTableAllows() throws IOException {
        Map<String, Set<String>> allowed = table();
        List<String> broken = new ArrayList<>();
        for (JavaClass origin : classes) {
            String from = layer(origin.getPackageName());
            if (from.isEmpty()) {
                continue;
            }
            assertThat(allowed).as("import table knows package " + from).containsKey(from);
            origin.getDirectDependenciesFromSelf().forEach(d -> {
                String to = layer(d.getTargetClass().getBaseComponentType().getPackageName());
                if (!to.isEmpty() && !to.equals(from) && !allowed.get(from).contains(to)) {
                    broken.add(from + " -> " + to + ": " + d.getDescription());
                }
            });
        }
        assertThat(broken).isEmpty();
    }

    @Test
    void theTableListsNoPackageThatIsGone() throws IOException {
        Set<String> present = new TreeSet<>();
        classes.forEach(c -> present.add(layer(c.getPackageName())));
        assertThat(present).containsAll(table().keySet());
    }

    @Test
    void noCyclesBetweenPackages() {
        slices().matching("slantfall.(*)..").should().beFreeOfCycles().check(classes);
        slices().matching("slantfall.(**)").should().beFreeOfCycles().check(classes);
    }

    @Test
    void outsideLibrariesHaveOneHome() {
        home("org.apache.commons.math3..", "slantfall.numerics..");
        home("com.fasterxml.jackson..", "slantfall.store..");
        home("picocli..", "slantfall.console..");
        home("javafx..", "slantfall.bench..");
        home("org.controlsfx..", "slantfall.bench..");
        home("atlantafx..", "slantfall.bench..");
    }

    @Test
    void onlyTheConsoleAndMainUseTheStandardStreams() {
        noClasses()
                .that()
                .resideOutsideOfPackages("slantfall.console..", "slantfall")
                .should(com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS)
                .because("the core neither logs nor prints")
                .check(classes);
    }

    private void home(String library, String owner) {
        noClasses()
                .that()
                .resideOutsideOfPackage(owner)
                .should()
                .dependOnClassesThat()
                .resideInAPackage(library)
                .because(library + " has its home in " + owner)
                .check(classes);
    }

    private static String layer(String packageName) {
        if (!packageName.startsWith(ROOT)) {
            return "";
        }
        String rest = packageName.substring(ROOT.length());
        int dot = rest.indexOf('.');
        return dot < 0 ? rest : rest.substring(0, dot);
    }

    private static Map<String, Set<String>> table() throws IOException {
        String text = Files.readString(Path.of("DEVELOPERS.md"));
        String part = text.substring(text.indexOf("<!-- import-table -->"), text.indexOf("<!-- end -->"));
        Map<String, Set<String>> table = new LinkedHashMap<>();
        part.lines().filter(l -> l.startsWith("| ") && !l.startsWith("| package")).forEach(line -> {
            String[] cells = line.split("\\|");
            Set<String> imports = Arrays.stream(cells[2].split(","))
                    .map(String::trim)
                    .filter(s -> !s.isEmpty())
                    .collect(Collectors.toCollection(TreeSet::new));
            table.put(cells[1].trim(), imports);
        });
        assertThat(table).isNotEmpty();
        return table;
    }
}
