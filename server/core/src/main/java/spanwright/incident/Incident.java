package spanwright.incident;

import java.time.Instant;

/**
 * The head of an incident; its log is kept beside it.
 *
 * @param id 1, 2, 3 ... in the order opened
 * @param title what it is called, not blank
 * @param beganAt when service was lost, as far as is known
 * @param openedAt when it was entered
 * @param by who opened it, not blank
 * @param start what it was opened from
 * @param posting the last posting that the records held when it was opened: as of it they are frozen for the incident
 */
public record Incident(
        int id, String title, Instant beganAt, Instant openedAt, String by, IncidentStart start, int posting) {

    /** Refuses what cannot be an incident. */
    public Incident {
        if (id < 1 || title.isBlank() || by.isBlank() || posting < 1 || beganAt.isAfter(openedAt)) {
            throw new IllegalArgumentException("not an incident: " + id + " '" + title + "' by '" + by + "'");
        }
    }
}
