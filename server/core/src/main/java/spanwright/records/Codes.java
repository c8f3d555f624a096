package spanwright.records;

import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.ColorCode;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberType;
import spanwright.plant.Setting;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.splicing.Panel;
import spanwright.splicing.PlanningValue;
import spanwright.splicing.Splitter;

/** Says by which code a record is found; a panel's and a splitter's are unique within their enclosure only. */
final class Codes {

    private Codes() {}

    /** The code that is unique within the record's kind, or null where the kind has none. */
    static @Nullable String of(Recorded record) {
        return switch (record.kind()) {
            case SETTING -> ((Setting) record).name();
            case STRUCTURE -> ((Structure) record).code();
            case SPAN -> ((Span) record).code();
            case FIBER_TYPE -> ((FiberType) record).code();
            case COLOR_CODE -> ((ColorCode) record).code();
            case CABLE_TYPE -> ((CableType) record).code();
            case CABLE -> ((Cable) record).code();
            case ENCLOSURE -> ((Enclosure) record).code();
            case SPLITTER -> within(((Splitter) record).enclosure(), ((Splitter) record).code());
            case PANEL -> within(((Panel) record).enclosure(), ((Panel) record).code());
            case CIRCUIT -> ((Circuit) record).code();
            case PLANNING_VALUE -> ((PlanningValue) record).item();
            default -> null;
        };
    }

    /** The code of a panel or splitter, made unique by its enclosure; no code holds a slash. */
    static String within(int enclosure, String code) {
        return enclosure + "/" + code;
    }
}
