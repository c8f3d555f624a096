package spanwright.exchange;

import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** Rows of {@code jumpers.csv}. */
final class JumperRows extends Rows<Joint> {

    private static final int A = Table.JUMPERS.column("a");
    private static final int B = Table.JUMPERS.column("b");
    private static final int LENGTH = Table.JUMPERS.column("length_m");
    private static final int TEMPORARY_UNTIL = Table.JUMPERS.column("temporary_until");
    private static final Length USUAL = new Length(3_000_000);

    private final Ends ends;
    private final Ports ports;

    JumperRows(References refs, Ends ends, Ports ports) {
        super(Table.JUMPERS, RecordKind.JOINT, refs);
        this.ends = ends;
        this.ports = ports;
    }

    @Override
    @Nullable
    Joint read(Row row, int id) {
        Ports.Found a = ports.find(row, A);
        Ports.Found b = ports.find(row, B);
        Length length = row.metres(LENGTH, Row.Bound.FROM_ZERO);
        if (a == null || b == null || !SpliceRows.sameCount(row, A, fronts(a), B, fronts(b))) {
            return null;
        }
        JointFacts facts = new JointFacts(
                null,
                null,
                null,
                Trust.POSTED,
                null,
                null,
                null,
                row.date(TEMPORARY_UNTIL, refs.zone()),
                null,
                Objects.requireNonNullElse(length, USUAL));
        return new Joint(id, JointKind.JUMPER, a.panel().enclosure(), fronts(a), fronts(b), facts);
    }

    private static EndRange fronts(Ports.Found found) {
        return new EndRange(new Leg(LegKind.FRONT, found.panel().id()), found.numbers());
    }

    @Override
    void write(Joint joint, Cells cells) {
        cells.put(A, ends.text(joint.a()));
        cells.put(B, ends.text(joint.b()));
        cells.put(LENGTH, joint.facts().jumperLength());
        cells.put(TEMPORARY_UNTIL, joint.facts().temporaryUntil());
    }
}
