package spanwright.sheet;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import spanwright.journal.Change;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.LegKind;

/** Enters which fibers are cut: those in a state that only a cut end has, and those whose joint was taken apart. */
final class TubeEntry {

    private final SheetEntry sheet;
    private final Map<Integer, Set<Integer>> cut = new HashMap<>();
    private final Map<Integer, Set<Integer>> uncut = new HashMap<>();
    private final Map<Integer, TextPlace> places = new HashMap<>();

    TubeEntry(SheetEntry sheet, List<Statement> statements, Map<Long, TextPlace> freed) {
        this.sheet = sheet;
        freed.forEach((key, place) -> note(cut, key, place));
        for (Statement statement : statements) {
            if (statement instanceof Statement.States states) {
                boolean through = states.condition() == EndCondition.THROUGH;
                EndRange range = states.range();
                for (int index = 0; index < range.count(); index++) {
                    note(through ? uncut : cut, range.key(index), states.place());
                }
            }
        }
    }

    private void note(Map<Integer, Set<Integer>> fibers, long key, TextPlace place) {
        if (EndKey.kind(key) == LegKind.BACK || EndKey.kind(key) == LegKind.AHEAD) {
            fibers.computeIfAbsent(EndKey.owner(key), row -> new HashSet<>()).add(EndKey.number(key));
            places.putIfAbsent(EndKey.owner(key), place);
        }
    }

    void enter() {
        RecordsView records = sheet.editor().records();
        List<Pass> passes = records.passes()
                .owned(Relation.ENCLOSURE_PASSES, sheet.enclosure())
                .toList();
        EnclosureLegs legs = new EnclosureLegs(records, sheet.enclosure());
        for (Pass pass : passes) {
            boolean middle = legs.list().stream().anyMatch(leg -> leg.row().id() == pass.runRow() && leg.middle());
            TextPlace place = places.get(pass.runRow());
            if (middle && place != null) {
                enter(pass, place);
            }
        }
    }

    private void enter(Pass pass, TextPlace place) {
        Set<Integer> opened = new TreeSet<>();
        for (FiberRange range : pass.opened()) {
            for (int index = 0; index < range.count(); index++) {
                opened.add(range.at(index));
            }
        }
        Set<Integer> before = new TreeSet<>(opened);
        opened.removeAll(uncut.getOrDefault(pass.runRow(), Set.of()));
        opened.addAll(cut.getOrDefault(pass.runRow(), Set.of()));
        if (!opened.equals(before)) {
            List<FiberRange> ranges = FiberRange.listOf(opened.stream().mapToInt(Integer::intValue));
            Pass after = new Pass(pass.id(), pass.enclosure(), pass.cable(), pass.runRow(), ranges, pass.tubesOpened());
            sheet.apply(place, Change.replace(pass, after));
        }
    }
}
