package spanwright.incident;

import java.math.BigDecimal;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.records.RecordsView;

/**
 * What an incident counts to at a moment. A circuit's minutes run from when its path went down until it is back; users
 * are the customers of the services that are down, as the records had them when the incident was opened.
 */
public final class IncidentCounts {

    /**
     * How it stood from a moment on.
     *
     * @param from the moment
     * @param circuitsDown circuits whose path is down
     * @param customersDown customers of the services that are down
     * @param single protection groups on a single path
     */
    public record Standing(Instant from, int circuitsDown, int customersDown, List<String> single) {

        /** Keeps its own copy. */
        public Standing {
            single = List.copyOf(single);
        }
    }

    private final Instant at;
    private final DownTimes times;
    private final List<Standing> standings = new ArrayList<>();
    private final Accrual outage = new Accrual();
    private final Accrual customers = new Accrual();
    private final Accrual circuits = new Accrual();
    private final Map<String, Accrual> singlePaths = new TreeMap<>();
    private final ServicesDown services;
    private final @Nullable Accrual statedUsers;
    private final @Nullable Accrual oc3;

    private IncidentCounts(IncidentLog log, RecordsView frozen, Instant at) {
        this.at = at;
        this.times = DownTimes.of(log);
        this.services = new ServicesDown(frozen, times.ever());
        times.moments().forEach(this::count);
        this.statedUsers = stated(log, said -> said.users() == null ? null : BigDecimal.valueOf(said.users()));
        this.oc3 = stated(log, EntryDraft::oc3);
    }

    /**
     * Counts.
     *
     * @param frozen the records as they stood when the incident was opened
     * @param at when
     */
    public static IncidentCounts of(IncidentLog log, RecordsView frozen, Instant at) {
        return new IncidentCounts(log, frozen, at);
    }

    private void count(DownTimes.Moment moment) {
        Set<String> down = moment.down();
        int customersDown = services.customers(down);
        List<String> single = services.single(down);
        standings.add(new Standing(moment.from(), down.size(), customersDown, single));
        outage.then(moment.from(), services.any(down) ? BigDecimal.ONE : BigDecimal.ZERO);
        customers.then(moment.from(), BigDecimal.valueOf(customersDown));
        circuits.then(moment.from(), BigDecimal.valueOf(down.size()));
        single.forEach(group -> singlePaths.computeIfAbsent(group, none -> new Accrual()));
        singlePaths.forEach(
                (group, path) -> path.then(moment.from(), single.contains(group) ? BigDecimal.ONE : BigDecimal.ZERO));
    }

    /** One value that a log states. */
    @FunctionalInterface
    private interface Value {
        @Nullable
        BigDecimal of(EntryDraft said);
    }

    /** What a person states holds until it is stated anew, or everything is back; null where nobody states it. */
    private @Nullable Accrual stated(IncidentLog log, Value value) {
        Accrual accrual = new Accrual();
        Instant back = times.allBack().orElse(Instant.MAX);
        boolean any = false;
        for (EntryDraft said : log.happened().toList()) {
            BigDecimal number = said.kind() == EntryKind.STATED ? value.of(said) : null;
            if (number != null && said.happenedAt().isBefore(back)) {
                accrual.then(any ? said.happenedAt() : log.incident().beganAt(), number);
                any = true;
            }
        }
        if (any && !back.equals(Instant.MAX)) {
            accrual.then(back, BigDecimal.ZERO);
        }
        return any ? accrual : null;
    }

    /** When it was counted. */
    public Instant at() {
        return at;
    }

    /** How it stood from the beginning on, whenever something changed up to then. */
    public List<Standing> standings() {
        return standings.stream().filter(each -> !each.from().isAfter(at)).toList();
    }

    /** Circuits whose path is down. */
    public Set<String> down() {
        Set<String> down = new TreeSet<>();
        for (DownTimes.Moment moment : times.moments()) {
            if (!moment.from().isAfter(at)) {
                down = moment.down();
            }
        }
        return down;
    }

    /** Circuits that were down and are back. */
    public Set<String> back() {
        Set<String> back = new TreeSet<>();
        times.moments().stream().filter(moment -> !moment.from().isAfter(at)).forEach(each -> back.addAll(each.down()));
        back.removeAll(down());
        return back;
    }

    /** Circuits of first priority whose service is down. */
    public List<String> firstPriorityDown() {
        return services.firstPriority(down());
    }

    /** How long at least one service has been down, in minutes. */
    public Accrual outage() {
        return outage;
    }

    /** Minutes of customers of services that are down. */
    public Accrual customerMinutes() {
        return customers;
    }

    /** Minutes of circuits whose path is down. */
    public Accrual circuitMinutes() {
        return circuits;
    }

    /** Minutes of the users whom a person states to be down, if one does. */
    public Optional<Accrual> statedUserMinutes() {
        return Optional.ofNullable(statedUsers);
    }

    /** Minutes of the capacity that a person states to be down, in OC3 equivalents, if one does. */
    public Optional<Accrual> oc3Minutes() {
        return Optional.ofNullable(oc3);
    }

    /** Minutes that each protection group has run on a single path. */
    public Map<String, Accrual> singlePaths() {
        return Map.copyOf(singlePaths);
    }

    /** Minutes that a protection group has run on a single path; none where it never did. */
    public Accrual singlePath(String group) {
        return singlePaths.getOrDefault(group, new Accrual());
    }
}
