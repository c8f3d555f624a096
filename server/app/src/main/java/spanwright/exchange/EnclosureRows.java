package spanwright.exchange;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.PlantState;
import spanwright.quantity.Length;

/** Rows of {@code enclosures.csv}. */
final class EnclosureRows extends Rows<Enclosure> {

    private static final int ENCLOSURE = Table.ENCLOSURES.column("enclosure");
    private static final int STRUCTURE = Table.ENCLOSURES.column("structure");
    private static final int KIND = Table.ENCLOSURES.column("kind");
    private static final int TRAY_GLASS = Table.ENCLOSURES.column("tray_glass_m");
    private static final int STATE = Table.ENCLOSURES.column("state");
    private static final int NOTE = Table.ENCLOSURES.column("note");

    EnclosureRows(References refs) {
        super(Table.ENCLOSURES, RecordKind.ENCLOSURE, refs);
    }

    @Override
    @Nullable
    Enclosure read(Row row, int id) {
        String code = row.code(ENCLOSURE);
        int structure = refs.structures.find(row, STRUCTURE);
        EnclosureKind kind = row.word(KIND, EnclosureKind.values(), EnclosureKind::word);
        Length trayGlass = row.metres(TRAY_GLASS, Row.Bound.FROM_ZERO);
        PlantState state = row.word(STATE, PlantState.values(), PlantState::word);
        String note = row.free(NOTE);
        if (code == null || structure == 0) {
            return null;
        }
        return new Enclosure(
                id,
                code,
                structure,
                Objects.requireNonNullElse(kind, EnclosureKind.CLOSURE),
                Objects.requireNonNullElse(trayGlass, Length.ZERO),
                Objects.requireNonNullElse(state, PlantState.IN_SERVICE),
                note);
    }

    @Override
    void write(Enclosure enclosure, Cells cells) {
        cells.put(ENCLOSURE, enclosure.code());
        cells.put(STRUCTURE, refs.structure(enclosure.structure()));
        cells.put(KIND, enclosure.type().word());
        cells.put(TRAY_GLASS, enclosure.trayGlass());
        cells.put(STATE, enclosure.state().word());
        cells.put(NOTE, enclosure.note());
    }

    @Override
    String key(Row row) {
        return row.text(ENCLOSURE);
    }
}
