package spanwright.cli;

import java.io.PrintWriter;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;
import spanwright.answers.Unanswerable;

/** {@code java -jar spanwright.jar COMMAND ...}. */
@Command(
        name = "spanwright",
        description = "The records of a fiber network's outside plant.",
        synopsisSubcommandLabel = "COMMAND",
        mixinStandardHelpOptions = true,
        usageHelpWidth = 100,
        footer = {
            "",
            "Exit status: 0 done, 1 the input is wrong, 2 wrong usage, 3 the program failed.",
            "Positions are records, not a locate. Call before you dig. Treat every fiber as live until proven dark.",
            "Follow local codes and licensed practice."
        })
public final class CommandLineProgram implements Runnable {

    /** Exit status where the input is wrong. */
    static final int WRONG_INPUT = 1;

    /** Exit status where the program failed. */
    static final int FAILED = 3;

    @Spec
    private CommandSpec spec;

    private CommandLineProgram() {}

    /**
     * Runs one command.
     *
     * @param out what answers are written to
     * @param err what a person should know is written to
     * @return the exit status
     */
    public static int run(Program program, PrintWriter out, PrintWriter err, String... args) {
        CommandLine line = new CommandLine(new CommandLineProgram());
        line.addSubcommand(new LoadCommand(program));
        line.addSubcommand(new TraceCommand(program));
        line.addSubcommand(new FaultCommand(program));
        line.addSubcommand(new ImpactCommand(program));
        line.addSubcommand(new SuspectsCommand(program));
        line.addSubcommand(new SparesCommand(program));
        line.addSubcommand(new CheckCommand(program));
        line.addSubcommand(new ExportCommand(program));
        line.addSubcommand(new ServeCommand(program));
        line.addSubcommand(new DemoCommand(program));
        line.getSubcommands().values().forEach(command -> command.setUsageHelpWidth(100));
        // A command that takes a file of codes reads it itself.
        line.setExpandAtFiles(false);
        line.setCaseInsensitiveEnumValuesAllowed(true);
        line.setOut(out).setErr(err);
        line.getCommandSpec()
                .versionProvider((IVersionProvider) () -> new String[] {"spanwright " + program.version()});
        line.setExecutionExceptionHandler(CommandLineProgram::explain);
        try {
            return line.execute(args);
        } finally {
            out.flush();
            err.flush();
        }
    }

    private static int explain(Exception exception, CommandLine command, CommandLine.ParseResult parsed) {
        PrintWriter err = command.getErr();
        if (exception instanceof WrongInput || exception instanceof Unanswerable) {
            err.println(exception.getMessage());
            return WRONG_INPUT;
        }
        err.println("The program failed; please report this:");
        exception.printStackTrace(err);
        return FAILED;
    }

    /** Prints the usage: without a command there is nothing to do. */
    @Override
    public void run() {
        spec.commandLine().usage(spec.commandLine().getOut());
    }
}
