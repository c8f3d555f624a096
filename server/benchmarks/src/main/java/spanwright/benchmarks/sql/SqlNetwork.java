package spanwright.benchmarks.sql;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Arrays;
import java.util.stream.IntStream;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * The network as two tables and the fastest recursive query over them that we found: every join stands twice, so a hop
 * is one look-up by primary key. The other end of a piece is {@code e + 1 - 2 * (e & 1)}.
 */
public final class SqlNetwork implements AutoCloseable {

    private static final String WALK = "WITH RECURSIVE w(piece, side, e) AS ("
            + "SELECT s.piece, 0, 2 * s.piece FROM start s UNION ALL SELECT s.piece, 1, 2 * s.piece + 1 FROM start s "
            + "UNION ALL SELECT w.piece, w.side, j.b + 1 - 2 * (j.b & 1) FROM w CROSS JOIN sym j ON j.a = w.e) ";
    private static final String LAST = "SELECT w.piece, w.side, w.e, c.circuit FROM w "
            + "LEFT JOIN circuit_end c ON c.e = w.e "
            + "WHERE NOT EXISTS (SELECT 1 FROM sym j WHERE j.a = w.e)";
    private static final String EVERY = "SELECT w.piece, w.side, w.e FROM w";

    private final Connection connection;
    private final PreparedStatement ends;
    private final PreparedStatement hops;

    /** Writes the network to a fresh file, everything cached. */
    public SqlNetwork(Path file, Snapshot snapshot) throws SQLException {
        connection = open(file);
        try (Statement statement = connection.createStatement()) {
            statement.execute(
                    "CREATE TABLE circuit_end(e INTEGER, circuit INTEGER, PRIMARY KEY(e, circuit)) WITHOUT ROWID");
            statement.execute("CREATE TEMP TABLE start(piece INTEGER PRIMARY KEY)");
        }
        connection.setAutoCommit(false);
        joins(connection, snapshot.network());
        circuits(snapshot);
        connection.commit();
        ends = connection.prepareStatement(WALK + LAST);
        hops = connection.prepareStatement(WALK + EVERY);
    }

    /** A fresh file with room for the joins, everything cached. */
    static Connection open(Path file) throws SQLException {
        Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file);
        try (Statement statement = connection.createStatement()) {
            statement.execute("PRAGMA journal_mode = OFF");
            statement.execute("PRAGMA synchronous = OFF");
            statement.execute("PRAGMA cache_size = -4000000");
            statement.execute("PRAGMA mmap_size = 8000000000");
            statement.execute("CREATE TABLE sym(a INTEGER PRIMARY KEY, b INTEGER NOT NULL)");
        }
        return connection;
    }

    /** Writes every join twice. */
    static void joins(Connection connection, Network network) throws SQLException {
        try (PreparedStatement insert = connection.prepareStatement("INSERT INTO sym VALUES (?, ?)")) {
            int batched = 0;
            for (int end = 0; end < 2 * network.pieces(); end++) {
                if (network.peer(end) != Network.NONE) {
                    insert.setInt(1, end);
                    insert.setInt(2, network.peer(end));
                    insert.addBatch();
                    if (++batched % 10_000 == 0) {
                        insert.executeBatch();
                    }
                }
            }
            insert.executeBatch();
        }
    }

    private void circuits(Snapshot snapshot) throws SQLException {
        try (PreparedStatement insert =
                connection.prepareStatement("INSERT OR IGNORE INTO circuit_end VALUES (?, ?)")) {
            for (Circuit circuit :
                    (Iterable<Circuit>) snapshot.records().circuits().list()::iterator) {
                insert(insert, snapshot.network(), circuit, circuit.a());
                insert(insert, snapshot.network(), circuit, circuit.z());
            }
        }
    }

    private static void insert(PreparedStatement insert, Network network, Circuit circuit, PortRange ports)
            throws SQLException {
        for (int index = 0; index < ports.ports().count(); index++) {
            insert.setInt(
                    1,
                    network.endOf(EndKey.of(
                            LegKind.FRONT, ports.panel(), ports.ports().at(index))));
            insert.setInt(2, circuit.id());
            insert.execute();
        }
    }

    private void start(int firstPiece, int count) throws SQLException {
        start(connection, firstPiece, count);
    }

    /** Lists the pieces from which the next query starts. */
    static void start(Connection connection, int firstPiece, int count) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute("DELETE FROM start");
            statement.execute("INSERT INTO start WITH RECURSIVE n(i) AS (SELECT " + firstPiece
                    + " UNION ALL SELECT i + 1 FROM n WHERE i < " + (firstPiece + count - 1) + ") SELECT i FROM n");
        }
    }

    /**
     * Both ends of the path of each piece of a block, and all circuits that end there.
     *
     * @return per piece its lower and its higher end, then the circuits' identities, each once, rising
     */
    public int[][] ends(Block block) throws SQLException {
        int firstPiece = block.firstPiece();
        int count = block.count();
        start(firstPiece, count);
        int[][] found = new int[count + 1][2];
        IntStream.Builder circuits = IntStream.builder();
        try (ResultSet rows = ends.executeQuery()) {
            while (rows.next()) {
                found[rows.getInt(1) - firstPiece][rows.getInt(2)] = rows.getInt(3);
                int circuit = rows.getInt(4);
                if (circuit != 0) {
                    circuits.add(circuit);
                }
            }
        }
        for (int index = 0; index < count; index++) {
            Arrays.sort(found[index]);
        }
        found[count] = circuits.build().sorted().distinct().toArray();
        return found;
    }

    /** The sum of all pieces met on the paths of a block's pieces, each walk from its own piece. */
    public long hops(Block block) throws SQLException {
        return hops(block.firstPiece(), block.count());
    }

    /** The same for some neighbouring pieces. */
    public long hops(int firstPiece, int count) throws SQLException {
        start(firstPiece, count);
        long sum = 0;
        try (ResultSet rows = hops.executeQuery()) {
            while (rows.next()) {
                sum += rows.getInt(3) >> 1;
            }
        }
        return sum;
    }

    @Override
    public void close() throws SQLException {
        connection.close();
    }
}
