package spanwright.paged;

import java.io.IOException;

/** Takes ints in order, in large lots, such as into a file. */
@FunctionalInterface
public interface IntSink {

    /**
     * Takes {@code count} ints of an array, from index 0; the array is not to be kept or changed.
     *
     * @throws IOException where they cannot be written
     */
    void put(int[] ints, int count) throws IOException;
}
