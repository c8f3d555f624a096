package spanwright.sqlite;

import java.io.IOException;
import java.sql.SQLException;
import org.jspecify.annotations.Nullable;
import org.sqlite.SQLiteErrorCode;
import org.sqlite.SQLiteException;

/** The records file could not be read or written. */
public final class StorageFault extends RuntimeException {

    private static final long serialVersionUID = 1;

    StorageFault(SQLException cause) {
        super(cause.getMessage(), cause);
    }

    StorageFault(IOException cause) {
        super(cause.getMessage(), cause);
    }

    /** Whether SQLite refused it because of a rule of the tables, and not because the file failed. */
    boolean breaksRule() {
        return primary() == SQLiteErrorCode.SQLITE_CONSTRAINT;
    }

    /** SQLite's own code, its details left out; null where it was not SQLite that failed. */
    @Nullable
    SQLiteErrorCode primary() {
        if (getCause() instanceof SQLiteException fault) {
            return SQLiteErrorCode.getErrorCode(fault.getResultCode().code & 0xFF);
        }
        return null;
    }
}
