package spanwright.loss;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import spanwright.plant.BuiltInTable;
import spanwright.plant.Source;
import spanwright.quantity.Loss;
import spanwright.records.RecordsView;
import spanwright.splicing.PlanningValue;

/**
 * The planning values: those of the table {@code planning_values} that is built in, each replaced whole by the recorded
 * one of its name.
 */
public final class PlanningLosses {

    private static final List<PlanningLoss> BUILT_IN = BuiltInTable.read("planning_values").stream()
            .map(PlanningLosses::builtIn)
            .toList();
    private static final Map<String, PlanningLoss> BY_ITEM =
            BUILT_IN.stream().collect(Collectors.toMap(PlanningLoss::item, Function.identity()));

    private final RecordsView records;

    /** The planning values of these records. */
    public PlanningLosses(RecordsView records) {
        this.records = records;
    }

    private static PlanningLoss builtIn(BuiltInTable.Row row) {
        String sd = row.get("sd_db");
        return new PlanningLoss(
                row.get("item"),
                decibels(row.get("expected_db")),
                decibels(row.get("limit_db")),
                sd.isEmpty() ? null : decibels(sd),
                sources(row, sd.isEmpty()),
                false);
    }

    private static Loss decibels(String number) {
        return Loss.ofDecibels(new BigDecimal(number));
    }

    private static String sources(BuiltInTable.Row row, boolean withoutSd) {
        Source expected = row.source("expected_source");
        Source limit = row.source("limit_source");
        String both = expected.equals(limit) ? expected.text() : expected.text() + "; limit: " + limit.text();
        return withoutSd ? both : both + "; " + row.source("sd_source").text();
    }

    /** The values that are built in, in the order of their table. */
    public static List<PlanningLoss> listBuiltIn() {
        return BUILT_IN;
    }

    /** The value of an item, if there is one. */
    public Optional<PlanningLoss> find(String item) {
        return records.planningValues()
                .find(item)
                .map(PlanningLosses::recorded)
                .or(() -> Optional.ofNullable(BY_ITEM.get(item)));
    }

    /** A blank limit is the expected value, a blank deviation none. */
    private static PlanningLoss recorded(PlanningValue value) {
        return new PlanningLoss(
                value.item(),
                value.expected(),
                Objects.requireNonNullElse(value.limit(), value.expected()),
                value.sd(),
                Objects.requireNonNullElse(value.source(), "these records"),
                true);
    }
}
