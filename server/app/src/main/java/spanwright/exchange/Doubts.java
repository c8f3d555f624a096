package spanwright.exchange;

import java.util.EnumMap;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/**
 * What has been refused already: rows that refer to it would fail only because of that, which is no fault of
 * their own. Where rows of a table could not be read at all, anything may have stood there.
 */
final class Doubts {

    private final Map<Table, Set<String>> keys = new EnumMap<>(Table.class);
    private final Set<Table> open = EnumSet.noneOf(Table.class);

    /** A row was refused by which others would find it. */
    void add(Table table, String key) {
        keys.computeIfAbsent(table, any -> new HashSet<>()).add(key);
    }

    /** Rows of the table were passed over unread. */
    void open(Table table) {
        open.add(table);
    }

    /** Whether what is not there may be missing for a fault that is reported already. */
    boolean cover(Table table, String key) {
        return open.contains(table) || keys.getOrDefault(table, Set.of()).contains(key);
    }
}
