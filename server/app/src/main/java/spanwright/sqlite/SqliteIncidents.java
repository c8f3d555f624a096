package spanwright.sqlite;

import java.math.BigDecimal;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.function.Supplier;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.mapper.RowMapper;
import org.jspecify.annotations.Nullable;
import spanwright.incident.EntryDraft;
import spanwright.incident.EntryKind;
import spanwright.incident.Incident;
import spanwright.incident.IncidentBook;
import spanwright.incident.IncidentDraft;
import spanwright.incident.IncidentEntry;
import spanwright.incident.IncidentLog;
import spanwright.incident.IncidentRules;
import spanwright.incident.IncidentStart;
import spanwright.incident.Written;
import spanwright.records.Refusal;

/**
 * The incident book in a records file, written in turn with the postings by the connection that writes them. A file of
 * the schema before it, opened to be read only, holds no incidents.
 */
final class SqliteIncidents implements IncidentBook {

    /** The schema that brought the tables of incidents. */
    private static final int SCHEMA = 2;

    private static final RowMapper<Incident> INCIDENT = (row, context) -> incident(row);
    private static final RowMapper<IncidentEntry> ENTRY = (row, context) -> entry(row);

    private final BookTurn turn;
    private final Jdbi jdbi;

    SqliteIncidents(BookTurn turn) {
        this.turn = turn;
        this.jdbi = Jdbi.create(turn.readers());
    }

    private boolean hasTables() {
        return turn.hasSchema(SCHEMA);
    }

    @Override
    public List<Incident> list() {
        if (!hasTables()) {
            return List.of();
        }
        return jdbi.withHandle(handle -> handle.createQuery("SELECT * FROM incident ORDER BY id DESC")
                .map(INCIDENT)
                .list());
    }

    @Override
    public Optional<Incident> find(int id) {
        if (!hasTables()) {
            return Optional.empty();
        }
        return jdbi.withHandle(handle -> handle.createQuery("SELECT * FROM incident WHERE id = :id")
                .bind("id", id)
                .map(INCIDENT)
                .findOne());
    }

    private Incident get(int id) {
        return find(id).orElseThrow(() -> new NoSuchElementException("There is no incident " + id + "."));
    }

    @Override
    public List<IncidentEntry> entries(int incident) {
        get(incident);
        return jdbi.withHandle(
                handle -> handle.createQuery("SELECT * FROM incident_entry WHERE incident = :id ORDER BY number")
                        .bind("id", incident)
                        .map(ENTRY)
                        .list());
    }

    @Override
    public Written<Incident> open(IncidentDraft draft, int posting) {
        return inTurn(() -> {
            Instant now = turn.now();
            List<Refusal> refusals = IncidentRules.refuse(draft, now);
            if (!refusals.isEmpty()) {
                return new Written.Refused<>(refusals);
            }
            int last = list().stream().findFirst().map(Incident::id).orElse(0);
            Incident incident =
                    new Incident(last + 1, draft.title(), draft.beganAt(), now, draft.by(), draft.start(), posting);
            turn.store().commit(connection -> insert(connection, incident));
            return new Written.Kept<>(incident);
        });
    }

    @Override
    public Written<IncidentEntry> write(int id, EntryDraft draft) {
        Incident incident = get(id);
        return inTurn(() -> {
            Instant now = turn.now();
            IncidentLog log = new IncidentLog(incident, entries(id));
            List<Refusal> refusals = IncidentRules.refuse(log, draft, now);
            if (!refusals.isEmpty()) {
                return new Written.Refused<>(refusals);
            }
            IncidentEntry entry = new IncidentEntry(id, log.entries().size() + 1, now, draft);
            turn.store().commit(connection -> insert(connection, entry));
            return new Written.Kept<>(entry);
        });
    }

    private <T> Written<T> inTurn(Supplier<Written<T>> writing) {
        return turn.take(writing, refusal -> new Written.Refused<>(List.of(refusal)));
    }

    private static void insert(Connection connection, Incident incident) throws SQLException {
        try (PreparedStatement row =
                connection.prepareStatement("INSERT INTO incident VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?)")) {
            row.setInt(1, incident.id());
            row.setString(2, incident.title());
            row.setString(3, PostingTime.text(incident.beganAt()));
            row.setString(4, PostingTime.text(incident.openedAt()));
            row.setString(5, incident.by());
            row.setString(6, String.join(" ", incident.start().cuts()));
            row.setString(7, String.join(" ", incident.start().down()));
            row.setString(8, String.join(" ", incident.start().up()));
            row.setString(9, incident.start().reading());
            row.setInt(10, incident.posting());
            row.executeUpdate();
        }
    }

    private static void insert(Connection connection, IncidentEntry entry) throws SQLException {
        EntryDraft said = entry.said();
        BigDecimal oc3 = said.oc3();
        try (PreparedStatement row =
                connection.prepareStatement("INSERT INTO incident_entry VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)")) {
            row.setInt(1, entry.incident());
            row.setInt(2, entry.number());
            row.setString(3, said.kind().word());
            row.setString(4, PostingTime.text(said.happenedAt()));
            row.setString(5, PostingTime.text(entry.writtenAt()));
            row.setString(6, said.by());
            row.setString(7, said.text());
            row.setString(8, String.join(" ", said.circuits()));
            row.setObject(9, said.users());
            row.setString(10, oc3 == null ? null : oc3.toPlainString());
            row.setObject(11, said.corrects());
            row.executeUpdate();
        }
    }

    private static Incident incident(ResultSet row) throws SQLException {
        return new Incident(
                row.getInt("id"),
                row.getString("title"),
                PostingTime.parse(row.getString("began_at")),
                PostingTime.parse(row.getString("opened_at")),
                row.getString("opened_by"),
                new IncidentStart(codes(row, "cuts"), codes(row, "down"), codes(row, "up"), row.getString("reading")),
                row.getInt("posting"));
    }

    private static IncidentEntry entry(ResultSet row) throws SQLException {
        String oc3 = row.getString("oc3");
        EntryDraft said = new EntryDraft(
                EntryKind.find(row.getString("kind")).orElseThrow(),
                PostingTime.parse(row.getString("happened_at")),
                row.getString("written_by"),
                row.getString("text"),
                codes(row, "circuits"),
                whole(row, "users"),
                oc3 == null ? null : new BigDecimal(oc3),
                whole(row, "corrects"));
        return new IncidentEntry(
                row.getInt("incident"), row.getInt("number"), PostingTime.parse(row.getString("written_at")), said);
    }

    private static List<String> codes(ResultSet row, String column) throws SQLException {
        String text = row.getString(column);
        return text.isEmpty() ? List.of() : List.of(text.split(" ", -1));
    }

    private static @Nullable Integer whole(ResultSet row, String column) throws SQLException {
        int value = row.getInt(column);
        return row.wasNull() ? null : (Integer) value;
    }
}
