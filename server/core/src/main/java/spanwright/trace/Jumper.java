package spanwright.trace;

import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.splicing.Joint;

/**
 * A jumper between two fronts.
 *
 * @param joint its row of the records
 * @param structure the structure where both ports are
 * @param a the port that the walk comes from
 * @param b the port that the walk goes to
 * @param glass its length
 */
public record Jumper(Joint joint, Structure structure, String a, String b, Length glass) implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.JUMPER;
    }
}
