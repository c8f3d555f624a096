package spanwright.trace;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import net.sf.geographiclib.Geodesic;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.SheathTie;
import spanwright.plant.SheathTwin;
import spanwright.plant.Span;
import spanwright.plants.PlainGlass;
import spanwright.quantity.Length;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;
import spanwright.trace.TraceTwin.Visit;

/** Writes what the slow twin of the tracer finds; no length is shared with the tracer. */
final class TwinText {

    private final RecordsView records;
    private final PlainGlass glass;
    private final Map<Integer, BigDecimal> positionOfRow = new HashMap<>();

    TwinText(RecordsView records, PlainGlass glass) {
        this.records = records;
        this.glass = glass;
    }

    String nothing(long front) {
        return port(front) + " >>  >> " + port(front);
    }

    String open(long first, List<Visit> visits, long last, List<String> circuits) {
        boolean complete = EndKey.kind(first) == LegKind.FRONT && EndKey.kind(last) == LegKind.FRONT;
        return end(first) + " >> " + String.join(" | ", elements(visits)) + " >> " + end(last)
                + (complete ? " complete" : "") + tail(circuits);
    }

    String incomplete(long first, List<Visit> visits, long last, List<String> circuits) {
        return end(first) + " >> " + String.join(" | ", elements(visits)) + " >> " + end(last) + tail(circuits);
    }

    private static String tail(List<String> circuits) {
        return circuits.isEmpty() ? "" : " " + String.join(",", circuits);
    }

    String circle(List<Visit> visits, boolean closed) {
        List<String> elements = elements(visits);
        if (closed) {
            addJoint(
                    elements, visits.get(visits.size() - 1).out(), visits.get(0).in());
        }
        return "circle: " + String.join(" | ", elements);
    }

    /** The stretches of a circle that is told from its piece on, the rest of it last. */
    String circleOf(List<List<Visit>> stretches, boolean closed) {
        List<String> elements = new ArrayList<>();
        List<Visit> all = new ArrayList<>();
        for (List<Visit> stretch : stretches) {
            elements.addAll(elements(stretch));
            all.addAll(stretch);
        }
        if (closed) {
            addJoint(elements, all.get(all.size() - 1).out(), all.get(0).in());
        }
        return "circle: " + String.join(" | ", elements);
    }

    private List<String> elements(List<Visit> visits) {
        List<String> elements = new ArrayList<>();
        Visit before = null;
        for (Visit visit : visits) {
            if (before != null) {
                addJoint(elements, before.out(), visit.in());
            }
            addPiece(elements, visit);
            before = visit;
        }
        return elements;
    }

    private void addPiece(List<String> elements, Visit visit) {
        switch (EndKey.kind(visit.in())) {
            case REAR, FRONT -> elements.add("(" + port(visit.in()) + ")");
            case IN, OUT -> {
                if (visit.in() != visit.out()) {
                    Splitter splitter = records.splitters().get(EndKey.owner(visit.in()));
                    elements.add(splitter.code() + " " + terminal(visit.in()) + ">" + terminal(visit.out()));
                }
            }
            case BACK, AHEAD -> elements.add(fiber(visit));
        }
    }

    private static String terminal(long key) {
        int number = EndKey.number(key);
        if (EndKey.kind(key) == LegKind.OUT) {
            return "out " + number;
        }
        return number == 1 ? "in" : "in " + number;
    }

    private void addJoint(List<String> elements, long from, long to) {
        int id = glass.joint(to);
        if (id == 0) {
            elements.add("through "
                    + Objects.requireNonNull(enclosure(EndKey.owner(to))).code());
            return;
        }
        Joint joint = records.joints().get(id);
        if (joint.type() == JointKind.JUMPER) {
            Length length = Objects.requireNonNull(joint.facts().jumperLength());
            elements.add(port(from) + " -" + length.exactMetres().toPlainString() + "- " + port(to));
        } else if (joint.type() == JointKind.SPLICE || joint.facts().method() != null) {
            elements.add(within(from) + " ~ " + within(to));
        }
    }

    private String port(long key) {
        Panel panel = records.panels().get(EndKey.owner(key));
        return records.enclosures().get(panel.enclosure()).code() + "/" + panel.code() + "/" + EndKey.number(key);
    }

    private String within(long key) {
        return switch (EndKey.kind(key)) {
            case REAR, FRONT -> port(key);
            case IN, OUT -> records.splitters().get(EndKey.owner(key)).code() + " " + terminal(key);
            case BACK -> cable(key).code() + " back " + EndKey.number(key);
            case AHEAD -> cable(key).code() + " ahead " + EndKey.number(key);
        };
    }

    private Cable cable(long key) {
        return records.cables().get(records.runRows().get(EndKey.owner(key)).cable());
    }

