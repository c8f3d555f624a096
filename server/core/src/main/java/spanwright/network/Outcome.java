package spanwright.network;

import java.util.List;
import spanwright.journal.Posting;
import spanwright.records.Refusal;

/** What became of an attempt to post. */
public sealed interface Outcome {

    /**
     * It is durable.
     *
     * @param posting its head
     * @param snapshot the state with it
     */
    record Posted(Posting posting, Snapshot snapshot) implements Outcome {}

    /**
     * Nothing of it is kept.
     *
     * @param refusals why, one at least
     */
    record Refused(List<Refusal> refusals) implements Outcome {

        /** Refuses to refuse without a reason. */
        public Refused {
            refusals = List.copyOf(refusals);
            if (refusals.isEmpty()) {
                throw new IllegalArgumentException("refused for no reason");
            }
        }
    }
}
