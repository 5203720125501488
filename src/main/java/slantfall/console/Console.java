package slantfall.console;

import java.io.PrintWriter;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.ParameterException;

/** All commands, with one place that turns what went wrong into a message and an exit status. */
public final class Console {

    /** Done. */
    public static final int DONE = 0;

    /** A requirement or house rule is crossed and {@code --strict} was given. */
    public static final int CROSSED = 1;

    /** The input is wrong, a missing file included. */
    public static final int WRONG_INPUT = 2;

    /** The input is right but the answer could not be computed. */
    public static final int NOT_COMPUTED = 3;

    private static final int LONGEST_MESSAGE = 1100;

    private Console() {}

    /**
     * Runs one command.
     *
     * @param out receives results
     * @param err receives problems
     * @return exit status
     */
    public static int run(String[] args, PrintWriter out, PrintWriter err) {
        CommandLine line = new CommandLine(new Root());
        line.setOut(out);
        line.setErr(err);
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.setUsageHelpAutoWidth(false);
        line.setParameterExceptionHandler((e, a) -> wrongArguments(e, err));
        line.setExecutionExceptionHandler((e, command, parsed) -> report(e, err));
        int status = line.execute(args);
        out.flush();
        err.flush();
        return status;
    }

    private static int wrongArguments(ParameterException e, PrintWriter err) {
        String command = e.getCommandLine().getCommandName();
        err.println(cut(e.getMessage()) + " Try: slantfall "
                + ("slantfall".equals(command) ? "" : command + " ") + "--help");
        return WRONG_INPUT;
    }

    private static int report(Exception e, PrintWriter err) {
        if (Problems.isInput(e)) {
            err.println(cut(e.getMessage()));
            return WRONG_INPUT;
        }
        String what = e.getMessage() == null ? e.getClass().getSimpleName() : e.getMessage();
        err.println(cut("could not compute: " + what));
        return NOT_COMPUTED;
    }

    private static String cut(String message) {
        String flat = message.strip();
        return flat.length() <= LONGEST_MESSAGE ? flat : flat.substring(0, LONGEST_MESSAGE - 3) + "...";
    }

    /** The command without a name. */
    @Command(
            name = "slantfall",
            description = "Liquid films on inclines and flow in inclined slots: answers with their margins."
                    + " Without a command the window opens.",
            mixinStandardHelpOptions = true,
            versionProvider = Version.class,
            synopsisSubcommandLabel = "COMMAND",
            subcommands = {AssessCommand.class, DescribeCommand.class, ProveCommand.class})
    static final class Root implements Runnable {

        @CommandLine.Spec
        private CommandLine.Model.CommandSpec spec;

        @Override
        public void run() {
            throw new ParameterException(spec.commandLine(), "Give a command: assess, describe or prove.");
        }
    }
}
