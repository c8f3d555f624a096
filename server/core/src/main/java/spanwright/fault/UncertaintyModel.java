package spanwright.fault;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import spanwright.fault.Approach.Coil;
import spanwright.fault.Approach.Stretch;
import spanwright.plant.Structure;
import spanwright.quantity.Length;

/** Reckons how sure a place is. Every constant stands with its source in {@code docs/FAULT-PLACE.md}. */
final class UncertaintyModel {

    /** Meters: where a break begins on a trace. */
    static final double CURSOR = 1.5;
    /** Meters: a joint on the same trace. */
    static final double EVENT_CURSOR = 0.75;
    /** Share of the glass: a group index by its type's table, or as somebody set it on the instrument. */
    static final double INDEX_OF_TYPE = 0.00034;
    /** Share of the glass: a group index by the reel's own sheet. */
    static final double INDEX_OF_REEL = 0.00014;
    /** Share of the glass: glass in a sheath by the type's excess length and the print's scale. */
    static final double RATIO_OF_TYPE = 0.004;
    /** Share of the glass: by the reel's own excess length and the print's scale. */
    static final double RATIO_OF_REEL = 0.003;
    /** Share of the glass: as measured between two known points of the same shot. */
    static final double RATIO_MEASURED = 0.0015;
    /** Meters: one mark, printed every meter or two feet, read to a whole number. */
    static final double MARK = 0.3;
    /** Share of the sheath: a length of route in the place of a length of sheath. */
    static final double UNMARKED = 0.01;
    /** Meters: a coil whose length is known. */
    static final double COIL = 1.2;
    /** Share of a coil's length, besides: one that nobody vouches for. */
    static final double COIL_UNKNOWN = 0.3;
    /** Meters: a structure whose accuracy is not recorded, taken with a hand-held receiver. */
    static final double MAP = 3;

    private final GlassIndex index;

    UncertaintyModel(GlassIndex index) {
        this.index = index;
    }

    Uncertainty of(GlassRuler ruler, Spot spot, Where where) {
        Approach approach = new Approach(ruler, spot);
        Map<Cause, Length> causes = new EnumMap<>(Cause.class);
        causes.put(Cause.CURSOR, Length.ofMetres(cursor(approach)));
        causes.put(Cause.INDEX, Length.ofMetres(index(approach)));
        causes.put(Cause.RATIO, Length.ofMetres(ratio(approach)));
        causes.put(Cause.MARKS, Length.ofMetres(marks(approach)));
        causes.put(Cause.COILS, Length.ofMetres(coils(approach.coils())));
        causes.put(Cause.MAP, Length.ofMetres(map(where)));
        return new Uncertainty(causes);
    }

    private static double cursor(Approach approach) {
        double share = approach.share();
        double before = approach.before().event() ? (1 - share) * EVENT_CURSOR : 0;
        double after = approach.calibrated() ? share * EVENT_CURSOR : 0;
        return Math.sqrt(CURSOR * CURSOR + before * before + after * after);
    }

    /** Between two known points it cancels out. */
    private double index(Approach approach) {
        return approach.calibrated()
                ? 0
                : sum(
                        approach.stretches(),
                        stretch -> (index.ofReel(stretch.fiber()) ? INDEX_OF_REEL : INDEX_OF_TYPE) * stretch.glass());
    }

    private static double ratio(Approach approach) {
        return sum(
                approach.stretches(),
                stretch -> (approach.calibrated() ? RATIO_MEASURED : ratioOfRecords(stretch)) * stretch.glass());
    }

    private static double ratioOfRecords(Stretch stretch) {
        return stretch.fiber().cable().overlengthPct() == null ? RATIO_OF_TYPE : RATIO_OF_REEL;
    }

    /** Two marks are read: at the structure, and where the known point is. */
    private static double marks(Approach approach) {
        double unmarked = UNMARKED * sum(approach.stretches(), Stretch::unmarked);
        return Math.sqrt(2 * MARK * MARK + unmarked * unmarked);
    }

    private static double coils(List<Coil> coils) {
        double squares = 0;
        for (Coil coil : coils) {
            double each =
                    COIL + (coil.known() ? 0 : COIL_UNKNOWN * coil.length().metres());
            squares += each * each;
        }
        return Math.sqrt(squares);
    }

    /** On a span as between its two structures. */
    private static double map(Where where) {
        double before = where.beyondBefore().metres();
        double whole = before + where.shortOfAfter().metres();
        double share = whole > 0 ? before / whole : 0;
        return (1 - share) * accuracy(where.before()) + share * accuracy(where.after());
    }

    private static double accuracy(Structure structure) {
        Length recorded = structure.accuracy();
        return recorded == null ? MAP : recorded.metres();
    }

    private static double sum(List<Stretch> stretches, ToDoubleFunction<Stretch> metres) {
        return stretches.stream().mapToDouble(metres).sum();
    }
}
