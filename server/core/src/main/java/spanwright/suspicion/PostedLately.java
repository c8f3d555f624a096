package spanwright.suspicion;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.journal.Recorded;
import spanwright.network.Ledger;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/**
 * The enclosures where postings of the last days made, made anew or undid splices without a day of their own: somebody was
 * there not long before. A posting at more enclosures than a crew opens in a night is a plant being loaded and says nothing.
 */
public final class PostedLately {

    /** Enclosures that one job opens, at the most. */
    static final int ENCLOSURES_A_JOB = 12;
    /** Changes of a posting beyond which it is not read: a sheet of 864 fibers joined singly comes to fewer. */
    static final int CHANGES_A_JOB = 5_000;
    /** Postings looked back over, so that an answer waits for no more than these. */
    static final int POSTINGS = 1_000;

    private PostedLately() {}

    /**
     * The day of the last such posting, by the identity of the enclosure.
     *
     * @param upTo the last posting that the question takes in
     * @param today the day for which it is asked
     * @param zone the records' own
     */
    public static Map<Integer, LocalDate> of(Ledger ledger, int upTo, LocalDate today, ZoneId zone) {
        Map<Integer, LocalDate> found = new HashMap<>();
        for (Posting posting : ledger.postings(upTo + 1, POSTINGS)) {
            LocalDate day = posting.at().atZone(zone).toLocalDate();
            if (day.isBefore(today.minusDays(Likelihood.LATELY))) {
                break;
            }
            if (posting.changes() <= CHANGES_A_JOB) {
                opened(ledger.changesOf(posting.number()), day)
                        .forEach(enclosure -> found.merge(enclosure, day, PostedLately::later));
            }
        }
        return found;
    }

    private static LocalDate later(LocalDate one, LocalDate other) {
        return one.isAfter(other) ? one : other;
    }

    /** The enclosures that a posting tells of: none where they are more than a job's. */
    private static Set<Integer> opened(List<Change> changes, LocalDate day) {
        Set<Made> before = new HashSet<>();
        Set<Made> after = new HashSet<>();
        for (Change change : changes) {
            Joint was = splice(change.before());
            Joint is = splice(change.after());
            if (was == null || is == null || !onlyCarried(was, is)) {
                add(was, before);
                add(is, after);
            }
        }
        Set<Made> kept = new HashSet<>(before);
        kept.retainAll(after);
        before.removeAll(kept);
        after.removeAll(kept);
        return told(before, after, day);
    }

    private static Set<Integer> told(Set<Made> undone, Set<Made> made, LocalDate day) {
        Set<Integer> undated = new HashSet<>();
        Set<Integer> worked = new HashSet<>();
        undone.forEach(each -> undated.add(each.enclosure));
        made.forEach(each -> {
            worked.add(each.enclosure);
            undated.remove(each.enclosure);
        });
        worked.addAll(undated);
        made.stream().filter(each -> each.undated(day)).forEach(each -> undated.add(each.enclosure));
        return worked.size() > ENCLOSURES_A_JOB ? Set.of() : undated;
    }

    private static @Nullable Joint splice(@Nullable Recorded record) {
        return record instanceof Joint joint && joint.type() == JointKind.SPLICE && !joint.planned() ? joint : null;
    }

    /** Joints that follow their cable to another record of it, or are seen or measured only, were not touched. */
    private static boolean onlyCarried(Joint was, Joint is) {
        return was.a().numbers().equals(is.a().numbers())
                && was.b().numbers().equals(is.b().numbers())
                && Objects.equals(was.facts().splicedOn(), is.facts().splicedOn())
                && Objects.equals(was.facts().splicedBy(), is.facts().splicedBy())
                && was.facts().method() == is.facts().method();
    }

    private static void add(@Nullable Joint joint, Set<Made> to) {
        for (int index = 0; joint != null && index < joint.count(); index++) {
            long a = joint.a().key(index);
            long b = joint.b().key(index);
            JointFacts facts = joint.facts();
            to.add(new Made(
                    joint.enclosure(),
                    Math.min(a, b),
                    Math.max(a, b),
                    facts.splicedOn(),
                    facts.splicedBy(),
                    facts.method()));
        }
    }

    /** One splice of two ends, as it was made; so a row that is only parted into several is the same as before. */
    private record Made(
            int enclosure,
            long one,
            long other,
            @Nullable LocalDate on,
            @Nullable String by,
            @Nullable SpliceMethod method) {

        /** Without a day, or with one that was still to come when it was posted. */
        boolean undated(LocalDate posted) {
            return on == null || on.isAfter(posted);
        }
    }
}
