package spanwright.records;

import java.util.HashMap;
import java.util.Map;

/**
 * An immutable map from codes to identities in two layers: a large base, shared, and a small layer of what
 * changed since. A posting copies only the small one; now and then both are merged.
 *
 * <p>Lost to this: copying one map a posting (milliseconds at 10^6 codes).
 */
final class CodeIndex {

    private static final int GONE = 0;
    private static final int MERGE_AT = 512;

    private final Map<String, Integer> base;
    private final Map<String, Integer> recent;

    private CodeIndex(Map<String, Integer> base, Map<String, Integer> recent) {
        this.base = base;
        this.recent = recent;
    }

    static CodeIndex empty() {
        return new CodeIndex(Map.of(), Map.of());
    }

    /** The identity behind a code, or 0. */
    int find(String code) {
        Integer id = recent.get(code);
        return id != null ? id : base.getOrDefault(code, GONE);
    }

    Editor edit() {
        return new Editor(this);
    }

    /** One thread's; dead after {@link #build}. */
    static final class Editor {

        private final CodeIndex from;
        private final Map<String, Integer> recent;

        private Editor(CodeIndex from) {
            this.from = from;
            this.recent = new HashMap<>(from.recent);
        }

        int find(String code) {
            Integer id = recent.get(code);
            return id != null ? id : from.base.getOrDefault(code, GONE);
        }

        void put(String code, int id) {
            recent.put(code, id);
        }

        void remove(String code) {
            recent.put(code, GONE);
        }

        CodeIndex build() {
            if (recent.size() <= Math.max(MERGE_AT, from.base.size() / 256)) {
                return new CodeIndex(from.base, recent);
            }
            if (from.base.isEmpty()) {
                recent.values().removeIf(id -> id == GONE);
                return new CodeIndex(recent, Map.of());
            }
            Map<String, Integer> merged = new HashMap<>((from.base.size() + recent.size()) * 4 / 3 + 1);
            merged.putAll(from.base);
            merged.putAll(recent);
            merged.values().removeIf(id -> id == GONE);
            return new CodeIndex(merged, Map.of());
        }
    }
}
