package spanwright.benchmarks.outage;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.plant.Span;
import spanwright.suspicion.Alarms;
import spanwright.suspicion.Suspect;
import spanwright.suspicion.Suspects;

/**
 * One span cut whole, and what the program makes of the alarms.
 *
 * @param down how many circuits are truly down
 * @param rank the place, from 1, of the first suspect that holds the span; 0 where none does
 * @param route the length of that suspect's route, m
 */
record SuspectTrial(int down, int rank, double route) {

    /** Cuts a span; nothing where that takes no circuit down, or no alarm came through. */
    static Optional<SuspectTrial> of(Snapshot snapshot, Span span, double wrong, Random random) {
        List<Circuit> dark = Impact.of(snapshot, List.of(new Cut.OfSpan(span.id()))).circuits().stream()
                .filter(HitCircuit::down)
                .map(HitCircuit::circuit)
                .toList();
        List<Circuit> lit = new ArrayList<>(snapshot.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .toList());
        lit.removeAll(new LinkedHashSet<>(dark));
        return alarms(dark, lit, wrong, random).map(alarms -> of(snapshot, span, dark.size(), alarms));
    }

    /**
     * What is reported. Of the alarms a share is missing, half of these circuits being reported up and half not at all;
     * and about as many circuits that are up are reported down.
     */
    private static Optional<Alarms> alarms(List<Circuit> dark, List<Circuit> lit, double wrong, Random random) {
        Set<Circuit> down = new LinkedHashSet<>();
        Set<Circuit> up = new LinkedHashSet<>(lit);
        for (Circuit circuit : dark) {
            if (random.nextDouble() >= wrong) {
                down.add(circuit);
            } else if (random.nextBoolean()) {
                up.add(circuit);
            }
            if (random.nextDouble() < wrong && !lit.isEmpty()) {
                Circuit other = lit.get(random.nextInt(lit.size()));
                up.remove(other);
                down.add(other);
            }
        }
        return down.isEmpty()
                ? Optional.empty()
                : Optional.of(new Alarms(List.copyOf(down), List.copyOf(up), false, Set.of(), null));
    }

    private static SuspectTrial of(Snapshot snapshot, Span span, int down, Alarms alarms) {
        List<Suspect> suspects = Suspects.of(snapshot, alarms).list();
        for (int index = 0; index < suspects.size(); index++) {
            Suspect suspect = suspects.get(index);
            if (suspect.kind() == Suspect.Kind.CUT
                    && suspect.tubes().isEmpty()
                    && suspect.spans().contains(span)) {
                return new SuspectTrial(down, index + 1, suspect.route().metres());
            }
        }
        return new SuspectTrial(down, 0, 0);
    }
}
