package spanwright.atlas;

import java.util.Objects;
import java.util.stream.Stream;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.BaseFeature;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** What can be found by name, what people look for most first. */
public enum Named {
    /** A circuit by its code. */
    CIRCUIT(RecordKind.CIRCUIT),
    /** A cable by its code or by the longer cable that it is part of. */
    CABLE(RecordKind.CABLE),
    /** An enclosure by its code. */
    ENCLOSURE(RecordKind.ENCLOSURE),
    /** A structure by its code. */
    STRUCTURE(RecordKind.STRUCTURE),
    /** A panel by its enclosure and code. */
    PANEL(RecordKind.PANEL),
    /** A splitter by its enclosure and code. */
    SPLITTER(RecordKind.SPLITTER),
    /** A span by its code. */
    SPAN(RecordKind.SPAN),
    /** A circuit by its customer. */
    CUSTOMER(RecordKind.CIRCUIT),
    /** A street, place or the like of the base map. */
    PLACE(RecordKind.BASE_FEATURE),
    /** A structure by its address. */
    ADDRESS(RecordKind.STRUCTURE);

    private final RecordKind kind;

    Named(RecordKind kind) {
        this.kind = kind;
    }

    /** The kind of record found. */
    public RecordKind kind() {
        return kind;
    }

    /** The names of a record, as written. */
    Stream<String> names(Records records, Recorded record) {
        Stream<String> names = switch (this) {
            case CIRCUIT -> Stream.of(((Circuit) record).code());
            case CABLE -> Stream.of(((Cable) record).code(), ((Cable) record).partOf());
            case ENCLOSURE -> Stream.of(((Enclosure) record).code());
            case STRUCTURE -> Stream.of(((Structure) record).code());
            case PANEL -> Stream.of(within(records, ((Panel) record).enclosure(), ((Panel) record).code()));
            case SPLITTER -> Stream.of(within(records, ((Splitter) record).enclosure(), ((Splitter) record).code()));
            case SPAN -> Stream.of(((Span) record).code());
            case CUSTOMER -> Stream.of(((Circuit) record).customer());
            case PLACE -> Stream.of(((BaseFeature) record).name());
            case ADDRESS -> Stream.of(((Structure) record).address());
        };
        return names.filter(Objects::nonNull);
    }

    private static String within(Records records, int enclosure, String code) {
        return records.enclosures().get(enclosure).code() + "/" + code;
    }
}
