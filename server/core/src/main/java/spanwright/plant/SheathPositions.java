package spanwright.plant;

import java.math.BigInteger;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import spanwright.quantity.Length;

/**
 * Where along its sheath a cable comes to and leaves each row of its run. Nominal lengths (coils and spans) are
 * stretched between neighbouring marks to what the marks say; before the first and after the last mark they hold.
 * Shared-out lengths are cut at rounded running totals, so that the parts add up to the whole. Immutable.
 */
public final class SheathPositions {

    /** The in of row k at 2k, its out at 2k + 1, in micrometres from the in of row 0; never falling. */
    private final long[] positions;
    /** In the order of their places, one a place. */
    private final SheathTie[] ties;

    private SheathPositions(long[] positions, SheathTie[] ties) {
        this.positions = positions;
        this.ties = ties;
    }

    /**
     * The positions of a run.
     *
     * @param slack sheath coiled at each row, row 0 first
     * @param spans route length of the span that leads to each row but row 0
     * @param ties marks of the governing ink, in any order; of two at one place the later counts
     */
    public static SheathPositions of(List<Length> slack, List<Length> spans, List<SheathTie> ties) {
        int rows = slack.size();
        if (rows == 0 || spans.size() != rows - 1) {
            throw new IllegalArgumentException("not a run: " + rows + " rows, " + spans.size() + " spans");
        }
        long[] nominal = new long[2 * rows];
        for (int row = 0; row < rows; row++) {
            long in = row == 0 ? 0 : nominal[2 * row - 1] + spans.get(row - 1).micrometres();
            nominal[2 * row] = in;
            nominal[2 * row + 1] = in + slack.get(row).micrometres();
        }
        SheathTie[] inOrder = inOrder(ties, rows);
        return new SheathPositions(tied(nominal, inOrder), inOrder);
    }

    private static SheathTie[] inOrder(List<SheathTie> ties, int rows) {
        SheathTie[] places = new SheathTie[2 * rows];
        for (SheathTie tie : ties) {
            places[tie.index()] = tie;
        }
        return Arrays.stream(places).filter(tie -> tie != null).toArray(SheathTie[]::new);
    }

    private static long[] tied(long[] nominal, SheathTie[] ties) {
        long[] positions = nominal.clone();
        for (int tie = 1; tie < ties.length; tie++) {
            share(nominal, positions, ties[tie - 1], ties[tie]);
        }
        if (ties.length > 0) {
            int last = ties[ties.length - 1].index();
            for (int index = last + 1; index < positions.length; index++) {
                positions[index] = positions[last] + nominal[index] - nominal[last];
            }
        }
        return positions;
    }

    private static void share(long[] nominal, long[] positions, SheathTie from, SheathTie to) {
        long sheath = to.mark().minus(from.mark()).abs().micrometres();
        int first = from.index();
        long whole = nominal[to.index()] - nominal[first];
        for (int index = first + 1; index <= to.index(); index++) {
            long part = nominal[index] - nominal[first];
            // Without any nominal length the spans share evenly; within one row all of it is slack of that row.
            positions[index] = positions[first]
                    + (whole > 0
                            ? proportion(sheath, part, whole)
                            : proportion(sheath, spansBetween(first, index), spansBetween(first, to.index())));
        }
    }

    private static long spansBetween(int from, int to) {
        return to - from == 1 ? 1 : to / 2 - from / 2;
    }

    /** Rounded half-up; the product of two lengths may leave the range of a long. */
    private static long proportion(long sheath, long part, long whole) {
        BigInteger twice = BigInteger.valueOf(sheath).multiply(BigInteger.valueOf(2 * part));
        return twice.add(BigInteger.valueOf(whole))
                .divide(BigInteger.valueOf(2 * whole))
                .longValueExact();
    }

    /** How many rows the run has. */
    public int rows() {
        return positions.length / 2;
    }

    /** The position at which the sheath arrives at a row, from 0; that of row 0 is 0. */
    public Length in(int row) {
        return new Length(positions[2 * row]);
    }

    /** The position at which the sheath leaves a row. */
    public Length out(int row) {
        return new Length(positions[2 * row + 1]);
    }

    /** The sheath coiled at a row, as the marks have it. */
    public Length coil(int row) {
        return out(row).minus(in(row));
    }

