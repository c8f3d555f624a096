package spanwright.loss;

import org.jspecify.annotations.Nullable;
import spanwright.quantity.Loss;

/**
 * What is reckoned for a thing whose loss was not measured.
 *
 * @param item which thing: {@code splice.fusion}, {@code splice.mechanical}, {@code connector}, {@code splitter.32}
 * @param expected expected loss
 * @param limit the most it may lose
 * @param sd standard deviation of the expected loss, or null: none
 * @param source where the values come from
 * @param replaced whether the records replace a built-in value, or add one
 */
public record PlanningLoss(
        String item, Loss expected, Loss limit, @Nullable Loss sd, String source, boolean replaced) {}
