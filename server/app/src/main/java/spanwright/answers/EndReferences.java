package spanwright.answers;

import java.util.Comparator;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import spanwright.answers.Unanswerable.Kind;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.Records;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.splicing.Splitter;

/**
 * Reads ends as the records write them wherever they are: {@code F-1 ahead 3 @ E4}, {@code S1 in @ E6}, {@code S1 out 5 @
 * E6}, {@code F-1 start 3}, {@code F-1 end 3}; and says what was probably meant where there is no such end.
 */
final class EndReferences {

    private static final Pattern WITHIN =
            Pattern.compile("([^\\s,/:]+) +(back|ahead|in|out)(?: +([0-9]{1,7}))? *@ *([^\\s,/:]+)");
    private static final Pattern BARE = Pattern.compile("([^\\s,/:]+) +(start|end) +([0-9]{1,7})");

    private final Records records;
    private final References references;

    EndReferences(Records records) {
        this.records = records;
        this.references = new References(records);
    }

    /** The key of an end. */
    long end(String text, String parameter) {
        Matcher within = WITHIN.matcher(text.strip());
        if (within.matches()) {
            String number = within.group(3);
            if (number != null || within.group(2).equals("in")) {
                return within(within, number == null ? 1 : Integer.parseInt(number), parameter);
            }
        }
        Matcher bare = BARE.matcher(text.strip());
        if (bare.matches()) {
            return bare(bare, parameter);
        }
        throw new Unanswerable(
                Kind.BAD_REQUEST,
                "'" + text + "' is not an end; an end is written F-1 ahead 3 @ E4, S1 in @ E6, S1 out 5 @ E6, or"
                        + " F-1 start 3 at a cable's bare end.",
                parameter);
    }

    /** The key of a port's front, or of an end. */
    long portOrEnd(String text, String parameter) {
        return text.indexOf('/') >= 0 ? references.front(text.strip(), parameter) : end(text, parameter);
    }

    private long within(Matcher written, int number, String parameter) {
        Enclosure enclosure = references.namedEnclosure(written.group(4), parameter);
        return switch (written.group(2)) {
            case "in", "out" -> terminal(written, number, enclosure, parameter);
            default -> fiber(written, number, enclosure, parameter);
        };
    }

    private long terminal(Matcher written, int number, Enclosure enclosure, String parameter) {
        Splitter splitter = records.findSplitter(enclosure.id(), written.group(1))
                .orElseThrow(() -> absent(
                        "There is no splitter " + written.group(1) + " in " + enclosure.code() + "."
                                + NearMiss.hint(written.group(1), splittersOf(enclosure)),
                        parameter));
        boolean input = written.group(2).equals("in");
        int count = input ? splitter.inputs() : splitter.outputs();
        if (number < 1 || number > count) {
            throw absent(
                    splitter.code() + " in " + enclosure.code() + " has " + (input ? "inputs" : "outputs") + " 1 to "
                            + count + ", not " + number + ".",
                    parameter);
        }
        return EndKey.of(input ? LegKind.IN : LegKind.OUT, splitter.id(), number);
    }

    private Stream<String> splittersOf(Enclosure enclosure) {
        return records.splitters()
                .owned(Relation.ENCLOSURE_SPLITTERS, enclosure.id())
                .map(Splitter::code);
    }

    private long fiber(Matcher written, int number, Enclosure enclosure, String parameter) {
        Cable cable = references.cable(written.group(1), number, parameter);
        List<RunRow> rows = records.passes()
                .owned(Relation.ENCLOSURE_PASSES, enclosure.id())
                .filter(pass -> pass.cable() == cable.id())
                .map(Pass::runRow)
                .map(records.runRows()::get)
                .sorted(Comparator.comparingInt(RunRow::seq))
                .toList();
        if (rows.isEmpty()) {
            throw absent(cable.code() + " is not in " + enclosure.code() + ".", parameter);
        }
        // Where a cable both begins and ends in an enclosure, ahead is its first row and back its last.
        boolean ahead = written.group(2).equals("ahead");
        RunRow row = ahead ? rows.get(0) : rows.get(rows.size() - 1);
        int last = records.runOf(cable.id()).size() - 1;
        if (row.seq() == (ahead ? last : 0)) {
            throw absent(
                    cable.code() + (ahead ? " ends" : " begins") + " in " + enclosure.code() + ", so it has only "
                            + (ahead ? "back" : "ahead") + " there.",
                    parameter);
        }
        return EndKey.of(ahead ? LegKind.AHEAD : LegKind.BACK, row.id(), number);
    }

    private long bare(Matcher written, String parameter) {
        int number = Integer.parseInt(written.group(3));
        Cable cable = references.cable(written.group(1), number, parameter);
        List<RunRow> run = records.runOf(cable.id());
        boolean start = written.group(2).equals("start");
        RunRow row = run.get(start ? 0 : run.size() - 1);
        return EndKey.of(start ? LegKind.AHEAD : LegKind.BACK, row.id(), number);
    }

    private static Unanswerable absent(String sentence, String parameter) {
        return new Unanswerable(Kind.BAD_REFERENCE, sentence, parameter);
    }
}
