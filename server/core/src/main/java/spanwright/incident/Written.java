package spanwright.incident;

import java.util.List;
import spanwright.records.Refusal;

/**
 * What became of an attempt to write into the incident book.
 *
 * @param <T> what was written
 */
public sealed interface Written<T> {

    /**
     * It is durable.
     *
     * @param kept as it was kept
     */
    record Kept<T>(T kept) implements Written<T> {}

    /**
     * Nothing of it is kept.
     *
     * @param refusals why, one at least
     */
    record Refused<T>(List<Refusal> refusals) implements Written<T> {

        /** Refuses to refuse without a reason. */
        public Refused {
            refusals = List.copyOf(refusals);
            if (refusals.isEmpty()) {
                throw new IllegalArgumentException("refused for no reason");
            }
        }
    }
}
