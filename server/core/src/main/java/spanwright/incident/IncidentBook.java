package spanwright.incident;

import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;

/** Where incidents and their logs are kept. Any number of threads may use it; what it has kept it never loses. */
public interface IncidentBook {

    /** All incidents, the last opened first. */
    List<Incident> list();

    /** An incident, if there is one of that id. */
    Optional<Incident> find(int id);

    /**
     * The log of an incident, in the order written.
     *
     * @throws NoSuchElementException where there is no such incident
     */
    List<IncidentEntry> entries(int incident);

    /**
     * Opens an incident, and returns once it is durable.
     *
     * @param posting the last posting of the records as they stand
     */
    Written<Incident> open(IncidentDraft draft, int posting);

    /**
     * Writes an entry, judged by {@link IncidentRules} alone with the log, and returns once it is durable.
     *
     * @throws NoSuchElementException where there is no such incident
     */
    Written<IncidentEntry> write(int incident, EntryDraft draft);
}