    private String end(long key) {
        return switch (EndKey.kind(key)) {
            case FRONT -> port(key);
            case REAR -> port(key) + " rear";
            case IN, OUT ->
                within(key) + " @ "
                        + records.enclosures()
                                .get(records.splitters().get(EndKey.owner(key)).enclosure())
                                .code();
            case BACK, AHEAD -> {
                Enclosure enclosure = enclosure(EndKey.owner(key));
                String side = EndKey.kind(key) == LegKind.AHEAD ? " start " : " end ";
                yield enclosure == null
                        ? cable(key).code() + side + EndKey.number(key)
                        : within(key) + " @ " + enclosure.code();
            }
        };
    }

    private @Nullable Enclosure enclosure(int runRow) {
        return enclosure(records, records.runRows().get(runRow));
    }

    static @Nullable Enclosure enclosure(RecordsView records, RunRow row) {
        return TraceTwin.inService(
                records,
                records.passes()
                        .list()
                        .filter(pass -> pass.runRow() == row.id())
                        .findFirst()
                        .orElse(null));
    }

    private String fiber(Visit visit) {
        Cable cable = cable(visit.in());
        BigDecimal from = position(cable, EndKey.owner(visit.in()));
        BigDecimal to = position(cable, EndKey.owner(visit.out()));
        BigDecimal sheath = to.subtract(from).abs();
        Double own = cable.overlengthPct();
        double excess =
                own == null ? records.cableTypes().get(cable.cableType()).overlengthPct() : own;
        BigDecimal length = sheath.multiply(
                        BigDecimal.ONE.add(BigDecimal.valueOf(excess).movePointLeft(2)))
                .setScale(6, RoundingMode.HALF_EVEN)
                .add(tray(visit.in()))
                .add(tray(visit.out()));
        return cable.code() + ":" + EndKey.number(visit.in()) + " " + code(visit.in()) + ">" + code(visit.out()) + " "
                + plain(sheath) + "/" + plain(length);
    }

    private static String plain(BigDecimal metres) {
        return Length.ofMetres(metres).exactMetres().toPlainString();
    }

    private String code(long key) {
        Enclosure enclosure = enclosure(EndKey.owner(key));
        return enclosure == null ? "-" : enclosure.code();
    }

    private BigDecimal tray(long key) {
        Enclosure enclosure = enclosure(EndKey.owner(key));
        boolean uncut = glass.peer(key) != null && glass.joint(key) == 0;
        return enclosure == null || uncut
                ? BigDecimal.ZERO
                : enclosure.trayGlass().exactMetres();
    }

    /** Where the enclosure at a row sits; at the outer rows the sheath's very ends. */
    private BigDecimal position(Cable cable, int runRow) {
        return positionOfRow.computeIfAbsent(runRow, row -> reckon(cable, row));
    }

    private BigDecimal reckon(Cable cable, int runRow) {
        List<RunRow> run = records.runOf(cable.id());
        List<Length> slack = run.stream().map(RunRow::slack).toList();
        List<Length> spans = run.stream().skip(1).map(this::length).toList();
        List<BigDecimal> positions = SheathTwin.positions(slack, spans, ties(cable, run));
        int row = run.indexOf(records.runRows().get(runRow));
        BigDecimal in = positions.get(2 * row);
        BigDecimal out = positions.get(2 * row + 1);
        if (row == 0 || row == run.size() - 1) {
            return row == 0 ? in : out;
        }
        return in.add(out.subtract(in).divide(BigDecimal.valueOf(2), 6, RoundingMode.DOWN));
    }

    private Length length(RunRow row) {
        Span span = records.spans().get(Objects.requireNonNull(row.span()));
        Length measured = span.measuredLength();
        if (measured != null) {
            return measured;
        }
        List<Position> bends = span.line() == null
                ? List.of(
                        records.structures().get(span.from()).position(),
                        records.structures().get(span.to()).position())
                : span.line().positions();
        double metres = 0;
        for (int bend = 1; bend < bends.size(); bend++) {
            Position a = bends.get(bend - 1);
            Position b = bends.get(bend);
            metres += Geodesic.WGS84.Inverse(a.lat(), a.lon(), b.lat(), b.lon()).s12;
        }
        return Length.ofMetres(metres);
    }

    private List<SheathTie> ties(Cable cable, List<RunRow> run) {
        List<SheathTie> ties = new ArrayList<>();
        for (SheathMark mark : records.sheathMarks().list().toList()) {
            int row = run.indexOf(records.runRows().get(mark.runRow()));
            if (row >= 0 && mark.ink().equals(cable.marksInk())) {
                if (mark.markIn() != null) {
                    ties.add(new SheathTie(row, false, mark.markIn(), mark.unit(), null));
                }
                if (mark.markOut() != null) {
                    ties.add(new SheathTie(row, true, mark.markOut(), mark.unit(), null));
                }
            }
        }
        return ties;
    }
}
