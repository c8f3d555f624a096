package spanwright.answers;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanwright.answers.Unanswerable.Kind;
import spanwright.circuits.Circuit;
import spanwright.outage.ClosedPlant;
import spanwright.outage.DownCircuits;
import spanwright.outage.LightQuestion;
import spanwright.quantity.Loss;
import spanwright.splicing.EndKey;
import spanwright.splicing.Panel;

/** Reads the codes in a question for temporary paths. */
public final class LightNames {

    private final View view;
    private final References references;

    /** By the codes of a view. */
    public LightNames(View view) {
        this.view = view;
        this.references = new References(view.records());
    }

    /**
     * The question that the codes ask.
     *
     * @param down circuits; none: all that the cuts take down
     * @param cuts what is cut, such as {@code span:S-1}
     * @param avoid what is suspect
     * @param fromPanels panels such as {@code HUT-S/OLT}
     */
    public LightQuestion question(
            List<String> down,
            List<String> cuts,
            List<String> avoid,
            List<String> fromPanels,
            boolean verifiedOnly,
            Loss margin,
            int offers) {
        ClosedPlant closed = new ClosedPlant(view.snapshot());
        cuts.forEach(place -> close(closed, place));
        avoid.forEach(place -> close(closed, place));
        Set<Circuit> circuits = new LinkedHashSet<>();
        down.forEach(code -> circuits.add(references.askedCircuit(code)));
        if (circuits.isEmpty()) {
            circuits.addAll(DownCircuits.of(view.snapshot(), closed));
        }
        List<Panel> panels = fromPanels.stream().distinct().map(this::panel).toList();
        return new LightQuestion(List.copyOf(circuits), closed, panels, verifiedOnly, margin, offers);
    }

    private Panel panel(String text) {
        return view.records().panels().get(EndKey.owner(references.front(text + "/1")));
    }

    private void close(ClosedPlant closed, String place) {
        int colon = place.indexOf(':');
        String code = place.substring(colon + 1);
        switch (colon < 0 ? "" : place.substring(0, colon)) {
            case "span" -> closed.span(references.span(code).id());
            case "structure" -> closed.structure(references.structure(code).id());
            case "enclosure" -> closed.enclosure(references.enclosure(code));
            case "cable" -> closed.cable(references.cable(code).id());
            default ->
                throw new Unanswerable(
                        Kind.BAD_REQUEST,
                        "'" + place + "' is no place; a place is written span:S-1, structure:H1, enclosure:E1 or"
                                + " cable:F-1.");
        }
    }
}
