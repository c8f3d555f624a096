package spanwright.incident;

import java.time.Instant;
import java.time.temporal.ChronoUnit;

/**
 * An incident as a person opens it.
 *
 * @param title what it is called
 * @param by who opens it
 * @param beganAt when service was lost, as far as is known
 * @param start what it is opened from
 */
public record IncidentDraft(String title, String by, Instant beganAt, IncidentStart start) {

    /** Keeps whole microseconds, as every book does. */
    public IncidentDraft {
        beganAt = beganAt.truncatedTo(ChronoUnit.MICROS);
    }
}
