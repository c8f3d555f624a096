package spanwright.planning;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * How sure the records are of one glass path.
 *
 * @param jumpered whether a jumper is on it
 * @param known whether all its joints and end states are known
 * @param verified whether all of them are verified, and there is at least one
 * @param verifiedOn the earliest day on which one of them was verified, where all give one; else null
 */
record PathTrust(
        boolean jumpered,
        boolean known,
        boolean verified,
        @Nullable LocalDate verifiedOn) {}
