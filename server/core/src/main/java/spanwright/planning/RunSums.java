package spanwright.planning;

import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * What a path sums up to from where it begins to where it ends, at a port's rear if it has one.
 *
 * @param glass its glass, that of new jumpers and the tray glass of new cuts included
 * @param loss what it is expected to lose, or null where a fiber's loss is not known
 * @param unverified joints that are there and that nobody has verified
 */
record RunSums(Length glass, @Nullable Loss loss, int unverified) {

    private static final Length JUMPER = Length.ofMetres(NewJoint.JUMPER_METRES);

    /** Its loss, or nothing. */
    Stream<Loss> losses() {
        return Stream.ofNullable(loss);
    }

    static RunSums of(SpareEnds ends, SpareRun run) {
        RunSums sums = terminal(ends, run.first()).plus(terminal(ends, run.last()));
        int last = run.entered().size() - 1;
        for (int step = 0; step <= last; step++) {
            int entry = run.entered().get(step);
            boolean cutIn = step == 0 || run.crossovers().get(step - 1) == Crossover.SPLICE;
            boolean cutOut = step == last || run.crossovers().get(step) == Crossover.SPLICE;
            boolean ahead = (entry & 1) == 0;
            sums = sums.plus(fiber(ends, entry >> 1, ahead ? cutIn : cutOut, ahead ? cutOut : cutIn));
            if (step < last) {
                sums = sums.plus(crossover(
                        ends,
                        entry ^ 1,
                        run.entered().get(step + 1),
                        run.crossovers().get(step)));
            }
        }
        return sums;
    }

    private static RunSums fiber(SpareEnds ends, int piece, boolean cutAtStart, boolean cutAtEnd) {
        Optional<Loss> loss = ends.findLoss(piece, cutAtStart, cutAtEnd);
        return new RunSums(ends.glass(piece, cutAtStart, cutAtEnd), loss.orElse(null), 0);
    }

    private static RunSums terminal(SpareEnds ends, int end) {
        return ends.findRear(end).map(rear -> joint(ends, end, rear)).orElse(new RunSums(Length.ZERO, Loss.ZERO, 0));
    }

    private static RunSums joint(SpareEnds ends, int from, int to) {
        return new RunSums(Length.ZERO, ends.joint(from, to), ends.isUnverified(from) ? 1 : 0);
    }

    private static RunSums crossover(SpareEnds ends, int from, int to, Crossover by) {
        return switch (by) {
            case AS_IT_IS -> joint(ends, from, to);
            case SPLICE -> new RunSums(Length.ZERO, ends.splice(), 0);
            case JUMPER ->
                patch(ends, from).plus(new RunSums(JUMPER, ends.jumper(), 0)).plus(patch(ends, to));
        };
    }

    private static RunSums patch(SpareEnds ends, int end) {
        int rear = ends.findRear(end).orElseThrow();
        return joint(ends, end, rear).plus(new RunSums(Length.ZERO, ends.connector(rear), 0));
    }

    private RunSums plus(RunSums other) {
        Loss both = loss == null || other.loss == null ? null : loss.plus(other.loss);
        return new RunSums(glass.plus(other.glass), both, unverified + other.unverified);
    }
}
