package spanwright.records;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicMask;
import spanwright.plant.Line;
import spanwright.plant.Position;
import spanwright.plant.Span;

/** A span begins and ends at its structures; one that ends where it began lies there, and only its length counts. */
public final class SpanRules {

    /** How far, in metres, a line may end from its structure. */
    private static final double WITHIN_METRES = 1;

    private SpanRules() {}

    /**
     * The line turned so that it leads from one structure to the other, where its two ends lie within 1 m of
     * them, either way round; as it is where both ways fit.
     */
    public static Optional<Line> fit(Line line, Position from, Position to) {
        Position first = line.positions().get(0);
        Position last = line.positions().get(line.positions().size() - 1);
        if (near(first, from) && near(last, to)) {
            return Optional.of(line);
        }
        if (near(first, to) && near(last, from)) {
            List<Position> turned = new ArrayList<>(line.positions());
            Collections.reverse(turned);
            return Optional.of(new Line(turned));
        }
        return Optional.empty();
    }

    private static boolean near(Position one, Position other) {
        return metres(one, other) <= WITHIN_METRES;
    }

    private static double metres(Position one, Position other) {
        return Geodesic.WGS84.Inverse(one.lat(), one.lon(), other.lat(), other.lon(), GeodesicMask.DISTANCE).s12;
    }

    static void ask(RecordsView view, Span span, Refusals refusals) {
        Line line = span.line();
        if (span.from() == span.to()) {
            if (span.measuredLength() == null) {
                refusals.add(
                        "span-without-length",
                        "length_m",
                        "span " + span.code() + " begins and ends at " + Names.structure(view, span.from())
                                + " and has no length; give its length_m, or another structure to end at");
            }
            if (line != null) {
                refusals.add(
                        "span-line-at-one-structure",
                        "line",
                        "span " + span.code() + " begins and ends at " + Names.structure(view, span.from())
                                + " and has a line; leave the line blank, it lies at the structure");
            }
        } else if (line != null) {
            askLine(view, span, line, refusals);
        }
    }

    private static void askLine(RecordsView view, Span span, Line line, Refusals refusals) {
        Position from = view.structures().get(span.from()).position();
        Position to = view.structures().get(span.to()).position();
        Position first = line.positions().get(0);
        Position last = line.positions().get(line.positions().size() - 1);
        if (!near(first, from) || !near(last, to)) {
            double off = Math.min(
                    Math.max(metres(first, from), metres(last, to)), Math.max(metres(first, to), metres(last, from)));
            refusals.add(
                    "span-line-elsewhere",
                    "line",
                    String.format(
                            Locale.ROOT,
                            "the line of span %s ends %.1f m from its structure; it begins and ends within 1 m of %s and %s",
                            span.code(),
                            off,
                            Names.structure(view, span.from()),
                            Names.structure(view, span.to())));
        }
    }
}
