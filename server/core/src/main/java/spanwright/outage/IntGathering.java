package spanwright.outage;

import java.util.Arrays;

/** Ints that grow in number, to be had each once. */
final class IntGathering {

    private int[] all = new int[1024];
    private int count;

    void add(int each) {
        if (count > 0 && all[count - 1] == each) {
            return;
        }
        if (count == all.length) {
            all = Arrays.copyOf(all, 2 * count);
        }
        all[count++] = each;
    }

    /** Each once, rising. */
    int[] distinct() {
        Arrays.sort(all, 0, count);
        int kept = 0;
        for (int index = 0; index < count; index++) {
            if (kept == 0 || all[index] != all[kept - 1]) {
                all[kept++] = all[index];
            }
        }
        count = kept;
        return Arrays.copyOf(all, kept);
    }
}
