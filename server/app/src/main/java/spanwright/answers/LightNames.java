package spanwright.answers;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import spanwright.circuits.Circuit;
import spanwright.quantity.Loss;
import spanwright.splicing.EndKey;
import spanwright.splicing.Panel;
import spanwright.temporary.ClosedPlant;
import spanwright.temporary.DownCircuits;
import spanwright.temporary.LightQuestion;

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
        CutReferences places = new CutReferences(view.records());
        closed.cut(places.list(cuts));
        closed.cut(places.list(avoid));
        Set<Circuit> circuits = new LinkedHashSet<>();
        down.forEach(code -> circuits.add(references.askedCircuit(code)));
        if (circuits.isEmpty()) {
            circuits.addAll(DownCircuits.of(view.snapshot(), closed));
        }
        List<Panel> panels = fromPanels.stream().distinct().map(this::panel).toList();
        return new LightQuestion(List.copyOf(circuits), closed, panels, verifiedOnly, margin, offers);
    }

    /** A step of an answer: it goes on unless its time is up. */
    public static void goOn() {
        if (Thread.currentThread().isInterrupted()) {
            throw new Unanswerable(Unanswerable.Kind.TOO_SLOW, "The search for light took too long and was stopped.");
        }
    }

    private Panel panel(String text) {
        return view.records().panels().get(EndKey.owner(references.front(text + "/1")));
    }
}
