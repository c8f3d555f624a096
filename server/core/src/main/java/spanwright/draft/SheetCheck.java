package spanwright.draft;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.EndNames;
import spanwright.sheet.EnclosureLegs;
import spanwright.sheet.LineRefusal;
import spanwright.sheet.Mistake;
import spanwright.sheet.SheetEntry;
import spanwright.sheet.SheetRead;
import spanwright.sheet.SheetReader;
import spanwright.sheet.SheetWriter;
import spanwright.sheet.Statement;
import spanwright.sheet.TextPlace;

/**
 * A sheet checked as if it were posted; nothing of it is kept.
 *
 * @param read what was understood
 * @param slips what is wrong, likely wrong, or to be asked, in the order of their places
 * @param before what the enclosure holds, as lines
 * @param after what it would hold
 * @param circuits the first circuits on glass that would change, each with its loss before and after
 * @param circuitsTotal how many there are
 * @param fingerprint what the sheet says, however its lines are cut and ordered
 * @param changes what it would change in the records
 */
public record SheetCheck(
        SheetRead read,
        List<Slip> slips,
        List<String> before,
        List<String> after,
        List<TouchedCircuit> circuits,
        int circuitsTotal,
        String fingerprint,
        List<Change> changes) {

    /** A circuit of this priority or before it is a priority circuit: the clerk of its sheet does not post it. */
    public static final int PRIORITY = 2;

    private static final int MOST_CIRCUITS = 50;
    private static final Comparator<Slip> BY_PLACE = Comparator.comparing((Slip slip) -> slip.weight() == Weight.PROMPT)
            .thenComparing(slip -> slip.place().line())
            .thenComparing(slip -> slip.place().column())
            .thenComparing(Slip::rule);

    /** Keeps its own copies. */
    public SheetCheck {
        slips = List.copyOf(slips);
        before = List.copyOf(before);
        after = List.copyOf(after);
        circuits = List.copyOf(circuits);
        changes = List.copyOf(changes);
    }

    /**
     * Checks a sheet.
     *
     * @param now the records as they are
     * @param enclosure identity of an enclosure that is there
     * @param drafts what else was written, to find a sheet that was posted before
     */
    public static SheetCheck of(Snapshot now, int enclosure, DraftText text, List<Draft> drafts) {
        SheetRead read = SheetReader.read(now.records(), enclosure, text.lines());
        SnapshotEditor editor = now.edit();
        List<LineRefusal> refused = SheetEntry.enter(editor, enclosure, text.header(), read.statements());
        List<Slip> slips = new ArrayList<>();
        read.mistakes().forEach(mistake -> slips.add(slip(mistake)));
        refused.forEach(refusal -> slips.add(slip(refusal)));
        editor.finish().forEach(refusal -> slips.add(slip(new LineRefusal(new TextPlace(1, 1, 0), refusal))));
        List<Change> changes = editor.changes();
        Snapshot after = editor.build(now.records().posting());
        EndNames names = new EndNames(now.records());
        CheckedSheet sheet = new CheckedSheet(
                now,
                after,
                enclosure,
                text.header(),
                read.statements(),
                changes,
                new EnclosureLegs(now.records(), enclosure),
                names);
        CrossedSlips.find(sheet, slips::add);
        CableSlips.find(sheet, slips::add);
        GlassSlips.find(sheet, slips::add);
        String fingerprint = fingerprint(names, read.statements());
        Prompts.find(sheet, fingerprint, drafts, slips::add);
        slips.sort(BY_PLACE);
        List<Circuit> touched = TouchedCircuits.list(now, after, changes);
        return new SheetCheck(
                read,
                slips,
                SheetWriter.present(now, enclosure),
                SheetWriter.present(after, enclosure),
                TouchedCircuits.reckon(
                        now, after, touched.stream().limit(MOST_CIRCUITS).toList()),
                touched.size(),
                fingerprint,
                changes);
    }

    private static Slip slip(Mistake mistake) {
        return Slip.error(mistake.place(), mistake.code(), mistake.text(), mistake.mend());
    }

    private static Slip slip(LineRefusal refused) {
        return Slip.error(
                refused.place(),
                refused.refusal().code(),
                refused.refusal().sentence(),
                "Mend the line, or the records that it clashes with.");
    }

    /** Every joint and state said, in one order. */
    private static String fingerprint(EndNames names, List<Statement> statements) {
        return statements.stream()
                .flatMap(statement -> Sayings.of(names, statement))
                .sorted()
                .collect(Collectors.joining(";"));
    }

    /** Whether a priority circuit is touched. */
    public boolean touchesPriority() {
        return !circuits.isEmpty() && circuits.get(0).circuit().priority() <= PRIORITY;
    }

    /** The slips that nobody has answered; an error cannot be answered. */
    public List<Slip> open(DraftText text) {
        return slips.stream()
                .filter(slip -> slip.weight() == Weight.ERROR || answer(slip, text) == null)
                .toList();
    }

    /** The answer to a slip, or null. */
    public static @Nullable String answer(Slip slip, DraftText text) {
        int index = slip.place().line() - 1;
        String line = slip.ofSheet() || index >= text.lines().size()
                ? ""
                : text.lines().get(index);
        return text.answers().stream()
                .filter(answer ->
                        answer.rule().equals(slip.rule()) && answer.line().equals(line))
                .map(Answer::reason)
                .findFirst()
                .orElse(null);
    }
}
