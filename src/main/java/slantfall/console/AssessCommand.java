package slantfall.console;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Assessment;
import slantfall.declare.Declaration;
import slantfall.declare.Entries;
import slantfall.declare.SetUp;
import slantfall.quantity.UnitSystem;
import slantfall.store.AssessmentCsv;
import slantfall.store.AssessmentJson;
import slantfall.store.ProjectFile;

/** Everything computed for a set-up. */
@Command(
        name = "assess",
        description = "Computes everything for the set-up in a file: readings, margins, panels of rules.",
        mixinStandardHelpOptions = true)
final class AssessCommand implements Callable<Integer> {

    private static final Set<String> PARTS = Set.of("traverses", "courses", "working");

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "FILE", description = "Set-up, *.slantfall.json.")
    private Path file;

    @Option(names = "--set", paramLabel = "KEY=VALUE", description = "Changes a setting first; may be repeated.")
    private List<String> changes = new ArrayList<>();

    @Option(names = "--as", paramLabel = "text|json|csv", description = "Form of the answer; text by default.")
    private Form form = Form.TEXT;

    @Option(names = "--with", paramLabel = "PART,...", description = "Adds traverses, courses, working.", split = ",")
    private List<String> with = new ArrayList<>();

    @Option(names = "--units", paramLabel = "SI|TRADE|US", description = "Units of the text; trade by default.")
    private UnitSystem units = UnitSystem.TRADE;

    @Option(names = "--strict", description = "Exit status 1 if a requirement or house rule is crossed.")
    private boolean strict;

    @Override
    public Integer call() {
        Set<String> parts = parts();
        ProjectFile.Opened opened = ProjectFile.read(file);
        SetUp setUp = changed(opened.setUp());
        Assessment assessment = Catalogue.named(setUp.arrangement()).assess(setUp);
        PrintWriter out = spec.commandLine().getOut();
        if (form == Form.JSON) {
            out.println(AssessmentJson.text(assessment, opened.reports(), parts));
        } else if (form == Form.CSV) {
            out.print(AssessmentCsv.text(assessment));
        } else {
            new AssessmentText(out, units).print(assessment, opened.reports(), parts);
        }
        return strict && !assessment.ownRulesCrossed().isEmpty() ? Console.CROSSED : Console.DONE;
    }

    private Set<String> parts() {
        Set<String> parts = new LinkedHashSet<>(with);
        for (String part : parts) {
            if (!PARTS.contains(part)) {
                throw new IllegalArgumentException("--with: no part \"" + part + "\"; one of courses, traverses, working.");
            }
        }
        return parts;
    }

    private SetUp changed(SetUp from) {
        SetUp setUp = from;
        for (String change : changes) {
            int equals = change.indexOf('=');
            if (equals <= 0) {
                throw new IllegalArgumentException("--set: write KEY=VALUE, such as angle=\"30 deg\"; was \"" + change + "\".");
            }
            String key = change.substring(0, equals).trim();
            Arrangement arrangement = Catalogue.named(setUp.arrangement());
            Declaration declaration = arrangement.declare(setUp.structure());
            setUp = Entries.set(setUp, declaration, key, change.substring(equals + 1));
        }
        return setUp;
    }
}
