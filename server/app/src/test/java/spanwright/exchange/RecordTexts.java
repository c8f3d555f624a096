package spanwright.exchange;

import java.lang.reflect.RecordComponent;
import java.math.BigDecimal;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;
import spanwright.splicing.Leg;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * Records as lines of text in which identities are replaced by what they stand for, so that records entered twice
 * can be compared. Made by reflection: a component that a reader or a writer forgets is not forgotten here.
 */
final class RecordTexts {

    private static final Map<String, RecordKind> IDENTITIES = Map.of(
            "cableType", RecordKind.CABLE_TYPE,
            "structure", RecordKind.STRUCTURE,
            "cable", RecordKind.CABLE,
            "span", RecordKind.SPAN,
            "runRow", RecordKind.RUN_ROW,
            "enclosure", RecordKind.ENCLOSURE,
            "panel", RecordKind.PANEL);

    private final RecordsView view;

    private RecordTexts(RecordsView view) {
        this.view = view;
    }

    /** Every record, sorted. */
    static List<String> of(RecordsView view) {
        RecordTexts texts = new RecordTexts(view);
        return Arrays.stream(RecordKind.values())
                .flatMap(kind -> IntStream.range(0, view.limit(kind)).mapToObj(id -> view.record(kind, id)))
                .flatMap(Stream::ofNullable)
                .map(record -> record.kind() + " " + texts.text((Record) record))
                .sorted()
                .toList();
    }

    private String text(Record record) {
        return Arrays.stream(record.getClass().getRecordComponents())
                .filter(component -> !component.getName().equals("id") || !(record instanceof Recorded))
                .map(component -> component.getName() + "=" + text(record, component))
                .collect(Collectors.joining(" ", "{", "}"));
    }

    private String text(Record record, RecordComponent component) {
        Object value = value(record, component);
        if (value == null) {
            return "-";
        }
        RecordKind kind = kindOf(record, component.getName());
        return kind == null ? text(value) : name(kind, (Integer) value);
    }

    private static @Nullable Object value(Record record, RecordComponent component) {
        try {
            component.getAccessor().setAccessible(true);
            return component.getAccessor().invoke(record);
        } catch (ReflectiveOperationException e) {
            throw new IllegalStateException(e);
        }
    }

    private static @Nullable RecordKind kindOf(Record record, String component) {
        if (record instanceof Leg leg && component.equals("owner")) {
            return switch (leg.kind()) {
                case BACK, AHEAD -> RecordKind.RUN_ROW;
                case IN, OUT -> RecordKind.SPLITTER;
                case REAR, FRONT -> RecordKind.PANEL;
            };
        }
        if (Set.of("from", "to").contains(component)) {
            return record instanceof spanwright.plant.Span ? RecordKind.STRUCTURE : RecordKind.ENCLOSURE;
        }
        return IDENTITIES.get(component);
    }

    private String name(RecordKind kind, int id) {
        Recorded record = view.record(kind, id);
        if (record instanceof RunRow row) {
            return name(RecordKind.CABLE, row.cable()) + "#" + row.seq();
        }
        if (record instanceof Panel panel) {
            return name(RecordKind.ENCLOSURE, panel.enclosure()) + "/" + panel.code();
        }
        if (record instanceof Splitter splitter) {
            return name(RecordKind.ENCLOSURE, splitter.enclosure()) + "/" + splitter.code();
        }
        return String.valueOf(record).replaceFirst(".*?code=([^,]*),.*", "$1");
    }

    private String text(Object value) {
        if (value instanceof Record record) {
            return text(record);
        }
        if (value instanceof Collection<?> many) {
            return many.stream().map(this::text).collect(Collectors.joining(", ", "[", "]"));
        }
        if (value instanceof Map<?, ?> map) {
            return new TreeMap<>(map).toString();
        }
        if (value instanceof BigDecimal number) {
            return number.stripTrailingZeros().toPlainString();
        }
        return value.toString();
    }
}
