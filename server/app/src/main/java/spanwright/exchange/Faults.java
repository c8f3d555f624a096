package spanwright.exchange;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Gathers the faults of a folder, to be given in order of the tables and their lines. */
final class Faults {

    /** How many are kept; a file in which every row is wrong says no more than its first rows. */
    static final int MOST = 200_000;

    private static final int AFTER_TABLES = Table.values().length;

    /** A fault with its place in the order. */
    private record Placed(int order, Fault fault) {}

    private final List<Placed> placed = new ArrayList<>();
    private long more;

    /** A fault at a line of a table's file. */
    void add(Table table, int line, String text) {
        add(table.ordinal(), new Fault(table.file(), line, text));
    }

    /** A fault of another file. */
    void add(String file, int line, String text) {
        add(AFTER_TABLES, new Fault(Texts.shown(file), line, text));
    }

    private void add(int order, Fault fault) {
        if (placed.size() < MOST) {
            placed.add(new Placed(order, fault));
        } else {
            more++;
        }
    }

    /** All of them in order. */
    List<Fault> list() {
        List<Fault> list = new ArrayList<>(placed.stream()
                .sorted(Comparator.comparingInt(Placed::order)
                        .thenComparing(one -> one.order == AFTER_TABLES ? one.fault.file() : "")
                        .thenComparingInt(one -> one.fault.line()))
                .map(Placed::fault)
                .toList());
        if (more > 0) {
            Fault last = list.get(list.size() - 1);
            list.add(new Fault(last.file(), last.line(), more + " more faults are not listed; mend these first"));
        }
        return list;
    }
}
