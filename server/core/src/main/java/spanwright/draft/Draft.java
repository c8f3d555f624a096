package spanwright.draft;

import java.time.Instant;
import org.jspecify.annotations.Nullable;

/**
 * A sheet being written.
 *
 * @param id 1, 2, 3 ... as begun
 * @param enclosure lasting identity of the enclosure
 * @param author who writes it
 * @param begunAt when it was begun
 * @param savedAt when it was last changed
 * @param revision 1 when begun, one more at every change, undo and redo too
 * @param base the last posting that its author has seen
 * @param steps where in its history it stands, and how far that reaches
 * @param state how far it has come
 * @param submittedBy who submitted it, or null
 * @param posting the posting that it became, or null
 * @param fingerprint what it said once it was posted, or null
 * @param text what is written in it
 */
public record Draft(
        int id,
        int enclosure,
        String author,
        Instant begunAt,
        Instant savedAt,
        int revision,
        int base,
        Steps steps,
        DraftState state,
        @Nullable String submittedBy,
        @Nullable Integer posting,
        @Nullable String fingerprint,
        DraftText text) {

    /**
     * A place in a history.
     *
     * @param oldest the oldest version that is kept
     * @param at the version that stands
     * @param newest the newest, above the one that stands where something was undone
     */
    public record Steps(int oldest, int at, int newest) {

        /** A history that begins. */
        static final Steps FIRST = new Steps(1, 1, 1);

        /** Refuses a place outside of the history. */
        public Steps {
            if (oldest < 1 || at < oldest || newest < at) {
                throw new IllegalArgumentException("no history: " + oldest + " " + at + " " + newest);
            }
        }
    }

    /** Whether there is something to undo. */
    public boolean canUndo() {
        return state == DraftState.WRITING && steps.at > steps.oldest;
    }

    /** Whether there is something to redo. */
    public boolean canRedo() {
        return state == DraftState.WRITING && steps.at < steps.newest;
    }
}
