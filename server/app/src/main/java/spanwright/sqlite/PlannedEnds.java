package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import spanwright.splicing.Joint;

/** Writes the table of the ends that planned jobs mean to join: few, so a row at a time. */
final class PlannedEnds {

    private final PreparedStatement insert;
    private final PreparedStatement delete;

    PlannedEnds(Connection connection) throws SQLException {
        this.insert = connection.prepareStatement(
                "INSERT INTO planned_end (job, end_key, peer_key, joint) VALUES (?, ?, ?, ?)");
        this.delete = connection.prepareStatement("DELETE FROM planned_end WHERE job = ? AND end_key = ?");
    }

    void remove(Joint joint) throws SQLException {
        for (int index = 0; index < joint.count(); index++) {
            remove(joint, joint.a().key(index));
            remove(joint, joint.b().key(index));
        }
    }

    private void remove(Joint joint, long key) throws SQLException {
        delete.setString(1, joint.plannedJob());
        delete.setLong(2, key);
        delete.executeUpdate();
    }

    void add(Joint joint) throws SQLException {
        for (int index = 0; index < joint.count(); index++) {
            add(joint, joint.a().key(index), joint.b().key(index));
            add(joint, joint.b().key(index), joint.a().key(index));
        }
    }

    private void add(Joint joint, long key, long peer) throws SQLException {
        insert.setString(1, joint.plannedJob());
        insert.setLong(2, key);
        insert.setLong(3, peer);
        insert.setInt(4, joint.id());
        insert.executeUpdate();
    }
}
