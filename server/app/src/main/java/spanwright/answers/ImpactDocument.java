package spanwright.answers;

import spanwright.circuits.Circuit;
import spanwright.network.Block;
import spanwright.outage.CutSection;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.records.CableLay;

/** The document of what a cut takes down. */
public final class ImpactDocument {

    private final View view;
    private final Impact impact;
    private final boolean fibers;
    private final CutFibers restored;

    /**
     * Of an answer.
     *
     * @param fibers whether to say what every fiber of the cut sheaths carries
     */
    public ImpactDocument(View view, Impact impact, boolean fibers) {
        this.view = view;
        this.impact = impact;
        this.fibers = fibers;
        this.restored = new CutFibers(view, impact);
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
        json.list("fibers", restored.inOrder(cut), (item, fiber) -> fiber(item, fiber, type, colors));
    }

    private void fiber(Json json, CutFibers.CutFiber fiber, CableType type, Colors colors) {
        int tube = type.tubeOf(fiber.number());
        json.whole("fiber", fiber.number()).whole("tube", tube);
        json.text("tube_color", colors.tube(tube)).text("fiber_color", colors.fiber(fiber.number()));
        json.texts("carries", fiber.carries().stream().map(Circuit::code).toList());
        json.whole("priority", fiber.priority());
        json.text("state", restored.state(fiber));
    }
}
