package spanwright.incident;

import java.time.Instant;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;

/** An incident's log as it is to be read: what was corrected no longer counts, but is still there to be seen. */
public final class IncidentLog {

    private final Incident incident;
    private final List<IncidentEntry> entries;
    private final Map<Integer, Integer> correctedBy = new HashMap<>();

    /**
     * A log.
     *
     * @param entries in the order written
     */
    public IncidentLog(Incident incident, List<IncidentEntry> entries) {
        this.incident = incident;
        this.entries = List.copyOf(entries);
        for (IncidentEntry entry : entries) {
            Integer corrects = entry.said().corrects();
            if (corrects != null) {
                correctedBy.put(corrects, entry.number());
            }
        }
    }

    /** Whose log it is. */
    public Incident incident() {
        return incident;
    }

    /** Every entry, in the order written. */
    public List<IncidentEntry> entries() {
        return entries;
    }

    /** The entry that stands in the place of another, if there is one. */
    public Optional<Integer> correctedBy(int number) {
        return Optional.ofNullable(correctedBy.get(number));
    }

    /** What counts, in the order written. */
    public Stream<EntryDraft> standing() {
        return entries.stream()
                .filter(entry -> !correctedBy.containsKey(entry.number()))
                .map(IncidentEntry::said);
    }

    /** What counts, in the order in which it happened; what happened at once in the order written. */
    Stream<EntryDraft> happened() {
        return standing().sorted(Comparator.comparing(EntryDraft::happenedAt));
    }

    /** When something of a kind first happened. */
    Optional<Instant> first(EntryKind kind) {
        return standing()
                .filter(said -> said.kind() == kind)
                .map(EntryDraft::happenedAt)
                .min(Comparator.naturalOrder());
    }

    /** The last of the entries that close or reopen it, if it was ever closed. */
    private Optional<EntryDraft> lastTurn() {
        return standing()
                .filter(said -> said.kind() == EntryKind.CLOSED || said.kind() == EntryKind.REOPENED)
                .reduce((before, after) -> after);
    }

    /** Whether it is open. */
    public boolean isOpen() {
        return closedAt().isEmpty();
    }

    /** When it was closed, if it is. */
    public Optional<Instant> closedAt() {
        return lastTurn().filter(said -> said.kind() == EntryKind.CLOSED).map(EntryDraft::happenedAt);
    }
}
