package spanwright.exchange;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Trust;
import spanwright.quantity.Loss;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/** Rows of {@code splices.csv}, the longest table: no string is made that an earlier row has made. */
final class SpliceRows extends Rows<Joint> {

    private static final int ENCLOSURE = Table.SPLICES.column("enclosure");
    private static final int TRAY = Table.SPLICES.column("tray");
    private static final int A = Table.SPLICES.column("a");
    private static final int B = Table.SPLICES.column("b");
    private static final int METHOD = Table.SPLICES.column("method");
    private static final int LOSS = Table.SPLICES.column("loss_db");
    private static final int TRUST = Table.SPLICES.column("trust");
    private static final int VERIFIED_ON = Table.SPLICES.column("verified_on");
    private static final int SPLICED_ON = Table.SPLICES.column("spliced_on");
    private static final int SPLICED_BY = Table.SPLICES.column("spliced_by");
    private static final int TEMPORARY_UNTIL = Table.SPLICES.column("temporary_until");
    private static final int JOB = Table.SPLICES.column("job");
    private static final BigDecimal LEAST_MEAN = new BigDecimal("-0.1");
    private static final BigDecimal MOST = BigDecimal.valueOf(100_000);

    private final Ends ends;
    private final Interned interned = new Interned();

    SpliceRows(References refs, Ends ends) {
        super(Table.SPLICES, RecordKind.JOINT, refs);
        this.ends = ends;
    }

    @Override
    @Nullable
    Joint read(Row row, int id) {
        int enclosure = refs.enclosures.find(row, ENCLOSURE);
        EndRange a = ends.find(row, A, enclosure);
        EndRange b = ends.find(row, B, enclosure);
        JointFacts facts = facts(row);
        if (a == null || b == null || !sameCount(row, A, a, B, b)) {
            return null;
        }
        return new Joint(id, JointKind.SPLICE, enclosure, a, b, facts);
    }

    private JointFacts facts(Row row) {
        SpliceMethod method = row.word(METHOD, SpliceMethod.values(), SpliceMethod::word);
        Loss loss = meanLoss(row, LOSS);
        Trust trust = row.word(TRUST, Trust.values(), Trust::word);
        LocalDate verifiedOn = row.date(VERIFIED_ON, refs.zone());
        LocalDate splicedOn = row.date(SPLICED_ON, refs.zone());
        LocalDate temporaryUntil = row.date(TEMPORARY_UNTIL, refs.zone());
        return interned.same(new JointFacts(
                text(row, TRAY),
                Objects.requireNonNullElse(method, SpliceMethod.FUSION),
                loss,
                Objects.requireNonNullElse(trust, Trust.POSTED),
                verifiedOn,
                splicedOn,
                text(row, SPLICED_BY),
                temporaryUntil,
                text(row, JOB),
                null));
    }

    private @Nullable String text(Row row, int column) {
        return row.blank(column) ? null : interned.text(row.chars(), row.from(column), row.to(column));
    }

    /** A splice's measured loss, the mean of both ways. */
    static @Nullable Loss meanLoss(Row row, int column) {
        BigDecimal number = row.decimal(
                column, LEAST_MEAN, MOST, "the mean of both ways is -0.1 dB or above and at most 100000 dB");
        return number == null ? null : Loss.ofDecibels(number);
    }

    /** Whether two sides have the same count; a fault where not. */
    static boolean sameCount(Row row, int columnA, EndRange a, int columnB, EndRange b) {
        if (a.count() == b.count()) {
            return true;
        }
        row.fault(
                columnB,
                row.named(columnA) + " has " + a.count() + " and " + row.named(columnB) + " has " + b.count()
                        + "; both sides of a row have the same count and join in order");
        return false;
    }

    @Override
    void write(Joint joint, Cells cells) {
        JointFacts facts = joint.facts();
        SpliceMethod method = facts.method();
        cells.put(ENCLOSURE, refs.enclosure(joint.enclosure()));
        cells.put(TRAY, facts.tray());
        cells.put(A, ends.text(joint.a()));
        cells.put(B, ends.text(joint.b()));
        cells.put(METHOD, method == null ? null : method.word());
        cells.put(LOSS, facts.loss());
        cells.put(TRUST, facts.trust().word());
        cells.put(VERIFIED_ON, facts.verifiedOn());
        cells.put(SPLICED_ON, facts.splicedOn());
        cells.put(SPLICED_BY, facts.splicedBy());
        cells.put(TEMPORARY_UNTIL, facts.temporaryUntil());
        cells.put(JOB, facts.job());
    }
}
