package spanwright.benchmarks.sql;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * What a cut takes down, by recursive SQL: walks from every fiber to its ends both ways, over splitters to all fronts
 * behind them, and joins the circuits with one port behind the one end and the other behind the other. A circuit is
 * single where another of its group is not hit; that the other is whole is taken for granted, which spares SQL a walk.
 */
public final class SqlImpact implements AutoCloseable {

    private static final String WALK = "WITH RECURSIVE w(piece, side, e) AS ("
            + "SELECT s.piece, 0, 2 * s.piece FROM start s UNION ALL SELECT s.piece, 1, 2 * s.piece + 1 FROM start s "
            + "UNION ALL SELECT w.piece, w.side, j.b + 1 - 2 * (j.b & 1) FROM w CROSS JOIN sym j ON j.a = w.e "
            + "UNION ALL SELECT w.piece, w.side, x.b - 1 FROM w CROSS JOIN crossing x ON x.a = w.e), ";
    private static final String HIT = "r(piece, side, e, circuit, far) AS MATERIALIZED ("
            + "SELECT w.piece, w.side, w.e, p.circuit, p.far FROM w CROSS JOIN port p ON p.e = w.e), "
            + "hit(circuit, piece) AS MATERIALIZED (SELECT DISTINCT one.circuit, one.piece FROM r one JOIN r other "
            + "ON other.piece = one.piece AND other.side = 1 AND other.e = one.far AND other.circuit = one.circuit "
            + "WHERE one.side = 0) ";
    private static final String ANSWER = "SELECT c.code, c.priority, c.customers, c.grp, hit.piece, "
            + "c.grp IS NOT NULL AND EXISTS (SELECT 1 FROM circuit o WHERE o.grp = c.grp "
            + "AND o.id NOT IN (SELECT circuit FROM hit)) AS single "
            + "FROM hit CROSS JOIN circuit c ON c.id = hit.circuit "
            + "ORDER BY c.priority, single, c.customers DESC, c.code, hit.piece";

    private final Connection connection;
    private final PreparedStatement query;

    /**
     * A circuit that is hit in one fiber.
     *
     * @param code of the circuit
     * @param single whether it is up, but unprotected
     * @param priority of the circuit
     * @param customers how many hang on it
     * @param fiber the fiber that is cut, from 1
     */
    public record Row(String code, boolean single, int priority, int customers, int fiber) {}

    /** Writes the network and its circuits to a fresh file, everything cached. */
    public SqlImpact(Path file, Snapshot snapshot) throws SQLException {
        connection = SqlNetwork.open(file);
        try (Statement statement = connection.createStatement()) {
            statement.execute("CREATE TABLE crossing(a INTEGER, b INTEGER, PRIMARY KEY(a, b)) WITHOUT ROWID");
            statement.execute("CREATE TABLE port(e INTEGER, circuit INTEGER, far INTEGER, "
                    + "PRIMARY KEY(e, circuit, far)) WITHOUT ROWID");
            statement.execute(
                    "CREATE TABLE circuit(id INTEGER PRIMARY KEY, code TEXT, priority INTEGER, customers INTEGER, grp TEXT)");
            statement.execute("CREATE TEMP TABLE start(piece INTEGER PRIMARY KEY)");
        }
        connection.setAutoCommit(false);
        SqlNetwork.joins(connection, snapshot.network());
        crossings(snapshot.network());
        circuits(snapshot);
        try (Statement statement = connection.createStatement()) {
            statement.execute("CREATE INDEX circuit_group ON circuit(grp)");
        }
        connection.commit();
        query = connection.prepareStatement(WALK + HIT + ANSWER);
    }

    private void crossings(Network network) throws SQLException {
        try (PreparedStatement insert = connection.prepareStatement("INSERT INTO crossing VALUES (?, ?)")) {
            for (Block block : network.blocks()) {
                for (int in = 1; block.kind() == BlockKind.SPLITTER && in <= block.inputs(); in++) {
                    for (int out = block.inputs() + 1; out <= block.count(); out++) {
                        crossing(insert, block.piece(in), block.piece(out));
                        crossing(insert, block.piece(out), block.piece(in));
                    }
                }
            }
        }
    }

    private static void crossing(PreparedStatement insert, int from, int to) throws SQLException {
        insert.setInt(1, 2 * from + 1);
        insert.setInt(2, 2 * to + 1);
        insert.execute();
    }

    private void circuits(Snapshot snapshot) throws SQLException {
        try (PreparedStatement circuit = connection.prepareStatement("INSERT INTO circuit VALUES (?, ?, ?, ?, ?)");
                PreparedStatement port = connection.prepareStatement("INSERT INTO port VALUES (?, ?, ?)")) {
            for (Circuit each :
                    (Iterable<Circuit>) snapshot.records().circuits().list()::iterator) {
                circuit.setInt(1, each.id());
                circuit.setString(2, each.code());
                circuit.setInt(3, each.priority());
                circuit.setInt(4, each.customersServed());
                circuit.setString(5, each.protectionGroup());
                circuit.execute();
                for (int index = 0; index < each.fibers(); index++) {
                    int a = end(snapshot.network(), each.a(), index);
                    int z = end(snapshot.network(), each.z(), index);
                    port(port, a, each.id(), z);
                    port(port, z, each.id(), a);
                }
            }
        }
    }

    private static int end(Network network, PortRange ports, int index) {
        return network.endOf(
                EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index)));
    }

    private static void port(PreparedStatement insert, int end, int circuit, int far) throws SQLException {
        insert.setInt(1, end);
        insert.setInt(2, circuit);
        insert.setInt(3, far);
        insert.execute();
    }

    /** The circuits that a cut of a whole cable section hits, as they are restored. */
    public List<Row> cut(Block block) throws SQLException {
        SqlNetwork.start(connection, block.firstPiece(), block.count());
        List<Row> found = new ArrayList<>();
        try (ResultSet rows = query.executeQuery()) {
            while (rows.next()) {
                found.add(new Row(
                        rows.getString(1),
                        rows.getBoolean(6),
                        rows.getInt(2),
                        rows.getInt(3),
                        rows.getInt(5) - block.firstPiece() + 1));
            }
        }
        return found;
    }

    @Override
    public void close() throws SQLException {
        connection.close();
    }
}
