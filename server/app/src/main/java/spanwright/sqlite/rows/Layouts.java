package spanwright.sqlite.rows;

import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import spanwright.journal.RecordKind;

/** The layouts of all kinds of record. */
public final class Layouts {

    private static final List<Layout> ALL = Stream.of(
                    PlantLayouts.list(), CableLayouts.list(), SplicingLayouts.list(), ServiceLayouts.list())
            .flatMap(List::stream)
            .sorted(Comparator.comparing(Layout::kind))
            .toList();
    private static final Map<String, Layout> BY_TABLE =
            ALL.stream().collect(Collectors.toMap(Layout::table, Function.identity()));

    static {
        if (!ALL.stream().map(Layout::kind).toList().equals(Arrays.asList(RecordKind.values()))) {
            throw new IllegalStateException("not one layout a kind: " + BY_TABLE.keySet());
        }
    }

    private Layouts() {}

    /** All layouts, in the order of their kinds: each refers only to those before it, or to its own. */
    public static List<Layout> all() {
        return ALL;
    }

    /** The layout of a kind. */
    public static Layout of(RecordKind kind) {
        return ALL.get(kind.ordinal());
    }

    /** The layout of a table. */
    public static Layout of(String table) {
        Layout layout = BY_TABLE.get(table);
        if (layout == null) {
            throw new IllegalArgumentException("no table of records: '" + table + "'");
        }
        return layout;
    }
}
