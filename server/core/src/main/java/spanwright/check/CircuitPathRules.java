package spanwright.check;

import java.util.List;
import java.util.Locale;
import java.util.function.Consumer;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.loss.Budget;
import spanwright.loss.BudgetCheck;
import spanwright.loss.LossReckoner;
import spanwright.loss.LossUnknown;
import spanwright.loss.Measurements;
import spanwright.loss.PathLoss;
import spanwright.loss.Reckoning;
import spanwright.plant.Trust;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.Relation;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.Tracer;

/** Working circuits whose path is broken, dead, not known, over its budget, or rests on what nobody is sure of. */
final class CircuitPathRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        Tracer tracer = new Tracer(checked.snapshot());
        Measurements measurements = new Measurements(checked.records());
        checked.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(circuit -> {
                    List<Path> paths = tracer.ofCircuit(circuit);
                    paths.forEach(path -> path(checked, circuit, path, found));
                    if (paths.stream().allMatch(Path::complete)) {
                        circuit.wavelengths()
                                .forEach(wavelength -> paths.forEach(path -> reckoned(
                                        circuit,
                                        wavelength,
                                        new LossReckoner(checked.records(), wavelength, measurements).reckon(path),
                                        found)));
                    }
                });
    }

    private static void path(Checked checked, Circuit circuit, Path path, Consumer<Finding> found) {
        if (!path.complete()) {
            String reached =
                    path.loop() ? "in a circle" : "to " + path.ends().get(1).name();
            found.accept(finding(
                    Severity.ERROR,
                    "circuit-without-path",
                    circuit,
                    "works, but no path joins its ports: from a the glass leads " + reached + ".",
                    "Record the joints that are missing, or mend its ports or its status."));
        }
        path.list(Fiber.class).stream()
                .filter(fiber -> dead(checked, fiber))
                .map(fiber -> fiber.cable().code() + ":" + fiber.fiber())
                .distinct()
                .forEach(fiber -> found.accept(finding(
                        Severity.ERROR,
                        "circuit-on-dead-fiber",
                        circuit,
                        "works on " + fiber + ", which is flagged dead.",
                        "One of the two is wrong: prove the fiber, then mend the flag or the joints.")));
        unsure(circuit, path, found);
    }

    private static boolean dead(Checked checked, Fiber fiber) {
        return checked.records()
                .fiberFlags()
                .owned(Relation.CABLE_FLAGS, fiber.cable().id())
                .filter(flag -> flag.flag() == Flag.DEAD && flag.fibers().contains(fiber.fiber()))
                .anyMatch(flag -> covers(fiber, flag));
    }

    /** Whether a flag's stretch takes in the whole section; a flag without ends takes in the whole cable. */
    private static boolean covers(Fiber fiber, FiberFlag flag) {
        int low = Math.min(fiber.fromRow(), fiber.toRow());
        int high = Math.max(fiber.fromRow(), fiber.toRow());
        return (flag.from() == null || row(fiber, flag.from()) <= low)
                && (flag.to() == null || row(fiber, flag.to()) >= high);
    }

    private static int row(Fiber fiber, int enclosure) {
        for (int row = 0; row < fiber.lay().rows().size(); row++) {
            if (fiber.lay()
                    .findEnclosure(row)
                    .filter(at -> at.id() == enclosure)
                    .isPresent()) {
                return row;
            }
        }
        return 0;
    }

    private static void unsure(Circuit circuit, Path path, Consumer<Finding> found) {
        List<String> unsure = path.list(Splice.class).stream()
                .filter(splice -> splice.joint().facts().trust() == Trust.UNKNOWN)
                .map(splice -> splice.enclosure().code())
                .distinct()
                .toList();
        if (!unsure.isEmpty()) {
            found.accept(finding(
                    Severity.NOTE,
                    "circuit-on-unknown-joints",
                    circuit,
                    "rests on joints of unknown trust at " + String.join(", ", unsure) + ".",
                    "Verify them on the next visit."));
        }
    }

    private static void reckoned(Circuit circuit, Wavelength wavelength, Reckoning reckoning, Consumer<Finding> found) {
        if (reckoning instanceof LossUnknown unknown) {
            found.accept(finding(
                    Severity.WARNING,
                    "circuit-loss-not-known",
                    circuit,
                    "has no loss at " + wavelength + ": " + unknown.sentence() + ".",
                    "Give the fiber type values that reach that wavelength, or mend the circuit's."));
        } else if (circuit.budget() != null && reckoning instanceof PathLoss loss) {
            Budget.find(circuit.budget())
                    .ifPresent(budget -> held(circuit, wavelength, BudgetCheck.of(loss, budget, Loss.ZERO), found));
        }
    }

    private static void held(Circuit circuit, Wavelength wavelength, BudgetCheck check, Consumer<Finding> found) {
        if (!check.passes()) {
            found.accept(finding(
                    Severity.WARNING,
                    "circuit-over-budget",
                    circuit,
                    String.format(
                            Locale.ROOT,
                            "loses %.2f dB at %s, %.2f dB more than its budget %s of %s.",
                            check.expected().decibels(),
                            wavelength,
                            -check.left().decibels(),
                            circuit.budget(),
                            check.budget().max()),
                    "Measure its joints, or give it a shorter way or another class."));
        }
        if (check.overload()) {
            found.accept(finding(
                    Severity.WARNING,
                    "circuit-below-least-loss",
                    circuit,
                    String.format(
                            Locale.ROOT,
                            "loses only %.2f dB at %s: less than the least of %s, so its receiver is overloaded.",
                            check.expected().decibels(),
                            wavelength,
                            circuit.budget()),
                    "Add an attenuator, or mend its budget."));
        }
    }

    private static Finding finding(Severity severity, String rule, Circuit circuit, String text, String mend) {
        return new Finding(severity, rule, "circuits.csv", circuit.code(), circuit.code() + " " + text, mend);
    }
}
