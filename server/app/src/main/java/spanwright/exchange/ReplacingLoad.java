package spanwright.exchange;

import java.util.Optional;
import java.util.function.BiPredicate;
import java.util.function.Function;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.records.Register;

/**
 * Enters rows of which each may take the place of a record that the file holds under the same name.
 *
 * @param <T> the record
 */
final class ReplacingLoad<T extends Recorded> implements TableLoad {

    private final Entering entering;
    private final Rows<T> rows;
    private final Register<T> register;
    private final Function<T, String> name;
    private final BiPredicate<T, T> mayReplace;

    /**
     * Rows that replace.
     *
     * @param mayReplace whether the record held may be replaced by the one read; else it is a code twice
     */
    ReplacingLoad(
            Entering entering,
            Rows<T> rows,
            Register<T> register,
            Function<T, String> name,
            BiPredicate<T, T> mayReplace) {
        this.entering = entering;
        this.rows = rows;
        this.register = register;
        this.name = name;
        this.mayReplace = mayReplace;
    }

    @Override
    public void enter(Row row) {
        T record = rows.read(row, entering.view().limit(rows.kind()));
        if (record == null) {
            return;
        }
        Optional<T> held = register.find(name.apply(record));
        boolean fromFile = held.isPresent()
                && entering.lines().before(held.get())
                && entering.lines().of(held.get()) == 0;
        if (!fromFile) {
            entering.add(rows.table(), row.line(), record);
            return;
        }
        T same = rows.read(row, held.get().id());
        if (same == null || !mayReplace.test(held.get(), same)) {
            entering.add(rows.table(), row.line(), record);
        } else if (same.equals(held.get())) {
            entering.lines().note(same, row.line());
        } else {
            entering.apply(rows.table(), row.line(), Change.replace(held.get(), same));
        }
    }
}
