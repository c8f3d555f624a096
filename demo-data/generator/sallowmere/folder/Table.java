package sallowmere.folder;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** Rows of one file of the records folder, gathered and then written as CSV (RFC 4180, lines end with LF). */
public final class Table {
    private final String file;
    private final List<String> columns;
    private final List<List<String>> rows = new ArrayList<>();

    /** An empty table for a file with these columns. */
    public Table(String file, String... columns) {
        this.file = file;
        this.columns = List.of(columns);
    }

    /** Adds a row; its values stand in the order of the columns, blank where null. */
    public void add(Object... values) {
        if (values.length != columns.size()) {
            throw new IllegalStateException(
                    file + ": " + values.length + " values for " + columns.size() + " columns: " + List.of(values));
        }
        List<String> row = new ArrayList<>();
        for (Object value : values) {
            row.add(value == null ? "" : value.toString());
        }
        rows.add(row);
    }

    /** How many rows it holds. */
    public int size() {
        return rows.size();
    }

    /** Writes the file into a folder. */
    public void write(Path folder) {
        StringBuilder text = new StringBuilder();
        line(text, columns);
        rows.forEach(row -> line(text, row));
        try {
            Files.createDirectories(folder);
            Files.writeString(folder.resolve(file), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static void line(StringBuilder text, List<String> values) {
        for (int i = 0; i < values.size(); i++) {
            text.append(i == 0 ? "" : ",").append(quoted(values.get(i)));
        }
        text.append('\n');
    }

    private static String quoted(String value) {
        boolean plain = value.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
        return plain ? value : '"' + value.replace("\"", "\"\"") + '"';
    }
}
