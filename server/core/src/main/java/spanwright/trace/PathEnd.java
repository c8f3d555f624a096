package spanwright.trace;

import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;

/**
 * Where a path ends.
 *
 * @param key the end of glass, port or splitter there
 * @param name as the records write it: {@code E9/P/4}, {@code E9/P/4 rear}, {@code F-1 ahead 3 @ E4}, {@code F-1 end 3},
 *     {@code S1 out 5 @ E6}
 */
public record PathEnd(long key, String name) {

    /** Whether it is the front of a port. */
    public boolean front() {
        return EndKey.kind(key) == LegKind.FRONT;
    }
}