    /** The whole sheath. */
    public Length length() {
        return new Length(positions[positions.length - 1]);
    }

    /** The position of an enclosure at a row: in0 on row 0, the out on the last row, elsewhere midway. */
    public Length enclosure(int row) {
        if (row == 0) {
            return in(0);
        }
        if (row == rows() - 1) {
            return out(row);
        }
        return new Length(positions[2 * row] + (positions[2 * row + 1] - positions[2 * row]) / 2);
    }

    /**
     * Where a position lies. At the very place where the sheath arrives at or leaves a row it lies at the row.
     *
     * @throws IllegalArgumentException where it is below 0 or beyond the sheath's end
     */
    public SheathPlace place(Length position) {
        long at = position.micrometres();
        if (at < 0 || at > length().micrometres()) {
            throw new IllegalArgumentException("not on the sheath of " + length() + ": " + position);
        }
        int row = 0;
        int beyond = rows();
        while (beyond - row > 1) {
            int middle = (row + beyond) >>> 1;
            if (positions[2 * middle] <= at) {
                row = middle;
            } else {
                beyond = middle;
            }
        }
        boolean onSpan = at > positions[2 * row + 1];
        int begins = onSpan ? 2 * row + 1 : 2 * row;
        return new SheathPlace(
                onSpan ? row + 1 : row,
                onSpan,
                new Length(at - positions[begins]),
                new Length(positions[begins + 1] - at));
    }

    /** The marks that tie it, in their order along the run. */
    public List<SheathTie> ties() {
        return List.of(ties);
    }

    /** The position that a tie ties. */
    public Length position(SheathTie tie) {
        return new Length(positions[tie.index()]);
    }

    /** The last tie at or before a position, if any. */
    public Optional<SheathTie> findTieBefore(Length position) {
        return Arrays.stream(ties)
                .filter(tie -> position(tie).compareTo(position) <= 0)
                .reduce((earlier, later) -> later);
    }

    /** The first tie at or after a position, if any. */
    public Optional<SheathTie> findTieAfter(Length position) {
        return Arrays.stream(ties)
                .filter(tie -> position(tie).compareTo(position) >= 0)
                .findFirst();
    }

    /** What all sheath between two positions rests on: {@link LengthBasis#MARKS} or {@link LengthBasis#NOMINAL}. */
    public LengthBasis basis(Length from, Length to) {
        boolean marked = ties.length > 1
                && position(ties[0]).compareTo(from) <= 0
                && position(ties[ties.length - 1]).compareTo(to) >= 0;
        return marked ? LengthBasis.MARKS : LengthBasis.NOMINAL;
    }

    /**
     * The mark printed at a position, if the sheath has two ties at least; beyond the outer ties the print goes on at
     * nominal length, the way it went.
     */
    public Optional<PrintedMark> findMark(Length position) {
        if (ties.length < 2) {
            return Optional.empty();
        }
        int next = 1;
        while (next < ties.length - 1 && position(ties[next]).compareTo(position) < 0) {
            next++;
        }
        SheathTie tie = ties[next];
        long printed = tie.mark().micrometres()
                + direction(next) * position.minus(position(tie)).micrometres();
        return Optional.of(new PrintedMark(new Length(printed), tie.unit()));
    }

    /** Whether the print rises (1) or falls (-1) up to a tie; where it stands still, as it goes elsewhere. */
    private int direction(int tie) {
        int here = ties[tie].mark().compareTo(ties[tie - 1].mark());
        for (int other = 1; here == 0 && other < ties.length; other++) {
            here = ties[other].mark().compareTo(ties[other - 1].mark());
        }
        return here < 0 ? -1 : 1;
    }

    /** The position at which a mark is printed, if the sheath has two ties at least and bears that mark. */
    public Optional<Length> findPosition(Length mark) {
        for (int next = 1; next < ties.length; next++) {
            long from = next == 1 ? 0 : positions[ties[next - 1].index()];
            long to = next == ties.length - 1 ? length().micrometres() : positions[ties[next].index()];
            long at = positions[ties[next].index()]
                    + direction(next) * mark.minus(ties[next].mark()).micrometres();
            if (at >= from && at <= to) {
                return Optional.of(new Length(at));
            }
        }
        return Optional.empty();
    }
}
