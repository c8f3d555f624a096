package spanwright.records;

import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.RunRow;
import spanwright.plant.Span;

/** How a refusal names records and columns: by the codes and words of the records folder. */
final class Names {

    private Names() {}

    /** The column that holds the code of a kind, or null where the kind has none. */
    static @Nullable String codeColumn(RecordKind kind) {
        return switch (kind) {
            case SETTING -> "name";
            case STRUCTURE -> "structure";
            case SPAN -> "span";
            case FIBER_TYPE -> "fiber_type";
            case COLOR_CODE -> "code";
            case CABLE_TYPE -> "cable_type";
            case CABLE -> "cable";
            case ENCLOSURE -> "enclosure";
            case SPLITTER -> "splitter";
            case PANEL -> "panel";
            case CIRCUIT -> "circuit";
            case PLANNING_VALUE -> "item";
            default -> null;
        };
    }

    /** {@code F-1 row 2}. */
    static String of(RecordsView view, RunRow row) {
        return cable(view, row.cable()) + " row " + row.seq();
    }

    static String structure(RecordsView view, int id) {
        return view.structures().find(id).map(found -> found.code()).orElse("?");
    }

    static String cable(RecordsView view, int id) {
        return view.cables().find(id).map(found -> found.code()).orElse("?");
    }

    static String enclosure(RecordsView view, int id) {
        return view.enclosures().find(id).map(found -> found.code()).orElse("?");
    }

    /** {@code S-1, S-2 and S-3}, the first few of many. */
    static String list(Stream<String> names) {
        var all = names.limit(MOST + 1).collect(Collectors.toList());
        if (all.size() > MOST) {
            return String.join(", ", all.subList(0, MOST)) + " and more";
        }
        int last = all.size() - 1;
        return last < 1 ? String.join("", all) : String.join(", ", all.subList(0, last)) + " and " + all.get(last);
    }

    private static final int MOST = 5;

    /** {@code S-1 (P-1 to P-2)}. */
    static String of(RecordsView view, Span span) {
        return span.code() + " (" + structure(view, span.from()) + " to " + structure(view, span.to()) + ")";
    }
}
