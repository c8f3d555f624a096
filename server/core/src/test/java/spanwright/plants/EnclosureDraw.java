package spanwright.plants;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.PlantState;
import spanwright.plant.RunRow;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Draws enclosures, the cables in them with what is opened, splitters and panels. */
final class EnclosureDraw {

    private final PlantDraft draft;
    private final Chance chance;

    EnclosureDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
    }

    void draw() {
        for (Structure structure : draft.structures) {
            for (int more = chance.between(0, 2); more > 0; more--) {
                enclosure(structure);
            }
        }
        draft.cables.forEach(this::passes);
        for (Enclosure enclosure : draft.enclosures) {
            splitters(enclosure);
            panels(enclosure);
        }
    }

    private void enclosure(Structure structure) {
        int id = draft.next(RecordKind.ENCLOSURE);
        draft.add(new Enclosure(
                id,
                "E" + id,
                structure.id(),
                chance.of(EnclosureKind.values()),
                chance.in(40) ? chance.metres(0.5, 3) : Length.ZERO,
                chance.in(10) ? chance.of(PlantState.PLANNED, PlantState.ABANDONED) : PlantState.IN_SERVICE,
                chance.perhaps(10, () -> "sealed, re-entered")));
    }

    private void passes(Cable cable) {
        List<RunRow> run = draft.run(cable.id());
        Set<Integer> used = new HashSet<>();
        int first = 0;
        for (RunRow row : run) {
            List<Enclosure> here = new ArrayList<>(draft.enclosures);
            int ring = draft.lastRow(row) ? first : 0;
            here.removeIf(enclosure -> enclosure.structure() != row.structure()
                    || (used.contains(enclosure.id()) && enclosure.id() != ring));
            if (here.isEmpty() || chance.in(20)) {
                continue;
            }
            int enclosure = chance.of(here).id();
            used.add(enclosure);
            first = draft.firstRow(row) ? enclosure : first;
            draft.add(new Pass(
                    draft.next(RecordKind.PASS),
                    enclosure,
                    cable.id(),
                    row.id(),
                    ranges(draft.fibers(cable)),
                    ranges(draft.cableTypes.get(cable.cableType() - 1).tubes())));
        }
    }

    /** None, or one or two rising ranges that do not meet. */
    private List<FiberRange> ranges(int most) {
        List<FiberRange> ranges = new ArrayList<>();
        int from = chance.between(1, most);
        if (chance.in(40)) {
            int to = chance.between(from, most);
            ranges.add(new FiberRange(from, to));
            if (to + 2 <= most && chance.in(50)) {
                ranges.add(FiberRange.of(chance.between(to + 2, most)));
            }
        }
        return ranges;
    }

    private void splitters(Enclosure enclosure) {
        for (int number = 1; number <= 2 && chance.in(35); number++) {
            int outputs = chance.of(2, 2, 4, 8);
            Map<Integer, Loss> taps = new HashMap<>();
            if (chance.in(20)) {
                for (int output = 1; output <= outputs; output++) {
                    taps.put(output, chance.decibels(1, 12));
                }
            }
            draft.add(new Splitter(
                    draft.next(RecordKind.SPLITTER),
                    enclosure.id(),
                    "S" + number,
                    chance.of(1, 1, 2),
                    outputs,
                    chance.perhaps(30, () -> chance.decibels(3, 15)),
                    taps));
        }
    }

    private void panels(Enclosure enclosure) {
        for (int number = 1; number <= 2 && chance.in(50); number++) {
            draft.add(new Panel(
                    draft.next(RecordKind.PANEL),
                    enclosure.id(),
                    number == 1 ? "P" : "Q",
                    chance.between(1, 12),
                    chance.of("SC/APC", "LC/UPC")));
        }
    }
}
