package spanwright.sqlite.rows;

/**
 * One column of a table.
 *
 * @param name its name, in words of the trade
 * @param type what it holds
 */
public record Column(String name, ColumnType type) {}
