package spanwright.sheet;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.SpliceMethod;

/**
 * What a line says of its joints or states behind its semicolons; whatever it does not say is null.
 *
 * @param tray tray
 * @param method how spliced
 * @param direct whether a termination has no splice: true {@code direct}, false {@code pigtail}
 * @param loss measured loss, two-way mean
 * @param trust how sure
 * @param seen when last seen
 * @param splicedOn when made
 * @param splicedBy by whom
 * @param until last day of a temporary joint
 * @param job job
 * @param length a jumper's length
 * @param light when light was sent from end to end over every fiber of the range, so that none is crossed
 */
public record JointWords(
        @Nullable String tray,
        @Nullable SpliceMethod method,
        @Nullable Boolean direct,
        @Nullable Loss loss,
        @Nullable Trust trust,
        @Nullable LocalDate seen,
        @Nullable LocalDate splicedOn,
        @Nullable String splicedBy,
        @Nullable LocalDate until,
        @Nullable String job,
        @Nullable Length length,
        @Nullable LocalDate light) {

    private static final Length JUMPER = Length.ofMetres(3);

    /** Says nothing. */
    public static final JointWords NONE =
            new JointWords(null, null, null, null, null, null, null, null, null, null, null, null);

    /** What is known of joints where nothing is recorded yet. */
    public JointFacts facts(JointKind type, boolean ofSplitter) {
        boolean bare = type == JointKind.JUMPER || (type == JointKind.TERMINATION && ofSplitter);
        JointFacts plain = new JointFacts(
                null,
                bare ? null : SpliceMethod.FUSION,
                null,
                Trust.POSTED,
                null,
                null,
                null,
                null,
                null,
                type == JointKind.JUMPER ? JUMPER : null);
        return over(plain);
    }

    /** What is known of joints once this is said over what was known. */
    public JointFacts over(JointFacts known) {
        return new JointFacts(
                or(tray, known.tray()),
                methodOver(known.method()),
                or(loss, known.loss()),
                trust == null ? known.trust() : trust,
                or(seen, known.verifiedOn()),
                or(splicedOn, known.splicedOn()),
                or(splicedBy, known.splicedBy()),
                or(until, known.temporaryUntil()),
                or(job, known.job()),
                known.jumperLength() == null ? null : or(length, known.jumperLength()));
    }

    private @Nullable SpliceMethod methodOver(@Nullable SpliceMethod known) {
        if (direct == null) {
            return or(method, known);
        }
        return direct ? null : or(method, or(known, SpliceMethod.FUSION));
    }

    private static <T> @Nullable T or(@Nullable T said, @Nullable T known) {
        return said == null ? known : said;
    }

    /** The same, with what a header says where the line says nothing. */
    public JointWords under(SheetHeader header) {
        return new JointWords(
                tray,
                method,
                direct,
                loss,
                trust,
                seen,
                or(splicedOn, header.splicedOn()),
                or(splicedBy, header.splicedBy()),
                until,
                or(job, header.job()),
                length,
                light);
    }
}
