package spanwright.sqlite;

import java.sql.ResultSet;
import java.sql.SQLException;
import spanwright.sqlite.rows.RowSource;

/** The row on which a result set stands. */
final class ResultRow implements RowSource {

    private final ResultSet results;
    private int column;

    ResultRow(ResultSet results) {
        this.results = results;
    }

    /** Passes to the next row, if there is one. */
    boolean next() throws SQLException {
        column = 0;
        return results.next();
    }

    @Override
    public boolean passNone() {
        try {
            boolean nothing = results.getObject(column + 1) == null;
            column += nothing ? 1 : 0;
            return nothing;
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public long integer() {
        try {
            return results.getLong(++column);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public double real() {
        try {
            return results.getDouble(++column);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public String text() {
        try {
            return results.getString(++column);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public byte[] blob() {
        try {
            return results.getBytes(++column);
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }
}
