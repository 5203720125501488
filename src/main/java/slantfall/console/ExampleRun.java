package slantfall.console;

import java.io.PrintWriter;
import java.util.Set;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Assessment;
import slantfall.quantity.UnitSystem;
import slantfall.store.Examples;
import slantfall.store.ProjectFile;

/** The main job done on an example, for a machine where no window opens. */
public final class ExampleRun {

    private ExampleRun() {}

    /**
     * Assesses the first example.
     *
     * @return exit status
     */
    public static int run(PrintWriter out, PrintWriter err) {
        String name = Examples.list().get(0);
        ProjectFile.Opened opened = Examples.open(name);
        Assessment assessment = Catalogue.named(opened.setUp().arrangement()).assess(opened.setUp());
        new AssessmentText(out, UnitSystem.TRADE).print(assessment, opened.reports(), Set.of());
        out.println();
        out.println("This was the example " + name + ". Your own: slantfall assess FILE; all commands: slantfall --help");
        out.flush();
        err.flush();
        return Console.DONE;
    }
}
