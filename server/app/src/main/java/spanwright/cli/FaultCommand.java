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
import spanwright.answers.FaultDocument;
import spanwright.answers.FaultQuestion;
import spanwright.answers.FaultReply;
import spanwright.answers.Json;

/** Finds where a distance read on an OTDR lies. */
@Command(
        name = "fault",
        description = "Finds where a distance read on an OTDR lies: span, structures, sheath mark, place on the map,"
                + " and how sure that is.",
        mixinStandardHelpOptions = true)
final class FaultCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @ArgGroup(exclusive = true, multiplicity = "1")
    private Start start = new Start();

    @Mixin
    private ViewOptions view;

    @Option(
            names = "--to",
            paramLabel = "PORT|END",
            description = "A port, or an end, that the path reaches: picks the way behind splitters.")
    private @Nullable String to;

    @Option(
            names = "--distance",
            required = true,
            paramLabel = "M",
            description = "The distance as the instrument shows it, in m, launch fiber included.")
    private BigDecimal distance = BigDecimal.ZERO;

    @Option(
            names = "--index",
            paramLabel = "N",
            description = "The group index set on the instrument. Default: the distance is meters of glass.")
    private @Nullable BigDecimal index;

    @Option(names = "--launch", paramLabel = "M", defaultValue = "0", description = "Launch fiber, m. Default: 0.")
    private BigDecimal launch = BigDecimal.ZERO;

    @Option(names = "--wavelength", paramLabel = "NM", description = "Wavelength in nm. Default: 1550.")
    private @Nullable BigDecimal wavelength;

    @Option(
            names = "--event",
            arity = "1..*",
            paramLabel = "ENCLOSURE=M",
            description = "A known joint of the same shot and its reading, such as C-S03=6038; several for several.")
    private @Nullable List<String> events;

    @Option(names = "--far-port", paramLabel = "PORT", description = "A port shot from the far end.")
    private @Nullable String farPort;

    @Option(names = "--far-distance", paramLabel = "M", description = "The distance read from there, in m.")
    private @Nullable BigDecimal farDistance;

    @Option(names = "--far-launch", paramLabel = "M", description = "Launch fiber there, m. Default: 0.")
    private @Nullable BigDecimal farLaunch;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    FaultCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        FaultQuestion question = question();
        return view.answer(program, of -> {
            FaultReply reply = FaultReply.of(of, question);
            if (json) {
                Output.document(out, Json.lines(new FaultDocument(reply)::write));
            } else {
                new FaultTable(out, of).print(reply);
            }
            return 0;
        });
    }

    private FaultQuestion question() {
        return new FaultQuestion(
                start.port,
                start.from,
                to,
                new FaultQuestion.Shot(distance, launch, index, wavelength),
                events == null ? List.of() : events,
                FaultQuestion.Far.of(farPort, farDistance, farLaunch));
    }

    /** Where the shot begins: one of these. */
    static final class Start {

        @Option(
                names = "--port",
                paramLabel = "PORT",
                description = "The port that was shot, such as E1/P/1: from its front through its rear.")
        private @Nullable String port;

        @Option(
                names = "--from",
                paramLabel = "\"END @ ENCLOSURE\"",
                description = "The end that was shot, into its glass, such as \"F-1 ahead 3 @ E4\".")
        private @Nullable String from;
    }
}
