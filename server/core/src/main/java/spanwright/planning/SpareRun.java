package spanwright.planning;

import java.util.List;

/**
 * One path of an option.
 *
 * @param entered the ends by which it enters its fibers, in order
 * @param crossovers how it goes on after each of them but the last
 */
public record SpareRun(List<Integer> entered, List<Crossover> crossovers) {

    /** Keeps its own copies. */
    public SpareRun {
        entered = List.copyOf(entered);
        crossovers = List.copyOf(crossovers);
        if (crossovers.size() != entered.size() - 1) {
            throw new IllegalArgumentException("a path goes over between its fibers: " + entered + " " + crossovers);
        }
    }

    /** Where it begins: an end of its first fiber. */
    public int first() {
        return entered.get(0);
    }

    /** Where it ends: an end of its last fiber. */
    public int last() {
        return entered.get(entered.size() - 1) ^ 1;
    }
}
