package spanwright.planning;

import java.util.List;
import java.util.Set;

/**
 * A path over spare glass.
 *
 * @param start where it begins
 * @param goal where it ends
 * @param entered the ends by which it enters its pieces, in order; a splitter that it comes to is none of them
 * @param joints the joints that must be made, in order
 * @param stretches the sections it travels and the structures where hands work
 * @param work what hands must do
 * @param loss what the search summed, in microdecibels
 */
public record SpareWay(
        SpareStart start,
        SpareGoal goal,
        List<Integer> entered,
        List<NewJoint> joints,
        Set<SpareStretch> stretches,
        SpareWork work,
        long loss) {

    /** Keeps its own copies. */
    public SpareWay {
        entered = List.copyOf(entered);
        joints = List.copyOf(joints);
        stretches = Set.copyOf(stretches);
    }

    /** The pieces it uses, in order. */
    public List<Integer> pieces() {
        return entered.stream().map(end -> end >> 1).toList();
    }

    /** The structures where hands work. */
    public List<Integer> visits() {
        return stretches.stream()
                .filter(SpareStretch::visit)
                .map(SpareStretch::id)
                .sorted()
                .toList();
    }
}
