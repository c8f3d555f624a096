package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;

/** Joints of one fiber each, those that carry on one another taken as ranges. */
final class JoinRuns {

    /** A range of joints. */
    record Run(EndRange a, EndRange b) {}

    private JoinRuns() {}

    static List<Run> list(List<Statement.Joins> joins) {
        List<Run> runs = new ArrayList<>();
        for (Statement.Joins each : joins) {
            int end = runs.size() - 1;
            Run longer = end < 0 ? null : longer(runs.get(end), each);
            if (longer == null) {
                runs.add(new Run(each.a(), each.b()));
            } else {
                runs.set(end, longer);
            }
        }
        return runs;
    }

    private static @Nullable Run longer(Run run, Statement.Joins next) {
        EndRange a = longer(run.a, next.a());
        EndRange b = longer(run.b, next.b());
        return a == null || b == null ? null : new Run(a, b);
    }

    private static @Nullable EndRange longer(EndRange range, EndRange next) {
        FiberRange numbers = range.numbers();
        FiberRange more = next.numbers();
        int step = more.first() - numbers.last();
        boolean on = range.leg().equals(next.leg())
                && Math.abs(step) == 1
                && (numbers.count() == 1 || numbers.step() == step)
                && (more.count() == 1 || more.step() == step);
        return on ? new EndRange(range.leg(), new FiberRange(numbers.first(), more.last())) : null;
    }
}
