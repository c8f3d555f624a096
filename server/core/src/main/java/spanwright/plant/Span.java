package spanwright.plant;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Length;

/**
 * A stretch of route between two structures.
 *
 * @param id lasting identity
 * @param code unique
 * @param from identity of the structure at its beginning
 * @param to identity of the structure at its end; the same only with a measured length
 * @param placement how it is placed
 * @param measuredLength measured along the route, or null: the geodesic length of the line
 * @param line its line on the map from {@code from} to {@code to}, or null: straight
 * @param state whether it is there
 * @param sharedRisk codes of risks it shares with other plant
 * @param note free text, or null
 */
public record Span(
        int id,
        String code,
        int from,
        int to,
        Placement placement,
        @Nullable Length measuredLength,
        @Nullable Line line,
        PlantState state,
        List<String> sharedRisk,
        @Nullable String note)
        implements Recorded {

    /** Keeps its own copy of the list. */
    public Span {
        sharedRisk = List.copyOf(sharedRisk);
    }

    @Override
    public RecordKind kind() {
        return RecordKind.SPAN;
    }
}
