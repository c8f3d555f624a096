package spanwright.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.answers.TraceAnswer;
import spanwright.answers.View;
import spanwright.circuits.Circuit;
import spanwright.loss.BudgetCheck;
import spanwright.loss.ElementLoss;
import spanwright.loss.PathLoss;
import spanwright.plant.Enclosure;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.quantity.Loss;
import spanwright.trace.Connector;
import spanwright.trace.Fiber;
import spanwright.trace.Jumper;
import spanwright.trace.Path;
import spanwright.trace.PathEnd;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Through;

/** A trace as a table for a person, 100 columns wide at most, lengths in the unit that people read first. */
final class TraceTable {

    private static final int WIDTH = 100;
    private static final int WHAT = 60;
    private static final String ROW = "%10s  %-" + WHAT + "s %8s %8s%n";

    private final PrintWriter out;
    private final LengthUnit unit;

    TraceTable(PrintWriter out, View view) {
        this.out = out;
        this.unit = view.unit();
    }

    void print(TraceAnswer answer) {
        if (answer.paths().isEmpty()) {
            out.println("No path: it is not in service.");
        }
        for (TraceAnswer.Reckoned reckoned : answer.paths()) {
            print(reckoned);
            out.println();
        }
        out.println("As of posting " + answer.view().posting()
                + Optional.ofNullable(answer.view().job())
                        .map(job -> ", as if " + job + " were built")
                        .orElse("") + ".");
    }

    private void print(TraceAnswer.Reckoned reckoned) {
        Path path = reckoned.path();
        @Nullable PathLoss loss = reckoned.loss();
        String circuits = path.circuits().stream().map(Circuit::code).collect(Collectors.joining(", "));
        String name = circuits.isEmpty() ? path.governing().map(Circuit::code).orElse("") : circuits;
        String ends = path.loop()
                ? "a circle"
                : path.ends().stream().map(PathEnd::name).collect(Collectors.joining(" to "));
        Output.wrapped(
                out,
                (name.isEmpty() ? "" : name + ": ") + ends + (path.complete() ? ", complete" : ", not complete")
                        + ", at " + reckoned.wavelength(),
                "",
                WIDTH);
        if (loss == null) {
            Output.wrapped(out, "No loss: " + reckoned.problem(), "", WIDTH);
            return;
        }
        out.printf(Locale.ROOT, ROW, "glass " + unit.symbol(), "", "loss dB", "limit dB");
        List<Length> before = path.glassBefore();
        for (int index = 0; index < before.size(); index++) {
            ElementLoss element = loss.elements().get(index);
            row(before.get(index), describe(element), element.expected(), element.limit());
        }
        row(path.glass(), "in all; statistical " + decibels(loss.statistical()) + " dB", loss.expected(), loss.limit());
        if (reckoned.budget() != null) {
            budget(reckoned.budget());
        }
    }

    private void row(Length at, String what, Loss expected, Loss limit) {
        out.printf(Locale.ROOT, ROW, length(at), Output.cut(what, WHAT), decibels(expected), decibels(limit));
    }

    private void budget(BudgetCheck check) {
        String name =
                check.budget().code() == null ? "" : "class " + check.budget().code() + ", ";
        String margin = check.margin().microdecibels() == 0 ? "" : " less " + decibels(check.margin()) + " dB margin";
        String verdict = check.passes() ? "passes" : "fails";
        String limit = check.passesAtLimit() ? "passes" : "fails";
        String sentence = "Budget: " + name + decibels(check.budget().max()) + " dB" + margin + ": " + verdict + ", "
                + decibels(check.left()) + " dB left; " + limit + " at the limit"
                + (check.overload() ? "; overload: less loss than the class allows" : "") + ".";
        Output.wrapped(out, sentence, "", WIDTH);
    }

    private String describe(ElementLoss loss) {
        return switch (loss.element().kind()) {
            case CONNECTOR -> "connector " + ((Connector) loss.element()).name();
            case SPLICE -> splice((Splice) loss.element());
            case FIBER -> fiber((Fiber) loss.element());
            case THROUGH ->
                "  through " + ((Through) loss.element()).enclosure().code();
            case JUMPER -> "jumper    " + ((Jumper) loss.element()).a() + " = " + ((Jumper) loss.element()).b();
            case SPLITTER -> splitter((SplitterCrossing) loss.element());
        };
    }

    private static String splice(Splice splice) {
        String tray = splice.joint().facts().tray();
        return "splice    " + splice.a() + " = " + splice.b() + "  "
                + splice.enclosure().code() + (tray == null || splice.pigtail() ? "" : " tray " + tray);
    }

    private String fiber(Fiber fiber) {
        return "fiber     " + fiber.cable().code() + ":" + fiber.fiber() + "  " + fiber.tubeColor() + ", "
                + fiber.fiberColor() + "  " + length(fiber.glass()) + " " + unit.symbol() + " to "
                + fiber.to().map(Enclosure::code).orElse("its bare end");
    }

    private static String splitter(SplitterCrossing crossing) {
        String side = crossing.towardOutput() ? "to output " : "from output ";
        return "splitter  " + crossing.splitter().code() + "  1:"
                + crossing.splitter().outputs() + "  " + side + crossing.output() + "  "
                + crossing.enclosure().code();
    }

    private String length(Length length) {
        return String.format(Locale.ROOT, "%,.1f", length.in(unit));
    }

    private static String decibels(Loss loss) {
        return String.format(Locale.ROOT, "%.2f", loss.decibels());
    }
}
