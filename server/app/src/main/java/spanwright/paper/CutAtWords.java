package spanwright.paper;

import java.util.List;
import java.util.Optional;
import spanwright.answers.Colors;
import spanwright.answers.View;
import spanwright.plant.Cable;
import spanwright.plant.CableType;

/** Where a cut meets a circuit, in codes and in colours. */
final class CutAtWords {

    private static final int NAMED = 2;

    private final View view;
    private final List<String> at;

    /**
     * Of an answer's list.
     *
     * @param at {@code F-1:3} for glass, else the code of an enclosure
     */
    CutAtWords(View view, List<String> at) {
        this.view = view;
        this.at = at;
    }

    /** The fibers and enclosures, the first few. */
    String fibers() {
        return at.size() <= NAMED ? String.join(", ", at) : at.get(0) + " and " + (at.size() - 1) + " more";
    }

    /** Tube and colour of the fibers that are named; empty where there are none. */
    String colors() {
        return String.join(
                "; ",
                at.stream()
                        .limit(at.size() <= NAMED ? NAMED : 1)
                        .flatMap(each -> colors(each).stream())
                        .toList());
    }

    private Optional<String> colors(String fiber) {
        int colon = fiber.lastIndexOf(':');
        Optional<Cable> cable =
                colon < 0 ? Optional.empty() : view.records().cables().find(fiber.substring(0, colon));
        return cable.map(found -> {
            CableType type = view.lay(found.id()).type();
            int number = Integer.parseInt(fiber.substring(colon + 1));
            Colors colors = new Colors(view, type);
            return colors.tube(type.tubeOf(number)) + " / " + colors.fiber(number);
        });
    }
}
