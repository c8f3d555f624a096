package spanwright.fault;

/**
 * A reading that cannot be placed.
 *
 * @param part what of the question stands in the way
 * @param sentence what is wrong and what would be right
 */
public record NotPlaced(Part part, String sentence) implements FaultAnswer {

    /** A part of the question. */
    public enum Part {
        /** Where the shot begins. */
        START,
        /** Which way it goes behind splitters. */
        TO,
        /** The distance read. */
        DISTANCE,
        /** The wavelength of the shot. */
        WAVELENGTH,
        /** A known event. */
        EVENT,
        /** The shot from the far end. */
        FAR
    }
}
