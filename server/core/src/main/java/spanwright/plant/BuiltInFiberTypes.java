package spanwright.plant;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/** The fiber types that are built in, from the table {@code fiber_types}; they have identity 0. */
public final class BuiltInFiberTypes {

    private static final Map<String, List<BuiltInTable.Row>> ROWS = rows();
    private static final Map<String, FiberType> TYPES = types();

    private BuiltInFiberTypes() {}

    private static Map<String, List<BuiltInTable.Row>> rows() {
        Map<String, List<BuiltInTable.Row>> rows = new LinkedHashMap<>();
        for (BuiltInTable.Row row : BuiltInTable.read("fiber_types")) {
            rows.computeIfAbsent(row.get("fiber_type"), code -> new ArrayList<>())
                    .add(row);
        }
        return rows;
    }

    private static Map<String, FiberType> types() {
        Map<String, FiberType> types = new LinkedHashMap<>();
        ROWS.forEach((code, rows) -> {
            BuiltInTable.Row any = rows.get(0);
            types.put(
                    code,
                    new FiberType(
                            0,
                            code,
                            rows.stream().map(BuiltInFiberTypes::values).toList(),
                            Double.valueOf(any.get("zero_dispersion_nm")),
                            Double.valueOf(any.get("dispersion_slope")),
                            Double.valueOf(any.get("pmd_ps_per_sqrt_km"))));
        });
        return types;
    }

    private static FiberValues values(BuiltInTable.Row row) {
        return new FiberValues(
                wavelength(row),
                Loss.ofDecibels(new BigDecimal(row.get("loss_db_per_km"))),
                Loss.ofDecibels(new BigDecimal(row.get("loss_limit_db_per_km"))),
                Double.valueOf(row.get("group_index")));
    }

    private static Wavelength wavelength(BuiltInTable.Row row) {
        return Wavelength.ofNanometres(new BigDecimal(row.get("wavelength_nm")));
    }

    /** The types built in. */
    public static List<FiberType> list() {
        return List.copyOf(TYPES.values());
    }

    /** The type with a code, if it is built in. */
    public static Optional<FiberType> find(String code) {
        return Optional.ofNullable(TYPES.get(code));
    }

    /** Where the values of a built-in type at one tabled wavelength come from, if it is tabled. */
    public static Optional<FiberSources> findSources(String code, Wavelength wavelength) {
        return ROWS.getOrDefault(code, List.of()).stream()
                .filter(row -> wavelength(row).equals(wavelength))
                .map(row -> new FiberSources(
                        row.source("loss_source"),
                        row.source("limit_source"),
                        row.source("index_source"),
                        row.source("dispersion_source")))
                .findFirst();
    }
}
