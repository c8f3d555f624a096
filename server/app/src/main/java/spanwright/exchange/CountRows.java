package spanwright.exchange;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.splicing.FiberCount;

/** Rows of {@code counts.csv}. */
final class CountRows extends Rows<FiberCount> {

    private static final int CABLE = Table.COUNTS.column("cable");
    private static final int FIBERS = Table.COUNTS.column("fibers");
    private static final int NAME = Table.COUNTS.column("name");
    private static final int NUMBERS = Table.COUNTS.column("numbers");
    private static final int MOST_NUMBER = 100_000_000;

    CountRows(References refs) {
        super(Table.COUNTS, RecordKind.FIBER_COUNT, refs);
    }

    @Override
    @Nullable
    FiberCount read(Row row, int id) {
        int cable = refs.cables.find(row, CABLE);
        FiberRange fibers = FiberFlagRows.fibers(refs, row, FIBERS, CABLE, cable);
        String name = row.free(NAME);
        FiberRange numbers = row.range(NUMBERS, MOST_NUMBER, "numbers of a count");
        if (fibers == null || numbers == null) {
            return null;
        }
        if (fibers.count() != numbers.count()) {
            row.fault(
                    NUMBERS,
                    row.named(FIBERS) + " has " + fibers.count() + " and " + row.named(NUMBERS) + " has "
                            + numbers.count() + "; both have the same count and go in order");
            return null;
        }
        return cable == 0 || name == null ? null : new FiberCount(id, cable, fibers, name, numbers);
    }

    @Override
    void write(FiberCount count, Cells cells) {
        cells.put(CABLE, refs.cable(count.cable()));
        cells.put(FIBERS, count.fibers());
        cells.put(NAME, count.name());
        cells.put(NUMBERS, count.numbers());
    }
}
