package spanwright.incident;

import java.time.Instant;
import java.util.Comparator;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;

/**
 * The clock of an incident: when each thing happened first; null what has not happened, or nobody has written.
 *
 * @param began when service was lost
 * @param called when somebody was told
 * @param onSite when a crew was there
 * @param found when the damage was found
 * @param firstLight when the first circuit had light again
 * @param allLight since when nothing is down any more
 * @param closed when the incident was closed; null while it is open
 */
public record IncidentClock(
        Instant began,
        @Nullable Instant called,
        @Nullable Instant onSite,
        @Nullable Instant found,
        @Nullable Instant firstLight,
        @Nullable Instant allLight,
        @Nullable Instant closed) {

    /** The clock that a log keeps. */
    public static IncidentClock of(IncidentLog log) {
        DownTimes down = DownTimes.of(log);
        return new IncidentClock(
                log.incident().beganAt(),
                log.first(EntryKind.CALLED).orElse(null),
                log.first(EntryKind.ON_SITE).orElse(null),
                log.first(EntryKind.FOUND).orElse(null),
                firstLight(log).orElse(null),
                allLight(log, down).orElse(null),
                log.closedAt().orElse(null));
    }

    /** Light that came back is light, whether or not somebody wrote that it was the first. */
    private static Optional<Instant> firstLight(IncidentLog log) {
        return Stream.of(EntryKind.FIRST_LIGHT, EntryKind.CIRCUITS_BACK, EntryKind.ALL_LIGHT)
                .flatMap(kind -> log.first(kind).stream())
                .min(Comparator.naturalOrder());
    }

    private static Optional<Instant> allLight(IncidentLog log, DownTimes down) {
        Optional<Instant> said = log.happened()
                .filter(entry -> entry.kind() == EntryKind.ALL_LIGHT)
                .reduce((before, after) -> after)
                .map(EntryDraft::happenedAt);
        return down.last().down().isEmpty() ? down.allBack().or(() -> said) : Optional.empty();
    }

    /** When the outage counts as discovered: when somebody was told, else when it was entered. */
    static Instant discovered(IncidentLog log) {
        return log.first(EntryKind.CALLED).orElse(log.incident().openedAt());
    }
}
