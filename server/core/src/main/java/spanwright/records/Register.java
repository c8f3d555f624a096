package spanwright.records;

import java.util.NoSuchElementException;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;

/**
 * All records of one kind, by identity.
 *
 * @param <T> the kind's type
 */
public final class Register<T extends Recorded> {

    private final RecordsView view;
    private final Class<T> type;
    private final RecordKind kind;

    Register(RecordsView view, RecordKind kind, Class<T> type) {
        this.view = view;
        this.kind = kind;
        this.type = type;
    }

    /**
     * The record of an identity.
     *
     * @throws NoSuchElementException where there is none
     */
    public T get(int id) {
        Recorded record = view.record(kind, id);
        if (record == null) {
            throw new NoSuchElementException("no " + kind + " " + id);
        }
        return type.cast(record);
    }

    /** The record of an identity, if any. */
    public Optional<T> find(int id) {
        return Optional.ofNullable(type.cast(view.record(kind, id)));
    }

    /** The record with a code, if any; of panels and splitters see {@link RecordsView}. */
    public Optional<T> find(String code) {
        int id = view.identity(kind, code);
        return id == 0 ? Optional.empty() : find(id);
    }

    /** All of them, in the order of their identities. */
    public Stream<T> list() {
        return IntStream.range(0, view.limit(kind))
                .mapToObj(id -> view.record(kind, id))
                .filter(Objects::nonNull)
                .map(type::cast);
    }

    /** Those that an owner owns by a relation, in the order in which they were entered. */
    public Stream<T> owned(Relation relation, int owner) {
        return IntStream.of(view.owned(relation, owner)).mapToObj(this::get);
    }

    /** How many there are. */
    public int count() {
        return view.count(kind);
    }
}
