package spanwright.sqlite;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Instant;
import java.util.Optional;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/** Reads a file into memory when it is opened: from its image if it can, else from its tables. */
final class Loading {

    private static final Logger LOG = LoggerFactory.getLogger(Loading.class);

    /**
     * What was read.
     *
     * @param tip where the journal ends, and the state there
     * @param image the posting of the image from which it was read; -1 where there is none worth keeping
     */
    record Loaded(Tip tip, int image) {}

    /** To make a change again takes about as long as to read this many joints from the tables. */
    private static final int JOINTS_A_CHANGE = 16;

    /** So many changes are made again in any case: it is done before anyone looks up. */
    private static final int FEW_CHANGES = 5_000;

    private Loading() {}

    static Loaded load(Path file) throws SQLException {
        try (Connection connection = Connections.reading(file)) {
            // One transaction, so that whoever writes meanwhile is seen in all tables or in none.
            connection.setAutoCommit(false);
            Loaded loaded = load(file, connection);
            connection.rollback();
            return loaded;
        }
    }

    private static Loaded load(Path file, Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery(
                        "SELECT number, posted_at, hash FROM posting ORDER BY number DESC LIMIT 1")) {
            if (!row.next()) {
                return new Loaded(Tip.NONE, 0);
            }
            int last = row.getInt(1);
            Instant at = PostingTime.parse(row.getString(2));
            PostingHash hash = PostingHash.read(row.getBytes(3));
            Snapshot image =
                    Image.read(file, number -> hash(connection, number)).orElse(null);
            if (image == null || tooFar(image, connection)) {
                LOG.info("{} is read from its tables.", file);
                return new Loaded(new Tip(StateReader.read(connection, last), at, hash), -1);
            }
            return new Loaded(
                    new Tip(goOn(image, last, connection), at, hash),
                    image.records().posting());
        }
    }

    private static Optional<PostingHash> hash(Connection connection, int posting) {
        try (PreparedStatement statement = connection.prepareStatement("SELECT hash FROM posting WHERE number = ?")) {
            statement.setInt(1, posting);
            try (ResultSet row = statement.executeQuery()) {
                return row.next() ? Optional.of(PostingHash.read(row.getBytes(1))) : Optional.empty();
            }
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    private static boolean tooFar(Snapshot image, Connection connection) throws SQLException {
        try (PreparedStatement statement =
                connection.prepareStatement("SELECT coalesce(sum(changes), 0) FROM posting WHERE number > ?")) {
            statement.setInt(1, image.records().posting());
            try (ResultSet row = statement.executeQuery()) {
                long changes = row.getLong(1);
                long joints = image.records().joints().count();
                return changes > FEW_CHANGES && changes * JOINTS_A_CHANGE > joints;
            }
        }
    }

    /** Makes the postings again that came after the image. */
    private static Snapshot goOn(Snapshot image, int last, Connection connection) throws SQLException {
        int first = image.records().posting() + 1;
        if (first > last) {
            return image;
        }
        SnapshotEditor editor = image.edit();
        for (int number = first; number <= last; number++) {
            Journal.changes(connection, number).forEach(editor::replay);
        }
        return editor.build(last);
    }
}
