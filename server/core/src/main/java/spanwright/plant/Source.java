package spanwright.plant;

/**
 * Where a built-in value comes from.
 *
 * @param text the source in words
 * @param status how the value came from it
 */
public record Source(String text, SourceStatus status) {}
