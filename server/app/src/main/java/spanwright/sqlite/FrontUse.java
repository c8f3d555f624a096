package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Writes the table of fronts in use: one jumper each, or else circuits' ends. */
final class FrontUse {

    private final PreparedStatement use;
    private final PreparedStatement leave;
    private final PreparedStatement drop;

    FrontUse(Connection connection) throws SQLException {
        this.use = connection.prepareStatement("INSERT INTO front_use (end_key, jumpers, circuit_ends) VALUES (?, ?, ?)"
                + " ON CONFLICT (end_key) DO UPDATE"
                + " SET jumpers = jumpers + excluded.jumpers, circuit_ends = circuit_ends + excluded.circuit_ends");
        this.leave = connection.prepareStatement(
                "UPDATE front_use" + " SET jumpers = jumpers - ?, circuit_ends = circuit_ends - ? WHERE end_key = ?");
        this.drop = connection.prepareStatement(
                "DELETE FROM front_use WHERE end_key = ? AND jumpers = 0 AND circuit_ends = 0");
    }

    void add(Joint jumper) throws SQLException {
        for (EndRange ends : new EndRange[] {jumper.a(), jumper.b()}) {
            for (int index = 0; index < ends.count(); index++) {
                use(ends.key(index), 1, 0);
            }
        }
    }

    void remove(Joint jumper) throws SQLException {
        for (EndRange ends : new EndRange[] {jumper.a(), jumper.b()}) {
            for (int index = 0; index < ends.count(); index++) {
                leave(ends.key(index), 1, 0);
            }
        }
    }

    void add(Circuit circuit) throws SQLException {
        if (circuit.status() != CircuitStatus.RETIRED) {
            for (PortRange ports : new PortRange[] {circuit.a(), circuit.z()}) {
                for (int index = 0; index < ports.ports().count(); index++) {
                    use(front(ports, index), 0, 1);
                }
            }
        }
    }

    void remove(Circuit circuit) throws SQLException {
        if (circuit.status() != CircuitStatus.RETIRED) {
            for (PortRange ports : new PortRange[] {circuit.a(), circuit.z()}) {
                for (int index = 0; index < ports.ports().count(); index++) {
                    leave(front(ports, index), 0, 1);
                }
            }
        }
    }

    private static long front(PortRange ports, int index) {
        return new Leg(LegKind.FRONT, ports.panel()).key(ports.ports().at(index));
    }

    private void use(long key, int jumpers, int circuits) throws SQLException {
        use.setLong(1, key);
        use.setInt(2, jumpers);
        use.setInt(3, circuits);
        use.executeUpdate();
    }

    private void leave(long key, int jumpers, int circuits) throws SQLException {
        leave.setInt(1, jumpers);
        leave.setInt(2, circuits);
        leave.setLong(3, key);
        leave.executeUpdate();
        drop.setLong(1, key);
        drop.executeUpdate();
    }
}
