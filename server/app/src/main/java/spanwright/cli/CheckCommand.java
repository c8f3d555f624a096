package spanwright.cli;

import java.io.PrintWriter;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import spanwright.answers.CheckDocument;
import spanwright.answers.Json;
import spanwright.answers.View;
import spanwright.check.Checker;
import spanwright.check.Finding;
import spanwright.check.Severity;

/** Asks every rule of the records that a person must judge. */
@Command(
        name = "check",
        description = "Asks every rule of the records that a person must judge, and lists what it finds.",
        mixinStandardHelpOptions = true)
final class CheckCommand implements Callable<Integer> {

    private static final int WIDTH = 100;

    private final Program program;

    @Spec
    private CommandSpec spec;

    @Mixin
    private ViewOptions view;

    @Option(names = "--json", description = "Print one JSON document and nothing else.")
    private boolean json;

    CheckCommand(Program program) {
        this.program = program;
    }

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        return view.answer(program, asked -> {
            List<Finding> findings = find(asked);
            if (json) {
                Output.document(out, Json.lines(document -> CheckDocument.write(document, findings)));
            } else {
                print(out, findings);
            }
            return 0;
        });
    }

    private static List<Finding> find(View view) {
        List<Finding> findings = new ArrayList<>();
        Checker.check(view.snapshot(), LocalDate.now(view.zone()), findings::add);
        return findings;
    }

    private static void print(PrintWriter out, List<Finding> findings) {
        for (Finding finding : findings) {
            out.printf(Locale.ROOT, "%-7s  %s  %s%n", finding.severity().word(), finding.code(), finding.rule());
            Output.wrapped(out, finding.text(), "         ", WIDTH);
            Output.wrapped(out, finding.mend(), "         ", WIDTH);
        }
        out.printf(
                Locale.ROOT,
                "%d errors, %d warnings, %d notes%n",
                count(findings, Severity.ERROR),
                count(findings, Severity.WARNING),
                count(findings, Severity.NOTE));
    }

    private static long count(List<Finding> findings, Severity severity) {
        return findings.stream()
                .filter(finding -> finding.severity() == severity)
                .count();
    }
}
