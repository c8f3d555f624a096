package spanwright.atlas;

import java.util.Arrays;
import java.util.BitSet;
import java.util.stream.IntStream;

/** Identities that differ between two states, rising. */
final class Changed {

    private final BitSet ids = new BitSet();

    void add(int id) {
        ids.set(id);
    }

    boolean contains(int id) {
        return ids.get(id);
    }

    int count() {
        return ids.cardinality();
    }

    IntStream stream() {
        return ids.stream();
    }

    @Override
    public String toString() {
        return Arrays.toString(ids.stream().toArray());
    }
}
