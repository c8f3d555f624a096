package spanwright.fault;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * Where a reading lies: one place, or one an output behind a splitter.
 *
 * @param places at least one, in order of outputs
 * @param between what lies between it and the place of a shot from the far end, or null where there is none
 */
public record FaultPlaces(List<FaultPlace> places, @Nullable Between between) implements FaultAnswer {

    /** Keeps its own copy. */
    public FaultPlaces {
        places = List.copyOf(places);
    }
}
