package spanwright.fault;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Position;
import spanwright.plant.PrintedMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.trace.Fiber;

/**
 * Where a point of glass lies in the plant, as seen from where the shot began.
 *
 * @param lies in what it lies
 * @param position where that is on the map
 * @param before the structure before it, or the one at which it is
 * @param after the structure after it, or the one at which it is
 * @param beyondBefore sheath from where it leaves the structure before, in a coil from where it arrives
 * @param shortOfAfter sheath to where it comes to the structure after, in a coil to where it leaves
 * @param span the span on which it is, or null
 * @param fiber the fiber in which it is, or null in a jumper
 * @param sheathPosition along that fiber's cable, or null in a jumper
 */
public record Where(
        Lies lies,
        Position position,
        Structure before,
        Structure after,
        Length beyondBefore,
        Length shortOfAfter,
        @Nullable Span span,
        @Nullable Fiber fiber,
        @Nullable Length sheathPosition) {

    /** In what glass lies. */
    public enum Lies {
        /** On a span. */
        SPAN("span"),
        /** In a coil. */
        SLACK("slack"),
        /** In tray glass, or at a joint. */
        TRAY("tray"),
        /** In a jumper. */
        JUMPER("jumper"),
        /** At a structure that its cable passes without a coil. */
        STRUCTURE("structure");

        private final String word;

        Lies(String word) {
            this.word = word;
        }

        /** How an answer writes it. */
        public String word() {
            return word;
        }
    }

    /** At a structure, at no distance from it. */
    static Where at(Lies lies, Structure structure, @Nullable Fiber fiber, @Nullable Length sheathPosition) {
        return new Where(
                lies,
                structure.position(),
                structure,
                structure,
                Length.ZERO,
                Length.ZERO,
                null,
                fiber,
                sheathPosition);
    }

    /** The mark printed there, where the cable has two ties at least. */
    public Optional<PrintedMark> findMark() {
        return fiber == null || sheathPosition == null
                ? Optional.empty()
                : fiber.lay().positions().findMark(sheathPosition);
    }
}
