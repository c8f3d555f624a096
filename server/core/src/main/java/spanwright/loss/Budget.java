package spanwright.loss;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import spanwright.plant.BuiltInTable;
import spanwright.plant.Source;
import spanwright.quantity.Loss;

/**
 * What a path may lose.
 *
 * @param code code of the PON class, or null where it is a number
 * @param max the most
 * @param min the least, below which the receiver is overloaded; null where it is a number
 * @param source where it comes from, for a person
 */
public record Budget(
        @Nullable String code, Loss max, @Nullable Loss min, String source) {

    private static final Pattern DECIBELS = Pattern.compile("\\d+(\\.\\d+)?");
    private static final List<Budget> CLASSES =
            BuiltInTable.read("budget_classes").stream().map(Budget::ofRow).toList();

    private static Budget ofRow(BuiltInTable.Row row) {
        Source max = row.source("max_source");
        Source min = row.source("min_source");
        return new Budget(
                row.get("class"),
                Loss.ofDecibels(new BigDecimal(row.get("max_db"))),
                Loss.ofDecibels(new BigDecimal(row.get("min_db"))),
                max.equals(min) ? max.text() : "maximum: " + max.text() + "; minimum: " + min.text());
    }

    /** The PON classes, in the order of their table. */
    public static List<Budget> listClasses() {
        return CLASSES;
    }

    /** A number of decibels. */
    public static Budget of(Loss max) {
        return new Budget(null, max, null, "a number of dB, as given");
    }

    /** The budget written so, if it is a class code or a plain number of decibels. */
    public static Optional<Budget> find(String text) {
        return DECIBELS.matcher(text).matches()
                ? Optional.of(of(Loss.ofDecibels(new BigDecimal(text))))
                : CLASSES.stream().filter(budget -> text.equals(budget.code())).findFirst();
    }
}
