package spanwright.exchange;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.quantity.Loss;
import spanwright.splicing.PlanningValue;

/** Rows of {@code planning_values.csv}. */
final class PlanningValueRows extends Rows<PlanningValue> {

    private static final int ITEM = Table.PLANNING_VALUES.column("item");
    private static final int EXPECTED = Table.PLANNING_VALUES.column("expected_db");
    private static final int LIMIT = Table.PLANNING_VALUES.column("limit_db");
    private static final int SD = Table.PLANNING_VALUES.column("sd_db");
    private static final int SOURCE = Table.PLANNING_VALUES.column("source");
    private static final List<String> ITEMS = List.of("splice.fusion", "splice.mechanical", "connector");
    private static final String SPLITTER = "splitter.";

    PlanningValueRows(References refs) {
        super(Table.PLANNING_VALUES, RecordKind.PLANNING_VALUE, refs);
    }

    @Override
    @Nullable
    PlanningValue read(Row row, int id) {
        String item = item(row);
        Loss expected = row.decibels(EXPECTED, Row.Bound.FROM_ZERO);
        Loss limit = row.decibels(LIMIT, Row.Bound.FROM_ZERO);
        Loss sd = row.decibels(SD, Row.Bound.FROM_ZERO);
        String source = row.free(SOURCE);
        return item == null || expected == null ? null : new PlanningValue(id, item, expected, limit, sd, source);
    }

    private static @Nullable String item(Row row) {
        String item = row.free(ITEM);
        if (item == null || ITEMS.contains(item) || (item.startsWith(SPLITTER) && outputs(item))) {
            return item;
        }
        row.fault(
                ITEM,
                row.named(ITEM) + " is no item; the items are " + String.join(", ", ITEMS)
                        + ", and splitter.2 to splitter.128" + Near.hint(item, ITEMS));
        return null;
    }

    private static boolean outputs(String item) {
        String count = item.substring(SPLITTER.length());
        int outputs = Decimals.whole(count.toCharArray(), 0, count.length());
        return outputs >= 2 && outputs <= SplitterRows.MOST_OUTPUTS && count.equals(Integer.toString(outputs));
    }

    @Override
    void write(PlanningValue value, Cells cells) {
        cells.put(ITEM, value.item());
        cells.put(EXPECTED, value.expected());
        cells.put(LIMIT, value.limit());
        cells.put(SD, value.sd());
        cells.put(SOURCE, value.source());
    }
}
