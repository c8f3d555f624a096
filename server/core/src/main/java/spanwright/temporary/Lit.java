package spanwright.temporary;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.loss.BudgetCheck;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * What light does over a temporary path, as if it were posted: the worst of the group's circuits counts.
 *
 * @param whole whether every circuit's ports are joined
 * @param worst the circuit that has least left of its budget, else loses most
 * @param glass the glass of its longest path
 * @param loss the most that one of its paths loses, or null where a table does not reach
 * @param check its loss held against its budget, or null where it has none
 * @param unknown why the loss is not known, else empty
 */
public record Lit(
        boolean whole,
        Circuit worst,
        Length glass,
        @Nullable Loss loss,
        @Nullable BudgetCheck check,
        List<String> unknown) {

    /** Keeps its own copy. */
    public Lit {
        unknown = List.copyOf(unknown);
    }

    /** Whether the budget is kept; where none is known nothing says that it is broken. */
    public boolean passes() {
        return check == null || check.passes();
    }
}
