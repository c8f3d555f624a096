package spanwright.benchmarks.grid;

/**
 * Splices what is still free at each node to what is free in another of its cables, so that little stays dark. A chain
 * holds 61 sections at the most and never closes on itself.
 */
final class SpareSplices {

    private static final int LONGEST = 61;

    private final Grid grid;
    private final Joins joins;
    /** Which chain a section is in: a forest, its roots the chains' names. */
    private final int[] parent;

    private final int[] length;

    SpareSplices(Grid grid, Joins joins) {
        this.grid = grid;
        this.joins = joins;
        parent = new int[grid.sections];
        length = new int[grid.sections];
        for (int section = 0; section < grid.sections; section++) {
            parent[section] = section;
            length[section] = 1;
        }
        for (int end = 0; end < joins.glassEnds(); end++) {
            int other = joins.peer(end);
            if (other > end && other < joins.glassEnds()) {
                unite(end >> 1, other >> 1);
            }
        }
    }

    void splice() {
        for (int node = 0; node < grid.nodes(); node++) {
            for (int first = 0; first < 4; first++) {
                for (int second = first + 1; second < 4; second++) {
                    splice(node, grid.cable(node, first), grid.cable(node, second));
                }
            }
        }
    }

    private void splice(int node, int one, int other) {
        if (one < 0 || other < 0) {
            return;
        }
        int there = 0;
        for (int here = 0; here < grid.fibers[one]; here++) {
            int end = end(node, one, here);
            if (joins.peer(end) != Joins.FREE) {
                continue;
            }
            while (there < grid.fibers[other] && joins.peer(end(node, other, there)) != Joins.FREE) {
                there++;
            }
            if (there == grid.fibers[other]) {
                return;
            }
            int target = end(node, other, there);
            if (fits(end >> 1, target >> 1)) {
                joins.join(end, target);
                unite(end >> 1, target >> 1);
            }
        }
    }

    private int end(int node, int cable, int fiber) {
        return 2 * (grid.firstSection[cable] + fiber) + (grid.from[cable] == node ? 0 : 1);
    }

    private boolean fits(int one, int other) {
        int a = chain(one);
        int b = chain(other);
        return a != b && length[a] + length[b] <= LONGEST;
    }

    private int chain(int section) {
        int root = section;
        while (parent[root] != root) {
            parent[root] = parent[parent[root]];
            root = parent[root];
        }
        return root;
    }

    private void unite(int one, int other) {
        int a = chain(one);
        int b = chain(other);
        parent[a] = b;
        length[b] += length[a];
    }
}
