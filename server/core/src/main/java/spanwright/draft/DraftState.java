package spanwright.draft;

import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;

/** How far a draft has come. */
public enum DraftState {
    /** It is being written. */
    WRITING,
    /** It waits for another person to post it. */
    SUBMITTED,
    /** It is in the records. */
    POSTED,
    /** It was given up; its text is kept. */
    DROPPED;

    /** As an answer writes it. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** The one written so, if any. */
    public static Optional<DraftState> find(String word) {
        return Arrays.stream(values())
                .filter(state -> state.word().equals(word))
                .findFirst();
    }

    /** Whether something may still come of it. */
    public boolean open() {
        return this == WRITING || this == SUBMITTED;
    }
}
