package spanwright.cli;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.answers.Json;
import spanwright.answers.TraceAnswer;
import spanwright.answers.TraceDocument;
import spanwright.answers.TraceQuestion;

/** Traces glass end to end, with loss. */
@Command(
        name = "trace",
        description = "Traces glass end to end, with its loss and what its budget leaves.",
        mixinStandardHelpOptions = true)
final class TraceCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @ArgGroup(exclusive = true, multiplicity = "1")
    private @Nullable Asked asked;

    @Mixin
    private ViewOptions view;

    @Option(
            names = "--wavelength",
            paramLabel = "NM",
            description = "Wavelength in nm. Default: each circuit's own, else 1310.")
    private @Nullable BigDecimal wavelength;

    @Option(
            names = "--budget",
            paramLabel = "CLASS|DB",
            description = "A PON class such as B+, or a number of dB. Default: each circuit's own.")
    private @Nullable String budget;

    @Option(names = "--margin", paramLabel = "DB", defaultValue = "0", description = "Margin to keep, dB. Default: 0.")
    private BigDecimal margin;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    TraceCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        TraceQuestion question = question();
        return view.answer(program, of -> {
            TraceAnswer answer = TraceAnswer.of(of, question);
            if (json) {
                Output.document(out, Json.lines(new TraceDocument(answer, false)::write));
            } else {
                new TraceTable(out, of).print(answer);
            }
            return 0;
        });
    }

    private TraceQuestion question() {
        Asked what = asked == null ? new Asked() : asked;
        return new TraceQuestion(
                what.circuits == null ? List.of() : what.circuits,
                what.allCircuits,
                what.port,
                what.fiber,
                wavelength == null ? null : TraceQuestion.wavelength(wavelength),
                budget == null ? null : TraceQuestion.budget(budget),
                TraceQuestion.margin(margin));
    }

    /** What is traced: one of these. */
    static final class Asked {

        @Option(
                names = "--circuit",
                paramLabel = "CODE",
                description = "A circuit, a path a fiber from its a to its z; several times for several.")
        private @Nullable List<String> circuits;

        @Option(names = "--all-circuits", description = "All circuits but the retired, by code.")
        private boolean allCircuits;

        @Option(
                names = "--port",
                paramLabel = "PORT",
                description = "From the front of a port, such as E1/P/1, through its rear.")
        private @Nullable String port;

        @Option(
                names = "--fiber",
                paramLabel = "CABLE:N",
                description = "Every path through each piece of a fiber, such as F-1:3.")
        private @Nullable String fiber;
    }
}
