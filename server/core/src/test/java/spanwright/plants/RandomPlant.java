package spanwright.plants;

import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;

/**
 * A small plant drawn from a seed: valid records of every kind, with the odd cases in them. Routes with twins and
 * loops; cables of several run rows, some ending where they began; planned and abandoned plant; splices by ranges
 * rising and falling; chains of splitters, two inputs; circles of joints; planned jobs; circuits with and without a
 * path, on two fibers and behind splitters.
 */
public final class RandomPlant {

    private final List<Recorded> records;

    private RandomPlant(List<Recorded> records) {
        this.records = List.copyOf(records);
    }

    /** A plant of some ten structures and cables. */
    public static RandomPlant of(long seed) {
        return of(seed, 1);
    }

    /** A plant so many times as large. */
    public static RandomPlant of(long seed, int scale) {
        Chance chance = new Chance(seed);
        PlantDraft draft = new PlantDraft();
        new RouteDraw(draft, chance).draw(scale * chance.between(3, 12));
        new CableDraw(draft, chance).draw(scale * chance.between(2, 12));
        new EnclosureDraw(draft, chance).draw();
        new JointDraw(draft, chance).draw(entered(draft.records()));
        new ServiceDraw(draft, chance).draw(entered(draft.records()));
        return new RandomPlant(draft.records());
    }

    private static Records entered(List<Recorded> records) {
        RecordsEditor editor = Records.empty().edit();
        records.forEach(record -> editor.apply(Change.add(record)));
        return editor.build(1);
    }

    /** Its records, kind after kind in their order, by identity. */
    public List<Recorded> records() {
        return records;
    }

    /** The changes that enter its records, in that order. */
    public List<Change> changes() {
        return records.stream().map(Change::add).toList();
    }

    /** Its records entered as posting 1, without asking any rule. */
    public Records entered() {
        return entered(records);
    }
}
