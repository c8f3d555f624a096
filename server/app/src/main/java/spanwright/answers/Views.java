package spanwright.answers;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Unanswerable.Kind;
import spanwright.network.Ledger;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/** Gives the view that a question asks for: now, as of a past posting, as if a planned job were built. Any thread's. */
public final class Views {

    private static final Pattern POSTING = Pattern.compile("[0-9]{1,9}");
    private static final int KEPT = 4;

    private final Ledger ledger;
    private final Deque<Built> built = new ArrayDeque<>();

    /** The views of a ledger. */
    public Views(Ledger ledger) {
        this.ledger = ledger;
    }

    /** The ledger. */
    public Ledger ledger() {
        return ledger;
    }

    /** The records as they are now. */
    public View now() {
        return new View(ledger.current(), null);
    }

    /**
     * The records as asked for.
     *
     * @param asOf a posting's number or a time, or null for now
     * @param asIf a job whose planned joints are taken as built, or null
     */
    public View of(@Nullable String asOf, @Nullable String asIf) {
        Snapshot snapshot = asOf == null ? ledger.current() : asOf(asOf.strip());
        LocalDate day = asOf == null ? null : day(snapshot);
        return new View(asIf == null ? snapshot : asIf(snapshot, asIf), asIf, day);
    }

    /** The day of the last posting in a past state. */
    private @Nullable LocalDate day(Snapshot past) {
        return ledger.findPosting(past.records().posting())
                .map(posting -> posting.at().atZone(View.zone(past.records())).toLocalDate())
                .orElse(null);
    }

    private Snapshot asOf(String asked) {
        Snapshot now = ledger.current();
        if (!POSTING.matcher(asked).matches()) {
            return ledger.asOf(instant(asked, View.zone(now.records())));
        }
        int posting = Integer.parseInt(asked);
        int last = now.records().posting();
        if (posting > last) {
            throw new Unanswerable(
                    Kind.BAD_REFERENCE, "There is no posting " + posting + "; the last is " + last + ".", "as_of");
        }
        return posting == last ? now : ledger.asOf(posting);
    }

    /** Reads a time; a date lasts through that day. */
    private static Instant instant(String text, ZoneId zone) {
        try {
            if (text.indexOf('T') < 0) {
                return LocalDate.parse(text)
                        .plusDays(1)
                        .atStartOfDay(zone)
                        .toInstant()
                        .minusNanos(1);
            }
            boolean offset = text.endsWith("Z") || text.lastIndexOf('+') > 0 || text.lastIndexOf('-') > 7;
            return offset
                    ? OffsetDateTime.parse(text).toInstant()
                    : LocalDateTime.parse(text).atZone(zone).toInstant();
        } catch (DateTimeException notATime) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    "'" + text + "' is neither a posting's number nor a time such as 2026-03-31T14:05-05:00"
                            + " or 2026-03-31.",
                    "as_of");
        }
    }

    private Snapshot asIf(Snapshot snapshot, String job) {
        if (snapshot.records().plannedJoints(job).isEmpty()) {
            throw new Unanswerable(
                    Kind.BAD_REFERENCE,
                    "No planned joint belongs to the job " + job + "."
                            + NearMiss.hint(job, snapshot.records().plannedJobs().stream()),
                    "as_if");
        }
        synchronized (built) {
            for (Built each : built) {
                if (each.from == snapshot && each.job.equals(job)) {
                    return each.to;
                }
            }
        }
        SnapshotEditor editor = snapshot.edit();
        editor.build(job);
        Snapshot to = editor.build(snapshot.records().posting());
        synchronized (built) {
            built.addFirst(new Built(snapshot, job, to));
            if (built.size() > KEPT) {
                built.removeLast();
            }
        }
        return to;
    }

    /** A job built before. */
    private record Built(Snapshot from, String job, Snapshot to) {}
}
