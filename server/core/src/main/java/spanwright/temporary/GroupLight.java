package spanwright.temporary;

import java.util.List;

/**
 * What there is for one group.
 *
 * @param group the group
 * @param offers temporary paths, the least work first, then the least loss
 * @param refused paths that would be less work, or what else there is, with why not
 */
public record GroupLight(DarkGroup group, List<LightOffer> offers, List<Refused> refused) {

    /** Keeps its own copies. */
    public GroupLight {
        offers = List.copyOf(offers);
        refused = List.copyOf(refused);
    }
}
