package spanwright.repair;

import java.util.List;
import spanwright.quantity.Length;

/**
 * What a repair makes.
 *
 * @param parts the codes of the part toward the start, the piece, and the part toward the end
 * @param partOf the longer cable that they are part of
 * @param fibers how many of each are joined
 * @param seams where they are joined, from the start
 * @param changes how many records it changes
 * @param piece the sheath of the piece
 * @param route the route that it takes, which needs as much at least
 * @param coilsRemoved sheath that was coiled along that route
 * @param circuits the working circuits whose glass the cut goes through, in the order in which they are restored
 * @param leftInJournal what was measured on glass that is there no longer: kept in the journal, as it was written
 */
public record RepairMade(
        List<String> parts,
        String partOf,
        int fibers,
        List<Seam> seams,
        int changes,
        Length piece,
        Length route,
        Length coilsRemoved,
        List<String> circuits,
        List<String> leftInJournal) {

    /** Keeps its own copies of the lists. */
    public RepairMade {
        parts = List.copyOf(parts);
        seams = List.copyOf(seams);
        circuits = List.copyOf(circuits);
        leftInJournal = List.copyOf(leftInJournal);
    }

    /** How many joints it makes. */
    public int joints() {
        return seams.size() * fibers;
    }

    /**
     * Where two parts are joined, every fiber straight.
     *
     * @param enclosure the enclosure's code
     * @param structure its structure's code
     * @param back the part that comes from the start
     * @param ahead the part that goes on toward the end
     * @param before the cut cable's coil there before
     * @param after what is left of it
     */
    public record Seam(String enclosure, String structure, String back, String ahead, Length before, Length after) {}
}
