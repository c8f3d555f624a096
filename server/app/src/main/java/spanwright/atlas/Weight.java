package spanwright.atlas;

import java.util.List;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.records.Relation;

/** From how far away a structure is worth drawing; rising. */
enum Weight {
    /** A pole, or a marked place, with nothing in it. */
    LIGHT,
    /** A place to open, with nothing in it. */
    PLAIN,
    /** Holds an enclosure. */
    HOLDING,
    /** A building, hut, vault or cabinet. */
    LARGE;

    private static final List<Weight> HEAVIEST_FIRST = List.of(LARGE, HOLDING, PLAIN, LIGHT);

    static List<Weight> heaviestFirst() {
        return HEAVIEST_FIRST;
    }

    static Weight of(Records records, Structure structure) {
        return switch (structure.type()) {
            case BUILDING, HUT, VAULT, CABINET -> LARGE;
            case MANHOLE, HANDHOLE, PEDESTAL -> holds(records, structure) ? HOLDING : PLAIN;
            case POLE, POINT -> holds(records, structure) ? HOLDING : LIGHT;
        };
    }

    private static boolean holds(Records records, Structure structure) {
        return records.owned(Relation.STRUCTURE_ENCLOSURES, structure.id()).length > 0;
    }

    /** The lightest that is drawn at a zoom: where a pole's span of 50 m is 20 pixels wide, all are (zoom 15). */
    static Weight from(double zoom) {
        if (zoom >= 15) {
            return LIGHT;
        }
        if (zoom >= 14) {
            return PLAIN;
        }
        return zoom >= 11 ? HOLDING : LARGE;
    }
}
