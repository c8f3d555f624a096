package spanwright.incident;

import java.math.BigDecimal;
import org.jspecify.annotations.Nullable;
import spanwright.plant.SourceStatus;

/**
 * A figure at which a regulator may ask for a report, or how long one has to make it.
 *
 * @param name its name among the settings
 * @param title what it is about, in a few words
 * @param limit above 0
 * @param unit what it counts: minutes, user-minutes, OC3-minutes, hours, days
 * @param source where the figure is from
 * @param status how it came from there; null where the records set it
 * @param note why the records' own setting is not used, or null
 */
public record ReportingThreshold(
        String name,
        String title,
        BigDecimal limit,
        String unit,
        String source,
        @Nullable SourceStatus status,
        @Nullable String note) {}
