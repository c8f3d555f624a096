package spanwright.draft;

import java.util.stream.IntStream;
import java.util.stream.Stream;
import spanwright.records.EndNames;
import spanwright.sheet.Statement;

/** What a statement says, fiber by fiber, so that sheets which say the same are the same however they are written. */
final class Sayings {

    private Sayings() {}

    static Stream<String> of(EndNames names, Statement statement) {
        if (statement instanceof Statement.Joins joins) {
            return IntStream.range(0, joins.a().count()).mapToObj(index -> {
                String a = names.end(joins.a().key(index));
                String b = names.end(joins.b().key(index));
                return a.compareTo(b) < 0 ? a + "=" + b : b + "=" + a;
            });
        }
        if (statement instanceof Statement.States states) {
            return IntStream.range(0, states.range().count())
                    .mapToObj(index -> names.end(states.range().key(index)) + " "
                            + states.condition().word());
        }
        return Stream.empty();
    }
}
