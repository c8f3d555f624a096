package spanwright.loss;

import spanwright.quantity.Loss;

/**
 * A path's loss held against a budget.
 *
 * @param budget the budget
 * @param margin kept free of it
 * @param expected the path's expected sum
 * @param limit the path's limit sum
 */
public record BudgetCheck(Budget budget, Loss margin, Loss expected, Loss limit) {

    /** Holds a path's loss against a budget, less a margin. */
    public static BudgetCheck of(PathLoss loss, Budget budget, Loss margin) {
        return new BudgetCheck(budget, margin, loss.expected(), loss.limit());
    }

    /** What is left of the budget less the margin after the expected sum; below 0 where it is overdrawn. */
    public Loss left() {
        return budget.max().minus(margin).minus(expected);
    }

    /** Whether the expected sum is at most the budget less the margin. */
    public boolean passes() {
        return left().microdecibels() >= 0;
    }

    /** Whether the limit sum is at most the budget less the margin. */
    public boolean passesAtLimit() {
        return limit.compareTo(budget.max().minus(margin)) <= 0;
    }

    /** Whether the expected sum, margin apart, is below the class's least: the receiver is overloaded. */
    public boolean overload() {
        Loss min = budget.min();
        return min != null && expected.compareTo(min) < 0;
    }
}
