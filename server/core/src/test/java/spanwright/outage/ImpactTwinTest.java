package spanwright.outage;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.Recorded;
import spanwright.network.Snapshot;
import spanwright.plants.RandomPlant;
import spanwright.records.CableLay;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.records.Register;

/** Random cuts of random plants, held against the twin that traces every circuit. */
class ImpactTwinTest {

    private static final int PLANTS = 240;
    private static final int CUTS = 12;

    @Test
    void agrees_with_tracing_every_circuit() {
        int down = 0;
        int single = 0;
        int places = 0;
        for (long seed = 1; seed <= PLANTS; seed++) {
            Snapshot snapshot = Snapshot.of(grouped(RandomPlant.of(seed).entered(), new Random(seed)));
            for (List<Cut> cuts : cuts(snapshot.records(), new Random(seed))) {
                Impact impact = Impact.of(snapshot, cuts);
                assertThat(ImpactText.of(impact))
                        .as("seed %s, %s", seed, cuts)
                        .isEqualTo(new ImpactTwin(snapshot, cuts).text());
                down += (int)
                        impact.circuits().stream().filter(HitCircuit::down).count();
                single += (int)
                        impact.circuits().stream().filter(HitCircuit::single).count();
                places += impact.circuits().stream()
                        .mapToInt(hit -> hit.at().size())
                        .sum();
            }
        }
        assertThat(down).as("circuits down").isGreaterThan(400);
        assertThat(single).as("circuits single").isGreaterThan(20);
        assertThat(places).as("circuits met at several places").isGreaterThan(down + single);
    }

    /** Has more circuits protect each other than a plant is drawn with. */
    private static Records grouped(Records records, Random random) {
        RecordsEditor editor = records.edit();
        records.circuits()
                .list()
                .filter(circuit -> random.nextInt(3) > 0)
                .forEach(circuit -> editor.apply(Change.replace(circuit, inGroup(circuit, "G-" + random.nextInt(3)))));
        return editor.build(records.posting());
    }

    private static Circuit inGroup(Circuit circuit, String group) {
        return new Circuit(
                circuit.id(),
                circuit.code(),
                circuit.service(),
                circuit.customer(),
                circuit.priority(),
                circuit.customersServed(),
                circuit.wavelengths(),
                circuit.budget(),
                group,
                circuit.a(),
                circuit.z(),
                circuit.status());
    }

    static List<List<Cut>> cuts(Records records, Random random) {
        List<List<Cut>> all = new ArrayList<>();
        for (int index = 0; index < CUTS; index++) {
            all.add(IntStream.rangeClosed(1, 1 + random.nextInt(2) * random.nextInt(3))
                    .mapToObj(each -> cut(records, random))
                    .toList());
        }
        return all;
    }

    private static Cut cut(Records records, Random random) {
        int cable = any(records.cables(), random);
        int fibers = records.cableTypes()
                .get(records.cables().get(cable).cableType())
                .tubes();
        return switch (random.nextInt(6)) {
            case 0 -> new Cut.OfSpan(any(records.spans(), random));
            case 1 -> new Cut.OfStructure(any(records.structures(), random));
            case 2 -> new Cut.OfCable(cable);
            case 3 -> new Cut.OfTube(cable, 1 + random.nextInt(fibers));
            case 4 ->
                new Cut.AtPlace(
                        cable,
                        CableLay.of(records, cable)
                                .positions()
                                .enclosure(random.nextInt(records.runOf(cable).size())));
            default ->
                records.enclosures().count() == 0
                        ? new Cut.OfCable(cable)
                        : new Cut.OfEnclosure(any(records.enclosures(), random));
        };
    }

    private static int any(Register<? extends Recorded> register, Random random) {
        return register.list()
                .skip(random.nextInt(register.count()))
                .findFirst()
                .orElseThrow()
                .id();
    }
}
