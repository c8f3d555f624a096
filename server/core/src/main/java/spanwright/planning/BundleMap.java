package spanwright.planning;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Set;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.plant.RunRow;

/** The bundles that have spare fibers and meet nothing that is to be avoided. Made for one question. */
final class BundleMap {

    /** Where sections run; those that begin and end at one structure are told apart by their enclosures. */
    private record Way(int from, int to, List<Integer> spans, int first, int last) {

        static Way of(SpareGlass glass, int first, int last, List<Integer> spans) {
            int from = glass.structure(first);
            int to = glass.structure(last);
            return new Way(from, to, spans, from == to ? first : 0, from == to ? last : 0);
        }

        Way back() {
            List<Integer> reversed = new ArrayList<>(spans);
            Collections.reverse(reversed);
            return new Way(to, from, reversed, last, first);
        }
    }

    private final SpareEnds ends;
    private final SpareQuestion question;
    private final Map<Way, List<Integer>> found = new LinkedHashMap<>();
    private final List<Bundle> bundles = new ArrayList<>();
    private final Map<Integer, List<Bundle>> leaving = new HashMap<>();
    private final Map<Integer, List<Bundle>> reaching = new HashMap<>();
    private final Map<Integer, Bundle> byEntry = new HashMap<>();

    BundleMap(SpareEnds ends, SpareQuestion question) {
        this.ends = ends;
        this.question = question;
        Network network = ends.glass().snapshot().network();
        network.blocks().stream()
                .filter(block -> block.kind() == BlockKind.SECTION)
                .forEach(this::add);
        Map<Way, Integer> ids = new HashMap<>();
        found.keySet().forEach(way -> ids.put(way, ids.size()));
        found.forEach((way, entries) -> {
            add(new Bundle(
                    bundles.size(),
                    Objects.requireNonNull(ids.get(way.back())),
                    way.from,
                    way.to,
                    way.spans,
                    entries,
                    entries.stream()
                            .mapToLong(entry -> ends.along(entry >> 1))
                            .min()
                            .orElse(0)));
        });
    }

    private void add(Bundle bundle) {
        bundles.add(bundle);
        leaving.computeIfAbsent(bundle.from(), key -> new ArrayList<>()).add(bundle);
        reaching.computeIfAbsent(bundle.to(), key -> new ArrayList<>()).add(bundle);
        bundle.entries().forEach(entry -> byEntry.put(entry, bundle));
    }

    private void add(Block section) {
        int start = ends.glass().enclosure(2 * section.firstPiece());
        int end = ends.glass().enclosure(2 * section.firstPiece() + 1);
        if (start == 0 || end == 0 || start == end || isBarred(start) || isBarred(end)) {
            return;
        }
        List<Integer> spans = spans(section);
        if (spans.stream().anyMatch(question.avoided().spans()::contains)) {
            return;
        }
        Way ahead = Way.of(ends.glass(), start, end, spans);
        for (int piece = section.firstPiece(); piece < section.firstPiece() + section.count(); piece++) {
            if (ends.glass().isSpare(piece)) {
                found.computeIfAbsent(ahead, key -> new ArrayList<>()).add(2 * piece);
                found.computeIfAbsent(ahead.back(), key -> new ArrayList<>()).add(2 * piece + 1);
            }
        }
    }

    /** Whether an enclosure is to be avoided; those at the two ends are not. */
    private boolean isBarred(int enclosure) {
        int structure = ends.glass().structure(enclosure);
        return structure != question.from()
                && structure != question.to()
                && question.avoided().enclosures().contains(enclosure);
    }

    private List<Integer> spans(Block section) {
        int from = ends.glass()
                .snapshot()
                .records()
                .runRows()
                .get(section.fromRow())
                .seq();
        int to =
                ends.glass().snapshot().records().runRows().get(section.toRow()).seq();
        List<Integer> spans = new ArrayList<>();
        for (RunRow row : ends.glass().snapshot().records().runOf(section.owner())) {
            Integer span = row.span();
            if (row.seq() > from && row.seq() <= to && span != null) {
                spans.add(span);
            }
        }
        return spans;
    }

    /** All of them, by number. */
    List<Bundle> list() {
        return bundles;
    }

    /** Those that leave a structure. */
    List<Bundle> leaving(int structure) {
        return leaving.getOrDefault(structure, List.of());
    }

    /** Those that come to a structure. */
    List<Bundle> reaching(int structure) {
        return reaching.getOrDefault(structure, List.of());
    }

    /** How fibers can go over from one bundle to the next. */
    BundleCrossing crossing(Bundle from, Bundle to) {
        Network network = ends.glass().snapshot().network();
        Set<Integer> opening = new HashSet<>();
        to.entries().stream()
                .filter(ends::isFreeable)
                .forEach(end -> opening.add(ends.glass().enclosure(end)));
        Set<Integer> both = new LinkedHashSet<>();
        int joined = 0;
        int patched = 0;
        for (int entry : from.entries()) {
            int exit = entry ^ 1;
            int peer = network.peer(exit);
            joined += peer != Network.NONE && to.equals(byEntry.get(peer)) ? 1 : 0;
            patched += ends.isPatchable(exit) ? 1 : 0;
            if (opening.contains(ends.glass().enclosure(exit)) && ends.isFreeable(exit)) {
                both.add(ends.glass().enclosure(exit));
            }
        }
        int patches = Math.min(
                patched, (int) to.entries().stream().filter(ends::isPatchable).count());
        return new BundleCrossing(joined + patches, List.copyOf(both));
    }

    /** The bundle that light enters by an end, if it is one of these. */
    boolean isEntry(int end, Bundle bundle) {
        return bundle.equals(byEntry.get(end));
    }
}
