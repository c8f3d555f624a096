package spanwright.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Unanswerable.Kind;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.loss.Budget;
import spanwright.loss.BudgetCheck;
import spanwright.loss.LossReckoner;
import spanwright.loss.LossUnknown;
import spanwright.loss.Measurements;
import spanwright.loss.PathLoss;
import spanwright.loss.Reckoning;
import spanwright.quantity.Wavelength;
import spanwright.splicing.EndKey;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** The paths that a question asks for, each with its loss and what its budget leaves. */
public final class TraceAnswer {

    private static final Wavelength USUAL = Wavelength.ofNanometres(1310);

    private final View view;
    private final TraceQuestion question;
    private final List<Reckoned> paths = new ArrayList<>();
    private final Map<Wavelength, LossReckoner> reckoners = new HashMap<>();
    private @Nullable Measurements measurements;

    private TraceAnswer(View view, TraceQuestion question) {
        this.view = view;
        this.question = question;
    }

    /** Answers a question. */
    public static TraceAnswer of(View view, TraceQuestion question) {
        TraceAnswer answer = new TraceAnswer(view, question);
        answer.trace();
        return answer;
    }

    /** The view that it was asked of. */
    public View view() {
        return view;
    }

    /** The paths in order. */
    public List<Reckoned> paths() {
        return List.copyOf(paths);
    }

    /** The wavelength asked for, else the one of all paths; none where paths differ, or there are none. */
    public Optional<Wavelength> wavelength() {
        Optional<Wavelength> asked = Optional.ofNullable(question.wavelength());
        return asked.or(() -> {
            List<Wavelength> all =
                    paths.stream().map(Reckoned::wavelength).distinct().toList();
            return all.size() == 1 ? Optional.of(all.get(0)) : Optional.empty();
        });
    }

    private void trace() {
        Tracer tracer = new Tracer(view.snapshot());
        References references = new References(view.records());
        if (question.port() != null) {
            long front = references.front(question.port());
            tracer.fromPort(EndKey.owner(front), EndKey.number(front)).forEach(this::add);
        } else if (question.fiber() != null) {
            References.FiberRef fiber = references.fiber(question.fiber());
            tracer.ofFiber(fiber.cable().id(), fiber.number()).forEach(this::add);
        } else {
            circuits(references).forEach(circuit -> tracer.ofCircuit(circuit).forEach(this::add));
        }
    }

    private List<Circuit> circuits(References references) {
        return question.allCircuits()
                ? view.records()
                        .circuits()
                        .list()
                        .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                        .sorted(Comparator.comparing(Circuit::code))
                        .toList()
                : question.circuits().stream().map(references::askedCircuit).toList();
    }

    private void add(Path path) {
        if (Thread.currentThread().isInterrupted()) {
            throw new Unanswerable(Kind.TOO_SLOW, "The trace took too long and was stopped.");
        }
        Optional<Circuit> circuit = path.governing();
        Wavelength own = circuit.map(each -> each.wavelengths().get(0)).orElse(USUAL);
        Wavelength wavelength = question.wavelength() == null ? own : question.wavelength();
        Reckoning reckoning =
                reckoners.computeIfAbsent(wavelength, this::reckoner).reckon(path);
        if (reckoning instanceof LossUnknown unknown) {
            unknown(path, wavelength, unknown.sentence() + ".");
            return;
        }
        PathLoss loss = (PathLoss) reckoning;
        Optional<Budget> budget = Optional.ofNullable(question.budget())
                .or(() -> circuit.flatMap(each -> Optional.ofNullable(each.budget()))
                        .flatMap(Budget::find));
        BudgetCheck check = budget.map(each -> BudgetCheck.of(loss, each, question.margin()))
                .orElse(null);
        paths.add(new Reckoned(path, wavelength, loss, check, null));
    }

    /** Among all circuits, one whose loss cannot be reckoned says so and leaves the others theirs. */
    private void unknown(Path path, Wavelength wavelength, String problem) {
        if (!question.allCircuits()) {
            throw new Unanswerable(Kind.WAVELENGTH_OUT_OF_RANGE, problem, "wavelength");
        }
        paths.add(new Reckoned(path, wavelength, null, null, problem));
    }

    private LossReckoner reckoner(Wavelength wavelength) {
        if (measurements == null) {
            measurements = new Measurements(view.records());
        }
        return new LossReckoner(view.records(), wavelength, measurements);
    }

    /**
     * One path.
     *
     * @param path the path
     * @param wavelength the wavelength at which it is asked about
     * @param loss what it loses, or null where that cannot be reckoned
     * @param budget its loss held against its budget, or null where it has none
     * @param problem why its loss cannot be reckoned, and what would be right; else null
     */
    public record Reckoned(
            Path path,
            Wavelength wavelength,
            @Nullable PathLoss loss,
            @Nullable BudgetCheck budget,
            @Nullable String problem) {}
}
