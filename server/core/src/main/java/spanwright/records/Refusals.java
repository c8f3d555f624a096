package spanwright.records;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;

/** Gathers why one record is refused. */
final class Refusals {

    private final Recorded record;
    private final List<Refusal> list = new ArrayList<>(0);

    Refusals(Recorded record) {
        this.record = record;
    }

    /** A broken rule; the column is null where the row as a whole is at fault. */
    void add(String code, @Nullable String column, String sentence) {
        list.add(new Refusal(code, sentence, column, record, null));
    }

    /** A clash with an earlier record. */
    void add(String code, @Nullable String column, String sentence, @Nullable Recorded earlier) {
        list.add(new Refusal(code, sentence, column, record, earlier));
    }

    List<Refusal> list() {
        return list;
    }
}
