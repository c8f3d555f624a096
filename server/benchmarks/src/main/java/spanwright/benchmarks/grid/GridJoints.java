package spanwright.benchmarks.grid;

import java.util.ArrayList;
import java.util.List;
import spanwright.plant.FiberRange;
import spanwright.plant.Trust;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.SpliceMethod;

/** Writes joined ends as ranges of joints: as long as both sides run side by side, rising or falling. */
final class GridJoints {

    private static final JointFacts FACTS =
            new JointFacts(null, SpliceMethod.FUSION, null, Trust.POSTED, null, null, null, null, null, null);

    private final Grid grid;
    private final Walks walks;
    private final Joins joins;
    /** What an end beyond the glass is: its leg and number, by end less the ends of glass. */
    private final Leg[] extraLegs;

    private final int[] extraNumbers;
    private final List<Joint> joints = new ArrayList<>();

    GridJoints(Grid grid, Walks walks, int[] portNumber) {
        this.grid = grid;
        this.walks = walks;
        this.joins = walks.joins;
        int extras = joins.ends() - joins.glassEnds();
        extraLegs = new Leg[extras];
        extraNumbers = new int[extras];
        for (int port = 0; port < portNumber.length; port++) {
            Walks.Port at = walks.ports.get(port);
            name(at.rear(), new Leg(LegKind.REAR, at.node() + 1), portNumber[port]);
        }
        for (int index = 0; index < walks.splitters.size(); index++) {
            Walks.Split split = walks.splitters.get(index);
            name(split.in(), new Leg(LegKind.IN, index + 1), 1);
            Leg out = new Leg(LegKind.OUT, index + 1);
            for (int output = 0; output < 32; output++) {
                name(split.firstOut() + output, out, output + 1);
            }
        }
    }

    private void name(int end, Leg leg, int number) {
        extraLegs[end - joins.glassEnds()] = leg;
        extraNumbers[end - joins.glassEnds()] = number;
    }

    List<Joint> joints() {
        for (int cable = 0; cable < grid.cables; cable++) {
            leg(cable, 0);
            leg(cable, 1);
        }
        // What is left joins two ends that are no glass: a splitter's output at once to a port.
        for (int end = joins.glassEnds(); end < joins.ends(); end++) {
            int other = joins.peer(end);
            if (other > end) {
                add(
                        new EndRange(leg(end), FiberRange.of(number(end))),
                        new EndRange(leg(other), FiberRange.of(number(other))));
            }
        }
        return joints;
    }

    /** The joints of one cable end, each written from the side of the lower end. */
    private void leg(int cable, int side) {
        int fiber = 0;
        while (fiber < grid.fibers[cable]) {
            int end = end(cable, fiber, side);
            int other = joins.peer(end);
            if (other == Joins.FREE || other < end) {
                fiber++;
                continue;
            }
            int run = run(cable, fiber, side);
            EndRange here = new EndRange(leg(end), new FiberRange(fiber + 1, fiber + run));
            int last = joins.peer(end(cable, fiber + run - 1, side));
            add(here, new EndRange(leg(other), new FiberRange(number(other), number(last))));
            fiber += run;
        }
    }

    /** How many fibers from one on are joined to one leg, its numbers rising or falling by one. */
    private int run(int cable, int fiber, int side) {
        int first = joins.peer(end(cable, fiber, side));
        int step = 0;
        int count = 1;
        while (fiber + count < grid.fibers[cable]) {
            int end = end(cable, fiber + count, side);
            int other = joins.peer(end);
            if (other <= end || !leg(other).equals(leg(first))) {
                break;
            }
            int way = number(other) - number(joins.peer(end(cable, fiber + count - 1, side)));
            if (Math.abs(way) != 1 || (step != 0 && way != step)) {
                break;
            }
            step = way;
            count++;
        }
        return count;
    }

    private int end(int cable, int fiber, int side) {
        return 2 * (grid.firstSection[cable] + fiber) + side;
    }

    private Leg leg(int end) {
        if (end >= joins.glassEnds()) {
            return extraLegs[end - joins.glassEnds()];
        }
        int cable = grid.cableOf(end >> 1);
        return (end & 1) == 0 ? new Leg(LegKind.AHEAD, 2 * cable + 1) : new Leg(LegKind.BACK, 2 * cable + 2);
    }

    private int number(int end) {
        return end >= joins.glassEnds()
                ? extraNumbers[end - joins.glassEnds()]
                : (end >> 1) - grid.firstSection[grid.cableOf(end >> 1)] + 1;
    }

    private void add(EndRange a, EndRange b) {
        boolean rearIsB = b.leg().kind() == LegKind.REAR;
        JointKind kind = rearIsB || a.leg().kind() == LegKind.REAR ? JointKind.TERMINATION : JointKind.SPLICE;
        int id = joints.size() + 1;
        joints.add(new Joint(id, kind, enclosure(a), rearIsB ? b : a, rearIsB ? a : b, FACTS));
    }

    private int enclosure(EndRange side) {
        int owner = side.leg().owner();
        return switch (side.leg().kind()) {
            case AHEAD -> grid.from[(owner - 1) / 2] + 1;
            case BACK -> grid.to[(owner - 1) / 2] + 1;
            case IN, OUT -> walks.splitters.get(owner - 1).node() + 1;
            case REAR, FRONT -> owner;
        };
    }
}
