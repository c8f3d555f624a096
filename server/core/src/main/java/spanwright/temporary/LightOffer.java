package spanwright.temporary;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import spanwright.circuits.Circuit;
import spanwright.planning.SpareWay;
import spanwright.planning.SpareWork;

/**
 * A temporary path.
 *
 * @param group whose
 * @param ways one a glass path of the group, in order
 * @param moves circuits whose ends move to other ports, as they would be
 * @param lit what light does over it
 */
public record LightOffer(DarkGroup group, List<SpareWay> ways, List<Circuit> moves, Lit lit) {

    /** Keeps its own copies. */
    public LightOffer {
        ways = List.copyOf(ways);
        moves = List.copyOf(moves);
    }

    /** What hands must do for all of it. */
    public SpareWork work() {
        return ways.stream().map(SpareWay::work).reduce(SpareWork.NONE, SpareWork::plus);
    }

    /** Pieces that it takes, its own glass among them. */
    public List<Integer> pieces() {
        List<Integer> pieces = new ArrayList<>();
        ways.forEach(way -> pieces.addAll(way.pieces()));
        return pieces;
    }

    /** The structures where hands work. */
    public Set<Integer> visits() {
        return ways.stream().flatMap(way -> way.visits().stream()).collect(Collectors.toSet());
    }
}
