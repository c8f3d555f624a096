package spanwright.temporary;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import spanwright.network.Network;

/**
 * Shares spare glass out over groups. Each group in turn takes the best that is left; where that leaves a group dark,
 * more offers over other glass are gathered, and the best choice among all of them is searched for.
 */
final class OfferSharing {

    /** Offers over other glass that are gathered for a group, beside those found before. */
    private static final int MOST_MORE = 4;

    private final Network network;

    OfferSharing(Network network) {
        this.network = network;
    }

    /** What comes of it. */
    record Shared(List<LightOffer> offers, List<DarkGroup> unserved, boolean proven) {}

    Shared share(List<TemporaryPaths.Seeking> groups) {
        List<List<LightOffer>> pool = new ArrayList<>();
        Set<Integer> taken = new HashSet<>();
        boolean all = true;
        for (TemporaryPaths.Seeking seeking : groups) {
            List<LightOffer> offers = new ArrayList<>(seeking.offers());
            Optional<LightOffer> left = offers.isEmpty() ? Optional.empty() : seeking.beside(taken);
            left.ifPresent(offer -> {
                taken.addAll(seeking.takes(offer));
                offers.add(0, offer);
            });
            all &= offers.isEmpty() || left.isPresent();
            pool.add(offers);
        }
        if (!all) {
            for (int index = 0; index < groups.size(); index++) {
                more(groups.get(index), pool.get(index));
            }
        }
        return choose(groups, pool);
    }

    private void more(TemporaryPaths.Seeking seeking, List<LightOffer> offers) {
        Set<Integer> used = new HashSet<>();
        Optional<LightOffer> next = offers.stream().findFirst();
        for (int count = 0; count < MOST_MORE && next.isPresent(); count++) {
            used.addAll(seeking.takes(next.get()));
            next = seeking.beside(used);
            next.ifPresent(offers::add);
        }
    }

    private Shared choose(List<TemporaryPaths.Seeking> groups, List<List<LightOffer>> pool) {
        List<Sharing.Wish> wishes = new ArrayList<>();
        for (int index = 0; index < groups.size(); index++) {
            TemporaryPaths.Seeking seeking = groups.get(index);
            wishes.add(new Sharing.Wish(
                    seeking.group().priority(),
                    seeking.group().customers(),
                    pool.get(index).stream()
                            .map(offer -> new Sharing.Choice(seeking.takes(offer), offer.work()))
                            .toList()));
        }
        Sharing.Outcome outcome =
                Sharing.of(wishes, piece -> network.blockOf(piece).firstPiece());
        List<LightOffer> offers = new ArrayList<>();
        List<DarkGroup> unserved = new ArrayList<>();
        for (int index = 0; index < groups.size(); index++) {
            int choice = outcome.choices().get(index);
            if (choice == Sharing.NOTHING) {
                unserved.add(groups.get(index).group());
            } else {
                offers.add(pool.get(index).get(choice));
            }
        }
        return new Shared(offers, unserved, outcome.proven());
    }
}
