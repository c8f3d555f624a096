package spanwright.sqlite;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.StringJoiner;
import org.jspecify.annotations.Nullable;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.RowSink;

/**
 * A row on its way into a table, parted into what most rows have alike and what each has of its own: words and nothing
 * are written into the statement, the rest is bound to it. A joint binds 9 values of its 21 so.
 */
final class RowPattern implements RowSink {

    private static final String NOTHING = "NULL";

    /** What rows have alike: per column a literal of SQL, or null where each has its own value. */
    private final @Nullable String[] literals;

    private final Map<String, String> quoted = new HashMap<>();
    private final Object[] values;
    private int column;
    private int bound;

    RowPattern(int columns) {
        this.literals = new String[columns];
        this.values = new Object[columns];
    }

    /** Begins the next row. */
    void restart() {
        column = 0;
        bound = 0;
    }

    /** What the row has in common with others; a fresh list. */
    List<@Nullable String> literals() {
        return Arrays.asList(literals.clone());
    }

    /** Whether the row has that in common with others. */
    boolean fits(List<@Nullable String> others) {
        for (int index = 0; index < literals.length; index++) {
            if (!Objects.equals(literals[index], others.get(index))) {
                return false;
            }
        }
        return true;
    }

    /** How many values of its own the row has. */
    int bound() {
        return bound;
    }

    /** One of the row's own values, from 0 on. */
    Object value(int index) {
        return values[index];
    }

    /** The statement that adds so many rows which have this in common. */
    static String insert(String table, List<Column> columns, List<@Nullable String> literals, int rows) {
        StringJoiner names = new StringJoiner(", ", "(", ")");
        StringJoiner marks = new StringJoiner(", ", "(", ")");
        for (int index = 0; index < columns.size(); index++) {
            String literal = literals.get(index);
            if (!NOTHING.equals(literal)) {
                names.add(columns.get(index).name());
                marks.add(literal == null ? "?" : literal);
            }
        }
        return "INSERT INTO " + table + " " + names + " VALUES " + marks + (", " + marks).repeat(rows - 1);
    }

    private void bind(Object value) {
        literals[column++] = null;
        values[bound++] = value;
    }

    @Override
    public void integer(long value) {
        bind(value);
    }

    @Override
    public void real(double value) {
        bind(value);
    }

    @Override
    public void text(String value) {
        bind(value);
    }

    @Override
    public void blob(byte[] value) {
        bind(value);
    }

    @Override
    public void word(String value) {
        literals[column++] = quoted.computeIfAbsent(value, word -> "'" + word.replace("'", "''") + "'");
    }

    @Override
    public void none() {
        literals[column++] = NOTHING;
    }
}
