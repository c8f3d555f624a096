package spanwright.circuits;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Wavelength;

/**
 * A service that lives on the path from its a ports to its z ports, one pair a fiber.
 *
 * @param id lasting identity
 * @param code unique
 * @param service what it is for, or null
 * @param customer for whom, or null
 * @param priority 1 first to be restored ... 5
 * @param customersServed how many customers hang on it, 0 or above
 * @param wavelengths those it uses; the first is the default; at least one
 * @param budget a class code or a number of dB, or null
 * @param protectionGroup circuits with the same code protect each other, or null
 * @param a its a ports
 * @param z its z ports, of the same count
 * @param status whether it works
 */
public record Circuit(
        int id,
        String code,
        @Nullable String service,
        @Nullable String customer,
        int priority,
        int customersServed,
        List<Wavelength> wavelengths,
        @Nullable String budget,
        @Nullable String protectionGroup,
        PortRange a,
        PortRange z,
        CircuitStatus status)
        implements Recorded {

    /** Keeps its own copy of the list; refuses what cannot be a circuit. */
    public Circuit {
        wavelengths = List.copyOf(wavelengths);
        if (priority < 1 || priority > 5 || customersServed < 0 || wavelengths.isEmpty()) {
            throw new IllegalArgumentException("not a circuit: " + code);
        }
        if (a.ports().count() != z.ports().count()) {
            throw new IllegalArgumentException("sides unlike in count: " + code);
        }
    }

    @Override
    public RecordKind kind() {
        return RecordKind.CIRCUIT;
    }

    /** How many fibers it runs on. */
    public int fibers() {
        return a.ports().count();
    }
}
