package spanwright.answers;

import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import spanwright.answers.Unanswerable.Kind;
import spanwright.circuits.Circuit;
import spanwright.suspicion.Alarms;
import spanwright.suspicion.PostedLately;

/** Reads which circuits are down and which are up. */
public final class AlarmReferences {

    private AlarmReferences() {}

    /**
     * The alarms that codes tell.
     *
     * @param views where the view is from: its postings tell where splices were made lately
     * @param byPath whether alarms are by path, so that a protected circuit that is up proves its own path
     * @param opened codes of enclosures that a crew is known to have opened lately
     */
    public static Alarms read(
            Views views,
            View view,
            Collection<String> down,
            Collection<String> up,
            boolean byPath,
            Collection<String> opened) {
        References references = new References(view.records());
        if (down.isEmpty()) {
            throw new Unanswerable(Kind.BAD_REQUEST, "Name at least one circuit that is down.", "down");
        }
        Set<String> both = new TreeSet<>(down);
        both.retainAll(new LinkedHashSet<>(up));
        if (!both.isEmpty()) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    String.join(", ", both.stream().limit(5).toList()) + " cannot be both down and up.",
                    "up");
        }
        return new Alarms(
                circuits(references, down),
                circuits(references, up),
                byPath,
                opened.stream()
                        .map(code -> references.openedEnclosure(code).id())
                        .collect(Collectors.toSet()),
                PostedLately.of(views.ledger(), view.posting(), view.day(), view.zone()),
                view.day());
    }

    private static List<Circuit> circuits(References references, Collection<String> codes) {
        return codes.stream().map(references::askedCircuit).toList();
    }
}
