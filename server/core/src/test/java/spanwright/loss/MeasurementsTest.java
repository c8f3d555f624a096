package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Direction;
import spanwright.splicing.Measurement;

class MeasurementsTest {

    private static final String END = "F-1 ahead 3 @ E4";

    @Test
    void the_latest_each_way_counts_and_one_without_a_date_is_the_oldest() {
        Measurements.BothWays both = both(
                measured(1, Direction.AB, 0.30, "2026-03-02", "Ida B."),
                measured(2, Direction.AB, 0.90, null, null),
                measured(3, Direction.AB, 0.20, "2026-03-01", "Ida B."),
                measured(4, Direction.BA, 0.10, "2026-03-05", null),
                measured(5, null, 5, "2026-04-01", null));

        assertThat(both.mean()).isEqualTo(Loss.ofDecibels(0.2));
        assertThat(both.source()).isEqualTo("Measured both ways at 1550 nm: 0.3 dB and 0.1 dB, by Ida B., 2026-03-05");
    }

    @Test
    void of_two_on_one_day_the_later_entered_counts() {
        Measurements.BothWays both = both(
                measured(1, Direction.AB, 0.30, "2026-03-02", null),
                measured(2, Direction.AB, 0.40, "2026-03-02", null),
                measured(3, Direction.BA, 0.40, null, "Ole H."));

        assertThat(both.mean()).isEqualTo(Loss.ofDecibels(0.4));
        assertThat(both.source()).endsWith(", by Ole H., 2026-03-02");
    }

    /** The mean keeps its sign: a splice may seem to gain. */
    @Test
    void a_mean_may_be_below_zero() {
        assertThat(both(measured(1, Direction.AB, -0.3, null, null), measured(2, Direction.BA, 0.26, null, null))
                        .mean())
                .isEqualTo(Loss.ofDecibels(-0.02));
    }

    @Test
    void one_way_alone_is_no_mean() {
        Measurements found = of(measured(1, Direction.BA, 0.3, null, null), measured(2, null, 0.2, null, null));

        List<Measurement> all = found.list(Wavelength.ofNanometres(1550), END, "another");
        assertThat(all).hasSize(2);
        assertThat(Measurements.bothWays(all)).isEmpty();
        assertThat(Measurements.bothWays(all.subList(1, 2))).isEmpty();
        assertThat(found.list(Wavelength.ofNanometres(1310), END)).isEmpty();
        assertThat(found.isEmpty()).isFalse();
        assertThat(of().isEmpty()).isTrue();
    }

    private static Measurements.BothWays both(Measurement... measurements) {
        return Measurements.bothWays(of(measurements).list(Wavelength.ofNanometres(1550), END))
                .orElseThrow();
    }

    private static Measurements of(Measurement... measurements) {
        RecordsEditor editor = Records.empty().edit();
        for (Measurement measurement : measurements) {
            editor.apply(Change.add(measurement));
        }
        return new Measurements(editor.build(1));
    }

    private static Measurement measured(
            int id, @Nullable Direction direction, double loss, @Nullable String on, @Nullable String by) {
        return new Measurement(
                id,
                END,
                Wavelength.ofNanometres(1550),
                direction,
                Loss.ofDecibels(loss),
                on == null ? null : LocalDate.parse(on),
                by,
                null);
    }
}
