package spanwright.boot;

import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The program's entry: {@code java -jar spanwright.jar}. */
@Command(
        name = "spanwright",
        description = "The records of a fiber network's outside plant.",
        mixinStandardHelpOptions = true)
public final class Main implements Runnable {

    @Spec
    private CommandSpec spec;

    private Main() {}

    /** Prints the usage: without a command there is nothing to do. */
    @Override
    public void run() {
        spec.commandLine().usage(spec.commandLine().getOut());
    }

    /** Runs the command line and exits with its code: 0 done, 2 the command line was not understood. */
    public static void main(String[] args) {
        System.exit(new CommandLine(new Main()).execute(args));
    }
}
