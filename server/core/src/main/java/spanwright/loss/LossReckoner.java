package spanwright.loss;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.splicing.Measurement;
import spanwright.splicing.Splitter;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Jumper;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;

/** Reckons what paths lose at one wavelength. One thread's; made for one answer. */
public final class LossReckoner {

    private final Wavelength wavelength;
    private final GlassValues glass;
    private final PlanningLosses planning;
    private final Measurements measurements;
    private final EndNames names;

    /** A reckoner that looks through the measurements of the records itself. */
    public LossReckoner(RecordsView records, Wavelength wavelength) {
        this(records, wavelength, new Measurements(records));
    }

    /** A reckoner over an index of the measurements of these records. */
    public LossReckoner(RecordsView records, Wavelength wavelength, Measurements measurements) {
        this.wavelength = wavelength;
        this.glass = new GlassValues(records);
        this.planning = new PlanningLosses(records);
        this.measurements = measurements;
        this.names = new EndNames(records);
    }

    /** The loss of a path, or why it is not known. */
    public Reckoning reckon(Path path) {
        List<ElementLoss> losses = new ArrayList<>();
        List<String> reasons = new ArrayList<>();
        Dispersion dispersion = Dispersion.NONE;
        for (Element element : path.elements()) {
            reckon(element, reasons).ifPresent(losses::add);
            dispersion = disperse(dispersion, element);
        }
        return reasons.isEmpty() ? new PathLoss(path, wavelength, losses, dispersion) : new LossUnknown(reasons);
    }

    /** What one element is expected to lose; nothing where that is not known. */
    public Optional<Loss> findExpected(Element element) {
        return reckon(element, new ArrayList<>()).map(ElementLoss::expected);
    }

    private Optional<ElementLoss> reckon(Element element, List<String> reasons) {
        return switch (element.kind()) {
            case FIBER -> fiber((Fiber) element, reasons);
            case JUMPER -> jumper((Jumper) element, reasons);
            case SPLICE -> splice((Splice) element);
            case CONNECTOR -> connector((Connector) element);
            case SPLITTER -> splitter((SplitterCrossing) element, reasons);
            case THROUGH ->
                Optional.of(new ElementLoss(
                        element,
                        Loss.ZERO,
                        Loss.ZERO,
                        null,
                        LossBasis.NONE,
                        "Uncut glass: nothing is lost",
                        List.of()));
        };
    }

    private Dispersion disperse(Dispersion sum, Element element) {
        return switch (element.kind()) {
            case FIBER -> sum.plus(glass.type(((Fiber) element).cable()), element.glass(), wavelength);
            case JUMPER -> sum.plus(glass.jumperType(), element.glass(), wavelength);
            case SPLICE, CONNECTOR, SPLITTER, THROUGH -> sum;
        };
    }

    private Optional<ElementLoss> fiber(Fiber fiber, List<String> reasons) {
        Cable cable = fiber.cable();
        Optional<TableValue> loss = glass.findLoss(cable, wavelength);
        if (loss.isEmpty()) {
            reasons.add(glass.whyNoLoss(cable, wavelength));
        }
        return loss.map(expected ->
                ofGlass(fiber, expected, glass.findLimit(cable, wavelength).orElse(expected)));
    }

    private Optional<ElementLoss> jumper(Jumper jumper, List<String> reasons) {
        Optional<TableValue> loss = glass.findJumperLoss(wavelength);
        if (loss.isEmpty()) {
            reasons.add(glass.whyNoJumperLoss(wavelength));
        }
        return loss.map(expected ->
                ofGlass(jumper, expected, glass.findJumperLimit(wavelength).orElse(expected)));
    }

    private static ElementLoss ofGlass(Element element, TableValue expected, TableValue limit) {
        String limitSource = limit.source().equals(expected.source()) ? "" : "; limit: " + limit.source();
        return new ElementLoss(
                element,
                over(element.glass(), expected),
                over(element.glass(), limit),
                null,
                expected.basis(),
                expected.source() + limitSource,
                List.of());
    }

    private static Loss over(Length glass, TableValue perKm) {
        return Loss.ofDecibels(glass.metres() / 1000 * perKm.value());
    }

    private Optional<ElementLoss> splice(Splice splice) {
        List<Measurement> found = measurements.list(wavelength, measuredAs(splice.aKey()), measuredAs(splice.bKey()));
        Loss recorded = splice.joint().facts().loss();
        return Optional.of(
                joint(splice, found, recorded, "splice." + splice.method().word()));
    }

    /** The name under which a splice at an end is measured; a port's name is that of its connector pair. */
    private String measuredAs(long key) {
        return EndKey.kind(key) == LegKind.REAR ? "" : names.anywhere(key);
    }

    private Optional<ElementLoss> connector(Connector connector) {
        List<Measurement> found = measurements.list(wavelength, connector.name());
        return Optional.of(joint(connector, found, null, "connector"));
    }

    private ElementLoss joint(Element element, List<Measurement> found, @Nullable Loss recorded, String item) {
        Optional<Measurements.BothWays> both = Measurements.bothWays(found);
        if (both.isPresent()) {
            return measured(element, both.get().mean(), both.get().source(), List.of());
        }
        if (recorded != null) {
            return measured(element, recorded, "Measured, two-way mean as recorded with the joint", found);
        }
        PlanningLoss value = planning.find(item).orElseThrow();
        return new ElementLoss(
                element, value.expected(), value.limit(), value.sd(), LossBasis.PLANNING, source(value), found);
    }

    private static ElementLoss measured(Element element, Loss loss, String source, List<Measurement> oneWay) {
        return new ElementLoss(element, loss, loss, null, LossBasis.MEASURED, source, oneWay);
    }

    private static String source(PlanningLoss value) {
        return "Planning value " + value.item() + (value.replaced() ? " of these records: " : ": ") + value.source();
    }

    private Optional<ElementLoss> splitter(SplitterCrossing crossing, List<String> reasons) {
        Splitter splitter = crossing.splitter();
        Loss tap = splitter.outputLosses().get(crossing.output());
        if (tap != null) {
            return Optional.of(
                    measured(crossing, tap, "Measured, as recorded for output " + crossing.output(), List.of()));
        }
        Loss whole = splitter.loss();
        if (whole != null) {
            return Optional.of(measured(crossing, whole, "Measured, as recorded for the splitter", List.of()));
        }
        String item = "splitter." + splitter.outputs();
        Optional<PlanningLoss> value = planning.find(item);
        if (value.isEmpty()) {
            reasons.add("splitter " + splitter.code() + " at "
                    + crossing.enclosure().code() + " has no loss, and there is no planning value " + item
                    + "; give either");
        }
        return value.map(found -> new ElementLoss(
                crossing, found.expected(), found.limit(), null, LossBasis.PLANNING, source(found), List.of()));
    }
}
