package spanwright.draft;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import spanwright.quantity.Length;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.sheet.CableLeg;
import spanwright.sheet.Statement;
import spanwright.splicing.Joint;

/** What only the person knows, asked before a sheet is submitted. */
final class Prompts {

    private Prompts() {}

    static void find(CheckedSheet sheet, String fingerprint, List<Draft> drafts, Consumer<Slip> found) {
        if (sheet.joins().findAny().isEmpty()) {
            return;
        }
        slack(sheet, found);
        repair(sheet, found);
        twice(sheet, fingerprint, drafts, found);
        half(sheet, found);
        light(sheet, found);
    }

    /** Slack pulled for new joints, and not lowered in the records. */
    private static void slack(CheckedSheet sheet, Consumer<Slip> found) {
        boolean apart =
                sheet.changes().stream().anyMatch(change -> change.before() instanceof Joint joint && !joint.planned());
        boolean said = sheet.statements().stream().anyMatch(Statement.Coiled.class::isInstance);
        List<String> coils = sheet.legs().list().stream()
                .filter(leg -> leg.row().slack().compareTo(Length.ZERO) > 0)
                .map(leg -> leg.cable().code() + " " + leg.row().slack())
                .distinct()
                .toList();
        if (apart && !said && !coils.isEmpty()) {
            found.accept(Slip.prompt(
                    "slack-used",
                    "Joints were made anew, and sheath is coiled here: " + String.join(", ", coils)
                            + ". Was any of it used?",
                    "Write what is left, such as " + coils.get(0).split(" ", 2)[0] + " slack 12 m, or answer that none"
                            + " was."));
        }
    }

    /** A cable joined to itself at mid-sheath is often one end of a piece let in. */
    private static void repair(CheckedSheet sheet, Consumer<Slip> found) {
        sheet.cableJoins()
                .filter(joins -> {
                    CableLeg a = sheet.leg(joins.a());
                    CableLeg b = sheet.leg(joins.b());
                    return a.cable().id() == b.cable().id()
                            && a.leg().kind() != b.leg().kind()
                            && a.row().id() == b.row().id();
                })
                .findFirst()
                .ifPresent(joins -> found.accept(Slip.prompt(
                        "repair-section",
                        sheet.leg(joins.a()).cable().code() + " is cut and joined to itself here. Was a piece of cable"
                                + " let in?",
                        "A piece let in is two enclosures, a cable and their joints: enter it as a repair, which makes"
                                + " all of them. Else answer that none was.")));
    }

    private static void twice(CheckedSheet sheet, String fingerprint, List<Draft> drafts, Consumer<Slip> found) {
        drafts.stream()
                .filter(draft -> fingerprint.equals(draft.fingerprint()))
                .findFirst()
                .ifPresent(draft -> found.accept(Slip.prompt(
                        "sheet-twice",
                        "This sheet says the same as " + named(draft) + ", posted as "
                                + draft.posting()
                                + (draft.enclosure() == sheet.enclosure()
                                        ? " here"
                                        : " to " + code(sheet.records(), draft.enclosure()))
                                + ".",
                        "Look at the enclosure's tag and at the job; drop this sheet if it is the same.")));
        if (sheet.changes().isEmpty()) {
            found.accept(Slip.prompt(
                    "nothing-new",
                    "The records of " + sheet.code() + " say all of this already.",
                    "Is it this enclosure, and this sheet? If so there is nothing to post."));
        }
        near(sheet, found);
    }

    private static String named(Draft draft) {
        String job = draft.text().header().job();
        return job == null ? "draft " + draft.id() : "job " + job;
    }

    private static String code(RecordsView records, int enclosure) {
        return records.enclosures().find(enclosure).map(one -> one.code()).orElse("an enclosure that is gone");
    }

    /** Another enclosure of a like code in which the same cables are. */
    private static void near(CheckedSheet sheet, Consumer<Slip> found) {
        List<Integer> cables = sheet.cableJoins()
                .flatMap(joins -> joins.ends().stream())
                .map(ends -> sheet.leg(ends).cable().id())
                .distinct()
                .toList();
        if (cables.isEmpty()) {
            return;
        }
        List<String> like = sheet.records()
                .passes()
                .owned(Relation.CABLE_PASSES, cables.get(0))
                .map(pass -> pass.enclosure())
                .filter(other -> other != sheet.enclosure() && holds(sheet.records(), other, cables))
                .map(other -> code(sheet.records(), other))
                .filter(code -> oneLetterApart(code, sheet.code()))
                .distinct()
                .toList();
        if (!like.isEmpty()) {
            found.accept(Slip.prompt(
                    "like-code",
                    "The same cables are in " + String.join(", ", like) + " too, a letter or digit away from "
                            + sheet.code() + ". Is it this one?",
                    "Read the tag on the photo again."));
        }
    }

    private static boolean holds(RecordsView records, int enclosure, List<Integer> cables) {
        List<Integer> there = new ArrayList<>();
        records.passes().owned(Relation.ENCLOSURE_PASSES, enclosure).forEach(pass -> there.add(pass.cable()));
        return there.containsAll(cables);
    }

    private static boolean oneLetterApart(String one, String other) {
        if (one.length() != other.length()) {
            return false;
        }
        int apart = 0;
        for (int at = 0; at < one.length(); at++) {
            apart += one.charAt(at) == other.charAt(at) ? 0 : 1;
        }
        return apart == 1;
    }

    /** Whether all was done, where the job's plan has joints here that the sheet does not make. */
    private static void half(CheckedSheet sheet, Consumer<Slip> found) {
        String job = sheet.header().job();
        List<String> left = job == null
                ? List.of()
                : sheet.after().records().plannedJoints(job).stream()
                        .map(sheet.after().records().joints()::get)
                        .filter(joint -> joint.enclosure() == sheet.enclosure())
                        .map(joint -> sheet.names().ends(joint.a()) + " = "
                                + sheet.names().ends(joint.b()))
                        .toList();
        found.accept(Slip.prompt(
                "all-done",
                "Was all of this sheet done?"
                        + (left.isEmpty() ? "" : " Of job " + job + " stay planned: " + String.join("; ", left) + "."),
                "Write ; trust planned; job NAME behind what is not done yet, and answer that the rest is."));
    }

    private static void light(CheckedSheet sheet, Consumer<Slip> found) {
        String ranges = sheet.cableJoins()
                .filter(joins -> joins.words().light() == null)
                .map(joins -> sheet.names().ends(joins.a()))
                .collect(Collectors.joining(", "));
        if (!ranges.isEmpty()) {
            found.accept(Slip.prompt(
                    "light-check",
                    "Was light sent from end to end over " + ranges + "? A loss test does not find crossed fibers.",
                    "Write ; light 2026-03-31 behind each range that was proven; the others stay unverified."));
        }
    }
}
