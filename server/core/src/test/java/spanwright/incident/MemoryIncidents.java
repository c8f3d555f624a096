package spanwright.incident;

import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import spanwright.records.Refusal;

/** An incident book that forgets all at its end: the plain twin of the real one, for tests. */
public final class MemoryIncidents implements IncidentBook {

    private final Clock clock;
    private final List<Incident> incidents = new ArrayList<>();
    private final List<List<IncidentEntry>> logs = new ArrayList<>();

    /** An empty book at the time of a clock. */
    public MemoryIncidents(Clock clock) {
        this.clock = clock;
    }

    @Override
    public synchronized List<Incident> list() {
        List<Incident> list = new ArrayList<>(incidents);
        Collections.reverse(list);
        return list;
    }

    @Override
    public synchronized Optional<Incident> find(int id) {
        return id < 1 || id > incidents.size() ? Optional.empty() : Optional.of(incidents.get(id - 1));
    }

    private Incident get(int id) {
        return find(id).orElseThrow(() -> new NoSuchElementException("There is no incident " + id + "."));
    }

    @Override
    public synchronized List<IncidentEntry> entries(int incident) {
        return List.copyOf(logs.get(get(incident).id() - 1));
    }

    @Override
    public synchronized Written<Incident> open(IncidentDraft draft, int posting) {
        List<Refusal> refusals = IncidentRules.refuse(draft, now());
        if (!refusals.isEmpty()) {
            return new Written.Refused<>(refusals);
        }
        Incident incident = new Incident(
                incidents.size() + 1, draft.title(), draft.beganAt(), now(), draft.by(), draft.start(), posting);
        incidents.add(incident);
        logs.add(new ArrayList<>());
        return new Written.Kept<>(incident);
    }

    @Override
    public synchronized Written<IncidentEntry> write(int id, EntryDraft draft) {
        IncidentLog log = new IncidentLog(get(id), entries(id));
        List<Refusal> refusals = IncidentRules.refuse(log, draft, now());
        if (!refusals.isEmpty()) {
            return new Written.Refused<>(refusals);
        }
        IncidentEntry entry = new IncidentEntry(id, log.entries().size() + 1, now(), draft);
        logs.get(id - 1).add(entry);
        return new Written.Kept<>(entry);
    }

    private Instant now() {
        return clock.instant().truncatedTo(ChronoUnit.MICROS);
    }
}
