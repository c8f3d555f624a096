package spanwright.records;

import java.util.HashMap;
import java.util.Map;
import java.util.function.Supplier;
import java.util.stream.Stream;
import spanwright.journal.Recorded;

/**
 * An immutable map from codes to identities in two layers: a large base, shared, and a small layer of what
 * changed since. A posting copies only the small one; now and then both are merged.
 *
 * <p>Lost to this: copying one map a posting (milliseconds at 10^6 codes).
 */
final class CodeIndex {

    private static final int GONE = 0;
    private static final int MERGE_AT = 512;

    private final Later<Map<String, Integer>> base;
    private final Map<String, Integer> recent;

    private CodeIndex(Later<Map<String, Integer>> base, Map<String, Integer> recent) {
        this.base = base;
        this.recent = recent;
    }

    static CodeIndex empty() {
        return new CodeIndex(Later.of(Map.of()), Map.of());
    }

    /** The index of all records of a kind, made when a code is first looked up. */
    static CodeIndex later(Supplier<Stream<Recorded>> records) {
        return new CodeIndex(Later.by(() -> codes(records.get())), Map.of());
    }

    private static Map<String, Integer> codes(Stream<Recorded> records) {
        Map<String, Integer> codes = new HashMap<>();
        records.forEach(record -> {
            String code = Codes.of(record);
            if (code != null) {
                codes.put(code, record.id());
            }
        });
        return codes;
    }

    /** The identity behind a code, or 0. */
    int find(String code) {
        Integer id = recent.get(code);
        return id != null ? id : base.get().getOrDefault(code, GONE);
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
            return id != null ? id : from.base.get().getOrDefault(code, GONE);
        }

        void put(String code, int id) {
            recent.put(code, id);
        }

        void remove(String code) {
            recent.put(code, GONE);
        }

        CodeIndex build() {
            if (recent.size() <= MERGE_AT || recent.size() <= from.base.get().size() / 256) {
                return new CodeIndex(from.base, recent);
            }
            Map<String, Integer> before = from.base.get();
            if (before.isEmpty()) {
                recent.values().removeIf(id -> id == GONE);
                return new CodeIndex(Later.of(recent), Map.of());
            }
            Map<String, Integer> merged = new HashMap<>((before.size() + recent.size()) * 4 / 3 + 1);
            merged.putAll(before);
            merged.putAll(recent);
            merged.values().removeIf(id -> id == GONE);
            return new CodeIndex(Later.of(merged), Map.of());
        }
    }
}
