package spanwright.exchange;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** The first row of a file: which field holds which column. */
final class Header {

    private Header() {}

    /**
     * Reads the header; every fault of it is told.
     *
     * @return for each column of the table its field, or -1; null where a required column is missing
     */
    static int @Nullable [] read(CsvReader reader, Table table, Faults faults) {
        int[] fieldOf = new int[table.columns().size()];
        Arrays.fill(fieldOf, -1);
        Set<String> unknown = new HashSet<>();
        for (int field = 0; field < reader.fields(); field++) {
            String name = new String(reader.chars(), reader.start(field), reader.end(field) - reader.start(field));
            int column = table.columns().indexOf(name);
            if (column < 0) {
                if (unknown.add(name)) {
                    faults.add(table, reader.line(), unknown(table, name, field));
                }
            } else if (fieldOf[column] >= 0) {
                faults.add(table, reader.line(), "column '" + name + "' stands twice; each column stands once");
            } else {
                fieldOf[column] = field;
            }
        }
        boolean whole = true;
        for (int column = 0; column < fieldOf.length; column++) {
            if (fieldOf[column] < 0 && table.required(column)) {
                String name = table.columns().get(column);
                faults.add(table, reader.line(), "column '" + name + "' is missing; it is required");
                whole = false;
            }
        }
        return whole ? fieldOf : null;
    }

    private static String unknown(Table table, String name, int field) {
        List<String> columns = table.columns();
        return (name.isEmpty()
                        ? "column " + (field + 1) + " has no name"
                        : "unknown column '" + Texts.shown(name) + "'")
                + "; the columns of " + table.file() + " are " + String.join(", ", columns) + Near.hint(name, columns);
    }
}
