package spanwright.repair;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.splicing.SpliceMethod;

/**
 * A piece let into a cut cable, as the repair sheet tells it.
 *
 * @param cable the code of the cable that was cut
 * @param at the sheath position of the cut; null where the span is named
 * @param span the code of the span on which it was cut; null where the position is given
 * @param first the enclosure on the side of the cable's start
 * @param second the enclosure on the side of its end
 * @param piece what was let in
 * @param slack coils that were drawn from, each with what is left
 * @param method how the joints were made
 * @param by who made them, or null
 * @param on when, or null
 * @param temporaryUntil their last day where they are temporary, or null
 * @param job the job, or null
 */
public record RepairOrder(
        String cable,
        @Nullable Length at,
        @Nullable String span,
        Place first,
        Place second,
        Piece piece,
        List<Coil> slack,
        SpliceMethod method,
        @Nullable String by,
        @Nullable LocalDate on,
        @Nullable LocalDate temporaryUntil,
        @Nullable String job) {

    /** Keeps its own copy. */
    public RepairOrder {
        slack = List.copyOf(slack);
    }

    /**
     * Where the piece is joined.
     *
     * @param enclosure the enclosure's code: one that is there, or a new one
     * @param structure the code of its structure, which the cable visits
     * @param trayGlass of a new enclosure
     */
    public record Place(String enclosure, String structure, Length trayGlass) {}

    /**
     * The piece.
     *
     * @param cable its code; null where the program names it
     * @param cableType the code of its type; null where it is of the cut cable's
     * @param reel its reel, or null
     * @param length its sheath; null where it is as long as the route
     */
    public record Piece(
            @Nullable String cable,
            @Nullable String cableType,
            @Nullable String reel,
            @Nullable Length length) {}

    /**
     * A coil that was drawn from.
     *
     * @param structure the code of its structure
     * @param left the sheath that is still coiled there
     */
    public record Coil(String structure, Length left) {}
}
