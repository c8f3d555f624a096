package spanwright.sheet;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.records.EndNames;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;

/** The ends that a sheet has named so far: each once, within the glass or within its planned job. */
final class NamedEnds {

    private final EndNames names;
    private final List<Mistake> mistakes;
    private final Map<String, Map<Long, Statement>> byJob = new HashMap<>();

    NamedEnds(EndNames names, List<Mistake> mistakes) {
        this.names = names;
        this.mistakes = mistakes;
    }

    /** Takes a statement's ends; false, and a mistake, where one of them was named before. */
    boolean take(Statement statement) {
        Map<Long, Statement> seen = byJob.computeIfAbsent(statement.job(), job -> new HashMap<>());
        for (EndRange ends : statement.ends()) {
            for (int index = 0; index < ends.count(); index++) {
                Statement earlier = seen.get(ends.key(index));
                if (earlier != null) {
                    mistakes.add(twice(statement, earlier, ends, ends.key(index)));
                    return false;
                }
            }
        }
        List<EndRange> sides = statement.ends();
        for (EndRange ends : sides) {
            for (int index = 0; index < ends.count(); index++) {
                if (seen.put(ends.key(index), statement) == statement) {
                    sides.forEach(side -> forget(seen, side, statement));
                    mistakes.add(itself(statement, ends, ends.key(index)));
                    return false;
                }
            }
        }
        return true;
    }

    private static void forget(Map<Long, Statement> seen, EndRange side, Statement statement) {
        for (int index = 0; index < side.count(); index++) {
            seen.remove(side.key(index), statement);
        }
    }

    private Mistake itself(Statement statement, EndRange ends, long key) {
        return new Mistake(
                placeOf(statement, ends),
                "end-joined-twice",
                names.end(key) + " stands on both sides of this line.",
                "Each end is joined once: name two ranges that do not meet.");
    }

    private Mistake twice(Statement statement, Statement earlier, EndRange ends, long key) {
        boolean cutAndThrough = isThrough(statement) != isThrough(earlier);
        String line = "line " + earlier.place().line();
        return new Mistake(
                placeOf(statement, ends),
                cutAndThrough ? "through-and-cut" : "end-joined-twice",
                cutAndThrough
                        ? names.end(key) + " would go through uncut and be cut as well, see " + line + "."
                        : names.end(key) + " is named in " + line + " already.",
                cutAndThrough
                        ? "A fiber goes through or is cut: look into the tube, and leave it out of one of the lines."
                        : "Each end stands once in a sheet: mend the range of one of the two lines.");
    }

    private static boolean isThrough(Statement statement) {
        return statement instanceof Statement.States states && states.condition() == EndCondition.THROUGH;
    }

    private static TextPlace placeOf(Statement statement, EndRange ends) {
        if (statement instanceof Statement.Joins joins) {
            return ends.equals(joins.a()) ? joins.aPlace() : joins.bPlace();
        }
        return statement.place();
    }

    /** Whether an end in the glass has been named. */
    boolean has(Leg leg, int number) {
        return find(leg, number) != null;
    }

    /** What has been said of an end in the glass, or null. */
    @Nullable
    Statement find(Leg leg, int number) {
        return byJob.getOrDefault("", Map.of()).get(leg.key(number));
    }

    /** The fibers of a leg that have not been named. */
    List<FiberRange> unnamed(CableLeg leg) {
        return FiberRange.listOf(IntStream.rangeClosed(1, leg.type().fibers()).filter(fiber -> !has(leg.leg(), fiber)));
    }
}
