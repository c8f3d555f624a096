package spanwright.records;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.plant.ColorCode;
import spanwright.plant.FiberType;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** What a record keeps as long as it lives: what it is a part of, and a code that others name it by in words. */
final class FixedRules {

    private FixedRules() {}

    /** Asks about the change of one record into another of the same identity. */
    static void ask(RecordsView view, Recorded before, Recorded after, Refusals refusals) {
        String column = moved(before, after);
        if (column != null) {
            refusals.add(
                    "moved",
                    column,
                    Names.of(view, before) + " keeps its " + column + "; remove it and enter it anew there");
        }
        if (!Objects.equals(Codes.of(before), Codes.of(after))) {
            askCode(view, before, refusals);
        }
    }

    private static @Nullable String moved(Recorded before, Recorded after) {
        return switch (before.kind()) {
            case RUN_ROW -> ((RunRow) before).cable() == ((RunRow) after).cable() ? null : "cable";
            case SHEATH_MARK -> ((SheathMark) before).runRow() == ((SheathMark) after).runRow() ? null : "seq";
            case PASS -> moved((Pass) before, (Pass) after);
            case SPLITTER -> ((Splitter) before).enclosure() == ((Splitter) after).enclosure() ? null : "enclosure";
            case PANEL -> ((Panel) before).enclosure() == ((Panel) after).enclosure() ? null : "enclosure";
            default -> null;
        };
    }

    private static @Nullable String moved(Pass before, Pass after) {
        if (before.enclosure() != after.enclosure()) {
            return "enclosure";
        }
        if (before.cable() != after.cable()) {
            return "cable";
        }
        return before.runRow() == after.runRow() ? null : "seq";
    }

    /** Fiber types and colour orders are referred to by code, and measurements name what they are of in words. */
    private static void askCode(RecordsView view, Recorded before, Refusals refusals) {
        boolean named = (before instanceof FiberType || before instanceof ColorCode)
                ? !RemovalRules.users(view, before).isEmpty()
                : Measured.list(view, before).findFirst().isPresent();
        if (named) {
            refusals.add(
                    "code-in-use",
                    Names.codeColumn(before.kind()),
                    Names.of(view, before) + " is referred to by that code; change what refers to it first");
        }
    }
}
