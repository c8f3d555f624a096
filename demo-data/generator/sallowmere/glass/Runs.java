package sallowmere.glass;

import java.util.ArrayList;
import java.util.List;

/** Whole numbers gathered into runs of neighbours. */
final class Runs {
    private Runs() {}

    /** The runs, each with its first and last, of rising numbers. */
    static List<int[]> of(List<Integer> numbers) {
        List<int[]> runs = new ArrayList<>();
        for (int number : numbers) {
            int[] last = runs.isEmpty() ? null : runs.get(runs.size() - 1);
            if (last != null && last[1] == number - 1) {
                last[1] = number;
            } else {
                runs.add(new int[] {number, number});
            }
        }
        return runs;
    }

    /** The runs of what rising numbers leave out of 1 to a count. */
    static List<int[]> missing(List<Integer> numbers, int count) {
        List<Integer> left = new ArrayList<>();
        for (int number = 1; number <= count; number++) {
            if (!numbers.contains(number)) {
                left.add(number);
            }
        }
        return of(left);
    }
}
