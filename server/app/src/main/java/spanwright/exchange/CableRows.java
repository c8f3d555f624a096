package spanwright.exchange;

import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Cable;
import spanwright.plant.PlantState;

/** Rows of {@code cables.csv}. */
final class CableRows extends Rows<Cable> {

    /** The ink of sheath marks where none is named. */
    static final String INK = "white";

    private static final int CABLE = Table.CABLES.column("cable");
    private static final int TYPE = Table.CABLES.column("cable_type");
    private static final int PART_OF = Table.CABLES.column("part_of");
    private static final int MARKS_INK = Table.CABLES.column("marks_ink");
    private static final int OVERLENGTH = Table.CABLES.column("overlength_pct");
    private static final int REEL = Table.CABLES.column("reel");
    private static final int INSTALLED_ON = Table.CABLES.column("installed_on");
    private static final int STATE = Table.CABLES.column("state");
    private static final int NOTE = Table.CABLES.column("note");

    CableRows(References refs) {
        super(Table.CABLES, RecordKind.CABLE, refs);
    }

    @Override
    @Nullable
    Cable read(Row row, int id) {
        String code = row.code(CABLE);
        int type = refs.cableTypes.find(row, TYPE);
        String partOf = row.free(PART_OF);
        String ink = row.free(MARKS_INK);
        Double overlength = CableTypeRows.overlength(row, OVERLENGTH);
        String reel = row.free(REEL);
        LocalDate installedOn = row.date(INSTALLED_ON, refs.zone());
        PlantState state = row.word(STATE, PlantState.values(), PlantState::word);
        String note = row.free(NOTE);
        if (code == null || type == 0) {
            return null;
        }
        return new Cable(
                id,
                code,
                type,
                partOf,
                Objects.requireNonNullElse(ink, INK),
                overlength,
                reel,
                installedOn,
                Objects.requireNonNullElse(state, PlantState.IN_SERVICE),
                note);
    }

    @Override
    void write(Cable cable, Cells cells) {
        cells.put(CABLE, cable.code());
        cells.put(TYPE, refs.cableType(cable.cableType()));
        cells.put(PART_OF, cable.partOf());
        cells.put(MARKS_INK, cable.marksInk());
        cells.put(OVERLENGTH, cable.overlengthPct());
        cells.put(REEL, cable.reel());
        cells.put(INSTALLED_ON, cable.installedOn());
        cells.put(STATE, cable.state().word());
        cells.put(NOTE, cable.note());
    }

    @Override
    String key(Row row) {
        return row.text(CABLE);
    }
}
