package spanwright.records;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.paged.PagedRefs;

/** An immutable map from an owner's identity to those of what it owns, in the order in which they were entered. */
final class OwnerIndex {

    private static final int[] NOTHING = new int[0];

    private final PagedRefs<int[]> owned;

    private OwnerIndex(PagedRefs<int[]> owned) {
        this.owned = owned;
    }

    static OwnerIndex empty() {
        return new OwnerIndex(PagedRefs.empty());
    }

    /** What an owner owns; not to be changed by the caller. */
    int[] find(int owner) {
        int[] ids = owned.find(owner);
        return ids == null ? NOTHING : ids;
    }

    Editor edit() {
        return new Editor(owned);
    }

    /** One thread's; dead after {@link #build}. */
    static final class Editor {

        private final PagedRefs<int[]> from;
        private final Map<Integer, Growing> touched = new HashMap<>();

        private Editor(PagedRefs<int[]> from) {
            this.from = from;
        }

        int[] find(int owner) {
            Growing growing = touched.get(owner);
            int[] ids = growing != null ? growing.trimmed() : from.find(owner);
            return ids == null ? NOTHING : ids;
        }

        void add(int owner, int id) {
            touch(owner).add(id);
        }

        void remove(int owner, int id) {
            touch(owner).remove(id);
        }

        private Growing touch(int owner) {
            return touched.computeIfAbsent(owner, key -> new Growing(from.find(key)));
        }

        OwnerIndex build() {
            PagedRefs.Editor<int[]> next = from.edit();
            touched.forEach((owner, growing) -> {
                int[] ids = growing.trimmed();
                next.set(owner, ids.length == 0 ? null : ids);
            });
            return new OwnerIndex(next.build());
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
