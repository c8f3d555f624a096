package spanwright.incident;

import java.math.BigDecimal;
import java.util.List;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.BuiltInTable;
import spanwright.plant.Setting;
import spanwright.plant.Source;
import spanwright.records.RecordsView;

/**
 * The figures at which a regulator may ask for a report: those of the table {@code reporting_thresholds} that is built
 * in, each replaced by the records' setting of its name. They only say how far a count is; a person decides.
 */
public final class ReportingThresholds {

    /** How long an outage lasts before any count matters. */
    public static final String DURATION = "report.minutes";

    /** User-minutes. */
    public static final String USER_MINUTES = "report.user_minutes";

    /** OC3-minutes. */
    public static final String OC3_MINUTES = "report.oc3_minutes";

    /** How long a protected service may run on a single path. */
    public static final String SINGLE_PATH = "report.single_path_days";

    /** Within what time a notice is due. */
    public static final String NOTICE = "report.notice_minutes";

    /** Within what time the first report is due. */
    public static final String FIRST_REPORT = "report.first_report_hours";

    /** Within what time the final report is due. */
    public static final String FINAL_REPORT = "report.final_report_days";

    private static final List<BuiltInTable.Row> ROWS = BuiltInTable.read("reporting_thresholds");
    private static final Pattern NUMBER = Pattern.compile("[0-9]{1,12}(\\.[0-9]{1,6})?");

    private final RecordsView records;

    /** The thresholds of these records. */
    public ReportingThresholds(RecordsView records) {
        this.records = records;
    }

    /** All of them, in the order of the built-in table. */
    public List<ReportingThreshold> list() {
        return ROWS.stream().map(this::of).toList();
    }

    /** The threshold of a name; one that is not built in is a bug. */
    public ReportingThreshold get(String name) {
        return list().stream()
                .filter(each -> each.name().equals(name))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException("no threshold " + name));
    }

    private ReportingThreshold of(BuiltInTable.Row row) {
        String value =
                records.settings().find(row.get("name")).map(Setting::value).orElse(null);
        if (value == null) {
            return builtIn(row, null);
        }
        if (!NUMBER.matcher(value).matches() || new BigDecimal(value).signum() == 0) {
            return builtIn(
                    row,
                    "The setting " + row.get("name") + " is '" + value
                            + "', not a number above 0, so the built-in value holds.");
        }
        return new ReportingThreshold(
                row.get("name"),
                row.get("title"),
                new BigDecimal(value),
                row.get("unit"),
                "these records' settings",
                null,
                null);
    }

    private static ReportingThreshold builtIn(BuiltInTable.Row row, @Nullable String note) {
        Source source = row.source("source");
        return new ReportingThreshold(
                row.get("name"),
                row.get("title"),
                new BigDecimal(row.get("limit")),
                row.get("unit"),
                source.text(),
                source.status(),
                note);
    }
}
