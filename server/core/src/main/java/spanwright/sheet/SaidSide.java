package spanwright.sheet;

import java.util.OptionalInt;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/**
 * One side of a line.
 *
 * @param place where it stands
 * @param leg which
 * @param cable the cable's leg, or null for a splitter or a panel
 * @param numbers the numbers, or null for the rest: every fiber of the leg that no other line names
 * @param face whether rear or front of a port was written, or null
 */
record SaidSide(
        TextPlace place,
        Leg leg,
        @Nullable CableLeg cable,
        @Nullable FiberRange numbers,
        @Nullable LegKind face) {

    boolean isPort() {
        return leg.kind() == LegKind.REAR || leg.kind() == LegKind.FRONT;
    }

    boolean isSplitter() {
        return leg.kind() == LegKind.IN || leg.kind() == LegKind.OUT;
    }

    boolean isRest() {
        return numbers == null;
    }

    /** How many ends, where they are numbered. */
    OptionalInt count() {
        return numbers == null ? OptionalInt.empty() : OptionalInt.of(numbers.count());
    }

    /** The ends of numbered sides, a port's by the face that is meant. */
    EndRange ends(LegKind meant) {
        FiberRange range = numbers;
        if (range == null) {
            throw new IllegalStateException("the rest has no numbers yet");
        }
        return new EndRange(isPort() ? new Leg(meant, leg.owner()) : leg, range);
    }
}
