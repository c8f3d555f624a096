package spanwright.exchange;

import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.quantity.Loss;
import spanwright.splicing.Splitter;

/** Rows of {@code splitters.csv}; unequal taps come after them. */
final class SplitterRows extends Rows<Splitter> {

    /** The most outputs of a splitter. */
    static final int MOST_OUTPUTS = 128;

    private static final int ENCLOSURE = Table.SPLITTERS.column("enclosure");
    private static final int SPLITTER = Table.SPLITTERS.column("splitter");
    private static final int INPUTS = Table.SPLITTERS.column("inputs");
    private static final int OUTPUTS = Table.SPLITTERS.column("outputs");
    private static final int LOSS = Table.SPLITTERS.column("loss_db");

    SplitterRows(References refs) {
        super(Table.SPLITTERS, RecordKind.SPLITTER, refs);
    }

    @Override
    @Nullable
    Splitter read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        String code = row.code(SPLITTER);
        Integer inputs = row.whole(INPUTS, 1, 2);
        Integer outputs = row.whole(OUTPUTS, 2, MOST_OUTPUTS);
        Loss loss = row.decibels(LOSS, Row.Bound.FROM_ZERO);
        if (enclosure == 0 || code == null || outputs == null || row.faulty(INPUTS)) {
            return null;
        }
        return new Splitter(id, enclosure, code, Objects.requireNonNullElse(inputs, 1), outputs, loss, Map.of());
    }

    @Override
    void write(Splitter splitter, Cells cells) {
        cells.put(ENCLOSURE, refs.enclosure(splitter.enclosure()));
        cells.put(SPLITTER, splitter.code());
        cells.put(INPUTS, splitter.inputs());
        cells.put(OUTPUTS, splitter.outputs());
        cells.put(LOSS, splitter.loss());
    }

    @Override
    String key(Row row) {
        return row.text(ENCLOSURE) + "/" + row.text(SPLITTER);
    }
}
