package sample.low;

import java.sql.SQLException;
import sample.high.High;

/** Uses what stands above it, and SQL. */
public final class Low {

    /** Something to be used. */
    public int height(High high) throws SQLException {
        return high.low().hashCode();
    }
}
