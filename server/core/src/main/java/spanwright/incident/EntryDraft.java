package spanwright.incident;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * An entry as a person writes it.
 *
 * @param kind what it tells
 * @param happenedAt when that happened
 * @param by who writes
 * @param text in words, or null
 * @param circuits the circuits that it names; none but where its kind names circuits
 * @param users users down that a person states, or null
 * @param oc3 capacity down that a person states, in OC3 equivalents, or null
 * @param corrects the number of the entry in whose place it stands, or null
 */
public record EntryDraft(
        EntryKind kind,
        Instant happenedAt,
        String by,
        @Nullable String text,
        List<String> circuits,
        @Nullable Integer users,
        @Nullable BigDecimal oc3,
        @Nullable Integer corrects) {

    /** Keeps its own copy of the list, and whole microseconds, as every book does. */
    public EntryDraft {
        happenedAt = happenedAt.truncatedTo(ChronoUnit.MICROS);
        circuits = List.copyOf(circuits);
    }

    /** An entry that tells when something happened, and no more. */
    public static EntryDraft of(EntryKind kind, Instant happenedAt, String by) {
        return new EntryDraft(kind, happenedAt, by, null, List.of(), null, null, null);
    }

    /** The same in other words. */
    public EntryDraft saying(String words) {
        return new EntryDraft(kind, happenedAt, by, words, circuits, users, oc3, corrects);
    }

    /** The same about these circuits. */
    public EntryDraft about(String... codes) {
        return new EntryDraft(kind, happenedAt, by, text, List.of(codes), users, oc3, corrects);
    }

    /** The same, stating what is down. */
    public EntryDraft stating(@Nullable Integer usersDown, @Nullable BigDecimal oc3Down) {
        return new EntryDraft(kind, happenedAt, by, text, circuits, usersDown, oc3Down, corrects);
    }

    /** The same in the place of an earlier entry. */
    public EntryDraft inPlaceOf(int earlier) {
        return new EntryDraft(kind, happenedAt, by, text, circuits, users, oc3, earlier);
    }
}
