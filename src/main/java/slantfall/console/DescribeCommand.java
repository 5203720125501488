package slantfall.console;

import java.io.PrintWriter;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import slantfall.catalogue.Catalogue;
import slantfall.declare.Arrangement;
import slantfall.declare.Entries;
import slantfall.store.DescribeJson;
import slantfall.store.Presets;

/** What can be set, read and checked. */
@Command(
        name = "describe",
        description = "Lists arrangements with their settings, readings and checks, and the liquids.",
        mixinStandardHelpOptions = true)
final class DescribeCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Parameters(arity = "0..1", paramLabel = "ARRANGEMENT", description = "One arrangement; all by default.")
    private String key;

    @Option(names = "--as", paramLabel = "text|json", description = "Form of the answer; text by default.")
    private Form form = Form.TEXT;

    @Override
    public Integer call() {
        if (form == Form.CSV) {
            throw new IllegalArgumentException("--as: describe writes text or json.");
        }
        List<Arrangement> wanted = key == null ? Catalogue.all() : List.of(find(key));
        Presets presets = Presets.load();
        PrintWriter out = spec.commandLine().getOut();
        if (form == Form.JSON) {
            out.println(DescribeJson.text(wanted, presets));
        } else {
            new DescribeText(out).print(wanted, presets);
        }
        return Console.DONE;
    }

    private static Arrangement find(String key) {
        List<String> known = Catalogue.all().stream().map(Arrangement::key).toList();
        return Catalogue.find(key)
                .orElseThrow(() -> new IllegalArgumentException(
                        "no arrangement \"" + key + "\"" + Entries.nearest(known, key)));
    }
}
