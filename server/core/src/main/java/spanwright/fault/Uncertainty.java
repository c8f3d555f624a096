package spanwright.fault;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import spanwright.quantity.Length;

/**
 * How sure a place is.
 *
 * @param causes one standard uncertainty a cause, along the sheath
 */
public record Uncertainty(Map<Cause, Length> causes) {

    /** Standard uncertainties within which about 95 of 100 true values lie. */
    private static final double COVERAGE = 2;

    /** Keeps its own copy; refuses one that lacks a cause. */
    public Uncertainty {
        causes = Collections.unmodifiableMap(new EnumMap<>(causes));
        if (causes.size() != Cause.values().length) {
            throw new IllegalArgumentException("each cause is told: " + causes);
        }
    }

    /** One standard uncertainty of one cause. */
    public Length of(Cause cause) {
        return causes.getOrDefault(cause, Length.ZERO);
    }

    /** How far either side the true place lies, in about 95 of 100: twice the root of the summed squares. */
    public Length within() {
        double squares = 0;
        for (Length each : causes.values()) {
            squares += each.metres() * each.metres();
        }
        return Length.ofMetres(COVERAGE * Math.sqrt(squares));
    }
}
