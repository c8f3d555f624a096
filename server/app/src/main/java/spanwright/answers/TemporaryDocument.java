package spanwright.answers;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import spanwright.journal.RecordKind;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.SpliceMethod;

/** Every joint that is meant for a while only, listed until it is undone; the one longest past its day first. */
public final class TemporaryDocument {

    private final View view;
    private final Changes changes;
    private final LocalDate today;

    /**
     * Of a view.
     *
     * @param changes by which postings its records were changed
     * @param today from when days are counted
     */
    public TemporaryDocument(View view, Changes changes, LocalDate today) {
        this.view = view;
        this.changes = changes;
        this.today = today;
    }

    /** Writes the list. */
    public void write(Json json) {
        List<Joint> joints = view.records()
                .joints()
                .list()
                .filter(joint -> !joint.planned() && joint.facts().temporaryUntil() != null)
                .sorted(Comparator.comparing(TemporaryDocument::until)
                        .thenComparing(joint -> view.enclosure(joint.enclosure()))
                        .thenComparing(Joint::id))
                .toList();
        json.date("today", today).list("temporary", joints, this::joint);
    }

    private static LocalDate until(Joint joint) {
        return Objects.requireNonNull(joint.facts().temporaryUntil());
    }

    private void joint(Json json, Joint joint) {
        JointFacts facts = joint.facts();
        SpliceMethod method = facts.method();
        long days = ChronoUnit.DAYS.between(today, until(joint));
        json.text("enclosure", view.enclosure(joint.enclosure()));
        json.text("a", view.names().ends(joint.a())).text("b", view.names().ends(joint.b()));
        json.whole("count", joint.count()).text("method", method == null ? null : method.word());
        json.date("until", until(joint)).whole("days_left", days).flag("lapsed", days < 0);
        json.text("job", facts.job());
        json.date("spliced_on", facts.splicedOn()).text("spliced_by", facts.splicedBy());
        changes.write(json, "changed", RecordKind.JOINT, joint.id());
    }
}
