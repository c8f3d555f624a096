package spanwright.answers;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.incident.Accrual;
import spanwright.incident.EntryDraft;
import spanwright.incident.Incident;
import spanwright.incident.IncidentClock;
import spanwright.incident.IncidentCounts;
import spanwright.incident.IncidentDesk;
import spanwright.incident.IncidentEntry;
import spanwright.incident.IncidentLog;
import spanwright.incident.ReportingStandings;
import spanwright.incident.ReportingThreshold;

/** The documents of incidents: which there are, and one with its clock, its log and what it counts to. */
public final class IncidentDocuments {

    private static final int DECIMALS = 3;
    private static final BigDecimal MINUTES_A_DAY =
            BigDecimal.valueOf(Duration.ofDays(1).toMinutes());

    private final Views views;
    private final IncidentDesk desk;

    /** Of a desk. */
    public IncidentDocuments(Views views, IncidentDesk desk) {
        this.views = views;
        this.desk = desk;
    }

    /** All incidents, open ones first. */
    public void list(Json json) {
        View now = views.now();
        json.list("incidents", desk.list(), (item, log) -> {
            IncidentCounts counts = IncidentCounts.of(log, desk.frozen(log.incident()), desk.now());
            head(item, now, log);
            time(item, now, "closed_at", log.closedAt().orElse(null));
            item.whole("circuits_down", counts.down().size());
            item.whole("customers_down", customersDown(counts));
        });
    }

    private static int customersDown(IncidentCounts counts) {
        List<IncidentCounts.Standing> standings = counts.standings();
        return standings.isEmpty() ? 0 : standings.get(standings.size() - 1).customersDown();
    }

    private static void head(Json json, View view, IncidentLog log) {
        Incident incident = log.incident();
        json.whole("incident", incident.id()).text("title", incident.title()).flag("open", log.isOpen());
        json.text("by", incident.by());
        time(json, view, "began_at", incident.beganAt());
        time(json, view, "opened_at", incident.openedAt());
        json.whole("posting", incident.posting());
    }

    private static void time(Json json, View view, String name, @Nullable Instant at) {
        json.text(name, at == null ? null : view.time(at));
    }

    /**
     * One incident.
     *
     * @param at when it is counted
     */
    public void one(Json json, IncidentLog log, Instant at) {
        View view = views.now();
        Incident incident = log.incident();
        IncidentCounts counts = IncidentCounts.of(log, desk.frozen(incident), at);
        head(json, view, log);
        json.object("from", from -> {
            from.texts("cuts", incident.start().cuts())
                    .texts("down", incident.start().down());
            from.texts("up", incident.start().up())
                    .text("reading", incident.start().reading());
        });
        json.object("clock", item -> clock(item, view, IncidentClock.of(log)));
        json.list("log", log.entries(), (item, entry) -> entry(item, view, log, entry));
        time(json, view, "counted_at", at);
        json.object("counts", item -> counts(item, view, counts));
        ReportingStandings standings = new ReportingStandings(log, counts, view.records());
        json.list("thresholds", standings.counts(), (item, standing) -> standing(item, view, standing));
        json.list("papers", standings.papers(), (item, due) -> due(item, view, due, at));
        json.text("decision", "a person decides");
    }

    private static void clock(Json json, View view, IncidentClock clock) {
        time(json, view, "began", clock.began());
        time(json, view, "called", clock.called());
        time(json, view, "on_site", clock.onSite());
        time(json, view, "found", clock.found());
        time(json, view, "first_light", clock.firstLight());
        time(json, view, "all_light", clock.allLight());
        time(json, view, "closed", clock.closed());
    }

    private static void entry(Json json, View view, IncidentLog log, IncidentEntry entry) {
        EntryDraft said = entry.said();
        json.whole("number", entry.number()).text("kind", said.kind().word());
        time(json, view, "at", said.happenedAt());
        time(json, view, "written_at", entry.writtenAt());
        json.text("by", said.by()).text("text", said.text()).texts("circuits", said.circuits());
        json.whole("users", said.users()).number("oc3", said.oc3()).whole("corrects", said.corrects());
        json.whole("corrected_by", log.correctedBy(entry.number()).orElse(null));
    }

    private static void counts(Json json, View view, IncidentCounts counts) {
        Instant at = counts.at();
        json.texts("circuits_down", counts.down()).texts("circuits_back", counts.back());
        json.whole("customers_down", customersDown(counts));
        json.texts("first_priority_down", counts.firstPriorityDown());
        minutes(json, "outage_minutes", counts.outage(), at);
        minutes(json, "circuit_minutes", counts.circuitMinutes(), at);
        minutes(json, "customer_minutes", counts.customerMinutes(), at);
        minutes(json, "stated_user_minutes", counts.statedUserMinutes().orElse(null), at);
        minutes(json, "oc3_minutes", counts.oc3Minutes().orElse(null), at);
        json.list("single_path", new TreeSet<>(counts.singlePaths().keySet()), (item, group) -> {
            Accrual path = counts.singlePath(group);
            item.text("protection_group", group).number("days", days(path.at(at)));
            item.flag("now", path.rate(at).signum() > 0);
        });
        json.list("over_time", counts.standings(), (item, standing) -> {
            time(item, view, "from", standing.from());
            item.whole("circuits_down", standing.circuitsDown()).whole("customers_down", standing.customersDown());
            item.texts("single_path", standing.single());
        });
    }

    private static BigDecimal days(BigDecimal minutes) {
        return minutes.divide(MINUTES_A_DAY, DECIMALS, RoundingMode.HALF_EVEN);
    }

    private static void minutes(Json json, String name, @Nullable Accrual count, Instant at) {
        json.number(name, count == null ? null : count.at(at).setScale(DECIMALS, RoundingMode.HALF_EVEN));
    }

    private static void standing(Json json, View view, ReportingStandings.Standing standing) {
        BigDecimal value = standing.value();
        threshold(json, standing.threshold());
        json.number("value", value == null ? null : value.setScale(DECIMALS, RoundingMode.HALF_EVEN));
        json.flag("reached", standing.reached());
        time(json, view, "reached_at", standing.reachedAt());
        json.text("basis", standing.basis());
    }

    private static void due(Json json, View view, ReportingStandings.Due due, Instant at) {
        Instant dueAt = due.dueAt();
        threshold(json, due.threshold());
        time(json, view, "from", due.from());
        time(json, view, "due_at", dueAt);
        json.number(
                "left_minutes",
                dueAt == null
                        ? null
                        : BigDecimal.valueOf(Duration.between(at, dueAt).toSeconds())
                                .divide(BigDecimal.valueOf(60), DECIMALS, RoundingMode.HALF_EVEN));
    }

    private static void threshold(Json json, ReportingThreshold threshold) {
        json.text("setting", threshold.name()).text("title", threshold.title());
        json.number("limit", threshold.limit()).text("unit", threshold.unit());
        json.text("source", threshold.source());
        json.text(
                "source_status",
                threshold.status() == null ? null : threshold.status().word());
        json.text("note", threshold.note());
    }
}
