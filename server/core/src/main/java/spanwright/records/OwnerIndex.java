package spanwright.records;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;

/** An immutable map from an owner's identity to those of what it owns, in the order in which they were entered. */
final class OwnerIndex {

    private static final int[] NOTHING = new int[0];

    private final Later<PagedRefs<int[]>> owned;

    private OwnerIndex(Later<PagedRefs<int[]>> owned) {
        this.owned = owned;
    }

    static OwnerIndex empty() {
        return new OwnerIndex(Later.of(PagedRefs.empty()));
    }

    /** The index of all records of a kind by one relation, made when an owner is first looked up. */
    static OwnerIndex later(Relation relation, Supplier<Stream<Recorded>> records) {
        return new OwnerIndex(Later.by(() -> owned(relation, records.get())));
    }

    private static PagedRefs<int[]> owned(Relation relation, Stream<Recorded> records) {
        Editor editor = empty().edit();
        records.forEach(record -> Ownership.tell(record, (by, owner) -> {
            if (by == relation) {
                editor.add(owner, record.id());
            }
        }));
        return editor.build().owned.get();
    }

    /** What an owner owns; not to be changed by the caller. */
    int[] find(int owner) {
        int[] ids = owned.get().find(owner);
        return ids == null ? NOTHING : ids;
    }

    Editor edit() {
        return new Editor(owned);
    }

    /** One thread's; dead after {@link #build}. */
    static final class Editor {

        private final Later<PagedRefs<int[]>> from;
        private final Map<Integer, Growing> touched = new HashMap<>();

        private Editor(Later<PagedRefs<int[]>> from) {
            this.from = from;
        }

        int[] find(int owner) {
            Growing growing = touched.get(owner);
            int[] ids = growing != null ? growing.trimmed() : from.get().find(owner);
            return ids == null ? NOTHING : ids;
        }

        void add(int owner, int id) {
            touch(owner).add(id);
        }

        void remove(int owner, int id) {
            touch(owner).remove(id);
        }

        private Growing touch(int owner) {
            return touched.computeIfAbsent(owner, key -> new Growing(from.get().find(key)));
        }

        OwnerIndex build() {
            if (touched.isEmpty()) {
                return new OwnerIndex(from);
            }
            PagedRefs.Editor<int[]> next = from.get().edit();
            touched.forEach((owner, growing) -> {
                int[] ids = growing.trimmed();
                next.set(owner, ids.length == 0 ? null : ids);
            });
            return new OwnerIndex(Later.of(next.build()));
        }
    }

    /** A list of ints that grows by doubling, so that a bulk load is not quadratic. */
    private static final class Growing {

        private int[] ids;
        private int size;

        Growing(int @Nullable [] ids) {
            this.ids = ids == null ? NOTHING : ids.clone();
            this.size = this.ids.length;
        }

        void add(int id) {
            if (size == ids.length) {
                ids = Arrays.copyOf(ids, Math.max(4, size * 2));
            }
            ids[size++] = id;
        }

        void remove(int id) {
            for (int index = 0; index < size; index++) {
                if (ids[index] == id) {
                    System.arraycopy(ids, index + 1, ids, index, size - index - 1);
                    size--;
                    return;
                }
            }
        }

        int[] trimmed() {
            if (size != ids.length) {
                ids = Arrays.copyOf(ids, size);
            }
            return ids;
        }
    }
}
