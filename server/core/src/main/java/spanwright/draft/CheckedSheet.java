package spanwright.draft;

import java.util.List;
import java.util.stream.Stream;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;
import spanwright.sheet.CableLeg;
import spanwright.sheet.EnclosureLegs;
import spanwright.sheet.SheetHeader;
import spanwright.sheet.Statement;
import spanwright.splicing.EndRange;

/**
 * What the rules of slips look at.
 *
 * @param before the records as they are
 * @param after the records as if the sheet were posted, as far as it can be
 * @param enclosure identity of the enclosure
 * @param header what the sheet says of all joints
 * @param statements what its lines say
 * @param changes what it changes
 * @param legs the enclosure's legs
 * @param names writes ends
 */
record CheckedSheet(
        Snapshot before,
        Snapshot after,
        int enclosure,
        SheetHeader header,
        List<Statement> statements,
        List<Change> changes,
        EnclosureLegs legs,
        EndNames names) {

    RecordsView records() {
        return before.records();
    }

    String code() {
        return records().enclosures().get(enclosure).code();
    }

    Stream<Statement.Joins> joins() {
        return statements.stream().filter(Statement.Joins.class::isInstance).map(Statement.Joins.class::cast);
    }

    /** Joins of two cables in the glass. */
    Stream<Statement.Joins> cableJoins() {
        return joins().filter(joins -> joins.job().isEmpty()
                && legs.find(joins.a().leg()).isPresent()
                && legs.find(joins.b().leg()).isPresent());
    }

    CableLeg leg(EndRange ends) {
        return legs.find(ends.leg()).orElseThrow();
    }
}
