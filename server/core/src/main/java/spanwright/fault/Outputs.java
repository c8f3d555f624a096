package spanwright.fault;

import java.util.List;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;

/** Which of the paths behind splitters count. */
final class Outputs {

    private Outputs() {}

    /**
     * The paths but those that end at a splitter's output, or input, to which nothing is joined; where all do, the first.
     */
    static List<Path> leadingSomewhere(List<Path> paths) {
        List<Path> leading = paths.stream().filter(path -> !deadOutput(path)).toList();
        return leading.isEmpty() ? paths.subList(0, 1) : leading;
    }

    private static boolean deadOutput(Path path) {
        if (path.loop() || path.elements().isEmpty()) {
            return false;
        }
        LegKind end = EndKey.kind(path.ends().get(1).key());
        return (end == LegKind.OUT || end == LegKind.IN)
                && path.elements().get(path.elements().size() - 1) instanceof SplitterCrossing;
    }

    /** Whether a path comes to an end of glass, to a port by either side of it. */
    static boolean reaches(Path path, long key) {
        return (!path.loop() && path.ends().get(1).key() == key)
                || path.elements().stream().anyMatch(element -> reaches(element, key));
    }

    private static boolean reaches(Element element, long key) {
        int owner = EndKey.owner(key);
        int number = EndKey.number(key);
        return switch (EndKey.kind(key)) {
            case FRONT, REAR ->
                element instanceof Connector connector && connector.panel().id() == owner && connector.port() == number;
            case IN ->
                element instanceof SplitterCrossing crossing
                        && crossing.splitter().id() == owner
                        && crossing.input() == number;
            case OUT ->
                element instanceof SplitterCrossing crossing
                        && crossing.splitter().id() == owner
                        && crossing.output() == number;
            case BACK, AHEAD -> element instanceof Splice splice && (splice.aKey() == key || splice.bKey() == key);
        };
    }
}
