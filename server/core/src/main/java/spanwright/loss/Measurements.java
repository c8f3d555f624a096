package spanwright.loss;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsView;
import spanwright.splicing.Direction;
import spanwright.splicing.Measurement;

/**
 * What was measured, by what it was measured of. Immutable once made: any number of threads may ask, and one index serves
 * all wavelengths of one state of the records.
 */
public final class Measurements {

    private static final Comparator<Measurement> BY_TIME = Comparator.comparing(
                    Measurement::on, Comparator.nullsFirst(Comparator.naturalOrder()))
            .thenComparing(Measurement::id);

    private final Map<String, List<Measurement>> byWhat = new HashMap<>();

    /** The measurements in these records. */
    public Measurements(RecordsView records) {
        records.measurements()
                .list()
                .forEach(measurement -> byWhat.computeIfAbsent(measurement.what(), what -> new ArrayList<>())
                        .add(measurement));
    }

    /** Whether there is none at all. */
    public boolean isEmpty() {
        return byWhat.isEmpty();
    }

    /** All measurements of a thing, by any of its names, at a wavelength, in order of time. */
    public List<Measurement> list(Wavelength wavelength, String... names) {
        return Stream.of(names)
                .flatMap(name -> byWhat.getOrDefault(name, List.of()).stream())
                .filter(measurement -> measurement.wavelength().equals(wavelength))
                .sorted(BY_TIME)
                .toList();
    }

    /**
     * The mean of both ways: of the latest each way.
     *
     * @param measurements of one thing at one wavelength, in order of time
     */
    static Optional<BothWays> bothWays(List<Measurement> measurements) {
        Measurement ab = latest(measurements, Direction.AB);
        Measurement ba = latest(measurements, Direction.BA);
        return ab == null || ba == null ? Optional.empty() : Optional.of(new BothWays(ab, ba));
    }

    private static @Nullable Measurement latest(List<Measurement> measurements, Direction direction) {
        return measurements.stream()
                .filter(measurement -> measurement.direction() == direction)
                .reduce((earlier, later) -> later)
                .orElse(null);
    }

    /** A thing measured both ways. */
    record BothWays(Measurement ab, Measurement ba) {

        /** The mean, halves of a microdecibel rounded half-even; may be below 0. */
        Loss mean() {
            return Loss.ofDecibels((ab.loss().decibels() + ba.loss().decibels()) / 2);
        }

        /** {@code Measured both ways at 1550 nm: 0.2 dB and 0.1 dB, by Ida B., 2026-03-31}. */
        String source() {
            String by = Stream.of(ab.by(), ba.by())
                    .filter(Objects::nonNull)
                    .distinct()
                    .map(name -> ", by " + name)
                    .findFirst()
                    .orElse("");
            String on = Stream.of(ba.on(), ab.on())
                    .filter(Objects::nonNull)
                    .max(Comparator.naturalOrder())
                    .map(day -> ", " + day)
                    .orElse("");
            return "Measured both ways at " + ab.wavelength() + ": " + ab.loss() + " and " + ba.loss() + by + on;
        }
    }
}
