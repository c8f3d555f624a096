package spanwright.answers;

import java.util.List;
import java.util.StringJoiner;
import spanwright.plant.FiberRange;

/** Writes numbers as a records folder does: {@code 7}, {@code 1-12}, {@code 1-12,25}. */
final class Numbers {

    private Numbers() {}

    static String range(int first, int last) {
        return new FiberRange(first, last).toString();
    }

    /** Rising numbers, neighbours drawn together. */
    static String list(List<Integer> rising) {
        StringJoiner ranges = new StringJoiner(",");
        int first = 0;
        for (int index = 1; index <= rising.size(); index++) {
            if (index == rising.size() || rising.get(index) != rising.get(index - 1) + 1) {
                ranges.add(range(rising.get(first), rising.get(index - 1)));
                first = index;
            }
        }
        return ranges.toString();
    }

    static String ranges(List<FiberRange> ranges) {
        StringJoiner joined = new StringJoiner(",");
        ranges.forEach(range -> joined.add(range.toString()));
        return joined.toString();
    }
}
