package spanwright.records;

import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Cable;
import spanwright.plant.CableValue;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Says which records own a record, by which relation: the one place from which all relation indexes follow. */
final class Ownership {

    private static final int GROUP_BITS = 15;
    /** The golden ratio's share of 2^32: neighbouring codes come to lie far apart. */
    private static final int SPREAD = 0x9E3779B9;

    /** Hears of each owner of a record. */
    interface Hearer {
        /** The record belongs to that owner by that relation. */
        void owned(Relation relation, int owner);
    }

    private Ownership() {}

    /** The relations by which records of a kind are owned, by whichever owner. */
    static List<Relation> relationsOf(RecordKind kind) {
        return switch (kind) {
            case SPAN -> List.of(Relation.STRUCTURE_SPANS);
            case CABLE -> List.of(Relation.CABLE_TYPE_CABLES);
            case CABLE_VALUE -> List.of(Relation.CABLE_VALUES);
            case RUN_ROW -> List.of(Relation.CABLE_RUN_ROWS, Relation.STRUCTURE_RUN_ROWS, Relation.SPAN_RUN_ROWS);
            case SHEATH_MARK -> List.of(Relation.RUN_ROW_MARKS);
            case ENCLOSURE -> List.of(Relation.STRUCTURE_ENCLOSURES);
            case PASS -> List.of(Relation.ENCLOSURE_PASSES, Relation.CABLE_PASSES, Relation.RUN_ROW_PASSES);
            case SPLITTER -> List.of(Relation.ENCLOSURE_SPLITTERS);
            case PANEL -> List.of(Relation.ENCLOSURE_PANELS);
            case END_STATE -> List.of(Relation.ENCLOSURE_END_STATES);
            case FIBER_FLAG -> List.of(Relation.CABLE_FLAGS);
            case FIBER_COUNT -> List.of(Relation.CABLE_COUNTS);
            case CIRCUIT -> List.of(Relation.PANEL_CIRCUITS, Relation.GROUP_CIRCUITS);
            default -> List.of();
        };
    }

    /** Tells the hearer every owner of a record, each once. */
    static void tell(Recorded record, Hearer hearer) {
        switch (record.kind()) {
            case SPAN -> tellSpan((Span) record, hearer);
            case CABLE -> hearer.owned(Relation.CABLE_TYPE_CABLES, ((Cable) record).cableType());
            case CABLE_VALUE -> hearer.owned(Relation.CABLE_VALUES, ((CableValue) record).cable());
            case RUN_ROW -> tellRunRow((RunRow) record, hearer);
            case SHEATH_MARK -> hearer.owned(Relation.RUN_ROW_MARKS, ((SheathMark) record).runRow());
            case ENCLOSURE -> hearer.owned(Relation.STRUCTURE_ENCLOSURES, ((Enclosure) record).structure());
            case PASS -> tellPass((Pass) record, hearer);
            case SPLITTER -> hearer.owned(Relation.ENCLOSURE_SPLITTERS, ((Splitter) record).enclosure());
            case PANEL -> hearer.owned(Relation.ENCLOSURE_PANELS, ((Panel) record).enclosure());
            case END_STATE -> hearer.owned(Relation.ENCLOSURE_END_STATES, ((EndState) record).enclosure());
            case FIBER_FLAG -> hearer.owned(Relation.CABLE_FLAGS, ((FiberFlag) record).cable());
            case FIBER_COUNT -> hearer.owned(Relation.CABLE_COUNTS, ((FiberCount) record).cable());
            case CIRCUIT -> tellCircuit((Circuit) record, hearer);
            default -> {
                // The other kinds belong to nothing.
            }
        }
    }

    private static void tellSpan(Span span, Hearer hearer) {
        hearer.owned(Relation.STRUCTURE_SPANS, span.from());
        if (span.to() != span.from()) {
            hearer.owned(Relation.STRUCTURE_SPANS, span.to());
        }
    }

    private static void tellRunRow(RunRow row, Hearer hearer) {
        hearer.owned(Relation.CABLE_RUN_ROWS, row.cable());
        hearer.owned(Relation.STRUCTURE_RUN_ROWS, row.structure());
        Integer span = row.span();
        if (span != null) {
            hearer.owned(Relation.SPAN_RUN_ROWS, span);
        }
    }

    private static void tellPass(Pass pass, Hearer hearer) {
        hearer.owned(Relation.ENCLOSURE_PASSES, pass.enclosure());
        hearer.owned(Relation.CABLE_PASSES, pass.cable());
        hearer.owned(Relation.RUN_ROW_PASSES, pass.runRow());
    }

    private static void tellCircuit(Circuit circuit, Hearer hearer) {
        hearer.owned(Relation.PANEL_CIRCUITS, circuit.a().panel());
        if (circuit.z().panel() != circuit.a().panel()) {
            hearer.owned(Relation.PANEL_CIRCUITS, circuit.z().panel());
        }
        String group = circuit.protectionGroup();
        if (group != null) {
            hearer.owned(Relation.GROUP_CIRCUITS, groupNumber(group));
        }
    }

    /** The number by which a protection group, which is no record, is found; few share one. */
    static int groupNumber(String group) {
        int hash = group.hashCode() * SPREAD;
        return hash >>> (Integer.SIZE - GROUP_BITS);
    }
}
