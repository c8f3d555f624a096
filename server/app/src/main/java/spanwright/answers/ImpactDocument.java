package spanwright.answers;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.outage.CutSection;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.planning.SectionUse;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.records.CableLay;

/** The document of what a cut takes down. */
public final class ImpactDocument {

    private final View view;
    private final Impact impact;
    private final boolean fibers;
    private final Map<Integer, Integer> rank = new HashMap<>();

    /**
     * Of an answer.
     *
     * @param fibers whether to say what every fiber of the cut sheaths carries
     */
    public ImpactDocument(View view, Impact impact, boolean fibers) {
        this.view = view;
        this.impact = impact;
        this.fibers = fibers;
        impact.circuits().forEach(hit -> rank.put(hit.circuit().id(), rank.size()));
    }

    /** Writes its members. */
    public void write(Json json) {
        json.list("circuits", impact.circuits(), ImpactDocument::circuit);
        json.whole("fibers_cut", impact.fibersCut()).whole("customers_down", impact.customersDown());
        json.whole("posting", view.posting());
        if (fibers) {
            json.list("sheath", impact.sections(), this::section);
        }
    }

    private static void circuit(Json json, HitCircuit hit) {
        Circuit circuit = hit.circuit();
        json.text("circuit", circuit.code()).text("state", hit.single() ? "single" : "down");
        json.whole("priority", circuit.priority()).whole("customers_served", circuit.customersServed());
        json.texts("at", hit.at()).text("service", circuit.service()).text("customer", circuit.customer());
        json.text("protection_group", circuit.protectionGroup()).flag("whole", hit.whole());
    }

    private void section(Json json, CutSection cut) {
        Block section = cut.section();
        CableLay lay = view.lay(section.owner());
        int from = lay.index(section.fromRow());
        int to = lay.index(section.toRow());
        json.text("cable", lay.cable().code());
        json.text("from", lay.findEnclosure(from).map(Enclosure::code).orElse(null));
        json.text("to", lay.findEnclosure(to).map(Enclosure::code).orElse(null));
        json.text("from_structure", lay.structure(from).code())
                .text("to_structure", lay.structure(to).code());
        CableType type = lay.type();
        Colors colors = new Colors(view, type);
        json.list("fibers", inOrder(cut), (item, fiber) -> fiber(item, fiber, type, colors));
    }

    /** The fibers in the order to restore: those of the first circuits first, dark ones last. */
    private List<CutFiber> inOrder(CutSection cut) {
        List<CutFiber> found = new ArrayList<>();
        for (int number : cut.fibers()) {
            SectionUse use = view.uses().of(cut.section(), number);
            List<Circuit> carried = use.circuits().stream()
                    .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                    .sorted(Comparator.comparingInt(circuit -> rank.getOrDefault(circuit.id(), rank.size())))
                    .toList();
            int first = carried.isEmpty()
                    ? Integer.MAX_VALUE
                    : rank.getOrDefault(carried.get(0).id(), rank.size());
            found.add(new CutFiber(number, carried, use, first));
        }
        found.sort(Comparator.comparingInt(CutFiber::rank).thenComparingInt(CutFiber::number));
        return found;
    }

    private void fiber(Json json, CutFiber fiber, CableType type, Colors colors) {
        int tube = type.tubeOf(fiber.number);
        json.whole("fiber", fiber.number).whole("tube", tube);
        json.text("tube_color", colors.tube(tube)).text("fiber_color", colors.fiber(fiber.number));
        json.texts("carries", fiber.carries.stream().map(Circuit::code).toList());
        json.whole(
                "priority",
                fiber.carries.isEmpty() ? null : (Integer) fiber.carries.get(0).priority());
        json.text("state", state(fiber));
    }

    /** {@code down} or {@code single} as the first circuit on it is, else what else the fiber is used for. */
    private String state(CutFiber fiber) {
        return fiber.rank < impact.circuits().size()
                ? impact.circuits().get(fiber.rank).single() ? "single" : "down"
                : fiber.use.use().word();
    }

    /** A fiber of a cut section, with the rank of the first circuit on it. */
    private record CutFiber(int number, List<Circuit> carries, SectionUse use, int rank) {}
}
