package spanwright.draft;

import java.util.List;
import spanwright.records.Refusal;

/** What became of an attempt to change a draft. */
public sealed interface DraftOutcome {

    /**
     * It is durable.
     *
     * @param draft as it is now
     */
    record Kept(Draft draft) implements DraftOutcome {}

    /**
     * It was changed meanwhile, so nothing was kept.
     *
     * @param now as it is now
     */
    record Stale(Draft now) implements DraftOutcome {}

    /**
     * It cannot be.
     *
     * @param refusals why, one at least
     */
    record Refused(List<Refusal> refusals) implements DraftOutcome {

        /** Keeps its own copy. */
        public Refused {
            refusals = List.copyOf(refusals);
        }
    }

    /**
     * The plant was changed meanwhile where the draft speaks of it, so nothing was posted.
     *
     * @param draft as it is
     * @param tubes the tubes, one at least
     */
    record Conflicting(Draft draft, List<TubeConflict> tubes) implements DraftOutcome {

        /** Keeps its own copy. */
        public Conflicting {
            tubes = List.copyOf(tubes);
        }
    }
}
