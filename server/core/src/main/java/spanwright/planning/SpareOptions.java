package spanwright.planning;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import spanwright.network.Snapshot;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;

/**
 * Spare fibers from one structure to another, the best options first. All paths of an option travel the same spans, none
 * of them twice; along each route the fibers are chosen exactly, and routes are tried by rising bound until no other can
 * be among the best, or so many were tried. An option that holds all spans and openings of a better one is left out.
 */
public final class SpareOptions {

    /** Options that one question is answered with at most. */
    public static final int MOST_OPTIONS = 5;

    /** Routes on which fibers are chosen for one question; beyond it what was found is given. */
    static final int MOST_ROUTES = 100;

    private static final Wavelength WAVELENGTH = Wavelength.ofNanometres(1550);

    private final SpareEnds ends;

    /** The options in a snapshot, reckoned at 1550 nm. */
    public SpareOptions(Snapshot snapshot) {
        this.ends = new SpareEnds(new SpareGlass(snapshot), WAVELENGTH);
    }

    /** What tells one option from another. */
    private record Places(Set<Integer> spans, Set<Integer> opened) {

        static Places of(SpareOption option) {
            return new Places(Set.copyOf(option.spans()), Set.copyOf(option.opened()));
        }

        boolean holds(Places other) {
            return spans.containsAll(other.spans) && opened.containsAll(other.opened);
        }
    }

    /** An option with how it was come to. */
    private record Found(SpareOption option, RouteChoice choice, RouteChoice.Chosen chosen, List<Bundle> route) {

        SpareCost cost() {
            return option.cost();
        }
    }

    /** Up to five options; none where there is none. */
    public List<SpareOption> list(SpareQuestion question) {
        BundleMap map = new BundleMap(ends, question);
        RouteSearch search = new RouteSearch(map, ends, question);
        List<Found> best = new ArrayList<>();
        for (int tried = 0; tried < MOST_ROUTES; tried++) {
            Optional<RouteSearch.Route> route = search.next();
            if (route.isEmpty() || isBeaten(route.get().least(), best)) {
                break;
            }
            best = best(
                    best,
                    found(
                            route.get(),
                            search,
                            new RouteChoice(ends, map, question, route.get().bundles())));
        }
        return best.stream()
                .limit(MOST_OPTIONS)
                .map(found -> option(found.route, found.choice, found.choice.sideBySide(found.chosen)))
                .sorted(Comparator.comparing(SpareOption::cost))
                .toList();
    }

    private static boolean isBeaten(SpareCost least, List<Found> best) {
        return best.size() >= MOST_OPTIONS
                && least.compareTo(best.get(MOST_OPTIONS - 1).cost()) >= 0;
    }

    private List<Found> found(RouteSearch.Route route, RouteSearch search, RouteChoice choice) {
        return choice.list(search, route.least().opened()).stream()
                .map(chosen -> new Found(option(route.bundles(), choice, chosen), choice, chosen, route.bundles()))
                .toList();
    }

    /** Both together, the best first; none that holds all places of a better one. */
    private static List<Found> best(List<Found> before, List<Found> more) {
        List<Found> all = new ArrayList<>(before);
        all.addAll(more);
        all.sort(Comparator.comparing(Found::cost));
        List<Found> kept = new ArrayList<>();
        Map<Found, Places> places = new HashMap<>();
        for (Found found : all) {
            Places here = Places.of(found.option);
            if (kept.stream().map(places::get).noneMatch(here::holds)) {
                kept.add(found);
                places.put(found, here);
            }
        }
        return kept;
    }

    private SpareOption option(List<Bundle> route, RouteChoice choice, RouteChoice.Chosen chosen) {
        List<SpareRun> runs = chosen.laid().runs();
        Set<Integer> opened = new LinkedHashSet<>();
        int splices = 0;
        int jumpers = 0;
        for (int step = 0; step + 1 < route.size(); step++) {
            for (SpareRun run : runs) {
                if (run.crossovers().get(step) == Crossover.SPLICE) {
                    splices++;
                    opened.add(ends.glass().enclosure(run.entered().get(step) ^ 1));
                } else if (run.crossovers().get(step) == Crossover.JUMPER) {
                    jumpers++;
                }
            }
        }
        List<RunSums> sums = runs.stream().map(run -> RunSums.of(ends, run)).toList();
        Length glass =
                sums.stream().map(RunSums::glass).max(Comparator.naturalOrder()).orElseThrow();
        boolean known = sums.stream().allMatch(sum -> sum.loss() != null);
        Loss loss = known
                ? sums.stream()
                        .flatMap(RunSums::losses)
                        .max(Comparator.naturalOrder())
                        .orElseThrow()
                : null;
        int unverified = sums.stream().mapToInt(RunSums::unverified).sum();
        List<Integer> spans =
                route.stream().flatMap(bundle -> bundle.spans().stream()).toList();
        long ranked = loss == null ? 0 : loss.microdecibels();
        return new SpareOption(
                runs,
                choice.isOneTube(runs),
                List.copyOf(opened),
                jumpers,
                glass,
                loss,
                spans,
                new SpareCost(opened.size(), splices, unverified, ranked));
    }
}
