package spanwright.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import spanwright.cli.Program.LoadResult;

/** Adds a records folder to a records file. */
@Command(
        name = "load",
        description = {
            "Adds a records folder, or its .zip, to a new or existing records file, as one posting.",
            "It is loaded whole or not at all. Every fault is one line on standard error:",
            "  file:line: what is wrong and what would be right"
        },
        mixinStandardHelpOptions = true)
final class LoadCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "FOLDER", description = "The records folder, or a .zip of one.")
    private Path folder;

    @Option(names = "--records", required = true, paramLabel = "FILE", description = "The records file.")
    private Path records;

    @Option(names = "--by", paramLabel = "NAME", description = "Who posts it. Default: the account that runs this.")
    private @Nullable String by;

    @Option(names = "--reason", paramLabel = "TEXT", description = "Why. Default: that the folder was loaded.")
    private @Nullable String reason;

    LoadCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter err = spec.commandLine().getErr();
        LoadResult result = program.load(folder, records, by(), reason(), step -> {
            err.println(step);
            err.flush();
        });
        if (result instanceof LoadResult.Refused refused) {
            refused.lines().forEach(err::println);
            return CommandLineProgram.WRONG_INPUT;
        }
        LoadResult.Loaded loaded = (LoadResult.Loaded) result;
        loaded.counts().forEach(count -> err.println("  " + count));
        err.println("Posting " + loaded.posting().number() + " in " + records + ".");
        return 0;
    }

    private String by() {
        return given(by, "--by", System.getProperty("user.name", "unknown"));
    }

    private String reason() {
        return given(
                reason,
                "--reason",
                "Loaded " + folder.toAbsolutePath().normalize().getFileName());
    }

    private static String given(@Nullable String value, String option, String otherwise) {
        if (value != null && value.isBlank()) {
            throw new WrongInput(option + " is blank; leave it out or say something.");
        }
        return value == null ? otherwise : value.strip();
    }
}
