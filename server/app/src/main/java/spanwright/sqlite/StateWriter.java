package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.sqlite.rows.Layouts;

/**
 * Writes what postings change into the tables of the state. What is removed or replaced goes first, then what is
 * added or comes instead: so a code or a place in an order may pass from one record to another within a posting.
 *
 * <p>One thread's. Once a call has failed it is not used again.
 */
final class StateWriter {

    private final Connection connection;
    private final Map<RecordKind, TableWriter> tables = new EnumMap<>(RecordKind.class);
    private final Map<RecordKind, Integer> nextIdentities = new EnumMap<>(RecordKind.class);
    private final PreparedStatement nextIdentity;
    private final JoinedEnds joined;
    private final PlannedEnds planned;
    private final FrontUse fronts;

    StateWriter(Connection connection) throws SQLException {
        this.connection = connection;
        this.joined = new JoinedEnds(connection);
        this.planned = new PlannedEnds(connection);
        this.fronts = new FrontUse(connection);
        this.nextIdentity = connection.prepareStatement("INSERT INTO next_identity (of_table, id) VALUES (?, ?)"
                + " ON CONFLICT (of_table) DO UPDATE SET id = max(id, excluded.id)");
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery("SELECT of_table, id FROM next_identity")) {
            while (rows.next()) {
                nextIdentities.put(Layouts.of(rows.getString(1)).kind(), rows.getInt(2));
            }
        }
    }

    /** Writes the changes of one posting. */
    void write(List<Change> changes) throws SQLException {
        List<Change> net = NetChanges.of(changes);
        for (Change change : net) {
            Recorded before = change.before();
            if (before != null) {
                remove(before, change.after());
            }
        }
        for (TableWriter table : tables.values()) {
            table.flushRemoved();
        }
        List<Joint> inGlass = new ArrayList<>();
        for (Change change : net) {
            Recorded after = change.after();
            if (after != null) {
                add(change.before(), after, inGlass);
            }
        }
        for (TableWriter table : tables.values()) {
            table.flushAdded();
        }
        joined.add(inGlass);
        writeIdentities(changes);
    }

    private TableWriter table(RecordKind kind) throws SQLException {
        TableWriter table = tables.get(kind);
        if (table == null) {
            table = new TableWriter(connection, Layouts.of(kind));
            tables.put(kind, table);
        }
        return table;
    }

    private void remove(Recorded before, @Nullable Recorded after) throws SQLException {
        table(before.kind()).remove(before.id());
        if (before instanceof Joint joint && !usesTheSame(joint, after)) {
            if (joint.planned()) {
                planned.remove(joint);
            } else {
                joined.remove(joint);
                if (joint.type() == JointKind.JUMPER) {
                    fronts.remove(joint);
                }
            }
        } else if (before instanceof Circuit circuit) {
            fronts.remove(circuit);
        }
    }

    private void add(@Nullable Recorded before, Recorded after, List<Joint> inGlass) throws SQLException {
        table(after.kind()).add(after);
        if (after instanceof Joint joint && !usesTheSame(joint, before)) {
            if (joint.planned()) {
                planned.add(joint);
            } else {
                inGlass.add(joint);
                if (joint.type() == JointKind.JUMPER) {
                    fronts.add(joint);
                }
            }
        } else if (after instanceof Circuit circuit) {
            fronts.add(circuit);
        }
    }

    /** Whether a joint only got other facts, so that the rows of its ends stay as they are. */
    private static boolean usesTheSame(Joint joint, @Nullable Recorded other) {
        return other instanceof Joint twin
                && !joint.planned()
                && !twin.planned()
                && joint.type() == twin.type()
                && joint.a().equals(twin.a())
                && joint.b().equals(twin.b());
    }

    /** Keeps the identities that a table forgets: without a removal its largest says as much. */
    private void writeIdentities(List<Change> changes) throws SQLException {
        Map<RecordKind, Integer> removed = new EnumMap<>(RecordKind.class);
        for (Change change : changes) {
            if (change.after() == null) {
                removed.merge(change.kind(), change.id() + 1, Math::max);
            }
        }
        for (Map.Entry<RecordKind, Integer> entry : removed.entrySet()) {
            if (entry.getValue() > nextIdentities.getOrDefault(entry.getKey(), 0)) {
                nextIdentities.put(entry.getKey(), entry.getValue());
                nextIdentity.setString(1, Layouts.of(entry.getKey()).table());
                nextIdentity.setInt(2, entry.getValue());
                nextIdentity.executeUpdate();
            }
        }
    }
}
