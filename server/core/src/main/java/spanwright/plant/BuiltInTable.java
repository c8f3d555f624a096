package spanwright.plant;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A table of built-in values, packed with the program: CSV with a header row, quoted fields without line breaks.
 * Sources are named by a key into the table {@code sources}.
 */
public final class BuiltInTable {

    private static final String FOLDER = "/spanwright/built-in/";

    private BuiltInTable() {}

    /** The rows of the table of that name; one that is not packed with the program is a bug. */
    public static List<Row> read(String name) {
        Map<String, Source> sources = new HashMap<>();
        for (Map<String, String> row : rows("sources")) {
            sources.put(cell(row, "source"), new Source(cell(row, "text"), SourceStatus.get(cell(row, "status"))));
        }
        return rows(name).stream().map(cells -> new Row(cells, sources)).toList();
    }

    private static List<Map<String, String>> rows(String name) {
        List<String> lines = text(FOLDER + name + ".csv").lines().toList();
        List<String> header = fields(lines.get(0));
        List<Map<String, String>> rows = new ArrayList<>();
        for (String line : lines.subList(1, lines.size())) {
            List<String> fields = fields(line);
            Map<String, String> row = new HashMap<>();
            for (int column = 0; column < fields.size(); column++) {
                row.put(header.get(column), fields.get(column));
            }
            rows.add(row);
        }
        return rows;
    }

    private static String text(String resource) {
        try (InputStream stream = BuiltInTable.class.getResourceAsStream(resource)) {
            if (stream == null) {
                throw new IllegalStateException("not packed with the program: " + resource);
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    private static List<String> fields(String line) {
        List<String> fields = new ArrayList<>();
        StringBuilder field = new StringBuilder();
        boolean quoted = false;
        for (int index = 0; index < line.length(); index++) {
            char letter = line.charAt(index);
            if (letter == '"') {
                quoted = !quoted;
            } else if (letter == ',' && !quoted) {
                fields.add(field.toString());
                field.setLength(0);
            } else {
                field.append(letter);
            }
        }
        fields.add(field.toString());
        return fields;
    }

    private static String cell(Map<String, String> row, String column) {
        String value = row.get(column);
        if (value == null) {
            throw new IllegalStateException("no column " + column);
        }
        return value;
    }

    /** One row. */
    public static final class Row {

        private final Map<String, String> cells;
        private final Map<String, Source> sources;

        private Row(Map<String, String> cells, Map<String, Source> sources) {
            this.cells = cells;
            this.sources = sources;
        }

        /** What a column holds; empty where blank. A column that the table does not have is a bug. */
        public String get(String column) {
            return cell(cells, column);
        }

        /** The source that a column names. */
        public Source source(String column) {
            Source source = sources.get(get(column));
            if (source == null) {
                throw new IllegalStateException("no source " + get(column));
            }
            return source;
        }
    }
}
