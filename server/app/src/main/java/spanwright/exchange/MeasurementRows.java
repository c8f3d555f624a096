package spanwright.exchange;

import java.math.BigDecimal;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.Direction;
import spanwright.splicing.Measurement;

/** Rows of {@code measurements.csv}: of an end {@code F-1 ahead 3 @ E4}, a fiber {@code F-1:3} or a port. */
final class MeasurementRows extends Rows<Measurement> {

    private static final int WHAT = Table.MEASUREMENTS.column("what");
    private static final int WAVELENGTH = Table.MEASUREMENTS.column("wavelength_nm");
    private static final int DIRECTION = Table.MEASUREMENTS.column("direction");
    private static final int LOSS = Table.MEASUREMENTS.column("loss_db");
    private static final int ON = Table.MEASUREMENTS.column("on");
    private static final int BY = Table.MEASUREMENTS.column("by");
    private static final int FILE = Table.MEASUREMENTS.column("file");
    private static final BigDecimal MOST = BigDecimal.valueOf(100_000);

    private final Ends ends;
    private final Ports ports;

    MeasurementRows(References refs, Ends ends, Ports ports) {
        super(Table.MEASUREMENTS, RecordKind.MEASUREMENT, refs);
        this.ends = ends;
        this.ports = ports;
    }

    @Override
    @Nullable
    Measurement read(Row row, int id) {
        boolean ofEnd = row.text(WHAT).contains(" @ ");
        boolean found = !row.blank(WHAT) && (ofEnd ? end(row) : row.text(WHAT).contains("/") ? port(row) : fiber(row));
        Wavelength wavelength = row.nanometres(WAVELENGTH);
        Direction direction = row.word(DIRECTION, Direction.values(), Direction::word);
        Loss loss = ofEnd ? oneWay(row) : row.decibels(LOSS, Row.Bound.FROM_ZERO);
        LocalDate on = row.date(ON, refs.zone());
        String by = row.free(BY);
        String file = row.free(FILE);
        return !found || wavelength == null || loss == null
                ? null
                : new Measurement(id, row.text(WHAT), wavelength, direction, loss, on, by, file);
    }

    /** One way over a joint may read below 0, where the glass behind it scatters more; the mean of both does not. */
    private static @Nullable Loss oneWay(Row row) {
        BigDecimal number = row.decimal(LOSS, MOST.negate(), MOST, "one way over a joint is -100000 to 100000 dB");
        return number == null ? null : Loss.ofDecibels(number);
    }

    private boolean end(Row row) {
        int at = row.from(WHAT) + row.text(WHAT).indexOf(" @ ");
        int enclosure = refs.enclosures.find(row, WHAT, at + 3, row.to(WHAT));
        var found = ends.find(row, WHAT, row.from(WHAT), at, enclosure);
        return found != null && one(row, found.count());
    }

    private boolean port(Row row) {
        var found = ports.find(row, WHAT);
        return found != null && one(row, found.numbers().count());
    }

    private boolean fiber(Row row) {
        int colon = row.text(WHAT).indexOf(':');
        if (colon < 1) {
            row.fault(WHAT, row.named(WHAT) + " is no end, fiber or port; write F-1 ahead 3 @ E4, F-1:3 or E9/P/4");
            return false;
        }
        int at = row.from(WHAT) + colon;
        int cable = refs.cables.find(row, WHAT, row.from(WHAT), at);
        int most = cable == 0 ? CableTypeRows.MOST_FIBERS : refs.typeOf(cable).fibers();
        var found = Ranges.range(
                row,
                WHAT,
                at + 1,
                row.to(WHAT),
                most,
                "fibers of cable " + row.text(WHAT).substring(0, colon));
        return cable != 0 && found != null && one(row, found.count());
    }

    private static boolean one(Row row, int count) {
        if (count != 1) {
            row.fault(WHAT, row.named(WHAT) + " names " + count + "; a measurement is of one end, fiber or port");
        }
        return count == 1;
    }

    @Override
    void write(Measurement measurement, Cells cells) {
        Direction direction = measurement.direction();
        cells.put(WHAT, measurement.what());
        cells.put(WAVELENGTH, measurement.wavelength().exactNanometres());
        cells.put(DIRECTION, direction == null ? null : direction.word());
        cells.put(LOSS, measurement.loss());
        cells.put(ON, measurement.on());
        cells.put(BY, measurement.by());
        cells.put(FILE, measurement.file());
    }
}
