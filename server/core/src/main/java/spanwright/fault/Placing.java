package spanwright.fault;

import java.util.Objects;
import spanwright.fault.Where.Lies;
import spanwright.plant.SheathPlace;
import spanwright.plant.SheathPositions;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.trace.Element;
import spanwright.trace.ElementKind;
import spanwright.trace.Fiber;

/** Finds where in the plant a point of a path's glass lies. */
final class Placing {

    private final Records records;

    Placing(Records records) {
        this.records = records;
    }

    Where place(GlassParts parts, Spot spot) {
        if (spot.part() < 0) {
            return Where.at(Lies.TRAY, parts.path().elements().get(0).structure(), null, null);
        }
        GlassPart part = parts.part(spot.part());
        Element element = parts.element(spot.part());
        return switch (part.kind()) {
            case TRAY_FROM -> inTray((Fiber) element, ((Fiber) element).fromRow());
            case TRAY_TO -> inTray((Fiber) element, ((Fiber) element).toRow());
            case JUMPER -> Where.at(Lies.JUMPER, element.structure(), null, null);
            case SHEATH -> inSheath(parts, part, (Fiber) element, spot.within());
        };
    }

    private static Where inTray(Fiber fiber, int row) {
        CableLay lay = fiber.lay();
        return Where.at(Lies.TRAY, lay.structure(row), fiber, lay.positions().enclosure(row));
    }

    private Where inSheath(GlassParts parts, GlassPart part, Fiber fiber, Length within) {
        boolean first = within.micrometres() == 0;
        boolean last = within.equals(part.length());
        if ((first && joint(parts, part.element(), -1)) || (last && joint(parts, part.element(), 1))) {
            return inTray(fiber, first ? fiber.fromRow() : fiber.toRow());
        }
        return onSheath(fiber, position(fiber, within));
    }

    /** Whether a fiber is cut in an enclosure at one of its sides: its very end is then at the joint, not in the coil. */
    private static boolean joint(GlassParts parts, int element, int side) {
        Fiber fiber = (Fiber) parts.path().elements().get(element);
        int next = element + side;
        boolean through = next >= 0
                && next < parts.path().elements().size()
                && parts.path().elements().get(next).kind() == ElementKind.THROUGH;
        return !through && (side < 0 ? fiber.from() : fiber.to()).isPresent();
    }

    /** The sheath position at a length of glass from where the walk comes into a sheath. */
    static Length position(Fiber fiber, Length glass) {
        long sheath = Math.min(
                fiber.sheath().micrometres(),
                Length.ofMetres(glass.metres() / (1 + fiber.lay().overlengthPct() / 100))
                        .micrometres());
        Length walked = new Length(sheath);
        return fiber.ahead()
                ? fiber.fromPosition().plus(walked)
                : fiber.fromPosition().minus(walked);
    }

    private Where onSheath(Fiber fiber, Length position) {
        CableLay lay = fiber.lay();
        SheathPositions positions = lay.positions();
        SheathPlace place = positions.place(position);
        Length walkedTo = fiber.ahead() ? place.before() : place.after();
        Length walkedFrom = fiber.ahead() ? place.after() : place.before();
        if (!place.onSpan()) {
            Structure at = lay.structure(place.row());
            Lies lies = positions.coil(place.row()).micrometres() > 0 ? Lies.SLACK : Lies.STRUCTURE;
            return new Where(lies, at.position(), at, at, walkedTo, walkedFrom, null, fiber, position);
        }
        Structure start = lay.structure(place.row() - 1);
        Structure end = lay.structure(place.row());
        return new Where(
                Lies.SPAN,
                lay.route(place.row()).line().at(place.fraction()),
                fiber.ahead() ? start : end,
                fiber.ahead() ? end : start,
                walkedTo,
                walkedFrom,
                records.spans()
                        .get(Objects.requireNonNull(lay.rows().get(place.row()).span())),
                fiber,
                position);
    }
}
