package spanwright.outage;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.function.IntConsumer;

/** Ranges of neighbouring pieces, none of them overlapping, each with a value above 0. */
final class PieceRanges {

    private final int[] from;
    private final int[] to;
    private final int[] values;

    private PieceRanges(List<Range> ranges) {
        List<Range> rising =
                ranges.stream().sorted(Comparator.comparingInt(Range::from)).toList();
        from = rising.stream().mapToInt(Range::from).toArray();
        to = rising.stream().mapToInt(Range::to).toArray();
        values = rising.stream().mapToInt(Range::value).toArray();
    }

    /** The value of a piece's range; 0 where it is in none. */
    int find(int piece) {
        int at = Arrays.binarySearch(from, piece);
        int range = at >= 0 ? at : -at - 2;
        return range >= 0 && piece < to[range] ? values[range] : 0;
    }

    /** Tells every piece, in order. */
    void forEach(IntConsumer hearer) {
        for (int range = 0; range < from.length; range++) {
            for (int piece = from[range]; piece < to[range]; piece++) {
                hearer.accept(piece);
            }
        }
    }

    /** Gathers ranges. */
    static final class Builder {

        private final List<Range> ranges = new ArrayList<>();

        void add(int firstPiece, int count, int value) {
            ranges.add(new Range(firstPiece, firstPiece + count, value));
        }

        PieceRanges build() {
            return new PieceRanges(ranges);
        }
    }

    /** Pieces from one up to another, that one not included. */
    private record Range(int from, int to, int value) {}
}
