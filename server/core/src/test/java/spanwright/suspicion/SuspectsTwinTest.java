package spanwright.suspicion;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Snapshot;
import spanwright.plants.RandomPlant;

/** Random alarms on random plants, held against the twin with a plain set for every span and enclosure. */
class SuspectsTwinTest {

    private static final int PLANTS = 260;
    private static final int ALARMS = 4;

    @Test
    void agrees_with_a_set_of_circuits_for_every_span_and_enclosure() {
        int compared = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            Snapshot snapshot = Snapshot.of(RandomPlant.of(seed).entered());
            Random random = new Random(seed);
            for (int round = 0; round < ALARMS; round++) {
                Optional<Alarms> alarms = alarms(snapshot, random);
                if (alarms.isPresent()) {
                    Suspects suspects = Suspects.of(snapshot, alarms.get());
                    Set<String> found = suspects.list().stream()
                            .filter(each -> each.kind() == Suspect.Kind.CUT
                                    && each.tubes().isEmpty())
                            .map(SuspectsTwinTest::text)
                            .collect(Collectors.toCollection(TreeSet::new));
                    assertThat(suspects.total()).isLessThanOrEqualTo(Suspects.LISTED);
                    assertThat(found)
                            .as("seed %s round %s", seed, round)
                            .isEqualTo(new SuspectsTwin(snapshot, alarms.get()).lines());
                    assertThat(suspects.list())
                            .extracting(Suspect::score)
                            .isSortedAccordingTo((one, other) -> Double.compare(other, one));
                    compared += found.size();
                }
            }
        }
        assertThat(compared).as("suspects compared").isGreaterThan(500);
    }

    private static String text(Suspect suspect) {
        Set<String> names = new TreeSet<>();
        suspect.spans().forEach(span -> names.add("span " + span.code()));
        suspect.enclosures().forEach(enclosure -> names.add("enclosure " + enclosure.code()));
        return SuspectsTwin.text(
                names, suspect.explains().size(), suspect.contradicts().size(), suspect.score());
    }

    private static Optional<Alarms> alarms(Snapshot snapshot, Random random) {
        List<Circuit> down = new ArrayList<>();
        List<Circuit> up = new ArrayList<>();
        snapshot.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                .forEach(circuit -> {
                    int drawn = random.nextInt(5);
                    if (drawn < 4) {
                        (drawn < 2 ? down : up).add(circuit);
                    }
                });
        return down.isEmpty()
                ? Optional.empty()
                : Optional.of(new Alarms(down, up, random.nextBoolean(), Set.of(), LocalDate.of(2026, 12, 1)));
    }
}
