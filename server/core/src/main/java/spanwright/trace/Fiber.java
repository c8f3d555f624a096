package spanwright.trace;

import java.util.Optional;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.LengthBasis;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/**
 * Glass of one fiber between two neighbouring enclosures, or between one and the bare end of its cable.
 *
 * @param lay how its cable lies
 * @param fiber its number, from 1
 * @param fromRow index of the run row that the walk comes from
 * @param toRow index of the run row that the walk goes to
 * @param fromTray tray glass where the walk comes from; zero where the fiber is not cut there
 * @param toTray tray glass where the walk goes to; zero where the fiber is not cut there
 * @param tubeColor colour of its tube, in words
 * @param fiberColor its own colour, in words
 */
public record Fiber(
        CableLay lay,
        int fiber,
        int fromRow,
        int toRow,
        Length fromTray,
        Length toTray,
        String tubeColor,
        String fiberColor)
        implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.FIBER;
    }

    /** Its cable. */
    public Cable cable() {
        return lay.cable();
    }

    /** Its tube, from 1. */
    public int tube() {
        return lay.type().tubeOf(fiber);
    }

    /** Whether the walk goes toward the end of the cable's run. */
    public boolean ahead() {
        return toRow > fromRow;
    }

    /** The enclosure that the walk comes from; none at a bare end. */
    public Optional<Enclosure> from() {
        return lay.findEnclosure(fromRow);
    }

    /** The enclosure that the walk goes to; none at a bare end. */
    public Optional<Enclosure> to() {
        return lay.findEnclosure(toRow);
    }

    /** The structure that the walk comes from. */
    @Override
    public Structure structure() {
        return lay.structure(fromRow);
    }

    /** The structure that the walk goes to. */
    public Structure toStructure() {
        return lay.structure(toRow);
    }

    /** The sheath position where the walk comes from. */
    public Length fromPosition() {
        return lay.positions().enclosure(fromRow);
    }

    /** The sheath position where the walk goes to. */
    public Length toPosition() {
        return lay.positions().enclosure(toRow);
    }

    /** Its length of sheath. */
    public Length sheath() {
        return toPosition().minus(fromPosition()).abs();
    }

    /** Its glass, tray glass where it is cut included. */
    @Override
    public Length glass() {
        return lay.glass(sheath()).plus(fromTray).plus(toTray);
    }

    /** Its route, coils apart. */
    public Length route() {
        return lay.routeTo(toRow).minus(lay.routeTo(fromRow)).abs();
    }

    /** What its length of sheath rests on. */
    public LengthBasis lengthBasis() {
        return lay.basis(fromRow, toRow);
    }

    /** Where its length of sheath comes from, for a person. */
    public String lengthSource() {
        return lay.source(fromRow, toRow);
    }
}
