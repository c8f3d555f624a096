package spanwright.exchange;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.records.Relation;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;

/** Rows of {@code fiber_flags.csv}. */
final class FiberFlagRows extends Rows<FiberFlag> {

    private static final int CABLE = Table.FIBER_FLAGS.column("cable");
    private static final int FIBERS = Table.FIBER_FLAGS.column("fibers");
    private static final int FLAG = Table.FIBER_FLAGS.column("flag");
    private static final int FROM = Table.FIBER_FLAGS.column("from");
    private static final int TO = Table.FIBER_FLAGS.column("to");
    private static final int OWNER = Table.FIBER_FLAGS.column("owner");
    private static final int REASON = Table.FIBER_FLAGS.column("reason");
    private static final int UNTIL = Table.FIBER_FLAGS.column("until");

    FiberFlagRows(References refs) {
        super(Table.FIBER_FLAGS, RecordKind.FIBER_FLAG, refs);
    }

    @Override
    @Nullable
    FiberFlag read(Row row, int id) {
        int cable = refs.cables.find(row, CABLE);
        FiberRange fibers = fibers(refs, row, FIBERS, CABLE, cable);
        Flag flag = row.word(FLAG, Flag.values(), Flag::word);
        int from = enclosure(row, FROM, cable);
        int to = enclosure(row, TO, cable);
        String owner = row.free(OWNER);
        String reason = row.free(REASON);
        LocalDate until = row.date(UNTIL, refs.zone());
        if (cable == 0 || fibers == null || flag == null) {
            return null;
        }
        return new FiberFlag(
                id,
                cable,
                fibers,
                flag,
                from == 0 ? null : Integer.valueOf(from),
                to == 0 ? null : Integer.valueOf(to),
                owner,
                reason,
                until);
    }

    /** Fibers of a cable. */
    static @Nullable FiberRange fibers(References refs, Row row, int column, int cableColumn, int cable) {
        int most = cable == 0 ? CableTypeRows.MOST_FIBERS : refs.typeOf(cable).fibers();
        return row.range(column, most, "fibers of cable " + row.text(cableColumn));
    }

    /** An enclosure that the cable is in; 0 where blank, wrong or in doubt. */
    private int enclosure(Row row, int column, int cable) {
        int enclosure = refs.enclosures.find(row, column);
        if (enclosure == 0 || cable == 0) {
            return 0;
        }
        boolean there = refs.view()
                .passes()
                .owned(Relation.CABLE_PASSES, cable)
                .anyMatch(pass -> pass.enclosure() == enclosure);
        if (!there && !refs.doubts().cover(Table.ENCLOSURE_CABLES, row.text(column) + "/" + row.text(CABLE))) {
            row.fault(
                    column,
                    row.named(column) + ": cable " + row.text(CABLE)
                            + " is not in that enclosure; name one that lists it in enclosure_cables.csv, or leave it blank");
        }
        return there ? enclosure : 0;
    }

    @Override
    void write(FiberFlag flag, Cells cells) {
        cells.put(CABLE, refs.cable(flag.cable()));
        cells.put(FIBERS, flag.fibers());
        cells.put(FLAG, flag.flag().word());
        cells.put(FROM, code(flag.from()));
        cells.put(TO, code(flag.to()));
        cells.put(OWNER, flag.owner());
        cells.put(REASON, flag.reason());
        cells.put(UNTIL, flag.until());
    }

    private @Nullable String code(@Nullable Integer enclosure) {
        return enclosure == null ? null : refs.enclosure(enclosure);
    }
}
