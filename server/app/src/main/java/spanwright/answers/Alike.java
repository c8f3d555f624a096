package spanwright.answers;

import java.util.ArrayList;
import java.util.List;
import java.util.function.IntFunction;

/**
 * Neighbouring numbers that are alike.
 *
 * @param first the first of them
 * @param last the last of them
 * @param what what they are alike in
 * @param <T> the kind of likeness, compared by equals
 */
record Alike<T>(int first, int last, T what) {

    /** The numbers from 1 to a count, drawn together where what is said of neighbours is equal. */
    static <T> List<Alike<T>> of(int count, IntFunction<T> what) {
        List<Alike<T>> ranges = new ArrayList<>();
        int first = 1;
        T alike = what.apply(1);
        for (int number = 2; number <= count; number++) {
            T here = what.apply(number);
            if (!here.equals(alike)) {
                ranges.add(new Alike<>(first, number - 1, alike));
                first = number;
                alike = here;
            }
        }
        ranges.add(new Alike<>(first, count, alike));
        return ranges;
    }

    String numbers() {
        return Numbers.range(first, last);
    }
}
