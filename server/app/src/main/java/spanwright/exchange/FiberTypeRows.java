package spanwright.exchange;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Objects;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/** Rows of {@code fiber_types.csv}, one a wavelength; the columns of the type are alike on all its rows. */
final class FiberTypeRows {

    static final int TYPE = Table.FIBER_TYPES.column("fiber_type");
    private static final int WAVELENGTH = Table.FIBER_TYPES.column("wavelength_nm");
    private static final int LOSS = Table.FIBER_TYPES.column("loss_db_per_km");
    private static final int LIMIT = Table.FIBER_TYPES.column("loss_limit_db_per_km");
    private static final int GROUP_INDEX = Table.FIBER_TYPES.column("group_index");
    private static final int ZERO = Table.FIBER_TYPES.column("zero_dispersion_nm");
    private static final int SLOPE = Table.FIBER_TYPES.column("dispersion_slope");
    private static final int PMD = Table.FIBER_TYPES.column("pmd_ps_per_sqrt_km");
    private static final BigDecimal MOST = BigDecimal.valueOf(100_000);

    private FiberTypeRows() {}

    /** A row of the type, and the line it stands on. */
    private record Values(FiberValues values, int line) {}

    /** The rows of one type as they are read. */
    static final class Gathered {

        private final Map<Wavelength, Values> byWavelength = new TreeMap<>();
        private int firstLine;
        private boolean inDoubt;
        private @Nullable Double zero;
        private @Nullable Double slope;
        private @Nullable Double pmd;

        /** Takes one row more. */
        void take(Row row) {
            Wavelength wavelength = row.nanometres(WAVELENGTH);
            Loss loss = row.decibels(LOSS, Row.Bound.FROM_ZERO);
            Loss limit = row.decibels(LIMIT, Row.Bound.FROM_ZERO);
            Double groupIndex = CableValueRows.groupIndex(row, GROUP_INDEX);
            takeType(row);
            if (wavelength == null || loss == null || row.faulty()) {
                inDoubt = true;
                return;
            }
            FiberValues values = new FiberValues(wavelength, loss, Objects.requireNonNullElse(limit, loss), groupIndex);
            Values earlier = byWavelength.putIfAbsent(wavelength, new Values(values, row.line()));
            if (earlier != null) {
                row.fault(
                        WAVELENGTH,
                        row.named(WAVELENGTH) + " stands twice for type " + row.text(TYPE)
                                + "; write one row a wavelength (the earlier is "
                                + row.table().file() + ":" + earlier.line
                                + ")");
            }
        }

        private void takeType(Row row) {
            Double rowZero = row.number(ZERO, BigDecimal.ONE, MOST, "a zero-dispersion wavelength is 1 to 100000 nm");
            Double rowSlope = row.number(SLOPE, MOST.negate(), MOST, "a slope is -100000 to 100000 ps/(nm2 km)");
            Double rowPmd = row.number(PMD, BigDecimal.ZERO, MOST, "a PMD coefficient is 0 to 100000 ps/sqrt(km)");
            if (firstLine == 0) {
                firstLine = row.line();
                zero = rowZero;
                slope = rowSlope;
                pmd = rowPmd;
                return;
            }
            askAlike(row, ZERO, zero, rowZero);
            askAlike(row, SLOPE, slope, rowSlope);
            askAlike(row, PMD, pmd, rowPmd);
        }

        private void askAlike(Row row, int column, @Nullable Double first, @Nullable Double value) {
            if (!inDoubt && !row.faulty(column) && !Objects.equals(first, value)) {
                row.fault(
                        column,
                        row.named(column) + " differs from the first row of type " + row.text(TYPE)
                                + "; it is alike on all rows of a type (the earlier is "
                                + row.table().file() + ":" + firstLine
                                + ")");
            }
        }

        /** Whether a row of it was refused. */
        boolean inDoubt() {
            return inDoubt;
        }

        int firstLine() {
            return firstLine;
        }

        /** The type that its rows make. */
        FiberType type(int id, String code) {
            return new FiberType(
                    id, code, byWavelength.values().stream().map(Values::values).toList(), zero, slope, pmd);
        }
    }

    /** Writes one row of a type. */
    static void write(FiberType type, FiberValues values, Cells cells) {
        cells.put(TYPE, type.code());
        cells.put(WAVELENGTH, values.wavelength().exactNanometres());
        cells.put(LOSS, values.lossPerKm());
        cells.put(LIMIT, values.lossLimitPerKm());
        cells.put(GROUP_INDEX, values.groupIndex());
        cells.put(ZERO, type.zeroDispersionNm());
        cells.put(SLOPE, type.dispersionSlope());
        cells.put(PMD, type.pmdPsPerSqrtKm());
    }
}
