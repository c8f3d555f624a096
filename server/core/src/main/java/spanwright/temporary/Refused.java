package spanwright.temporary;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.planning.SpareWay;

/**
 * A path that is not offered, or that there is none.
 *
 * @param why the reason
 * @param text the reason for a person
 * @param ways the paths, one a glass path of the group; none where there is none
 * @param lit what light would do over them, or null
 */
public record Refused(
        Why why, String text, List<SpareWay> ways, @Nullable Lit lit) {

    /** Keeps its own copy. */
    public Refused {
        ways = List.copyOf(ways);
    }

    /** Reasons to refuse. */
    public enum Why {
        /** It loses more than a budget allows. */
        OVER_BUDGET,
        /** It passes a place to avoid. */
        SUSPECT,
        /** It lies along a protecting circuit's path. */
        PARTNER,
        /** It uses spare glass that nobody has verified. */
        UNVERIFIED,
        /** No spare glass leads there. */
        NO_SPARE_GLASS,
        /** The records do not say where the circuit runs, or not that anything hits it. */
        NOT_DOWN_BY_RECORDS
    }
}
