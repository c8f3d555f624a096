package spanwright.draft;

import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * A circuit on glass that a sheet changes.
 *
 * @param circuit the circuit
 * @param wavelength its first wavelength
 * @param wholeBefore whether a path joins its ports now
 * @param wholeAfter whether one would
 * @param lossBefore the greatest expected loss of its paths now, or null where it is not known
 * @param lossAfter the same as if posted
 */
public record TouchedCircuit(
        Circuit circuit,
        Wavelength wavelength,
        boolean wholeBefore,
        boolean wholeAfter,
        @Nullable Loss lossBefore,
        @Nullable Loss lossAfter) {}
