package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.network.Snapshot;
import spanwright.plant.Cable;
import spanwright.plants.RandomPlant;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** The reckoner against its slow twin, on random plants. */
class LossTwinTest {

    static IntStream seeds() {
        return IntStream.range(0, 200);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void sums_as_the_twin_does(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Tracer tracer = new Tracer(Snapshot.of(records));
        for (int nanometres : new int[] {1270, 1310, 1349, 1550, 1650}) {
            Wavelength wavelength = Wavelength.ofNanometres(nanometres);
            LossReckoner reckoner = new LossReckoner(records, wavelength);
            for (Cable cable : records.cables().list().toList()) {
                for (Path path : tracer.ofFiber(cable.id(), 1)) {
                    assertSame(new LossTwin(records, wavelength, path), reckoner.reckon(path));
                }
            }
        }
    }

    private static void assertSame(LossTwin twin, Reckoning reckoning) {
        if (twin.unknown) {
            assertThat(reckoning).isInstanceOf(LossUnknown.class);
            return;
        }
        PathLoss loss = (PathLoss) reckoning;
        // Each element is rounded to the microdecibel.
        double rounding = 0.5e-6 * loss.elements().size() + 1e-9;
        assertThat(loss.expected().decibels()).isCloseTo(twin.expected.doubleValue(), within(rounding));
        assertThat(loss.limit().decibels()).isCloseTo(twin.limit.doubleValue(), within(rounding));
        assertThat(loss.statistical().decibels())
                .isCloseTo(twin.statistical().doubleValue(), within(rounding + 0.5e-6));
    }
}
