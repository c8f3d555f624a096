package spanwright.sheet;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;

/** Parts of ranges. */
final class RangeParts {

    private RangeParts() {}

    /** A run of indexes, the last one apart. */
    record Run(int from, int to) {}

    /** The runs of set bits. */
    static List<Run> runs(BitSet bits) {
        List<Run> runs = new ArrayList<>();
        for (int from = bits.nextSetBit(0); from >= 0; ) {
            int to = bits.nextClearBit(from);
            runs.add(new Run(from, to));
            from = bits.nextSetBit(to);
        }
        return runs;
    }

    static EndRange part(EndRange ends, Run run) {
        FiberRange numbers = ends.numbers();
        return new EndRange(ends.leg(), new FiberRange(numbers.at(run.from), numbers.at(run.to - 1)));
    }

    static Joint part(Joint joint, int id, Run run) {
        return new Joint(
                id, joint.type(), joint.enclosure(), part(joint.a(), run), part(joint.b(), run), joint.facts());
    }

    static EndState part(EndState state, int id, Run run) {
        return new EndState(
                id, state.enclosure(), part(state.ends(), run), state.condition(), state.trust(), state.verifiedOn());
    }
}
