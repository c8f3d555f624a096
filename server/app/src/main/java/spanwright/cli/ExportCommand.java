package spanwright.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import spanwright.cli.Program.ExportFormat;

/** Writes the records for other programs. */
@Command(
        name = "export",
        description = {
            "Writes the records for other programs.",
            "  folder   a records folder that, loaded into a fresh file, gives the same state;",
            "           a zip of one where OUT ends in .zip",
            "  geojson  structures, enclosures, spans and cables on the map"
        },
        mixinStandardHelpOptions = true)
final class ExportCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Mixin
    private ViewOptions view;

    @Option(names = "--format", required = true, paramLabel = "FORMAT", description = "folder or geojson.")
    private ExportFormat format;

    @Parameters(paramLabel = "OUT", description = "The folder or file to write; not there yet.")
    private Path out;

    ExportCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        return view.answer(program, (asked, posting) -> {
            program.export(asked, posting, format, out);
            spec.commandLine().getErr().println("Written as of posting " + asked.posting() + ": " + out);
            return 0;
        });
    }
}
