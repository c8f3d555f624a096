package spanwright.splicing;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * What is known of a range of joints.
 *
 * @param tray tray, or null
 * @param method how spliced; null for a jumper and for a direct termination, which has no splice
 * @param loss measured loss of each splice, two-way mean, at least -0.1 dB; null where not measured
 * @param trust how sure
 * @param verifiedOn when last seen, or null
 * @param splicedOn when made, or null
 * @param splicedBy by whom, or null
 * @param temporaryUntil last day of a temporary joint, or null
 * @param job the job it belongs to, or null
 * @param jumperLength a jumper's length; null for the others
 */
public record JointFacts(
        @Nullable String tray,
        @Nullable SpliceMethod method,
        @Nullable Loss loss,
        Trust trust,
        @Nullable LocalDate verifiedOn,
        @Nullable LocalDate splicedOn,
        @Nullable String splicedBy,
        @Nullable LocalDate temporaryUntil,
        @Nullable String job,
        @Nullable Length jumperLength) {}
