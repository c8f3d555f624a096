package spanwright.planning;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.records.Records;

/**
 * The slow, obvious twin of the options: every path fiber after fiber, every pair of them, the cheapest kept. It knows
 * nothing of bundles, routes and flows. It reckons enclosures opened, splices and unverified joints.
 */
final class SpareOptionsTwin {

    /** A path so far. */
    private record Trail(List<Integer> entered, List<Integer> spans, List<Integer> opened, int unverified) {}

    private final Network network;
    private final Records records;
    private final FiberUses uses;
    private final int to;
    private final List<Trail> whole = new ArrayList<>();

    SpareOptionsTwin(Snapshot snapshot, int from, int to) {
        this.network = snapshot.network();
        this.records = snapshot.records();
        this.uses = new FiberUses(snapshot);
        this.to = to;
        for (int end = 0; end < 2 * network.pieces(); end++) {
            if (isSpare(end) && structure(end) == from && !held(end)) {
                go(new Trail(List.of(), List.of(), List.of(), rear(end) ? unverified(end) : 0), end);
            }
        }
    }

    /** {@code opened splices unverified} of the best option of one or two fibers; null where there is none. */
    @Nullable
    String best(int fibers, boolean sameTube) {
        int[] best = null;
        for (int one = 0; one < whole.size(); one++) {
            int last = fibers == 1 ? one : whole.size() - 1;
            for (int other = fibers == 1 ? one : one + 1; other <= last; other++) {
                List<Trail> paths = fibers == 1 ? List.of(whole.get(one)) : List.of(whole.get(one), whole.get(other));
                int[] cost = cost(paths, sameTube);
                if (cost != null && (best == null || Arrays.compare(cost, best) < 0)) {
                    best = cost;
                }
            }
        }
        return best == null ? null : best[0] + " " + best[1] + " " + best[2];
    }

    private int @Nullable [] cost(List<Trail> paths, boolean sameTube) {
        Set<Integer> pieces = new HashSet<>();
        Set<Integer> opened = new HashSet<>();
        Set<String> tubes = new HashSet<>();
        Set<Integer> cables = new HashSet<>();
        int splices = 0;
        int unverified = 0;
        for (Trail path : paths) {
            if (!path.spans.equals(paths.get(0).spans)) {
                return null;
            }
            for (int end : path.entered) {
                Block block = network.blockOf(end >> 1);
                if (!pieces.add(end >> 1)) {
                    return null;
                }
                cables.add(block.owner());
                int number = block.number(end >> 1);
                tubes.add(block.owner() + "/"
                        + records.cableTypes()
                                .get(records.cables().get(block.owner()).cableType())
                                .tubeOf(number));
            }
            opened.addAll(path.opened);
            splices += path.opened.size();
            unverified += path.unverified;
        }
        return sameTube && tubes.size() > cables.size() ? null : new int[] {opened.size(), splices, unverified};
    }

    private void go(Trail before, int end) {
        List<Integer> entered = new ArrayList<>(before.entered);
        entered.add(end);
        List<Integer> spans = new ArrayList<>(before.spans);
        spans.addAll(spans(end));
        Trail trail = new Trail(entered, spans, before.opened, before.unverified);
        int exit = end ^ 1;
        if (structure(exit) == to) {
            if (held(exit)) {
                return;
            }
            whole.add(
                    new Trail(entered, spans, before.opened, before.unverified + (rear(exit) ? unverified(exit) : 0)));
            return;
        }
        for (int next = 0; next < 2 * network.pieces(); next++) {
            if (isSpare(next) && enclosure(next) == enclosure(exit) && isFresh(trail, next)) {
                if (network.peer(exit) == next) {
                    go(new Trail(entered, spans, before.opened, before.unverified + unverified(next)), next);
                } else if (!held(exit) && !held(next)) {
                    List<Integer> opened = new ArrayList<>(before.opened);
                    opened.add(enclosure(exit));
                    go(new Trail(entered, spans, opened, before.unverified), next);
                }
            }
        }
    }

    /** Whether the spans of a fiber are not yet on the trail, nor where it leads to. */
    private boolean isFresh(Trail trail, int next) {
        return trail.entered.size() < 6 && spans(next).stream().noneMatch(trail.spans::contains);
    }

    private boolean isSpare(int end) {
        Block block = network.blockOf(end >> 1);
        // A circle of glass has no end where a person could have proven it.
        if (block.kind() != BlockKind.SECTION
                || network.paths().circle(network.paths().pathOf(end >> 1))) {
            return false;
        }
        FiberUse use = uses.of(block, block.number(end >> 1)).use();
        return use == FiberUse.SPARE || use == FiberUse.SPARE_VERIFIED;
    }

    /** Whether an end is joined to a fiber that is reserved or leased; such a joint is not undone. */
    private boolean held(int end) {
        int peer = network.peer(end);
        if (peer == Network.NONE || network.joint(end) == 0) {
            return false;
        }
        Block block = network.blockOf(peer >> 1);
        if (block.kind() != BlockKind.SECTION) {
            return false;
        }
        FiberUse use = uses.of(block, block.number(peer >> 1)).use();
        return use == FiberUse.RESERVED || use == FiberUse.LEASED;
    }

    private boolean rear(int end) {
        int peer = network.peer(end);
        return peer != Network.NONE && network.blockOf(peer >> 1).kind() == BlockKind.PANEL;
    }

    private int unverified(int end) {
        int joint = network.joint(end);
        return joint != 0 && records.joints().get(joint).facts().trust() != Trust.VERIFIED ? 1 : 0;
    }

    private int enclosure(int end) {
        Block block = network.blockOf(end >> 1);
        return records.findPassAt((end & 1) == 0 ? block.fromRow() : block.toRow())
                .orElseThrow()
                .enclosure();
    }

    private int structure(int end) {
        Enclosure enclosure = records.enclosures().get(enclosure(end));
        return enclosure.structure();
    }

    private List<Integer> spans(int entered) {
        Block block = network.blockOf(entered >> 1);
        int from = records.runRows().get(block.fromRow()).seq();
        int until = records.runRows().get(block.toRow()).seq();
        List<Integer> spans = new ArrayList<>();
        for (RunRow row : records.runOf(block.owner())) {
            Integer span = row.span();
            if (span != null && row.seq() > from && row.seq() <= until) {
                spans.add(span);
            }
        }
        if ((entered & 1) == 1) {
            Collections.reverse(spans);
        }
        return spans;
    }
}
