package spanwright.journal;

import java.time.Instant;

/**
 * The head of one posting; its changes are kept beside it.
 *
 * @param number 1, 2, 3 ... in the order posted
 * @param at when it became durable, never before the posting before it
 * @param by the person, not blank
 * @param reason why, not blank
 * @param changes how many changes it holds
 */
public record Posting(int number, Instant at, String by, String reason, int changes) {

    /** Refuses a posting without a number, a person or a reason. */
    public Posting {
        if (number < 1 || by.isBlank() || reason.isBlank() || changes < 0) {
            throw new IllegalArgumentException("not a posting: " + number + " by '" + by + "' for '" + reason + "'");
        }
    }
}
