package spanwright.exchange;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.RecordsView;
import spanwright.records.Relation;

/** Finds the record of a row by a key: texts of columns that it alone has. */
final class RowFinder {

    private final PostingRows posting;
    private final Table table;
    private final Rows<?> rows;
    private final RecordsView view;

    RowFinder(PostingRows posting, Table table) {
        this.posting = posting;
        this.table = table;
        this.rows = posting.formats().of(table);
        this.view = posting.editor().records();
    }

    /** The one record with a key; null where there is none or are several, which is then noted. */
    @Nullable
    Recorded find(Map<String, String> key) {
        if (key.isEmpty()) {
            posting.fault(
                    null,
                    "the key is empty; name the row by its columns, such as "
                            + table.columns().get(0));
            return null;
        }
        List<Recorded> found = new ArrayList<>();
        candidates(key).filter(record -> has(record, key)).limit(2).forEach(found::add);
        if (found.size() == 1) {
            return found.get(0);
        }
        posting.fault(
                key.keySet().iterator().next(),
                found.isEmpty()
                        ? "there is no such row in " + table.word() + ": " + words(key)
                                + "; name one that the records hold"
                        : "several rows of " + table.word() + " have " + words(key)
                                + "; name more columns, so that one is meant");
        return null;
    }

    private static String words(Map<String, String> key) {
        return String.join(
                ", ",
                key.entrySet().stream()
                        .map(entry -> entry.getKey() + " '" + Texts.shown(entry.getValue()) + "'")
                        .toList());
    }

    private boolean has(Recorded record, Map<String, String> key) {
        Map<String, String> texts = PostingRows.texts(rows, record);
        return key.entrySet().stream()
                .allMatch(entry -> same(texts.getOrDefault(entry.getKey(), ""), entry.getValue()));
    }

    private static boolean same(String text, String asked) {
        return text.equals(asked)
                || (Decimals.plain(asked.toCharArray(), 0, asked.length())
                        && Decimals.plain(text.toCharArray(), 0, text.length())
                        && new java.math.BigDecimal(asked).compareTo(new java.math.BigDecimal(text)) == 0);
    }

    /** Records among which the one with the key is: by its code or its owner where the key names it. */
    private Stream<Recorded> candidates(Map<String, String> key) {
        RecordKind kind = rows.kind();
        String first = key.getOrDefault(table.columns().get(0), "");
        return switch (kind) {
            case STRUCTURE ->
                first.isEmpty()
                        ? all(kind)
                        : view.structures().find(first).stream().map(r -> r);
            case SPAN ->
                first.isEmpty() ? all(kind) : view.spans().find(first).stream().map(r -> r);
            case CABLE ->
                first.isEmpty() ? all(kind) : view.cables().find(first).stream().map(r -> r);
            case ENCLOSURE ->
                first.isEmpty()
                        ? all(kind)
                        : view.enclosures().find(first).stream().map(r -> r);
            case CIRCUIT ->
                first.isEmpty()
                        ? all(kind)
                        : view.circuits().find(first).stream().map(r -> r);
            case CABLE_VALUE -> ofCable(first, kind, Relation.CABLE_VALUES);
            case RUN_ROW -> ofCable(first, kind, Relation.CABLE_RUN_ROWS);
            case FIBER_FLAG -> ofCable(first, kind, Relation.CABLE_FLAGS);
            case FIBER_COUNT -> ofCable(first, kind, Relation.CABLE_COUNTS);
            case SHEATH_MARK -> marksOf(first);
            case PASS -> ofEnclosure(first, kind, Relation.ENCLOSURE_PASSES);
            case SPLITTER -> ofEnclosure(first, kind, Relation.ENCLOSURE_SPLITTERS);
            case PANEL -> ofEnclosure(first, kind, Relation.ENCLOSURE_PANELS);
            case END_STATE -> ofEnclosure(first, kind, Relation.ENCLOSURE_END_STATES);
            default -> all(kind);
        };
    }

    private Stream<Recorded> all(RecordKind kind) {
        return IntStream.range(0, view.limit(kind))
                .mapToObj(id -> view.record(kind, id))
                .flatMap(Stream::ofNullable);
    }

    private Stream<Recorded> ofCable(String code, RecordKind kind, Relation relation) {
        return view.cables()
                .find(code)
                .map(cable -> owned(kind, relation, cable.id()))
                .orElseGet(() -> code.isEmpty() ? all(kind) : Stream.empty());
    }

    private Stream<Recorded> ofEnclosure(String code, RecordKind kind, Relation relation) {
        return view.enclosures()
                .find(code)
                .map(enclosure -> owned(kind, relation, enclosure.id()))
                .orElseGet(() -> code.isEmpty() ? all(kind) : Stream.empty());
    }

    private Stream<Recorded> owned(RecordKind kind, Relation relation, int owner) {
        return IntStream.of(view.owned(relation, owner))
                .mapToObj(id -> view.record(kind, id))
                .flatMap(Stream::ofNullable);
    }

    private Stream<Recorded> marksOf(String code) {
        return view.cables().find(code).stream()
                .flatMap(cable -> IntStream.of(view.owned(Relation.CABLE_RUN_ROWS, cable.id()))
                        .boxed())
                .flatMap(row -> owned(RecordKind.SHEATH_MARK, Relation.RUN_ROW_MARKS, row));
    }
}
