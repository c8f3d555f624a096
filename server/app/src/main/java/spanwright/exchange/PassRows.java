package spanwright.exchange;

import java.util.List;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.CableType;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;

/** Rows of {@code enclosure_cables.csv}. */
final class PassRows extends Rows<Pass> {

    private static final int ENCLOSURE = Table.ENCLOSURE_CABLES.column("enclosure");
    private static final int CABLE = Table.ENCLOSURE_CABLES.column("cable");
    private static final int SEQ = Table.ENCLOSURE_CABLES.column("seq");
    private static final int OPENED = Table.ENCLOSURE_CABLES.column("opened");
    private static final int TUBES_OPENED = Table.ENCLOSURE_CABLES.column("tubes_opened");

    PassRows(References refs) {
        super(Table.ENCLOSURE_CABLES, RecordKind.PASS, refs);
    }

    @Override
    @Nullable
    Pass read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        int cable = refs.cables.find(row, CABLE);
        CableType type = cable == 0 ? null : refs.typeOf(cable);
        int fibers = type == null ? CableTypeRows.MOST_FIBERS : type.fibers();
        int tubes = type == null ? CableTypeRows.MOST_FIBERS : type.tubes();
        List<FiberRange> opened = row.ranges(OPENED, fibers, "fibers of cable " + row.text(CABLE));
        List<FiberRange> tubesOpened = row.ranges(TUBES_OPENED, tubes, "tubes of cable " + row.text(CABLE));
        int runRow = runRow(row, enclosure, cable);
        return enclosure == 0 || runRow == 0 ? null : new Pass(id, enclosure, cable, runRow, opened, tubesOpened);
    }

    private int runRow(Row row, int enclosure, int cable) {
        if (!row.blank(SEQ)) {
            return Runs.row(refs, row, CABLE, SEQ);
        }
        if (enclosure == 0 || cable == 0) {
            return 0;
        }
        int structure = refs.view().enclosures().get(enclosure).structure();
        List<RunRow> visits = Runs.at(refs, cable, structure);
        if (Runs.inDoubt(refs, cable)) {
            return visits.size() == 1 ? visits.get(0).id() : 0;
        }
        String where = refs.structure(structure);
        if (visits.isEmpty()) {
            row.fault(
                    CABLE,
                    row.named(CABLE) + " does not visit structure " + where + ", where enclosure " + row.text(ENCLOSURE)
                            + " is; name a cable whose run has a row there");
        } else if (visits.size() > 1) {
            row.fault(
                    SEQ,
                    "seq is blank, but cable " + row.text(CABLE) + " visits structure " + where
                            + " more than once; name the run row: "
                            + visits.stream().map(visit -> "" + visit.seq()).collect(Collectors.joining(" or ")));
        }
        return visits.size() == 1 ? visits.get(0).id() : 0;
    }

    @Override
    void write(Pass pass, Cells cells) {
        cells.put(ENCLOSURE, refs.enclosure(pass.enclosure()));
        cells.put(CABLE, refs.cable(pass.cable()));
        cells.put(SEQ, refs.seq(pass.runRow()));
        cells.ranges(OPENED, pass.opened());
        cells.ranges(TUBES_OPENED, pass.tubesOpened());
    }

    @Override
    String key(Row row) {
        return row.text(ENCLOSURE) + "/" + row.text(CABLE);
    }
}
