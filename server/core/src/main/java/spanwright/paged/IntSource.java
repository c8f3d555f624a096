package spanwright.paged;

import java.io.IOException;

/** Gives back the ints that an {@link IntSink} took, in the same order; lots may be cut otherwise. */
@FunctionalInterface
public interface IntSource {

    /**
     * Fills the first {@code count} places of an array with the next ints.
     *
     * @throws IOException where they cannot be read, or there are too few
     */
    void get(int[] into, int count) throws IOException;
}
