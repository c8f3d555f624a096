package spanwright.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Cable;
import spanwright.plants.PlainGlass;
import spanwright.plants.RandomPlant;
import spanwright.records.Records;
import spanwright.splicing.Panel;

/** The tracer against its slow twin, on random plants. */
class TracerTwinTest {

    static IntStream seeds() {
        return IntStream.range(0, 250);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void traces_as_the_twin_does(int seed) {
        Records records = RandomPlant.of(seed).entered();

        assertSame(Snapshot.of(records), new PlainGlass(records));
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void traces_as_the_twin_does_as_if_a_job_were_built(int seed) {
        Records records = RandomPlant.of(seed).entered();
        for (String job : records.plannedJobs()) {
            SnapshotEditor editor = Snapshot.of(records).edit();
            editor.build(job);

            assertSame(editor.build(1), new PlainGlass(records, job));
        }
    }

    private static void assertSame(Snapshot snapshot, PlainGlass glass) {
        Records records = snapshot.records();
        Tracer tracer = new Tracer(snapshot);
        TraceTwin twin = new TraceTwin(records, glass);
        for (Panel panel : records.panels().list().toList()) {
            for (int port = 1; port <= panel.ports(); port++) {
                List<Path> paths = tracer.fromPort(panel.id(), port);
                assertThat(TraceText.lines(paths))
                        .as("panel %s port %s", panel.id(), port)
                        .isEqualTo(String.join("\n", twin.ofPort(panel.id(), port)));
                paths.forEach(TracerTwinTest::assertTrack);
            }
        }
        for (Circuit circuit : records.circuits().list().toList()) {
            assertThat(TraceText.lines(tracer.ofCircuit(circuit)))
                    .as(circuit.code())
                    .isEqualTo(String.join("\n", twin.ofCircuit(circuit)));
        }
        for (Cable cable : records.cables().list().toList()) {
            for (int fiber = 1;
                    fiber <= records.cableTypes().get(cable.cableType()).fibers();
                    fiber++) {
                assertThat(TraceText.lines(tracer.ofFiber(cable.id(), fiber)))
                        .as("%s:%s", cable.code(), fiber)
                        .isEqualTo(String.join("\n", twin.ofFiber(cable.id(), fiber)));
            }
        }
    }

    private static void assertTrack(Path path) {
        GlassTrack track = GlassTrack.of(path);
        if (path.elements().isEmpty()) {
            return;
        }
        TrackPoint before = track.points().get(0);
        for (TrackPoint point : track.points()) {
            assertThat(point.glass()).isGreaterThanOrEqualTo(before.glass());
            assertThat(point.sheath()).isGreaterThanOrEqualTo(before.sheath());
            assertThat(point.route()).isGreaterThanOrEqualTo(before.route());
            before = point;
        }
        assertThat(before.glass()).isEqualTo(path.glass());
        assertThat(before.sheath()).isEqualTo(path.sheath());
        assertThat(before.route()).isEqualTo(path.route());
        Station last = track.stations().get(track.stations().size() - 1);
        assertThat(last.at().glass()).isLessThanOrEqualTo(path.glass());
    }
}
