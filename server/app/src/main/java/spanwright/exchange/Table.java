package spanwright.exchange;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** The tables of a records folder in their order, each with its columns in their order; {@code *} = required. */
@SuppressWarnings("ImmutableEnumChecker") // The list is unmodifiable, and the array is not given out.
enum Table {
    SETTINGS("settings", "name*", "value*"),
    STRUCTURES(
            "structures",
            "structure*",
            "kind*",
            "lon*",
            "lat*",
            "accuracy_m",
            "address",
            "state",
            "shared_risk",
            "note"),
    SPANS("spans", "span*", "from*", "to*", "placement*", "length_m", "line", "state", "shared_risk", "note"),
    FIBER_TYPES(
            "fiber_types",
            "fiber_type*",
            "wavelength_nm*",
            "loss_db_per_km*",
            "loss_limit_db_per_km",
            "group_index",
            "zero_dispersion_nm",
            "dispersion_slope",
            "pmd_ps_per_sqrt_km"),
    CABLE_TYPES(
            "cable_types",
            "cable_type*",
            "fibers*",
            "fibers_per_tube*",
            "fiber_type*",
            "overlength_pct",
            "ribbon",
            "fibers_per_ribbon",
            "colors"),
    COLOR_CODES("color_codes", "code*", "position*", "color*"),
    CABLES(
            "cables",
            "cable*",
            "cable_type*",
            "part_of",
            "marks_ink",
            "overlength_pct",
            "reel",
            "installed_on",
            "state",
            "note"),
    CABLE_VALUES("cable_values", "cable*", "wavelength_nm*", "group_index", "loss_db_per_km", "source"),
    CABLE_RUNS("cable_runs", "cable*", "seq*", "structure*", "span", "slack_m", "slack_trust", "slack_on", "duct"),
    SHEATH_MARKS("sheath_marks", "cable*", "seq*", "ink", "unit*", "mark_in", "mark_out", "read_on", "trust"),
    ENCLOSURES("enclosures", "enclosure*", "structure*", "kind*", "tray_glass_m", "state", "note"),
    ENCLOSURE_CABLES("enclosure_cables", "enclosure*", "cable*", "seq", "opened", "tubes_opened"),
    SPLITTERS("splitters", "enclosure*", "splitter*", "inputs", "outputs*", "loss_db"),
    SPLITTER_OUTPUTS("splitter_outputs", "enclosure*", "splitter*", "output*", "loss_db*"),
    SPLICES(
            "splices",
            "enclosure*",
            "tray",
            "a*",
            "b*",
            "method",
            "loss_db",
            "trust",
            "verified_on",
            "spliced_on",
            "spliced_by",
            "temporary_until",
            "job"),
    PANELS("panels", "enclosure*", "panel*", "ports*", "connector"),
    TERMINATIONS(
            "terminations",
            "enclosure*",
            "panel*",
            "ports*",
            "end*",
            "method",
            "loss_db",
            "trust",
            "verified_on",
            "job",
            "temporary_until"),
    END_STATES("end_states", "enclosure*", "end*", "state*", "trust", "verified_on"),
    JUMPERS("jumpers", "a*", "b*", "length_m", "temporary_until"),
    MEASUREMENTS("measurements", "what*", "wavelength_nm*", "direction", "loss_db*", "on", "by", "file"),
    FIBER_FLAGS("fiber_flags", "cable*", "fibers*", "flag*", "from", "to", "owner", "reason", "until"),
    COUNTS("counts", "cable*", "fibers*", "name*", "numbers*"),
    CIRCUITS(
            "circuits",
            "circuit*",
            "service",
            "customer",
            "priority",
            "customers_served",
            "wavelength_nm",
            "budget",
            "protection_group",
            "a*",
            "z*",
            "status"),
    PLANNING_VALUES("planning_values", "item*", "expected_db*", "limit_db", "sd_db", "source");

    private final String word;
    private final List<String> columns;
    private final boolean[] required;

    Table(String word, String... columns) {
        this.word = word;
        this.columns =
                Arrays.stream(columns).map(column -> column.replace("*", "")).toList();
        this.required = new boolean[columns.length];
        for (int index = 0; index < columns.length; index++) {
            required[index] = columns[index].endsWith("*");
        }
    }

    /** The table's name, as a posting names it. */
    String word() {
        return word;
    }

    /** The table's file in a folder. */
    String file() {
        return word + ".csv";
    }

    /** Its columns in their order. */
    List<String> columns() {
        return columns;
    }

    /** Whether a column must hold a value. */
    boolean required(int column) {
        return required[column];
    }

    /**
     * The index of a column.
     *
     * @throws IllegalArgumentException where the table has no such column
     */
    int column(String name) {
        int index = columns.indexOf(name);
        if (index < 0) {
            throw new IllegalArgumentException(word + " has no column " + name);
        }
        return index;
    }

    /** The names of all tables, without {@code .csv}. */
    static List<String> words() {
        return Arrays.stream(values()).map(Table::word).toList();
    }

    /** The table of a name without {@code .csv}, if any. */
    static Optional<Table> find(String word) {
        return Arrays.stream(values()).filter(table -> table.word.equals(word)).findFirst();
    }
}
