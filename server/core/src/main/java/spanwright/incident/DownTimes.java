package spanwright.incident;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;

/** Which circuits' paths were down when, as an incident's log tells it: sets that hold from one moment to the next. */
final class DownTimes {

    /**
     * From a moment on.
     *
     * @param from the moment
     * @param down the circuits whose path is down, by code
     */
    record Moment(Instant from, SortedSet<String> down) {}

    private final List<Moment> moments = new ArrayList<>();

    private DownTimes(Incident incident) {
        moments.add(
                new Moment(incident.beganAt(), new TreeSet<>(incident.start().down())));
    }

    static DownTimes of(IncidentLog log) {
        DownTimes times = new DownTimes(log.incident());
        log.happened().forEach(times::follow);
        return times;
    }

    private void follow(EntryDraft said) {
        SortedSet<String> now = new TreeSet<>(last().down());
        boolean changed = switch (said.kind()) {
            case CIRCUITS_DOWN -> now.addAll(said.circuits());
            case CIRCUITS_BACK -> now.removeAll(said.circuits());
            case ALL_LIGHT -> now.retainAll(List.of());
            default -> false;
        };
        if (changed) {
            add(later(said.happenedAt(), last().from()), now);
        }
    }

    /** What is said to have happened before the outage began counts from its beginning. */
    private static Instant later(Instant one, Instant other) {
        return one.isAfter(other) ? one : other;
    }

    private void add(Instant from, SortedSet<String> down) {
        if (last().from().equals(from)) {
            moments.remove(moments.size() - 1);
        }
        moments.add(new Moment(from, down));
    }

    /** Every moment at which something changed, the beginning first. */
    List<Moment> moments() {
        return List.copyOf(moments);
    }

    /** How it stands after all that was written. */
    Moment last() {
        return moments.get(moments.size() - 1);
    }

    /** Since when nothing is down, if something ever was and nothing is. */
    Optional<Instant> allBack() {
        return moments.size() > 1 && last().down().isEmpty() ? Optional.of(last().from()) : Optional.empty();
    }

    /** Every circuit that was ever down. */
    SortedSet<String> ever() {
        SortedSet<String> all = new TreeSet<>();
        moments.forEach(moment -> all.addAll(moment.down()));
        return all;
    }
}
