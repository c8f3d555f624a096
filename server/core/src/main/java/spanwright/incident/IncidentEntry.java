package spanwright.incident;

import java.time.Instant;

/**
 * One entry of an incident's log. It stays as it was written.
 *
 * @param incident the incident's id
 * @param number 1, 2, 3 ... in the order written
 * @param writtenAt when it was written
 * @param said what was written
 */
public record IncidentEntry(int incident, int number, Instant writtenAt, EntryDraft said) {

    /** Refuses an entry that corrects itself or a later one. */
    public IncidentEntry {
        Integer corrects = said.corrects();
        if (incident < 1 || number < 1 || (corrects != null && corrects >= number)) {
            throw new IllegalArgumentException("not an entry: " + incident + "/" + number);
        }
    }
}
