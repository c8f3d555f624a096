package spanwright.records;

import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Span;

/** How a refusal names records and columns: by the codes and words of the records folder. */
final class Names {

    private static final int MOST = 5;

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

    /** A record in words, such as {@code structure HH-1}. */
    static String of(RecordsView view, Recorded record) {
        String code = Codes.of(record);
        String what = record.kind().name().toLowerCase(Locale.ROOT).replace('_', ' ');
        return switch (record.kind()) {
            case RUN_ROW -> of(view, (RunRow) record);
            case PASS ->
                "cable " + cable(view, ((Pass) record).cable()) + " in enclosure "
                        + enclosure(view, ((Pass) record).enclosure());
            case SPLITTER, PANEL -> what + " " + plain(code);
            default -> code == null ? "the " + what : what + " " + code;
        };
    }

    private static String plain(@Nullable String code) {
        return code == null ? "" : code.substring(code.indexOf('/') + 1);
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
        return list(names, " and ");
    }

    /** {@code 0, 2 or 5}, the first few of many. */
    static String choice(Stream<String> names) {
        return list(names, " or ");
    }

    private static String list(Stream<String> names, String last) {
        var all = names.limit(MOST + 1).collect(Collectors.toList());
        if (all.size() > MOST) {
            return String.join(", ", all.subList(0, MOST)) + " and more";
        }
        int end = all.size() - 1;
        return end < 1 ? String.join("", all) : String.join(", ", all.subList(0, end)) + last + all.get(end);
    }

    /** {@code S-1 (P-1 to P-2)}. */
    static String of(RecordsView view, Span span) {
        return span.code() + " (" + structure(view, span.from()) + " to " + structure(view, span.to()) + ")";
    }
}
