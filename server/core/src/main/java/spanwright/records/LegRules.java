package spanwright.records;

import java.util.Arrays;
import java.util.EnumSet;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/**
 * The rules of the ends that a row names in an enclosure: the cable, splitter or panel is there, and has as many.
 * What was found of a leg is remembered until plant changes.
 */
final class LegRules {

    private static final int SLOTS = 1 << 10;

    /**
     * What is known of a leg.
     *
     * @param leg which
     * @param enclosure identity of the enclosure it is in, 0 where in none
     * @param most the largest number on it, 0 where it does not exist
     * @param what what is numbered
     */
    private record Known(Leg leg, int enclosure, int most, String what) {}

    private static final Set<RecordKind> PLANT = EnumSet.of(
            RecordKind.CABLE_TYPE,
            RecordKind.CABLE,
            RecordKind.RUN_ROW,
            RecordKind.ENCLOSURE,
            RecordKind.PASS,
            RecordKind.SPLITTER,
            RecordKind.PANEL);

    private final RecordsView view;
    private final @Nullable Known[] known = new Known[SLOTS];
    private boolean empty = true;

    LegRules(RecordsView view) {
        this.view = view;
    }

    /** Records of a kind have changed: what is known may hold no longer. */
    void forget(RecordKind kind) {
        if (PLANT.contains(kind) && !empty) {
            Arrays.fill(known, null);
            empty = true;
        }
    }

    /** Asks whether a row's ends exist in its enclosure. */
    void ask(int enclosure, EndRange ends, String column, Refusals refusals) {
        Known leg = known(ends.leg());
        if (leg.enclosure != enclosure || leg.most == 0) {
            refusals.add(
                    "end-not-there",
                    column,
                    "there is no " + leg.what + " in enclosure " + Names.enclosure(view, enclosure)
                            + "; enter what is there first, or name an end that is");
            return;
        }
        FiberRange numbers = ends.numbers();
        if (numbers.first() > leg.most || numbers.last() > leg.most) {
            refusals.add(
                    "number-above-count",
                    column,
                    "number " + Math.max(numbers.first(), numbers.last()) + " is too large; the " + leg.what
                            + " are 1 to " + leg.most);
        }
    }

    private Known known(Leg leg) {
        int slot = (leg.owner() * 7 + leg.kind().ordinal()) & (SLOTS - 1);
        Known kept = known[slot];
        if (kept == null || !kept.leg.equals(leg)) {
            kept = find(leg);
            known[slot] = kept;
            empty = false;
        }
        return kept;
    }

    private Known find(Leg leg) {
        return switch (leg.kind()) {
            case BACK, AHEAD -> ofCable(leg);
            case IN, OUT -> ofSplitter(leg);
            case REAR, FRONT -> ofPanel(leg);
        };
    }

    private Known ofCable(Leg leg) {
        RunRow row = view.runRows().find(leg.owner()).orElse(null);
        if (row == null) {
            return new Known(leg, 0, 0, "such cable");
        }
        boolean back = leg.kind() == LegKind.BACK;
        int last = 0;
        for (int id : view.owned(Relation.CABLE_RUN_ROWS, row.cable())) {
            last = Math.max(last, view.runRows().get(id).seq());
        }
        String cable = Names.cable(view, row.cable());
        int enclosure = view.findPassAt(row.id()).map(Pass::enclosure).orElse(0);
        if (row.seq() == (back ? 0 : last)) {
            return new Known(leg, enclosure, 0, (back ? "back" : "ahead") + " of cable " + cable);
        }
        int fibers = view.cableTypes()
                .get(view.cables().get(row.cable()).cableType())
                .fibers();
        return new Known(leg, enclosure, fibers, "fibers of cable " + cable);
    }

    private Known ofSplitter(Leg leg) {
        Splitter splitter = view.splitters().find(leg.owner()).orElse(null);
        if (splitter == null) {
            return new Known(leg, 0, 0, "such splitter");
        }
        boolean in = leg.kind() == LegKind.IN;
        return new Known(
                leg,
                splitter.enclosure(),
                in ? splitter.inputs() : splitter.outputs(),
                (in ? "inputs" : "outputs") + " of splitter " + splitter.code());
    }

    private Known ofPanel(Leg leg) {
        Panel panel = view.panels().find(leg.owner()).orElse(null);
        return panel == null
                ? new Known(leg, 0, 0, "such panel")
                : new Known(leg, panel.enclosure(), panel.ports(), "ports of panel " + panel.code());
    }
}
