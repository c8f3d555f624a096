package spanwright.sqlite.rows;

/** What a column holds, besides nothing. */
public enum ColumnType {
    /** A whole number of 64 bits. */
    INTEGER,
    /** A double, kept to the last bit. */
    REAL,
    /** Text. */
    TEXT,
    /** Bytes. */
    BLOB
}
