package spanwright.cli;

import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import spanwright.answers.CutReferences;
import spanwright.answers.ImpactDocument;
import spanwright.answers.Json;
import spanwright.outage.Impact;

/** What a cut takes down, in the order to restore. */
@Command(
        name = "impact",
        description = "What a cut takes down, in the order to restore. Several things are one cut.",
        mixinStandardHelpOptions = true)
final class ImpactCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @ArgGroup(exclusive = true, multiplicity = "1..*")
    private List<Asked> asked = new ArrayList<>();

    @Mixin
    private ViewOptions view;

    @Option(names = "--fibers", description = "With --json: what every fiber of the cut sheaths carries, too.")
    private boolean fibers;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    ImpactCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        List<String> cuts = cuts();
        return view.answer(program, of -> {
            Impact impact = Impact.of(of.snapshot(), new CutReferences(of.records()).list(cuts));
            if (json) {
                Output.document(out, Json.lines(new ImpactDocument(of, impact, fibers)::write));
            } else {
                new ImpactTable(out, of).print(impact);
            }
            return 0;
        });
    }

    /** What is cut, as references; a cable that tubes follow is cut in these tubes only. */
    private List<String> cuts() {
        List<String> cuts = new ArrayList<>();
        String cable = null;
        boolean whole = false;
        for (Asked each : asked) {
            if (each.cable != null) {
                cable = each.cable;
                whole = cuts.add("cable:" + cable);
            } else if (each.tube != null && cable == null) {
                throw new ParameterException(
                        spec.commandLine(), "--tube belongs to the --cable before it; name the cable first");
            } else if (each.tube != null) {
                if (whole) {
                    cuts.remove(cuts.lastIndexOf("cable:" + cable));
                    whole = false;
                }
                cuts.add("tube:" + cable + "/" + each.tube);
            } else {
                cuts.add(each.plain());
            }
        }
        return cuts;
    }

    /** One thing that is cut. */
    static final class Asked {

        @Option(names = "--span", paramLabel = "S", description = "Every cable section that lies on a span.")
        private @Nullable String span;

        @Option(
                names = "--structure",
                paramLabel = "S",
                description = "Every cable section that passes, begins or ends at a structure, and all enclosures and"
                        + " jumpers there.")
        private @Nullable String structure;

        @Option(
                names = "--cable",
                paramLabel = "CABLE",
                description = "All sections of a cable; the name of a longer cable means all its reels.")
        private @Nullable String cable;

        @Option(names = "--tube", paramLabel = "N", description = "Only this tube of the --cable before it.")
        private @Nullable Integer tube;

        @Option(names = "--enclosure", paramLabel = "E", description = "What lies in an enclosure or passes it.")
        private @Nullable String enclosure;

        @Option(
                names = "--place",
                paramLabel = "CABLE@M",
                description = "The section of a cable at so many metres of sheath from its start.")
        private @Nullable String place;

        private String plain() {
            if (span != null) {
                return "span:" + span;
            }
            if (structure != null) {
                return "structure:" + structure;
            }
            return enclosure == null ? "place:" + place : "enclosure:" + enclosure;
        }
    }
}
