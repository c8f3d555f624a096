package spanwright.boot;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import spanwright.cli.CommandLineProgram;

/** The program's entry: {@code java -jar spanwright.jar COMMAND ...}. */
public final class Main {

    private Main() {}

    /** Runs the command line and exits with its status, see {@link CommandLineProgram}. */
    public static void main(String[] args) {
        PrintWriter out = new PrintWriter(System.out, false, StandardCharsets.UTF_8);
        PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
        System.exit(CommandLineProgram.run(new Parts(), out, err, args));
    }
}
