package spanwright.suspicion;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import spanwright.network.Snapshot;

/**
 * What explains an outage.
 *
 * @param list the suspects, best first; the best of them where there are many
 * @param total how many there are
 * @param together the suspects that explain most when taken together, as indexes into the list
 * @param score the score of these together
 */
public record Suspects(List<Suspect> list, int total, List<Integer> together, double score) {

    /** How many suspects are listed at most, those taken together apart. */
    static final int LISTED = 100;

    /** Keeps its own copies of the lists. */
    public Suspects {
        list = List.copyOf(list);
        together = List.copyOf(together);
    }

    /** What explains alarms. */
    public static Suspects of(Snapshot snapshot, Alarms alarms) {
        Suspicion suspicion = new Suspicion(snapshot, alarms);
        List<Candidate> candidates = suspicion.candidates();
        CauseSets sets = new CauseSets(candidates, alarms.down().size());
        List<Integer> chosen = sets.find();
        TreeSet<Integer> listed = new TreeSet<>(chosen);
        for (int index = 0; index < Math.min(LISTED, candidates.size()); index++) {
            listed.add(index);
        }
        List<Integer> order = List.copyOf(listed);
        SuspectWriter writer = new SuspectWriter(snapshot, suspicion);
        List<Suspect> list = new ArrayList<>();
        order.forEach(index -> list.add(writer.write(candidates.get(index))));
        return new Suspects(
                list, suspicion.total(), chosen.stream().map(order::indexOf).toList(), sets.score(chosen));
    }
}
