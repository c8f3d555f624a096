package spanwright.sheet;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.splicing.EndRange;

/** What statements say of each end, within the glass or within one planned job. */
final class EndWishes {

    /**
     * What is said of an end.
     *
     * @param statement who says it
     * @param index the end's place in the statement's ranges
     * @param partner the key of the end that it is to join; 0 where it is to be in a state
     */
    record Wish(Statement statement, int index, long partner) {}

    private final Map<Long, Wish> byEnd = new LinkedHashMap<>();

    EndWishes(List<Statement> statements) {
        statements.forEach(this::add);
    }

    private void add(Statement statement) {
        if (statement instanceof Statement.Joins joins) {
            add(joins, joins.a(), joins.b());
            add(joins, joins.b(), joins.a());
        } else if (statement instanceof Statement.States states) {
            for (int index = 0; index < states.range().count(); index++) {
                byEnd.put(states.range().key(index), new Wish(states, index, 0));
            }
        }
    }

    private void add(Statement.Joins joins, EndRange own, EndRange other) {
        for (int index = 0; index < own.count(); index++) {
            byEnd.put(own.key(index), new Wish(joins, index, other.key(index)));
        }
    }

    /** What is said of an end, or null. */
    @Nullable
    Wish find(long key) {
        return byEnd.get(key);
    }

    /** The ends of which something is said, in the order of the lines. */
    Collection<Long> ends() {
        return byEnd.keySet();
    }
}
