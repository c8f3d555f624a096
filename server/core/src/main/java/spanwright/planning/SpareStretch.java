package spanwright.planning;

/**
 * Something that tells one path from another: a cable section travelled, by any of its fibers, or a structure where hands
 * work.
 *
 * @param visit whether it is a structure
 * @param id the first piece of the section, or identity of the structure
 */
public record SpareStretch(boolean visit, int id) {

    static SpareStretch section(int firstPiece) {
        return new SpareStretch(false, firstPiece);
    }

    static SpareStretch visit(int structure) {
        return new SpareStretch(true, structure);
    }
}
