package spanwright.benchmarks.grid;

/** Which sections are joined in one chain: a forest, its roots the chains' names. */
final class Chains {

    private static final int LONGEST = 61;

    private final int[] parent;
    private final int[] length;

    /** The chains that some joins make. */
    Chains(int sections, Joins joins) {
        parent = new int[sections];
        length = new int[sections];
        for (int section = 0; section < sections; section++) {
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

    /** Whether two sections may be joined: it closes no circle, and the chain is of {@value #LONGEST} at the most. */
    boolean fits(int one, int other) {
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

    void unite(int one, int other) {
        int a = chain(one);
        int b = chain(other);
        parent[a] = b;
        length[b] += length[a];
    }
}
