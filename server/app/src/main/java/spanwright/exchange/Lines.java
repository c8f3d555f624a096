package spanwright.exchange;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.RecordsView;
import spanwright.splicing.Joint;

/** Remembers on which line each record of the folder stands. */
final class Lines {

    private final int[] firstIdentity;
    private final int[][] lines;
    private final Map<String, Integer> replaced = new HashMap<>();

    Lines(RecordsView view) {
        RecordKind[] kinds = RecordKind.values();
        firstIdentity = new int[kinds.length];
        lines = new int[kinds.length][];
        for (RecordKind kind : kinds) {
            firstIdentity[kind.ordinal()] = view.limit(kind);
            lines[kind.ordinal()] = new int[16];
        }
    }

    /** Whether a record was there before the folder. */
    boolean before(Recorded record) {
        return record.id() < firstIdentity[record.kind().ordinal()];
    }

    /** Notes where a record stands; the first time counts. */
    void note(Recorded record, int line) {
        if (before(record)) {
            replaced.putIfAbsent(record.kind() + "/" + record.id(), line);
            return;
        }
        int kind = record.kind().ordinal();
        int index = record.id() - firstIdentity[kind];
        if (index >= lines[kind].length) {
            lines[kind] = Arrays.copyOf(lines[kind], Math.max(index + 1, 2 * lines[kind].length));
        }
        if (lines[kind][index] == 0) {
            lines[kind][index] = line;
        }
    }

    /** The line of a record of this folder; 0 where it is not of this folder. */
    int of(Recorded record) {
        if (before(record)) {
            return replaced.getOrDefault(record.kind() + "/" + record.id(), 0);
        }
        int kind = record.kind().ordinal();
        int index = record.id() - firstIdentity[kind];
        return index < lines[kind].length ? lines[kind][index] : 0;
    }

    /** The table in which a record stands, or null for a feature of the base map. */
    static @Nullable Table table(Recorded record) {
        return switch (record.kind()) {
            case SETTING -> Table.SETTINGS;
            case STRUCTURE -> Table.STRUCTURES;
            case SPAN -> Table.SPANS;
            case FIBER_TYPE -> Table.FIBER_TYPES;
            case COLOR_CODE -> Table.COLOR_CODES;
            case CABLE_TYPE -> Table.CABLE_TYPES;
            case CABLE -> Table.CABLES;
            case CABLE_VALUE -> Table.CABLE_VALUES;
            case RUN_ROW -> Table.CABLE_RUNS;
            case SHEATH_MARK -> Table.SHEATH_MARKS;
            case ENCLOSURE -> Table.ENCLOSURES;
            case PASS -> Table.ENCLOSURE_CABLES;
            case SPLITTER -> Table.SPLITTERS;
            case PANEL -> Table.PANELS;
            case JOINT -> tableOf((Joint) record);
            case END_STATE -> Table.END_STATES;
            case MEASUREMENT -> Table.MEASUREMENTS;
            case FIBER_FLAG -> Table.FIBER_FLAGS;
            case FIBER_COUNT -> Table.COUNTS;
            case CIRCUIT -> Table.CIRCUITS;
            case PLANNING_VALUE -> Table.PLANNING_VALUES;
            case BASE_FEATURE -> null;
        };
    }

    /** The table in which a joint stands. */
    static Table tableOf(Joint joint) {
        return switch (joint.type()) {
            case SPLICE -> Table.SPLICES;
            case TERMINATION -> Table.TERMINATIONS;
            case JUMPER -> Table.JUMPERS;
        };
    }
}
