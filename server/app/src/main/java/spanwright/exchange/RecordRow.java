package spanwright.exchange;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.plant.BaseFeature;
import spanwright.plant.CableValue;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.records.RecordsView;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Splitter;

/**
 * A record as a row of the records folder. Of a record that several rows make, each column holds those of all of
 * them, parted by spaces.
 *
 * @param table the table, without {@code .csv}; {@code basemap} for a feature of the base map
 * @param code what it is about, in the notation of the records, or null
 * @param columns text by column, in the folder's order; blank columns left out
 */
public record RecordRow(String table, @Nullable String code, Map<String, String> columns) {

    /** Keeps its own copy, in order. */
    public RecordRow {
        columns = Collections.unmodifiableMap(new LinkedHashMap<>(columns));
    }

    /**
     * The row of a record.
     *
     * @param view the records that it is part of, or was: what it refers to is named by their codes
     */
    public static RecordRow of(RecordsView view, Recorded record) {
        Table table = Lines.table(record);
        if (table == null) {
            BaseFeature feature = (BaseFeature) record;
            String name = feature.name();
            return new RecordRow(
                    "basemap", name, name == null ? Map.of("layer", feature.layer()) : named(feature.layer(), name));
        }
        Formats formats = new Formats(new References(view, new Doubts()));
        Map<String, String> columns = switch (table) {
            case FIBER_TYPES -> columns((FiberType) record);
            case COLOR_CODES -> columns((ColorCode) record);
            default -> PostingRows.texts(formats.of(table), record);
        };
        if (record instanceof Splitter splitter && !splitter.outputLosses().isEmpty()) {
            columns.put("output_losses_db", taps(splitter));
        }
        return new RecordRow(table.word(), code(formats, record, columns), columns);
    }

    private static Map<String, String> named(String layer, String name) {
        Map<String, String> columns = new LinkedHashMap<>();
        columns.put("layer", layer);
        columns.put("name", name);
        return columns;
    }

    private static Map<String, String> columns(FiberType type) {
        Map<String, String> columns = new LinkedHashMap<>();
        Cells cells = new Cells(Table.FIBER_TYPES);
        for (FiberValues values : type.values()) {
            FiberTypeRows.write(type, values, cells);
            cells.byColumn()
                    .forEach((column, text) -> columns.merge(
                            column, text, (before, more) -> before.equals(more) ? before : before + " " + more));
        }
        return columns;
    }

    private static Map<String, String> columns(ColorCode code) {
        Map<String, String> columns = new LinkedHashMap<>();
        columns.put("code", code.code());
        columns.put("position", "1-" + code.colors().size());
        columns.put("color", String.join(", ", code.colors()));
        return columns;
    }

    private static String taps(Splitter splitter) {
        return new TreeMap<>(splitter.outputLosses())
                .entrySet().stream()
                        .map(tap -> tap.getKey() + ":"
                                + tap.getValue().exactDecibels().toPlainString())
                        .collect(Collectors.joining(" "));
    }

    private static @Nullable String code(Formats formats, Recorded record, Map<String, String> columns) {
        return switch (record.kind()) {
            case CABLE_VALUE -> columns.get("cable") + " " + ((CableValue) record).wavelength();
            case RUN_ROW -> columns.get("cable") + " row " + columns.get("seq");
            case SHEATH_MARK -> columns.get("cable") + " row " + columns.get("seq") + " " + columns.get("ink");
            case PASS -> columns.get("cable") + " @ " + columns.get("enclosure");
            case SPLITTER -> columns.get("splitter") + " @ " + columns.get("enclosure");
            case PANEL -> columns.get("enclosure") + "/" + columns.get("panel");
            case JOINT -> code(formats.ends(), (Joint) record);
            case END_STATE -> columns.get("end") + " @ " + columns.get("enclosure");
            case FIBER_FLAG, FIBER_COUNT -> columns.get("cable") + ":" + columns.get("fibers");
            default -> columns.values().stream().findFirst().orElse(null);
        };
    }

    private static String code(Ends ends, Joint joint) {
        String a = ends.text(joint.a());
        String b = ends.text(joint.b());
        return joint.type() == JointKind.SPLICE || joint.type() == JointKind.TERMINATION
                ? a + " = " + b
                : a + " - " + b;
    }
}
