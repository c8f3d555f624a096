package spanwright.incident;

import java.math.BigDecimal;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.records.Refusal;

/** What may be written into an incident book, the same for every book. */
public final class IncidentRules {

    private final List<Refusal> refusals = new ArrayList<>();

    private IncidentRules() {}

    /** Why an incident cannot be opened; empty where it can. */
    public static List<Refusal> refuse(IncidentDraft draft, Instant now) {
        IncidentRules rules = new IncidentRules();
        rules.askWriter(draft.by());
        rules.askTime(draft.beganAt(), now, "began_at");
        if (draft.title().isBlank()) {
            rules.add("incident-without-title", "title", "An incident has a title: say what it is called.");
        }
        if (draft.start().isBlank()) {
            rules.add(
                    "incident-from-nothing",
                    null,
                    "An incident is opened from a place, a list or a reading: give cuts, down, up or reading.");
        }
        return rules.refusals;
    }

    /** Why an entry cannot be written into a log; empty where it can. */
    public static List<Refusal> refuse(IncidentLog log, EntryDraft draft, Instant now) {
        IncidentRules rules = new IncidentRules();
        rules.askWriter(draft.by());
        rules.askTime(draft.happenedAt(), now, "at");
        rules.askContent(draft);
        rules.askCorrection(log, draft);
        if (rules.refusals.isEmpty()) {
            rules.askWhole(log, draft, now);
        }
        return rules.refusals;
    }

    private void add(String code, @Nullable String column, String sentence) {
        refusals.add(new Refusal(code, sentence, column, null, null));
    }

    private void askWriter(String by) {
        if (by.isBlank()) {
            add("entry-by-nobody", "by", "Every entry is written by a person: say who writes.");
        }
    }

    private void askTime(Instant at, Instant now, String column) {
        if (at.isAfter(now)) {
            add(
                    "entry-in-future",
                    column,
                    "An entry tells what has happened: " + at + " is yet to come, it is " + now + ".");
        }
    }

    private void askContent(EntryDraft draft) {
        String kind = draft.kind().word();
        String text = draft.text();
        if (draft.kind().needsText() && (text == null || text.isBlank())) {
            add("entry-without-text", "text", "An entry " + kind + " has a text: say what there is to say.");
        }
        if (draft.kind().namesCircuits() == draft.circuits().isEmpty()) {
            String right = draft.circuits().isEmpty() ? " names the circuits." : " names no circuits.";
            add("entry-circuits", "circuits", "An entry " + kind + right);
        }
        askStated(draft);
    }

    private void askStated(EntryDraft draft) {
        Integer users = draft.users();
        BigDecimal oc3 = draft.oc3();
        boolean states = users != null || oc3 != null;
        if (states != (draft.kind() == EntryKind.STATED)) {
            add(
                    "entry-stated",
                    null,
                    "Users and oc3 are given in an entry stated, one of them at least, and in no other.");
        } else if ((users != null && users < 0) || (oc3 != null && oc3.signum() < 0)) {
            add("entry-stated", null, "Users and oc3 are 0 or above.");
        }
    }

    private void askCorrection(IncidentLog log, EntryDraft draft) {
        Integer corrects = draft.corrects();
        if (corrects == null) {
            return;
        }
        if (corrects < 1 || corrects > log.entries().size()) {
            add("entry-corrects-none", "corrects", "There is no entry " + corrects + " to correct.");
        } else {
            log.correctedBy(corrects)
                    .ifPresent(by -> add(
                            "entry-corrected-already",
                            "corrects",
                            "Entry " + corrects + " was corrected by entry " + by + ": correct that one."));
        }
    }

    /** Asks about the log as it would be with the entry. */
    private void askWhole(IncidentLog log, EntryDraft draft, Instant now) {
        List<IncidentEntry> entries = new ArrayList<>(log.entries());
        entries.add(new IncidentEntry(log.incident().id(), entries.size() + 1, now, draft));
        IncidentLog whole = new IncidentLog(log.incident(), entries);
        askTurn(log, draft);
        DownTimes down = DownTimes.of(whole);
        Set<String> unknown = new TreeSet<>(draft.kind() == EntryKind.CIRCUITS_BACK ? draft.circuits() : List.of());
        unknown.removeAll(down.ever());
        if (!unknown.isEmpty()) {
            add("circuit-not-down", "circuits", "Not down in this incident: " + String.join(", ", unknown) + ".");
        }
        if (!whole.isOpen() && !down.last().down().isEmpty()) {
            add(
                    "incident-circuits-down",
                    null,
                    "A closed incident has no circuit down; not back yet: "
                            + String.join(", ", down.last().down())
                            + ". Enter circuits_back or all_light first, or reopen it.");
        }
    }

    private void askTurn(IncidentLog log, EntryDraft draft) {
        if (draft.corrects() != null) {
            return;
        }
        if (draft.kind() == EntryKind.CLOSED && !log.isOpen()) {
            add("incident-closed", null, "The incident is closed already.");
        }
        if (draft.kind() == EntryKind.REOPENED && log.isOpen()) {
            add("incident-open", null, "The incident is open.");
        }
    }
}
