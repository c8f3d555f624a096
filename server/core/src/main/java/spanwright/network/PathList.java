package spanwright.network;

/**
 * Several paths' ends one behind another, to be filled again and again so that nothing is thrown away between two
 * answers. One thread's.
 */
public final class PathList {

    private int[] from = new int[1];
    private int[] ends = new int[0];
    private int count;

    /** How many paths there are. */
    public int count() {
        return count;
    }

    /** Where in {@link #ends} a path begins; of the count of paths, where the last of them ends. */
    public int from(int index) {
        return from[index];
    }

    /** The end by which a walk enters the piece at a place of the list. */
    public int end(int place) {
        return ends[place];
    }

    /** The list itself, until it is filled anew; past the last path's end stands nothing of meaning. */
    public int[] ends() {
        return ends;
    }

    void begin(int paths) {
        count = 0;
        if (from.length <= paths) {
            from = new int[paths + 1];
        }
    }

    /** Adds a path of so many pieces. */
    void add(int length) {
        from[count + 1] = from[count] + length;
        count++;
    }

    /** Room for all the paths added, to be filled. */
    int[] room() {
        if (ends.length < from[count]) {
            ends = new int[from[count] + (from[count] >>> 2)];
        }
        return ends;
    }
}
