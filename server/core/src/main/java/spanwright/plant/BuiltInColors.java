package spanwright.plant;

import java.util.List;
import java.util.Optional;

/** The colour orders that are built in, from the table {@code color_codes}. */
public final class BuiltInColors {

    private static final String CODE = "TIA-598";
    private static final List<BuiltInTable.Row> ROWS = BuiltInTable.read("color_codes");
    private static final FiberColors COLORS = new FiberColors(
            CODE,
            ROWS.stream().map(row -> row.get("color")).toList(),
            ROWS.stream().map(row -> row.get("tracer")).toList());

    private BuiltInColors() {}

    /** The codes of the orders built in. */
    public static List<String> list() {
        return List.of(CODE);
    }

    /** The order with a code, if it is built in. */
    public static Optional<FiberColors> find(String code) {
        return code.equals(CODE) ? Optional.of(COLORS) : Optional.empty();
    }

    /** Where the colour at a position comes from. */
    public static Source source(int position) {
        return ROWS.get((position - 1) % ROWS.size()).source("source");
    }
}
