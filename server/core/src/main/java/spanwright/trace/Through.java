package spanwright.trace;

import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Structure;

/**
 * An enclosure that the fiber passes uncut: the same glass, no loss.
 *
 * @param enclosure the enclosure
 * @param structure where that is
 * @param cable the cable
 * @param fiber the fiber's number
 */
public record Through(Enclosure enclosure, Structure structure, Cable cable, int fiber) implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.THROUGH;
    }
}
