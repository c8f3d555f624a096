package spanwright.plants;

import java.util.List;
import spanwright.records.Refusal;

/** A rule refuses what is drawn. */
final class RefusedDrawing extends IllegalArgumentException {

    private static final long serialVersionUID = 1;

    private final transient List<Refusal> refusals;

    RefusedDrawing(List<Refusal> refusals) {
        super(refusals.toString());
        this.refusals = List.copyOf(refusals);
    }

    List<Refusal> refusals() {
        return refusals;
    }
}
