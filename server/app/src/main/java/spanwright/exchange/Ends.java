package spanwright.exchange;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Splitter;

/**
 * Ends as they are written: {@code <cable> back <fibers>}, {@code <cable> ahead <fibers>}, {@code <splitter> in},
 * {@code <splitter> out <outputs>}, within an enclosure. Where a cable both begins and ends in an enclosure,
 * {@code ahead} leaves from its first row and {@code back} from its last.
 */
final class Ends {

    private static final String FORM = "; write <cable> back <fibers>, <cable> ahead <fibers>, <splitter> in or"
            + " <splitter> out <outputs>, such as F-1 ahead 1-12";
    private static final LegKind[] SIDES = {LegKind.BACK, LegKind.AHEAD, LegKind.IN, LegKind.OUT};
    private static final String[] WORDS = {"back", "ahead", "in", "out"};

    /**
     * A leg that a row may name.
     *
     * @param leg the leg
     * @param most the largest number on it
     * @param what what is numbered, for a fault
     */
    private record Reach(Leg leg, int most, String what) {}

    private final References refs;
    private final RecordsView view;
    private final SliceIds known = new SliceIds();
    private final List<Reach> reaches = new ArrayList<>();

    Ends(References refs) {
        this.refs = refs;
        this.view = refs.view();
    }

    /**
     * The ends that a column names in an enclosure; null where they are wrong, or in doubt.
     *
     * @param enclosure the enclosure's identity, or 0 where it is in doubt itself
     */
    @Nullable
    EndRange find(Row row, int column, int enclosure) {
        return row.blank(column) ? null : find(row, column, row.from(column), row.to(column), enclosure);
    }

    /** The same of a part of a column. */
    @Nullable
    EndRange find(Row row, int column, int from, int to, int enclosure) {
        char[] chars = row.chars();
        int first = space(chars, from, to);
        int second = first < to ? space(chars, first + 1, to) : to;
        int side = side(chars, first + 1, second);
        boolean whole = side == 2 && second == to;
        if (first == from || side < 0 || (second == to && !whole)) {
            row.fault(column, row.named(column) + " is no end" + FORM);
            return null;
        }
        FiberRange numbers = whole ? FiberRange.of(1) : Ranges.find(chars, second + 1, to);
        if (numbers == null) {
            // Read once more, for the sentence.
            Ranges.range(row, column, second + 1, to, Integer.MAX_VALUE, "");
            return null;
        }
        Reach reach = enclosure == 0 ? null : reach(row, column, from, first, enclosure, side);
        if (reach == null) {
            return null;
        }
        if (numbers.first() > reach.most || numbers.last() > reach.most) {
            row.fault(
                    column,
                    row.named(column) + " names " + Math.max(numbers.first(), numbers.last()) + "; the " + reach.what
                            + " are 1 to " + reach.most);
            return null;
        }
        return new EndRange(reach.leg, numbers);
    }

    private static int space(char[] chars, int from, int to) {
        int at = from;
        while (at < to && chars[at] != ' ') {
            at++;
        }
        return at;
    }

    private static int side(char[] chars, int from, int to) {
        for (int side = 0; side < WORDS.length; side++) {
            if (from <= to && Texts.same(WORDS[side], chars, from, to)) {
                return side;
            }
        }
        return -1;
    }

    private @Nullable Reach reach(Row row, int column, int from, int to, int enclosure, int side) {
        int scope = enclosure * WORDS.length + side;
        int place = known.find(scope, row.chars(), from, to);
        if (place != 0) {
            return reaches.get(place - 1);
        }
        Reach reach = side < 2
                ? ofCable(row, column, from, to, enclosure, SIDES[side])
                : ofSplitter(row, column, from, to, enclosure, SIDES[side]);
        if (reach != null) {
            reaches.add(reach);
            known.put(scope, new String(row.chars(), from, to - from), reaches.size());
        }
        return reach;
    }

    private @Nullable Reach ofCable(Row row, int column, int from, int to, int enclosure, LegKind side) {
        int cable = refs.cables.find(row, column, from, to);
        if (cable == 0) {
            return null;
        }
        String code = view.cables().get(cable).code();
        List<Pass> passes = view.passes()
                .owned(Relation.CABLE_PASSES, cable)
                .filter(pass -> pass.enclosure() == enclosure)
                .toList();
        String where = view.enclosures().get(enclosure).code();
        if (refs.doubts().cover(Table.ENCLOSURE_CABLES, where + "/" + code)
                || refs.doubts().cover(Table.CABLE_RUNS, code)) {
            return null;
        }
        if (passes.isEmpty()) {
            row.fault(
                    column,
                    row.named(column) + ": cable " + code + " is not in enclosure " + where
                            + "; list it in enclosure_cables.csv, or name a cable that is there");
            return null;
        }
        RunRow at = rowOf(passes, side);
        int last = view.runOf(cable).stream().mapToInt(RunRow::seq).max().orElse(0);
        if (at.seq() == (side == LegKind.BACK ? 0 : last)) {
            row.fault(
                    column,
                    row.named(column) + ": cable " + code
                            + (side == LegKind.BACK
                                    ? " begins at " + where + ", where it has only ahead"
                                    : " ends at " + where + ", where it has only back"));
            return null;
        }
        return new Reach(new Leg(side, at.id()), refs.typeOf(cable).fibers(), "fibers of cable " + code);
    }

    /** The run row where a side leaves: of a ring, ahead from the first and back from the last. */
    private RunRow rowOf(List<Pass> passes, LegKind side) {
        RunRow one = view.runRows().get(passes.get(0).runRow());
        if (passes.size() == 1) {
            return one;
        }
        RunRow other = view.runRows().get(passes.get(1).runRow());
        return side == LegKind.AHEAD == one.seq() < other.seq() ? one : other;
    }

    private @Nullable Reach ofSplitter(Row row, int column, int from, int to, int enclosure, LegKind side) {
        String code = new String(row.chars(), from, to - from);
        String where = view.enclosures().get(enclosure).code();
        Optional<Splitter> splitter = view.findSplitter(enclosure, code);
        if (splitter.isEmpty()) {
            if (!refs.doubts().cover(Table.SPLITTERS, where + "/" + code)) {
                row.fault(
                        column,
                        row.named(column) + ": there is no splitter '" + Texts.shown(code) + "' in enclosure " + where
                                + "; enter it in splitters.csv, or name one that is there");
            }
            return null;
        }
        boolean in = side == LegKind.IN;
        return new Reach(
                new Leg(side, splitter.get().id()),
                in ? splitter.get().inputs() : splitter.get().outputs(),
                (in ? "inputs" : "outputs") + " of splitter " + code);
    }

    /** Ends as a row names them, their enclosure apart. */
    String text(EndRange ends) {
        int owner = ends.leg().owner();
        return switch (ends.leg().kind()) {
            case BACK -> refs.cableAt(owner) + " back " + ends.numbers();
            case AHEAD -> refs.cableAt(owner) + " ahead " + ends.numbers();
            case IN ->
                refs.splitter(owner) + (ends.numbers().equals(FiberRange.of(1)) ? " in" : " in " + ends.numbers());
            case OUT -> refs.splitter(owner) + " out " + ends.numbers();
            case REAR, FRONT -> refs.panelWhole(owner) + "/" + ends.numbers();
        };
    }
}
