package sallowmere.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

/** One continuous sheath: where it runs, how much lies coiled, and where its marks were read. */
public final class Cable {
    private final String code;
    private final CableType type;
    private final String partOf;
    private final Double overlength;
    private final String installed;
    private final Marking marking;
    private final List<Row> rows = new ArrayList<>();
    private final TreeSet<Integer> read = new TreeSet<>();

    /**
     * A cable that starts at a structure.
     *
     * @param partOf the longer cable that it is a reel of, blank for none
     * @param overlength excess length of the glass in per cent, null for the type's
     * @param installed the date
     * @param slack metres coiled at the first structure
     */
    public Cable(
            String code,
            CableType type,
            String partOf,
            Double overlength,
            String installed,
            Marking marking,
            Structure start,
            double slack) {
        this.code = code;
        this.type = type;
        this.partOf = partOf;
        this.overlength = overlength;
        this.installed = installed;
        this.marking = marking;
        rows.add(new Row(start, null, 0, slack, 0));
    }

    /**
     * Goes on along a span.
     *
     * @param sheath metres of sheath along the span
     * @param slack metres coiled at the structure reached
     */
    public void go(Span span, double sheath, double slack) {
        Row last = last();
        Structure next = span.from() == last.structure() ? span.to() : span.from();
        if (span.from() != last.structure() && span.to() != last.structure()) {
            throw new IllegalStateException(code + ": " + span.code() + " does not touch " + last.structure());
        }
        rows.add(new Row(next, span, last.leave() + sheath, slack, last.route() + span.length()));
    }

    /** Notes that the marks were read at a row. */
    public void readAt(int seq) {
        read.add(seq);
    }

    /** The rows at which the marks were read, in order. */
    public List<Integer> reads() {
        return List.copyOf(read);
    }

    /** The rows in order. */
    public List<Row> rows() {
        return rows;
    }

    /** The row reached so far. */
    public Row last() {
        return rows.get(rows.size() - 1);
    }

    /** The number of the row at a structure. */
    public int seqAt(Structure structure) {
        for (int seq = 0; seq < rows.size(); seq++) {
            if (rows.get(seq).structure() == structure) {
                return seq;
            }
        }
        throw new IllegalStateException(code + " does not visit " + structure.code());
    }

    /** The number of the row whose route is nearest to some metres. */
    public int seqNear(double route) {
        int best = 0;
        for (int seq = 0; seq < rows.size(); seq++) {
            if (Math.abs(rows.get(seq).route() - route)
                    < Math.abs(rows.get(best).route() - route)) {
                best = seq;
            }
        }
        return best;
    }

    /** Its code. */
    public String code() {
        return code;
    }

    /** Its type. */
    public CableType type() {
        return type;
    }

    /** The longer cable that it is a reel of, or blank. */
    public String partOf() {
        return partOf;
    }

    /** Its own excess length in per cent, or null. */
    public Double overlength() {
        return overlength;
    }

    /** When it was laid. */
    public String installed() {
        return installed;
    }

    /** How its sheath is numbered. */
    public Marking marking() {
        return marking;
    }
}
