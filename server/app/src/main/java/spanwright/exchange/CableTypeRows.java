package spanwright.exchange;

import java.math.BigDecimal;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.BuiltInColors;
import spanwright.plant.BuiltInFiberTypes;
import spanwright.plant.CableType;

/** Rows of {@code cable_types.csv}. */
final class CableTypeRows extends Rows<CableType> {

    /** More than any cable has; a count above it is a slip. */
    static final int MOST_FIBERS = 100_000;

    private static final int TYPE = Table.CABLE_TYPES.column("cable_type");
    private static final int FIBERS = Table.CABLE_TYPES.column("fibers");
    private static final int FIBERS_PER_TUBE = Table.CABLE_TYPES.column("fibers_per_tube");
    private static final int FIBER_TYPE = Table.CABLE_TYPES.column("fiber_type");
    private static final int OVERLENGTH = Table.CABLE_TYPES.column("overlength_pct");
    private static final int RIBBON = Table.CABLE_TYPES.column("ribbon");
    private static final int FIBERS_PER_RIBBON = Table.CABLE_TYPES.column("fibers_per_ribbon");
    private static final int COLORS = Table.CABLE_TYPES.column("colors");
    private static final String BUILT_IN_COLORS = "TIA-598";
    private static final BigDecimal MOST_OVERLENGTH = BigDecimal.valueOf(100);

    CableTypeRows(References refs) {
        super(Table.CABLE_TYPES, RecordKind.CABLE_TYPE, refs);
    }

    @Override
    @Nullable
    CableType read(Row row, int id) {
        String code = row.code(TYPE);
        Integer fibers = row.whole(FIBERS, 1, MOST_FIBERS);
        Integer perTube = row.whole(FIBERS_PER_TUBE, 1, MOST_FIBERS);
        String fiberType = fiberType(row);
        Double overlength = overlength(row, OVERLENGTH);
        YesNo ribbon = row.word(RIBBON, YesNo.values(), YesNo::word);
        Integer perRibbon = row.whole(FIBERS_PER_RIBBON, 1, MOST_FIBERS);
        String colors = colors(row);
        if (code == null || fibers == null || perTube == null) {
            return null;
        }
        return new CableType(
                id,
                code,
                fibers,
                perTube,
                fiberType,
                Objects.requireNonNullElse(overlength, 0.0),
                ribbon == YesNo.YES,
                perRibbon,
                colors);
    }

    /** An excess length in per cent. */
    static @Nullable Double overlength(Row row, int column) {
        return row.number(column, BigDecimal.ZERO, MOST_OVERLENGTH, "an excess length is 0 to 100 per cent");
    }

    private String fiberType(Row row) {
        String name = row.free(FIBER_TYPE);
        if (name == null || BuiltInFiberTypes.find(name).isPresent()) {
            return Objects.requireNonNullElse(name, "G.652.D");
        }
        if (refs.view().fiberTypes().find(name).isEmpty() && !refs.doubts().cover(Table.FIBER_TYPES, name)) {
            row.fault(
                    FIBER_TYPE,
                    row.named(FIBER_TYPE) + " is no fiber type; name one of fiber_types.csv, or G.652.D"
                            + " or G.657.A1, which are built in"
                            + Near.hint(
                                    name,
                                    refs.view()
                                            .fiberTypes()
                                            .list()
                                            .map(type -> type.code())
                                            .toList()));
        }
        return name;
    }

    private String colors(Row row) {
        String name = row.free(COLORS);
        if (name == null) {
            return BUILT_IN_COLORS;
        }
        if (BuiltInColors.find(name).isEmpty()
                && refs.view().colorCodes().find(name).isEmpty()
                && !refs.doubts().cover(Table.COLOR_CODES, name)) {
            row.fault(
                    COLORS,
                    row.named(COLORS) + " is no colour order; name one of color_codes.csv, or TIA-598, which"
                            + " is built in");
        }
        return name;
    }

    @Override
    void write(CableType type, Cells cells) {
        cells.put(TYPE, type.code());
        cells.put(FIBERS, type.fibers());
        cells.put(FIBERS_PER_TUBE, type.fibersPerTube());
        cells.put(FIBER_TYPE, type.fiberType());
        cells.put(OVERLENGTH, type.overlengthPct());
        cells.put(RIBBON, (type.ribbon() ? YesNo.YES : YesNo.NO).word());
        cells.put(FIBERS_PER_RIBBON, type.fibersPerRibbon());
        cells.put(COLORS, type.colors());
    }

    @Override
    String key(Row row) {
        return row.text(TYPE);
    }

    /** Yes or no. */
    enum YesNo {
        /** It is so. */
        YES("yes"),
        /** It is not so. */
        NO("no");

        private final String word;

        YesNo(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }
}
