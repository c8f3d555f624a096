package spanwright.fault;

import java.util.Optional;
import spanwright.fault.Where.Lies;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.trace.Path;

/**
 * Where a distance read on an OTDR lies.
 *
 * @param path the path that was shot
 * @param where the place in the plant
 * @param glass glass from the path's start to it, the launch fiber not counted, as known events stretch it
 * @param sheath sheath from the path's start to it, by the records
 * @param recordedGlass glass from the path's start to it, by the records
 * @param over glass read beyond the path's end; below 0 where the reading ends on the path
 * @param uncertainty how sure it is
 * @param window the stretch within which the true place lies
 */
public record FaultPlace(
        Path path,
        Where where,
        Length glass,
        Length sheath,
        Length recordedGlass,
        Length over,
        Uncertainty uncertainty,
        Window window) {

    /** Whether the reading lies beyond the path's end; the place is then that end. */
    public boolean pastEnd() {
        return over.micrometres() >= 0;
    }

    /** The structure in whose coil it lies, if any. */
    public Optional<Structure> findCoil() {
        return where.lies() == Lies.SLACK ? Optional.of(where.before()) : Optional.empty();
    }

    /** The structure in whose coil it may lie as well, the nearest of several; none where it lies in one. */
    public Optional<Structure> findNearCoil() {
        return where.lies() == Lies.SLACK
                ? Optional.empty()
                : window.coils().stream().findFirst();
    }
}
