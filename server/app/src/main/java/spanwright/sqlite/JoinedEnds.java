package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.List;
import spanwright.splicing.Joint;

/**
 * Writes the table of joined ends: its rows sorted by key, so that a load appends pages instead of searching for
 * them, and many by one statement, so that less is spent on the way into SQLite than within it.
 *
 * <p>Measured for a million joints: one row a statement in batches 239,000 joints/s, 64 rows a statement 290,000, a
 * statement a range of 4 ends 383,000, of 12 ends 611,000, but of single ends 149,000. So short sides go 64 rows a
 * statement, long ones a range at a time.
 */
final class JoinedEnds {

    /** At most this many joints are sorted at once, which bounds the memory it takes. */
    private static final int CHUNK = 4_000_000;

    /** From this many ends a side on, statements by range are faster. */
    private static final int LONG_SIDE = 4;

    /** The longest range that one statement adds. */
    private static final int COUNTING = 1024;

    private static final String ROW = "(?, ?)";
    private static final int[] ROWS = {64, 8, 1};

    private final PreparedStatement remove;
    private final PreparedStatement[] byRows = new PreparedStatement[ROWS.length];
    private final PreparedStatement byRange;
    private final long[] waiting = new long[2 * ROWS[0]];
    private int rows;

    JoinedEnds(Connection connection) throws SQLException {
        this.remove = connection.prepareStatement("DELETE FROM joined_end WHERE end_key BETWEEN ? AND ? AND joint = ?");
        for (int index = 0; index < ROWS.length; index++) {
            byRows[index] = connection.prepareStatement(
                    "INSERT INTO joined_end VALUES " + ROW + (", " + ROW).repeat(ROWS[index] - 1));
        }
        count(connection);
        this.byRange =
                connection.prepareStatement("INSERT INTO joined_end SELECT ?1 + n, ?2 FROM temp.counting WHERE n < ?3");
    }

    private static void count(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.executeUpdate("CREATE TEMP TABLE IF NOT EXISTS counting (n INTEGER PRIMARY KEY)");
            statement.executeUpdate("INSERT OR IGNORE INTO temp.counting WITH RECURSIVE counted (n) AS"
                    + " (VALUES (0) UNION ALL SELECT n + 1 FROM counted WHERE n + 1 < " + COUNTING + ")"
                    + " SELECT n FROM counted");
        }
    }

    /** Removes the rows of a joint. */
    void remove(Joint joint) throws SQLException {
        remove(JointSide.of(joint, true));
        remove(JointSide.of(joint, false));
    }

    private void remove(JointSide side) throws SQLException {
        remove.setLong(1, side.key());
        remove.setLong(2, side.key() + side.count() - 1);
        remove.setInt(3, side.joint());
        remove.executeUpdate();
    }

    /** Adds the rows of joints. */
    void add(List<Joint> joints) throws SQLException {
        for (int from = 0; from < joints.size(); from += CHUNK) {
            addChunk(joints.subList(from, Math.min(joints.size(), from + CHUNK)));
        }
    }

    private void addChunk(List<Joint> joints) throws SQLException {
        int sides = 2 * joints.size();
        long[] keys = new long[sides];
        int[] order = new int[sides];
        long ends = 0;
        int at = 0;
        for (Joint joint : joints) {
            for (int side = 0; side < 2; side++) {
                keys[at] = JointSide.key(joint, side == 0);
                order[at] = at++;
            }
            ends += 2L * joint.count();
        }
        KeySort.sort(keys, order, sides);
        boolean longSides = ends >= (long) LONG_SIDE * sides;
        for (int number : order) {
            JointSide side = JointSide.of(joints.get(number >>> 1), (number & 1) == 0);
            if (longSides) {
                addRange(side);
            } else {
                addRows(side);
            }
        }
        flush();
    }

    private void addRange(JointSide side) throws SQLException {
        for (int from = 0; from < side.count(); from += COUNTING) {
            byRange.setLong(1, side.key() + from);
            byRange.setInt(2, side.joint());
            byRange.setInt(3, Math.min(COUNTING, side.count() - from));
            byRange.executeUpdate();
        }
    }

    private void addRows(JointSide side) throws SQLException {
        for (int index = 0; index < side.count(); index++) {
            waiting[2 * rows] = side.key() + index;
            waiting[2 * rows + 1] = side.joint();
            if (++rows == ROWS[0]) {
                flush();
            }
        }
    }

    private void flush() throws SQLException {
        int written = 0;
        for (int index = 0; index < ROWS.length; index++) {
            while (rows - written >= ROWS[index]) {
                PreparedStatement statement = byRows[index];
                for (int cell = 0; cell < 2 * ROWS[index]; cell++) {
                    statement.setLong(cell + 1, waiting[2 * written + cell]);
                }
                statement.executeUpdate();
                written += ROWS[index];
            }
        }
        rows = 0;
    }
}
