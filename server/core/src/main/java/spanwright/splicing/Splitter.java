package spanwright.splicing;

import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Loss;

/**
 * A splitter: light crosses from an input to every output, and from an output to the inputs only.
 *
 * @param id lasting identity
 * @param enclosure identity of the enclosure
 * @param code unique within its enclosure
 * @param inputs 1 or 2
 * @param outputs 2 to 128
 * @param loss measured loss, or null: the planning value
 * @param outputLosses measured loss by output, for unequal taps
 */
public record Splitter(
        int id,
        int enclosure,
        String code,
        int inputs,
        int outputs,
        @Nullable Loss loss,
        Map<Integer, Loss> outputLosses)
        implements Recorded {

    /** Keeps its own copy of the map; refuses counts out of range. */
    public Splitter {
        outputLosses = Map.copyOf(outputLosses);
        if (inputs < 1 || inputs > 2 || outputs < 2 || outputs > 128) {
            throw new IllegalArgumentException("not a splitter: " + inputs + " in, " + outputs + " out");
        }
    }

    @Override
    public RecordKind kind() {
        return RecordKind.SPLITTER;
    }
}
