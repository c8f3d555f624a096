package spanwright.exchange;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Line;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.quantity.Length;
import spanwright.records.SpanRules;

/** Rows of {@code spans.csv}. */
final class SpanRows extends Rows<Span> {

    private static final int SPAN = Table.SPANS.column("span");
    private static final int FROM = Table.SPANS.column("from");
    private static final int TO = Table.SPANS.column("to");
    private static final int PLACEMENT = Table.SPANS.column("placement");
    private static final int LENGTH = Table.SPANS.column("length_m");
    private static final int LINE = Table.SPANS.column("line");
    private static final int STATE = Table.SPANS.column("state");
    private static final int SHARED_RISK = Table.SPANS.column("shared_risk");
    private static final int NOTE = Table.SPANS.column("note");
    /** Stands in for a length that is wrong, where a span needs one. */
    private static final Length SOME = new Length(1_000_000);

    SpanRows(References refs) {
        super(Table.SPANS, RecordKind.SPAN, refs);
    }

    @Override
    @Nullable
    Span read(Row row, int id) {
        String code = row.code(SPAN);
        int from = refs.structures.find(row, FROM);
        int to = refs.structures.find(row, TO);
        Placement placement = row.word(PLACEMENT, Placement.values(), Placement::word);
        Length length = row.metres(LENGTH, Row.Bound.ABOVE_ZERO);
        Line line = row.blank(LINE) ? null : Wkt.line(row, LINE);
        PlantState state = row.word(STATE, PlantState.values(), PlantState::word);
        List<String> sharedRisk = row.codes(SHARED_RISK);
        String note = row.free(NOTE);
        if (code == null || from == 0 || to == 0) {
            return null;
        }
        return new Span(
                id,
                code,
                from,
                to,
                Objects.requireNonNullElse(placement, Placement.BURIED),
                row.faulty(LENGTH) ? SOME : length,
                line == null ? null : fitted(from, to, line),
                Objects.requireNonNullElse(state, PlantState.IN_SERVICE),
                sharedRisk,
                note);
    }

    /** The line from its first structure to its second; as it is where it fits neither way or nobody can tell. */
    private @Nullable Line fitted(int from, int to, Line line) {
        Structure begin = refs.view().structures().get(from);
        Structure end = refs.view().structures().get(to);
        if (refs.doubts().cover(Table.STRUCTURES, begin.code()) || refs.doubts().cover(Table.STRUCTURES, end.code())) {
            return null;
        }
        Optional<Line> fitted = SpanRules.fit(line, begin.position(), end.position());
        return fitted.orElse(line);
    }

    @Override
    void write(Span span, Cells cells) {
        cells.put(SPAN, span.code());
        cells.put(FROM, refs.structure(span.from()));
        cells.put(TO, refs.structure(span.to()));
        cells.put(PLACEMENT, span.placement().word());
        cells.put(LENGTH, span.measuredLength());
        Line line = span.line();
        cells.put(LINE, line == null ? null : Wkt.text(line));
        cells.put(STATE, span.state().word());
        cells.put(SHARED_RISK, span.sharedRisk());
        cells.put(NOTE, span.note());
    }

    @Override
    String key(Row row) {
        return row.text(SPAN);
    }
}
