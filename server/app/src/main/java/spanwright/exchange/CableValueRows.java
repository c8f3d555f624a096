package spanwright.exchange;

import java.math.BigDecimal;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.CableValue;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/** Rows of {@code cable_values.csv}. */
final class CableValueRows extends Rows<CableValue> {

    private static final int CABLE = Table.CABLE_VALUES.column("cable");
    private static final int WAVELENGTH = Table.CABLE_VALUES.column("wavelength_nm");
    private static final int GROUP_INDEX = Table.CABLE_VALUES.column("group_index");
    private static final int LOSS = Table.CABLE_VALUES.column("loss_db_per_km");
    private static final int SOURCE = Table.CABLE_VALUES.column("source");
    private static final BigDecimal MOST_INDEX = BigDecimal.valueOf(5);

    CableValueRows(References refs) {
        super(Table.CABLE_VALUES, RecordKind.CABLE_VALUE, refs);
    }

    @Override
    @Nullable
    CableValue read(Row row, int id) {
        int cable = refs.cables.find(row, CABLE);
        Wavelength wavelength = row.nanometres(WAVELENGTH);
        Double groupIndex = groupIndex(row, GROUP_INDEX);
        Loss loss = row.decibels(LOSS, Row.Bound.FROM_ZERO);
        String source = row.free(SOURCE);
        return cable == 0 || wavelength == null
                ? null
                : new CableValue(id, cable, wavelength, groupIndex, loss, source);
    }

    /** A group index: light in glass is slower than in a vacuum. */
    static @Nullable Double groupIndex(Row row, int column) {
        return row.number(column, BigDecimal.ONE, MOST_INDEX, "a group index is 1 to 5, of silica glass about 1.468");
    }

    @Override
    void write(CableValue value, Cells cells) {
        cells.put(CABLE, refs.cable(value.cable()));
        cells.put(WAVELENGTH, value.wavelength().exactNanometres());
        cells.put(GROUP_INDEX, value.groupIndex());
        cells.put(LOSS, value.lossPerKm());
        cells.put(SOURCE, value.source());
    }
}
