package spanwright.splicing;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * One measured loss, at one wavelength, in one direction.
 *
 * @param id lasting identity
 * @param what what was measured, as written: an end, a fiber or a port
 * @param wavelength at which
 * @param direction which way, or null where nobody said
 * @param loss measured; a single way may be below 0
 * @param on when, or null
 * @param by by whom, or null
 * @param file the trace file, or null
 */
public record Measurement(
        int id,
        String what,
        Wavelength wavelength,
        @Nullable Direction direction,
        Loss loss,
        @Nullable LocalDate on,
        @Nullable String by,
        @Nullable String file)
        implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.MEASUREMENT;
    }
}
