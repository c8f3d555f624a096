package spanwright.planning;

import spanwright.journal.RecordKind;
import spanwright.network.Network;
import spanwright.records.Records;

/**
 * Numbers what a path can stand at: an end of glass (with whether hands work at its structure already), the splices of an
 * enclosure come to by glass or by a port's rear, the jumpers of a structure, a goal.
 */
final class SpareStates {

    private final int splicing;
    private final int patching;
    private final int goals;

    SpareStates(Network network, Records records) {
        this.splicing = 4 * network.pieces();
        this.patching = splicing + 2 * records.limit(RecordKind.ENCLOSURE);
        this.goals = patching + records.limit(RecordKind.STRUCTURE);
    }

    int end(int end, boolean working) {
        return 2 * end + (working ? 1 : 0);
    }

    int splicing(int enclosure, boolean fromRear) {
        return splicing + 2 * enclosure + (fromRear ? 1 : 0);
    }

    int patching(int structure) {
        return patching + structure;
    }

    int goal(int index) {
        return goals + index;
    }

    boolean isEnd(int state) {
        return state < splicing;
    }

    int endOf(int state) {
        return state >> 1;
    }

    boolean working(int state) {
        return (state & 1) == 1;
    }

    boolean isSplicing(int state) {
        return state >= splicing && state < patching;
    }

    int enclosureOf(int state) {
        return (state - splicing) >> 1;
    }

    boolean fromRear(int state) {
        return ((state - splicing) & 1) == 1;
    }

    int structureOf(int state) {
        return state - patching;
    }

    boolean isGoal(int state) {
        return state >= goals;
    }

    int goalOf(int state) {
        return state - goals;
    }
}
