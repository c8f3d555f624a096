package spanwright.sheet;

import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.FiberColors;
import spanwright.plant.FiberRange;
import spanwright.plant.RunRow;
import spanwright.plant.Structure;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/**
 * A cable as seen from an enclosure in one direction.
 *
 * @param leg its ends
 * @param cable the cable
 * @param type its type
 * @param colors its own colour order
 * @param row the run row at the enclosure
 * @param toward the next structure that way
 * @param middle whether the cable goes on the other way too, so that its fibers are uncut unless said otherwise
 */
public record CableLeg(
        Leg leg, Cable cable, CableType type, FiberColors colors, RunRow row, Structure toward, boolean middle) {

    /** {@code F-1 ahead}. */
    public String name() {
        return cable.code() + (leg.kind() == LegKind.BACK ? " back" : " ahead");
    }

    /** {@code F-1 ahead, toward HH-2}. */
    public String nameToward() {
        return name() + ", toward " + toward.code();
    }

    /** The fibers of a tube, rising. */
    public FiberRange fibersOf(int tube) {
        int first = (tube - 1) * type.fibersPerTube() + 1;
        return new FiberRange(first, Math.min(type.fibers(), first + type.fibersPerTube() - 1));
    }

    /** {@code tube 3 GR}. */
    public String tubeName(int tube) {
        return "tube " + tube + " " + ColorLetters.of(colors, tube);
    }
}
