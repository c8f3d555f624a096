package spanwright.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.answers.Json;
import spanwright.answers.SparesDocument;
import spanwright.answers.SparesReply;

/** Spare fibers from one structure to another. */
@Command(
        name = "spares",
        description = "Finds spare fibers end to end, best first: fewest enclosures opened, then new splices, then"
                + " unverified joints, then loss at 1550 nm.",
        mixinStandardHelpOptions = true)
final class SparesCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Mixin
    private ViewOptions view;

    @Option(names = "--from", required = true, paramLabel = "STRUCTURE", description = "Where they begin.")
    private String from = "";

    @Option(names = "--to", required = true, paramLabel = "STRUCTURE", description = "Where they end.")
    private String to = "";

    @Option(names = "--fibers", required = true, paramLabel = "N", description = "How many, a path each.")
    private int fibers;

    @Option(names = "--same-tube", description = "Every path in one tube throughout each cable.")
    private boolean sameTube;

    @Option(
            names = "--avoid-circuit",
            paramLabel = "C",
            description = "No span and no enclosure of a circuit's path, the two structures apart.")
    private @Nullable String avoid;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    SparesCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        SparesReply.Asked asked = new SparesReply.Asked(from, to, fibers, sameTube, avoid);
        return view.answer(program, of -> {
            SparesReply reply = SparesReply.of(of, asked);
            if (json) {
                Output.document(out, Json.lines(new SparesDocument(reply)::write));
            } else {
                new SparesTable(out, reply, asked).print();
            }
            return 0;
        });
    }
}
