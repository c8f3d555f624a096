package spanwright.temporary;

import java.util.List;
import spanwright.circuits.Circuit;

/**
 * Temporary paths for all that is down.
 *
 * @param groups in the order to serve them
 * @param strays circuits that nothing hits by the records, or whose ports no path joins
 * @param shared one offer a group that is served, no piece used twice, in the order of the groups
 * @param unserved groups for which nothing is left
 * @param proven whether no other sharing out of the offers found serves more; else the search for one was cut short
 */
public record LightAnswer(
        List<GroupLight> groups,
        List<Circuit> strays,
        List<LightOffer> shared,
        List<DarkGroup> unserved,
        boolean proven) {

    /** Keeps its own copies. */
    public LightAnswer {
        groups = List.copyOf(groups);
        strays = List.copyOf(strays);
        shared = List.copyOf(shared);
        unserved = List.copyOf(unserved);
    }
}
