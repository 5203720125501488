package slantfall.console;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import slantfall.proof.ProofResult;
import slantfall.proof.Prover;
import slantfall.proof.PublishedRow;
import slantfall.store.ProofRows;

/** Recomputes published values. */
@Command(
        name = "prove",
        description = "Recomputes every published value that the program carries and shows source, mark and deviation.",
        mixinStandardHelpOptions = true)
final class ProveCommand implements Callable<Integer> {

    @Spec
    private CommandSpec spec;

    @Option(names = "--rows", paramLabel = "FILE", description = "Recomputes the values of a file instead.")
    private Path file;

    @Option(names = "--as", paramLabel = "text|json", description = "Form of the answer; text by default.")
    private Form form = Form.TEXT;

    @Override
    public Integer call() {
        if (form == Form.CSV) {
            throw new IllegalArgumentException("--as: prove writes text or json.");
        }
        List<PublishedRow> rows = file == null ? ProofRows.shipped() : ProofRows.read(file);
        ProofResult result = Prover.prove(rows);
        PrintWriter out = spec.commandLine().getOut();
        if (form == Form.JSON) {
            out.println(ProofRows.json(result));
        } else {
            print(out, result);
        }
        return result.rows().stream().allMatch(ProofResult.Row::ok) ? Console.DONE : Console.NOT_COMPUTED;
    }

    private static void print(PrintWriter out, ProofResult result) {
        Table table = new Table();
        table.row("", "value", "expected", "obtained", "deviation", "allowed", "mark", "source");
        for (ProofResult.Row row : result.rows()) {
            String kind = row.absolute() ? " abs" : "";
            table.row(row.ok() ? "●" : "✕", row.id(), number(row.expected()), number(row.obtained()),
                    small(row.deviation()) + kind, small(row.tolerance()), row.mark(), row.source());
        }
        table.print(out, "");
        long failed = result.rows().stream().filter(r -> !r.ok()).count();
        out.println(result.rows().size() - failed + " reproduced, " + failed + " not, " + result.unknown().size()
                + " of unknown family.");
        if (!result.unknown().isEmpty()) {
            out.println("Unknown family: " + String.join(", ", result.unknown()));
        }
    }

    private static String number(double value) {
        return String.format(Locale.ROOT, "%.8g", value);
    }

    private static String small(double value) {
        return String.format(Locale.ROOT, "%.1e", value);
    }
}
