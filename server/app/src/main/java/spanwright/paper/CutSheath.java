package spanwright.paper;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Colors;
import spanwright.answers.CutFibers;
import spanwright.answers.CutFibers.CutFiber;
import spanwright.answers.View;
import spanwright.circuits.Circuit;
import spanwright.network.Block;
import spanwright.outage.CutSection;
import spanwright.outage.Impact;
import spanwright.paper.JoinedWords.Joined;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.records.CableLay;
import spanwright.splicing.FiberFlag;

/**
 * A cut sheath: every cut fiber of one cable section, tube by tube, the tube that holds what is to be restored first on
 * top; of several such, the one with more circuits down.
 *
 * @param cable code of the cable
 * @param type its type, in words
 * @param near where the section begins, toward the cable's start
 * @param far where it ends
 * @param fibers its fibers in that order
 */
public record CutSheath(String cable, String type, String near, String far, List<Fiber> fibers) {

    private static final int LAST = Integer.MAX_VALUE;
    private static final int NAMED = 2;

    /** Keeps its own copy. */
    public CutSheath {
        fibers = List.copyOf(fibers);
    }

    /**
     * A fiber of the sheath.
     *
     * @param number from 1
     * @param tube from 1
     * @param tubeColor in words
     * @param color in words
     * @param near what it is joined to where the section begins
     * @param far what it is joined to where the section ends
     * @param state {@code down}, {@code single}, or what it is used for
     * @param priority of its first circuit, or null
     * @param carries the working circuits on it, the first to be restored first
     * @param beneath what else is known of its use; may be empty
     */
    public record Fiber(
            int number,
            int tube,
            String tubeColor,
            String color,
            Joined near,
            Joined far,
            String state,
            @Nullable Integer priority,
            List<String> carries,
            String beneath) {

        /** Keeps its own copy. */
        public Fiber {
            carries = List.copyOf(carries);
        }

        /** Its circuits, the first by name. */
        String carriesInWords() {
            if (carries.size() <= NAMED) {
                return String.join(", ", carries);
            }
            return carries.get(0) + " +" + (carries.size() - 1);
        }
    }

    /** The cut sheaths of what a cut takes down. */
    public static List<CutSheath> of(View view, Impact impact) {
        CutFibers found = new CutFibers(view, impact);
        return impact.sections().stream().map(cut -> of(view, found, cut)).toList();
    }

    private static CutSheath of(View view, CutFibers found, CutSection cut) {
        Block section = cut.section();
        CableLay lay = view.lay(section.owner());
        CableType type = lay.type();
        Map<Integer, List<CutFiber>> tubes = new TreeMap<>();
        for (CutFiber fiber : found.inOrder(cut)) {
            tubes.computeIfAbsent(type.tubeOf(fiber.number()), tube -> new ArrayList<>())
                    .add(fiber);
        }
        Rows rows = new Rows(found, section, type, new Colors(view, type), new JoinedWords(view));
        return new CutSheath(
                lay.cable().code(),
                type.code() + ", " + type.fibers() + " fibers",
                side(lay, lay.index(section.fromRow())),
                side(lay, lay.index(section.toRow())),
                inOrder(found, tubes.values()).stream()
                        .flatMap(List::stream)
                        .map(rows::fiber)
                        .toList());
    }

    private static String side(CableLay lay, int row) {
        String structure = lay.structure(row).code();
        return lay.findEnclosure(row)
                .map(Enclosure::code)
                .map(code -> code.equals(structure) ? code : code + " at " + structure)
                .orElse(structure + ", bare end");
    }

    /** The tubes in the order to splice them, each by rising fiber. */
    private static List<List<CutFiber>> inOrder(CutFibers found, Collection<List<CutFiber>> tubes) {
        // A stable sort of tubes that stand in the order of their numbers already.
        return tubes.stream()
                .sorted(Comparator.<List<CutFiber>>comparingInt(CutSheath::priority)
                        .thenComparing(tube -> firstDown(found, tube), Comparator.reverseOrder()))
                .map(tube -> tube.stream()
                        .sorted(Comparator.comparingInt(CutFiber::number))
                        .toList())
                .toList();
    }

    private static int priority(List<CutFiber> tube) {
        return tube.stream().mapToInt(CutSheath::priority).min().orElse(LAST);
    }

    private static int priority(CutFiber fiber) {
        Integer own = fiber.priority();
        return own == null ? LAST : own;
    }

    /** How many circuits are down on a tube's fibers of its first priority. */
    private static int firstDown(CutFibers found, List<CutFiber> tube) {
        int first = priority(tube);
        return tube.stream()
                .filter(fiber -> priority(fiber) == first && found.state(fiber).equals("down"))
                .mapToInt(fiber -> fiber.carries().size())
                .sum();
    }

    /** Makes the rows of one section. */
    private record Rows(CutFibers found, Block section, CableType type, Colors colors, JoinedWords joined) {

        Fiber fiber(CutFiber fiber) {
            int number = fiber.number();
            int tube = type.tubeOf(number);
            int end = 2 * section.piece(number);
            return new Fiber(
                    number,
                    tube,
                    colors.tube(tube),
                    colors.fiber(number),
                    joined.at(end),
                    joined.at(end + 1),
                    found.state(fiber),
                    fiber.priority(),
                    fiber.carries().stream().map(Circuit::code).toList(),
                    beneath(fiber));
        }

        private static String beneath(CutFiber fiber) {
            FiberFlag flag = fiber.use().flag();
            if (!fiber.carries().isEmpty()) {
                long customers = fiber.carries().stream()
                        .mapToLong(Circuit::customersServed)
                        .sum();
                return customers + (customers == 1 ? " customer" : " customers");
            }
            if (flag == null) {
                return "";
            }
            String owner = flag.owner() == null ? "" : flag.owner();
            return flag.until() == null ? owner : owner + " until " + flag.until();
        }
    }
}
