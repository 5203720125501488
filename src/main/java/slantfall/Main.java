package slantfall;

import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Locale;
import slantfall.bench.Bench;
import slantfall.console.Console;
import slantfall.console.ExampleRun;

/**
 * Starts the console if there is a command, else the bench; where no window can open, says so in one line and assesses
 * an example on the console. Touches no window class on the console path.
 */
public final class Main {

    /** Opens the window on a file named after it. */
    private static final String BENCH = "--bench";

    private Main() {}

    /** Entry point. */
    public static void main(String[] args) {
        PrintWriter out = new PrintWriter(new OutputStreamWriter(System.out, StandardCharsets.UTF_8), false);
        PrintWriter err = new PrintWriter(new OutputStreamWriter(System.err, StandardCharsets.UTF_8), true);
        boolean window = args.length == 0 || BENCH.equals(args[0]);
        int status = window ? bench(Arrays.copyOfRange(args, Math.min(1, args.length), args.length), out, err)
                : Console.run(args, out, err);
        out.flush();
        err.flush();
        System.exit(status);
    }

    private static int bench(String[] args, PrintWriter out, PrintWriter err) {
        String reason = displayMissing();
        if (reason.isEmpty()) {
            try {
                Bench.open(args);
                return Console.DONE;
            } catch (UnsupportedOperationException | LinkageError e) {
                reason = "the desktop's native libraries cannot be loaded (on Linux install libgtk-3-0)";
            } catch (RuntimeException e) {
                if (!(e.getCause() instanceof LinkageError) && !(e.getCause() instanceof UnsupportedOperationException)) {
                    throw e;
                }
                reason = "the desktop's native libraries cannot be loaded (on Linux install libgtk-3-0)";
            }
        }
        err.println("No window: " + reason + ". Here is an example on the console instead.");
        return ExampleRun.run(out, err);
    }

    /** Why no window can be tried, empty if it can. */
    private static String displayMissing() {
        boolean linux = System.getProperty("os.name", "").toLowerCase(Locale.ROOT).contains("linux");
        boolean headless = "Headless".equalsIgnoreCase(System.getProperty("monocle.platform"));
        String display = System.getenv("DISPLAY");
        return linux && !headless && (display == null || display.isBlank()) ? "no display (DISPLAY is not set)" : "";
    }
}
