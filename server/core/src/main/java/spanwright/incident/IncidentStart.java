package spanwright.incident;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * What an incident was opened from; at least one of them is known.
 *
 * @param cuts what is believed cut, such as {@code span:S-1} or {@code place:F-1@1352.2}
 * @param down circuits whose path is down from the beginning
 * @param up circuits known to be up
 * @param reading a reading of a trace as it was told, or null
 */
public record IncidentStart(
        List<String> cuts,
        List<String> down,
        List<String> up,
        @Nullable String reading) {

    /** Keeps its own copies. */
    public IncidentStart {
        cuts = List.copyOf(cuts);
        down = List.copyOf(down);
        up = List.copyOf(up);
    }

    /** Whether nothing is known. */
    public boolean isBlank() {
        return cuts.isEmpty() && down.isEmpty() && up.isEmpty() && reading == null;
    }
}
