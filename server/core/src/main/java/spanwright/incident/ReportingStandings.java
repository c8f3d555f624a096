package spanwright.incident;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.records.RecordsView;

/** How far an incident is from each threshold, and when each paper would be due. It decides nothing. */
public final class ReportingStandings {

    private static final BigDecimal MINUTES_A_DAY =
            BigDecimal.valueOf(Duration.ofDays(1).toMinutes());
    private static final int DIGITS = 6;

    /**
     * How far a count is.
     *
     * @param threshold the threshold
     * @param value the count so far, in the threshold's unit; null where nobody has stated what is needed
     * @param reachedAt when it was reached, or will be if nothing changes; null where it will not be
     * @param basis what was counted
     */
    public record Standing(
            ReportingThreshold threshold,
            @Nullable BigDecimal value,
            @Nullable Instant reachedAt,
            String basis) {

        /** Whether it is reached; what is not known is not. */
        public boolean reached() {
            return value != null && value.compareTo(threshold.limit()) >= 0;
        }
    }

    /**
     * When a paper would be due, if the outage is one to report.
     *
     * @param threshold how long one has
     * @param from from when that runs; null while nothing has set it running
     * @param dueAt when it ends; null while it does not run
     */
    public record Due(
            ReportingThreshold threshold,
            @Nullable Instant from,
            @Nullable Instant dueAt) {}

    private final IncidentLog log;
    private final IncidentCounts counts;
    private final ReportingThresholds thresholds;

    /**
     * Of an incident.
     *
     * @param settings the records whose settings hold
     */
    public ReportingStandings(IncidentLog log, IncidentCounts counts, RecordsView settings) {
        this.log = log;
        this.counts = counts;
        this.thresholds = new ReportingThresholds(settings);
    }

    /** Every count with a threshold. */
    public List<Standing> counts() {
        List<Standing> list = new ArrayList<>();
        list.add(of(ReportingThresholds.DURATION, Optional.of(counts.outage()), "while at least one service is down"));
        boolean stated = counts.statedUserMinutes().isPresent();
        list.add(of(
                ReportingThresholds.USER_MINUTES,
                counts.statedUserMinutes().or(() -> Optional.of(counts.customerMinutes())),
                stated ? "users as stated in the log" : "customers of the records, each taken as one user"));
        list.add(of(
                ReportingThresholds.OC3_MINUTES,
                counts.oc3Minutes(),
                counts.oc3Minutes().isPresent()
                        ? "capacity as stated in the log"
                        : "not known: the records do not hold capacity; state it in the log"));
        list.add(longestSinglePath());
        return list;
    }

    private Standing of(String name, Optional<Accrual> count, String basis) {
        ReportingThreshold threshold = thresholds.get(name);
        return new Standing(
                threshold,
                count.map(each -> each.at(counts.at())).orElse(null),
                count.flatMap(each -> each.reaches(threshold.limit())).orElse(null),
                basis);
    }

    private Standing longestSinglePath() {
        ReportingThreshold threshold = thresholds.get(ReportingThresholds.SINGLE_PATH);
        Accrual longest = counts.singlePaths().values().stream()
                .max(Comparator.comparing(each -> each.at(counts.at())))
                .orElse(new Accrual());
        return new Standing(
                threshold,
                longest.at(counts.at()).divide(MINUTES_A_DAY, DIGITS, RoundingMode.HALF_EVEN),
                longest.reaches(threshold.limit().multiply(MINUTES_A_DAY)).orElse(null),
                "the protection group longest on a single path");
    }

    /**
     * Every paper. The notice's time begins once the outage has lasted the minutes that make it one, but not before
     * it was discovered; the reports' when it was discovered.
     */
    public List<Due> papers() {
        Instant discovered = IncidentClock.discovered(log);
        Optional<Instant> lasted = counts.outage()
                .reaches(thresholds.get(ReportingThresholds.DURATION).limit())
                .filter(at -> !at.isAfter(counts.at()));
        Instant notice =
                lasted.map(at -> at.isBefore(discovered) ? discovered : at).orElse(null);
        Instant report = lasted.isPresent() ? discovered : null;
        return List.of(
                due(ReportingThresholds.NOTICE, notice, Duration.ofMinutes(1)),
                due(ReportingThresholds.FIRST_REPORT, report, Duration.ofHours(1)),
                due(ReportingThresholds.FINAL_REPORT, report, Duration.ofDays(1)));
    }

    private Due due(String name, @Nullable Instant from, Duration unit) {
        ReportingThreshold threshold = thresholds.get(name);
        BigDecimal seconds = threshold.limit().multiply(BigDecimal.valueOf(unit.toSeconds()));
        return new Due(threshold, from, from == null ? null : from.plusSeconds(seconds.longValue()));
    }
}
