package spanwright.exchange;

import java.math.BigDecimal;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.quantity.Length;

/** Rows of {@code structures.csv}. */
final class StructureRows extends Rows<Structure> {

    private static final int STRUCTURE = Table.STRUCTURES.column("structure");
    private static final int KIND = Table.STRUCTURES.column("kind");
    private static final int LON = Table.STRUCTURES.column("lon");
    private static final int LAT = Table.STRUCTURES.column("lat");
    private static final int ACCURACY = Table.STRUCTURES.column("accuracy_m");
    private static final int ADDRESS = Table.STRUCTURES.column("address");
    private static final int STATE = Table.STRUCTURES.column("state");
    private static final int SHARED_RISK = Table.STRUCTURES.column("shared_risk");
    private static final int NOTE = Table.STRUCTURES.column("note");
    private static final Position SOMEWHERE = new Position(0, 0);

    StructureRows(References refs) {
        super(Table.STRUCTURES, RecordKind.STRUCTURE, refs);
    }

    @Override
    @Nullable
    Structure read(Row row, int id) {
        String code = row.code(STRUCTURE);
        StructureKind kind = row.word(KIND, StructureKind.values(), StructureKind::word);
        Double lon = row.number(LON, BigDecimal.valueOf(-180), BigDecimal.valueOf(180), "a longitude is -180 to 180");
        Double lat = row.number(LAT, BigDecimal.valueOf(-90), BigDecimal.valueOf(90), latitude(lon));
        Length accuracy = row.metres(ACCURACY, Row.Bound.FROM_ZERO);
        String address = row.free(ADDRESS);
        PlantState state = row.word(STATE, PlantState.values(), PlantState::word);
        List<String> sharedRisk = row.codes(SHARED_RISK);
        String note = row.free(NOTE);
        if (code == null) {
            return null;
        }
        if (lon == null || lat == null) {
            refs.doubts().add(Table.STRUCTURES, code);
        }
        return new Structure(
                id,
                code,
                Objects.requireNonNullElse(kind, StructureKind.POINT),
                lon == null || lat == null ? SOMEWHERE : new Position(lon, lat),
                accuracy,
                address,
                Objects.requireNonNullElse(state, PlantState.IN_SERVICE),
                sharedRisk,
                note);
    }

    private static String latitude(@Nullable Double lon) {
        return "a latitude is -90 to 90"
                + (lon != null && Math.abs(lon) <= 90 ? " - are lon and lat the wrong way round?" : "");
    }

    @Override
    void write(Structure structure, Cells cells) {
        cells.put(STRUCTURE, structure.code());
        cells.put(KIND, structure.type().word());
        cells.put(LON, structure.position().lon());
        cells.put(LAT, structure.position().lat());
        cells.put(ACCURACY, structure.accuracy());
        cells.put(ADDRESS, structure.address());
        cells.put(STATE, structure.state().word());
        cells.put(SHARED_RISK, structure.sharedRisk());
        cells.put(NOTE, structure.note());
    }

    @Override
    String key(Row row) {
        return row.text(STRUCTURE);
    }
}
