package spanwright.sqlite;

import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Types;
import spanwright.sqlite.rows.RowSink;

/** Binds a row to a prepared statement. */
final class StatementSink implements RowSink {

    private final PreparedStatement statement;
    private int column;

    StatementSink(PreparedStatement statement) {
        this.statement = statement;
    }

    /** Begins the next row. */
    void restart() {
        column = 0;
    }

    @Override
    public void integer(long value) {
        try {
            statement.setLong(++column, value);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public void real(double value) {
        try {
            statement.setDouble(++column, value);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public void text(String value) {
        try {
            statement.setString(++column, value);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public void blob(byte[] value) {
        try {
            statement.setBytes(++column, value);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public void none() {
        try {
            statement.setNull(++column, Types.NULL);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }
}
