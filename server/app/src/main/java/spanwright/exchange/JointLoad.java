package spanwright.exchange;

import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;

/**
 * Enters splices or terminations. Rows of one joint each that follow one another, made alike and counting on at both
 * sides, become one range, as a crew would have written them: so a folder with a row a joint is kept in as few records.
 * A row that holds a range already stays as it is.
 *
 * <p>Where a rule refuses a range, its rows are entered one by one, so that each fault stands on its own line.
 */
final class JointLoad implements TableLoad {

    private final Entering entering;
    private final Rows<Joint> rows;
    /** The first row of those held back; null where none is. */
    private @Nullable Joint held;

    private int line;
    private int count;
    private int stepA;
    private int stepB;

    JointLoad(Entering entering, Rows<Joint> rows) {
        this.entering = entering;
        this.rows = rows;
    }

    @Override
    public void enter(Row row) {
        Joint joint = rows.read(row, entering.view().limit(rows.kind()));
        if (joint != null && takes(joint, row.line())) {
            count++;
            return;
        }
        end();
        held = joint;
        line = row.line();
        count = 1;
    }

    /** Whether the rows held back go on with this one. */
    private boolean takes(Joint joint, int at) {
        Joint first = held;
        if (first == null || at != line + count || !alike(first, joint)) {
            return false;
        }
        int distanceA = distance(first.a(), joint.a());
        int distanceB = distance(first.b(), joint.b());
        if (count == 1 && Math.abs(distanceA) == 1 && Math.abs(distanceB) == 1) {
            stepA = distanceA;
            stepB = distanceB;
            return true;
        }
        return count > 1 && distanceA == count * stepA && distanceB == count * stepB;
    }

    private static boolean alike(Joint first, Joint joint) {
        // A row whose sides are one leg might meet itself in a range.
        return first.count() == 1
                && joint.count() == 1
                && first.enclosure() == joint.enclosure()
                && first.a().leg().equals(joint.a().leg())
                && first.b().leg().equals(joint.b().leg())
                && !first.a().leg().equals(first.b().leg())
                && first.facts().equals(joint.facts());
    }

    private static int distance(EndRange first, EndRange next) {
        return next.numbers().first() - first.numbers().first();
    }

    @Override
    public void end() {
        Joint first = held;
        held = null;
        if (first != null && (count == 1 || !entering.addFolded(part(first, 0, count), line))) {
            for (int index = 0; index < count; index++) {
                entering.add(rows.table(), line + index, part(first, index, 1));
            }
        }
    }

    /** Some of the rows held back, as one record with the next identity. */
    private Joint part(Joint first, int from, int size) {
        int id = entering.view().limit(rows.kind());
        return new Joint(
                id,
                first.type(),
                first.enclosure(),
                part(first.a(), stepA, from, size),
                part(first.b(), stepB, from, size),
                first.facts());
    }

    private EndRange part(EndRange first, int step, int from, int size) {
        if (count == 1) {
            return first;
        }
        int number = first.numbers().first() + from * step;
        return new EndRange(first.leg(), new FiberRange(number, number + (size - 1) * step));
    }
}
