package spanwright.answers;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.planning.EndStates;
import spanwright.planning.FiberUses;
import spanwright.quantity.LengthUnit;
import spanwright.records.CableLay;
import spanwright.records.Catalogue;
import spanwright.records.EndNames;
import spanwright.records.Records;

/**
 * The state that a question is asked of, with what its answer reads again and again. One question's, so one thread's.
 */
public final class View {

    private final Snapshot snapshot;
    private final @Nullable String job;
    private final @Nullable LocalDate day;
    private final EndNames names;
    private final Catalogue catalogue;
    private final FiberUses uses;
    private final EndStates endStates;
    private final Map<Integer, CableLay> lays = new HashMap<>();

    /**
     * A view.
     *
     * @param snapshot the state
     * @param job the planned job that is built in it, or null
     */
    public View(Snapshot snapshot, @Nullable String job) {
        this(snapshot, job, null);
    }

    /**
     * A view of the past.
     *
     * @param day the day as of which it is, or null for today
     */
    View(Snapshot snapshot, @Nullable String job, @Nullable LocalDate day) {
        this.snapshot = snapshot;
        this.job = job;
        this.day = day;
        this.names = new EndNames(snapshot.records());
        this.catalogue = new Catalogue(snapshot.records());
        this.uses = new FiberUses(snapshot);
        this.endStates = new EndStates(snapshot.records(), snapshot.network());
    }

    /** The state. */
    public Snapshot snapshot() {
        return snapshot;
    }

    /** Its records. */
    public Records records() {
        return snapshot.records();
    }

    /** Its network. */
    public Network network() {
        return snapshot.network();
    }

    /** The last posting that it takes in; 0 where there is none. */
    public int posting() {
        return records().posting();
    }

    /** The planned job that is built in it, or null. */
    public @Nullable String job() {
        return job;
    }

    /** Writes ends, ports and fibers. */
    public EndNames names() {
        return names;
    }

    /** Fiber types and colour orders. */
    Catalogue catalogue() {
        return catalogue;
    }

    /** What fibers are used for. */
    public FiberUses uses() {
        return uses;
    }

    /** What is recorded of ends without a joint. */
    public EndStates endStates() {
        return endStates;
    }

    /** How a cable lies. */
    public CableLay lay(int cable) {
        return lays.computeIfAbsent(cable, id -> CableLay.of(records(), id));
    }

    /** A setting's value, or null. */
    public @Nullable String setting(String name) {
        return records().settings().find(name).map(setting -> setting.value()).orElse(null);
    }

    /** The unit in which people read lengths first. */
    public LengthUnit unit() {
        return Optional.ofNullable(setting("unit")).flatMap(LengthUnit::find).orElse(LengthUnit.METRE);
    }

    /** The records' own zone. */
    public ZoneId zone() {
        return zone(records());
    }

    /** The day as of which it is, in the records' own zone. */
    public LocalDate day() {
        return day == null ? LocalDate.now(zone()) : day;
    }

    /** The zone that records name; UTC where they name none. */
    static ZoneId zone(Records records) {
        return records.settings()
                .find("time_zone")
                .map(setting -> known(setting.value()))
                .orElse(ZoneOffset.UTC);
    }

    private static ZoneId known(String name) {
        try {
            return ZoneId.of(name);
        } catch (DateTimeException unknown) {
            return ZoneOffset.UTC;
        }
    }

    /** An instant as {@code 2026-03-31T14:05:00-05:00} in the records' own zone, exact. */
    public String time(Instant at) {
        return DateTimeFormatter.ISO_OFFSET_DATE_TIME.format(at.atZone(zone()));
    }

    /** The code of a structure. */
    String structure(int id) {
        return records().structures().get(id).code();
    }

    /** The code of a cable. */
    String cable(int id) {
        return records().cables().get(id).code();
    }

    /** The code of an enclosure. */
    String enclosure(int id) {
        return records().enclosures().get(id).code();
    }
}
