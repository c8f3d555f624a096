package spanwright.temporary;

import java.util.List;
import spanwright.circuits.Circuit;
import spanwright.quantity.Loss;
import spanwright.splicing.Panel;

/**
 * Which circuits want light another way, and what may be used.
 *
 * @param down the circuits that are down, none twice
 * @param closed what is cut or suspect, and what else to keep away from
 * @param fromPanels panels whose free ports may feed a splitter instead of its circuits' own a port, wherever they are;
 *     only the dispatcher knows what equipment stands behind a port
 * @param verifiedOnly whether spare glass must be verified
 * @param margin kept free of each budget
 * @param most the most offers a group
 */
public record LightQuestion(
        List<Circuit> down, ClosedPlant closed, List<Panel> fromPanels, boolean verifiedOnly, Loss margin, int most) {

    /** Keeps its own copies. */
    public LightQuestion {
        down = List.copyOf(down);
        fromPanels = List.copyOf(fromPanels);
        if (most < 1) {
            throw new IllegalArgumentException("no offer asked for: " + most);
        }
    }
}
