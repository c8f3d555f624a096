package spanwright.splicing;

import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.quantity.Loss;

/**
 * A planning value that replaces the built-in one of that name whole.
 *
 * @param id lasting identity
 * @param item splice.fusion, splice.mechanical, connector, splitter.N
 * @param expected expected loss
 * @param limit limit, or null: the expected value
 * @param sd standard deviation, or null: none
 * @param source where it comes from, or null
 */
public record PlanningValue(
        int id,
        String item,
        Loss expected,
        @Nullable Loss limit,
        @Nullable Loss sd,
        @Nullable String source) implements Recorded {

    @Override
    public RecordKind kind() {
        return RecordKind.PLANNING_VALUE;
    }
}
