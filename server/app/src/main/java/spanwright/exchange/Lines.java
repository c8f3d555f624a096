package spanwright.exchange;

import java.util.Arrays;
import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;

/** Remembers on which line each record of the folder stands. */
final class Lines {

    private final int[] firstIdentity;
    private final int[][] lines;
    private final Map<String, Integer> replaced = new HashMap<>();
    /** The joints, by how far they lie above the first of the folder, that stand on a line for each end. */
    private final BitSet folded = new BitSet();

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

    /** Notes a new range of joints whose rows stand on a line each, from one line on. */
    void noteFolded(Joint range, int firstLine) {
        note(range, firstLine);
        folded.set(range.id() - firstIdentity[RecordKind.JOINT.ordinal()]);
    }

    /** The line of a record of this folder where another clashes with it; 0 where it is not of this folder. */
    int of(Recorded record, @Nullable Recorded other) {
        int line = of(record);
        return line != 0 && record instanceof Joint range && other instanceof Joint joint && isFolded(range)
                ? line + firstShared(range, joint)
                : line;
    }

    private boolean isFolded(Joint range) {
        return !before(range) && folded.get(range.id() - firstIdentity[RecordKind.JOINT.ordinal()]);
    }

    /** The first index of a range whose ends another joint names as well; 0 where it names none. */
    private static int firstShared(Joint range, Joint joint) {
        for (int index = 0; index < range.count(); index++) {
            if (names(joint, range.a(), index) || names(joint, range.b(), index)) {
                return index;
            }
        }
        return 0;
    }

    private static boolean names(Joint joint, EndRange side, int index) {
        int number = side.numbers().at(index);
        return names(joint.a(), side.leg(), number) || names(joint.b(), side.leg(), number);
    }

    private static boolean names(EndRange ends, Leg leg, int number) {
        return ends.leg().equals(leg) && ends.numbers().contains(number);
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
