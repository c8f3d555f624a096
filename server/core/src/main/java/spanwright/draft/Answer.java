package spanwright.draft;

/**
 * Why a warning is let stand, or what a prompt was answered with.
 *
 * @param rule the rule that found it
 * @param line the text of the line it was found in, blank where it is about the sheet; so an answer goes where its line
 *     goes, and holds no longer once the line says something else
 * @param reason the answer, not blank
 */
public record Answer(String rule, String line, String reason) {

    /** Refuses what cannot be kept a line an answer. */
    public Answer {
        if (rule.isBlank() || reason.isBlank()) {
            throw new IllegalArgumentException("an answer has a rule and a reason");
        }
    }
}
