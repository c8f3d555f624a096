package spanwright.exchange;

import java.util.Optional;
import java.util.function.Function;
import spanwright.journal.Recorded;
import spanwright.records.Register;

/**
 * The records of one kind by the codes that rows name them with. A code that leads nowhere is a fault, unless it
 * leads to a row that is refused itself; either way it reads as 0.
 *
 * @param <T> the kind's type
 */
final class Known<T extends Recorded> {

    /** How many codes are looked through for near ones, per kind. */
    private static final long MOST_COMPARED = 5_000_000;

    private final Register<T> register;
    private final Table table;
    private final String what;
    private final Function<T, String> code;
    private final Doubts doubts;
    private final SliceIds ids = new SliceIds();
    private long compared;

    Known(Register<T> register, Table table, String what, Function<T, String> code, Doubts doubts) {
        this.register = register;
        this.table = table;
        this.what = what;
        this.code = code;
        this.doubts = doubts;
    }

    /** The identity behind the code in a column; 0 where blank, missing or in doubt. */
    int find(Row row, int column) {
        return row.blank(column) ? 0 : find(row, column, row.from(column), row.to(column));
    }

    /** The identity behind the code in a part of a column; 0 where missing or in doubt. */
    int find(Row row, int column, int from, int to) {
        int id = ids.find(0, row.chars(), from, to);
        if (id != 0) {
            return id;
        }
        String text = new String(row.chars(), from, to - from);
        Optional<T> found = register.find(text);
        if (found.isPresent()) {
            id = found.get().id();
            ids.put(0, text, id);
        } else if (!doubts.cover(table, text)) {
            row.fault(
                    column,
                    row.table().columns().get(column) + ": there is no " + what + " '" + Texts.shown(text)
                            + "'; name one of " + table.file() + near(text));
        }
        return id;
    }

    private String near(String text) {
        compared += register.count();
        if (compared > MOST_COMPARED) {
            return "";
        }
        String nearest = Near.find(text, () -> register.list().map(code).iterator());
        return nearest == null ? "" : " - did you mean '" + nearest + "'?";
    }
}
