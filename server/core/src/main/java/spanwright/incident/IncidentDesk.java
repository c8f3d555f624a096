package spanwright.incident;

import java.time.Clock;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.network.Ledger;
import spanwright.records.Records;
import spanwright.records.Refusal;

/** Opens, follows and closes incidents, with the records beside the book. Any number of threads may use it. */
public final class IncidentDesk {

    private static final Pattern CUT = Pattern.compile("(span|structure|cable|enclosure|tube|place):\\S+");

    private final Ledger ledger;
    private final IncidentBook book;
    private final Clock clock;

    /** A desk over the records and the book. */
    public IncidentDesk(Ledger ledger, IncidentBook book, Clock clock) {
        this.ledger = ledger;
        this.book = book;
        this.clock = clock;
    }

    /** What time it is. */
    public Instant now() {
        return clock.instant();
    }

    /** All logs: of open incidents first, of each kind that which began last first. */
    public List<IncidentLog> list() {
        return book.list().stream()
                .map(incident -> new IncidentLog(incident, book.entries(incident.id())))
                .sorted(Comparator.comparing((IncidentLog log) -> !log.isOpen())
                        .thenComparing(log -> log.incident().beganAt(), Comparator.reverseOrder())
                        .thenComparing(log -> log.incident().id(), Comparator.reverseOrder()))
                .toList();
    }

    /**
     * The log of an incident.
     *
     * @throws NoSuchElementException where there is none of that id
     */
    public IncidentLog log(int id) {
        Incident incident =
                book.find(id).orElseThrow(() -> new NoSuchElementException("There is no incident " + id + "."));
        return new IncidentLog(incident, book.entries(id));
    }

    /** The records as they stood when an incident was opened. */
    public Records frozen(Incident incident) {
        return ledger.asOf(incident.posting()).records();
    }

    /** Opens an incident on the records as they stand now. */
    public Written<Incident> open(IncidentDraft draft) {
        Records records = ledger.current().records();
        List<Refusal> refusals = new ArrayList<>();
        if (records.posting() == 0) {
            refusals.add(refusal("incident-without-records", null, "There are no records yet: load them first."));
        }
        askCircuits(records, draft.start().down(), "down", refusals);
        askCircuits(records, draft.start().up(), "up", refusals);
        askBoth(draft.start(), refusals);
        draft.start().cuts().stream()
                .filter(cut -> !CUT.matcher(cut).matches())
                .forEach(cut -> refusals.add(refusal(
                        "cut-unreadable",
                        "cuts",
                        "'" + cut + "' is not a cut: write span:, structure:, cable:, enclosure:, tube: or place:"
                                + " before its code.")));
        return refusals.isEmpty() ? book.open(draft, records.posting()) : new Written.Refused<>(refusals);
    }

    /**
     * Writes an entry.
     *
     * @throws NoSuchElementException where there is no such incident
     */
    public Written<IncidentEntry> write(int id, EntryDraft draft) {
        List<Refusal> refusals = new ArrayList<>();
        if (draft.kind() == EntryKind.CIRCUITS_DOWN) {
            askCircuits(frozen(log(id).incident()), draft.circuits(), "circuits", refusals);
        }
        return refusals.isEmpty() ? book.write(id, draft) : new Written.Refused<>(refusals);
    }

    private static void askCircuits(Records records, Collection<String> codes, String column, List<Refusal> refusals) {
        Set<String> unknown = new TreeSet<>();
        codes.stream().filter(code -> records.circuits().find(code).isEmpty()).forEach(unknown::add);
        if (!unknown.isEmpty()) {
            refusals.add(refusal(
                    "circuit-unknown",
                    column,
                    "The records hold no such circuit: " + String.join(", ", unknown) + "."));
        }
    }

    private static void askBoth(IncidentStart start, List<Refusal> refusals) {
        Set<String> both = new TreeSet<>(start.down());
        both.retainAll(start.up());
        if (!both.isEmpty()) {
            refusals.add(refusal(
                    "circuit-down-and-up", "up", "Down and up at once: " + String.join(", ", both) + "; keep one."));
        }
    }

    private static Refusal refusal(String code, @Nullable String column, String sentence) {
        return new Refusal(code, sentence, column, null, null);
    }
}
