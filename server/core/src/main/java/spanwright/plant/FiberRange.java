package spanwright.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * A rising or falling run of numbers: fibers, outputs, tubes or ports.
 *
 * @param first the first number, from 1
 * @param last the last number, from 1; below the first where the range falls
 */
public record FiberRange(int first, int last) {

    /** Refuses numbers below 1. */
    public FiberRange {
        if (first < 1 || last < 1) {
            throw new IllegalArgumentException("numbers start at 1: " + first + "-" + last);
        }
    }

    /** A range of one. */
    public static FiberRange of(int number) {
        return new FiberRange(number, number);
    }

    /** How many numbers it holds. */
    public int count() {
        return Math.abs(last - first) + 1;
    }

    /** 1 where it rises, -1 where it falls, 1 where it holds one number. */
    public int step() {
        return last < first ? -1 : 1;
    }

    /** The number at an index from 0 to count - 1. */
    public int at(int index) {
        return first + index * step();
    }

    /** Whether it holds a number. */
    public boolean contains(int number) {
        return number >= Math.min(first, last) && number <= Math.max(first, last);
    }

    /** Rising numbers as the fewest rising ranges. */
    public static List<FiberRange> listOf(IntStream rising) {
        List<FiberRange> ranges = new ArrayList<>();
        rising.forEach(number -> {
            int end = ranges.size() - 1;
            if (end >= 0 && ranges.get(end).last() + 1 == number) {
                ranges.set(end, new FiberRange(ranges.get(end).first(), number));
            } else {
                ranges.add(of(number));
            }
        });
        return ranges;
    }

    /** As written: {@code 7} or {@code 1-12} or {@code 12-1}. */
    @Override
    public String toString() {
        return first == last ? Integer.toString(first) : first + "-" + last;
    }
}
