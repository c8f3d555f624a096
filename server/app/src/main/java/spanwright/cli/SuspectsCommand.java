package spanwright.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.answers.AlarmReferences;
import spanwright.answers.Json;
import spanwright.answers.SuspectsDocument;
import spanwright.suspicion.Suspects;

/** Which spans and enclosures explain alarms. */
@Command(
        name = "suspects",
        description = "Which spans and enclosures explain the alarms, best first.",
        mixinStandardHelpOptions = true)
final class SuspectsCommand implements Callable<Integer> {

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Option(
            names = "--down",
            required = true,
            paramLabel = "C,C,...|@FILE",
            description = "Circuits that are down, or a file that names them.")
    private List<String> down = new ArrayList<>();

    @Option(names = "--up", paramLabel = "C,C,...|@FILE", description = "Circuits that are up, or a file.")
    private List<String> up = new ArrayList<>();

    @Option(
            names = "--by-path",
            description = "The alarms are by path: a protected circuit that is up proves its own path.")
    private boolean byPath;

    @Option(
            names = "--opened",
            paramLabel = "E,E,...",
            description = "Enclosures that a crew is known to have opened lately: joints may be crossed there.")
    private List<String> opened = new ArrayList<>();

    @Mixin
    private ViewOptions view;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    SuspectsCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        List<String> dark = codes(down);
        List<String> light = codes(up);
        List<String> opens = codes(opened);
        return view.answerWithin(program, (views, of) -> {
            Suspects suspects = Suspects.of(of.snapshot(), AlarmReferences.read(views, of, dark, light, byPath, opens));
            if (json) {
                Output.document(out, Json.lines(new SuspectsDocument(of, suspects)::write));
            } else {
                new SuspectsTable(out, of).print(suspects);
            }
            return 0;
        });
    }

    /** The codes in lists, those in files among them; parted by commas or white space. */
    private static List<String> codes(List<String> lists) {
        return lists.stream()
                .flatMap(list -> list.startsWith("@") ? Stream.of(text(Path.of(list.substring(1)))) : Stream.of(list))
                .flatMap(text -> Arrays.stream(text.split("[,\\s]+")))
                .filter(code -> !code.isEmpty())
                .toList();
    }

    private static String text(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException unreadable) {
            throw new WrongInput("There is no file " + file + " that can be read; it should name circuits.");
        }
    }
}
