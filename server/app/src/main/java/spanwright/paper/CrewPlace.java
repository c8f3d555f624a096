package spanwright.paper;

import org.jspecify.annotations.Nullable;
import spanwright.answers.View;
import spanwright.fault.FaultPlace;
import spanwright.fault.Where;
import spanwright.plant.Cable;
import spanwright.plant.Position;
import spanwright.plant.SheathPlace;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.trace.Fiber;

/**
 * A place that a crew is sent to.
 *
 * @param position where it is on the map
 * @param lay the cable on which it lies, or null in a jumper
 * @param sheath how far along that cable's sheath, or null in a jumper
 * @param fiber the fiber that was shot, or null where none was
 * @param within how far either side the true place may lie along the sheath, or null where nothing says
 * @param at the structure at which it lies, or null on a span
 */
public record CrewPlace(
        Position position,
        @Nullable CableLay lay,
        @Nullable Length sheath,
        @Nullable Integer fiber,
        @Nullable Length within,
        @Nullable Structure at) {

    /** The place of a reading. */
    public static CrewPlace of(FaultPlace place) {
        Where where = place.where();
        Fiber fiber = where.fiber();
        return new CrewPlace(
                where.position(),
                fiber == null ? null : fiber.lay(),
                where.sheathPosition(),
                fiber == null ? null : Integer.valueOf(fiber.fiber()),
                place.uncertainty().within(),
                where.span() == null ? where.before() : null);
    }

    /**
     * A place along a cable that nothing was read at.
     *
     * @param sheath from the cable's start, on its sheath
     */
    public static CrewPlace of(View view, Cable cable, Length sheath) {
        CableLay lay = view.lay(cable.id());
        SheathPlace place = lay.positions().place(sheath);
        Position position = place.onSpan()
                ? lay.route(place.row()).line().at(place.fraction())
                : lay.structure(place.row()).position();
        return new CrewPlace(position, lay, sheath, null, null, place.onSpan() ? null : lay.structure(place.row()));
    }
}
