package spanwright.fault;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;
import spanwright.plant.SheathTie;
import spanwright.plant.SheathTwin;
import spanwright.plant.Span;
import spanwright.quantity.Length;
import spanwright.records.RecordsView;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Jumper;
import spanwright.trace.Path;
import spanwright.trace.Through;

/**
 * Walks a path's glass stretch by stretch, tray by tray, coil by coil, span by span, in decimal fractions, from the
 * sentences of the records folder. No length is shared with the finder. One path's.
 */
final class FaultTwin {

    private static final MathContext EXACT = new MathContext(34);

    private final RecordsView records;
    private final Path path;
    private final List<Bead> beads = new ArrayList<>();

    FaultTwin(RecordsView records, Path path) {
        this.records = records;
        this.path = path;
        for (int at = 0; at < path.elements().size(); at++) {
            Element element = path.elements().get(at);
            if (element instanceof Fiber fiber) {
                addFiber(fiber, !throughAt(at - 1), !throughAt(at + 1));
            } else if (element instanceof Jumper jumper) {
                beads.add(new Bead(
                        "jumper",
                        jumper.glass().exactMetres(),
                        jumper.structure().code()));
            }
        }
    }

    private boolean throughAt(int at) {
        return at >= 0 && at < path.elements().size() && path.elements().get(at) instanceof Through;
    }

    /** Where a reading lies. */
    static final class Found {
        String lies = "";
        String before = "";
        String after = "";
        double beyond;
        double shortOf;

        @Nullable
        String span;

        @Nullable
        String fiber;

        double sheath;
        double glass;
        double over = -1;

        @Nullable
        Double mark;

        double lon;
        double lat;

        @Override
        public String toString() {
            return lies + " " + before + ">" + after + " +" + beyond + " -" + shortOf + " " + span + " " + fiber + "@"
                    + sheath + " mark " + mark + " glass " + glass + " over " + over + " at " + lon + "," + lat;
        }
    }

    private BigDecimal index(@Nullable Fiber fiber) {
        return GlassIndexTwin.of(records, fiber);
    }

    /** A stretch of glass that lies in one place. */
    private static final class Bead {
        private final String lies;
        private final BigDecimal glass;
        private final String structure;
        private @Nullable Fiber fiber;
        private BigDecimal from = BigDecimal.ZERO;
        private int row;

        Bead(String lies, BigDecimal glass, String structure) {
            this.lies = lies;
            this.glass = glass;
            this.structure = structure;
        }

        Bead in(Fiber walked, int runRow, BigDecimal start) {
            fiber = walked;
            row = runRow;
            from = start;
            return this;
        }
    }

    private void addFiber(Fiber fiber, boolean cutFrom, boolean cutTo) {
        Cable cable = fiber.cable();
        List<RunRow> run = records.runOf(cable.id());
        List<BigDecimal> positions = positions(cable, run);
        BigDecimal ratio = ratio(cable);
        int step = fiber.ahead() ? 1 : -1;
        addTray(fiber, run.get(fiber.fromRow()), cutFrom, enclosureAt(positions, fiber.fromRow()));
        BigDecimal at = enclosureAt(positions, fiber.fromRow());
        for (int row = fiber.fromRow(); row != fiber.toRow(); row += step) {
            BigDecimal leaves = positions.get(2 * row + (fiber.ahead() ? 1 : 0));
            BigDecimal arrives = positions.get(2 * (row + step) + (fiber.ahead() ? 0 : 1));
            addSheath("slack", fiber, run, row, at, leaves, ratio);
            addSheath("span", fiber, run, fiber.ahead() ? row + 1 : row, leaves, arrives, ratio);
            at = arrives;
        }
        BigDecimal end = enclosureAt(positions, fiber.toRow());
        addSheath("slack", fiber, run, fiber.toRow(), at, end, ratio);
        addTray(fiber, run.get(fiber.toRow()), cutTo, end);
    }

    private void addSheath(
            String lies, Fiber fiber, List<RunRow> run, int row, BigDecimal from, BigDecimal to, BigDecimal ratio) {
        BigDecimal glass = to.subtract(from).abs().multiply(ratio);
        beads.add(new Bead(lies, glass, structure(run.get(row))).in(fiber, row, from));
    }

    private void addTray(Fiber fiber, RunRow row, boolean cut, BigDecimal at) {
        Enclosure enclosure = records.findPassAt(row.id())
                .map(pass -> records.enclosures().get(pass.enclosure()))
                .orElse(null);
        boolean there = enclosure != null && enclosure.state() == PlantState.IN_SERVICE && cut;
        if (there) {
            BigDecimal tray = Objects.requireNonNull(enclosure).trayGlass().exactMetres();
            beads.add(
                    new Bead("tray", tray, structure(row)).in(fiber, fiber.lay().index(row.id()), at));
        }
    }

    private String structure(RunRow row) {
        return records.structures().get(row.structure()).code();
    }

    private BigDecimal ratio(Cable cable) {
        Double own = cable.overlengthPct();
        double excess =
                own == null ? records.cableTypes().get(cable.cableType()).overlengthPct() : own;
        return BigDecimal.ONE.add(BigDecimal.valueOf(excess).movePointLeft(2));
    }

    private List<BigDecimal> positions(Cable cable, List<RunRow> run) {
        return SheathTwin.positions(
                run.stream().map(RunRow::slack).toList(),
                run.stream().skip(1).map(this::length).toList(),
                ties(cable, run));
    }

    private static BigDecimal enclosureAt(List<BigDecimal> positions, int row) {
        BigDecimal in = positions.get(2 * row);
        BigDecimal out = positions.get(2 * row + 1);
        if (row == 0) {
            return in;
        }
        return 2 * row + 2 == positions.size() ? out : in.add(out).divide(BigDecimal.valueOf(2), EXACT);
    }

    private List<Position> bends(Span span) {
        return span.line() == null
                ? List.of(
                        records.structures().get(span.from()).position(),
                        records.structures().get(span.to()).position())
                : span.line().positions();
    }

    private Length length(RunRow row) {
        Span span = records.spans().get(Objects.requireNonNull(row.span()));
        return span.measuredLength() != null ? span.measuredLength() : Length.ofMetres(metres(bends(span)));
    }

    private static double metres(List<Position> bends) {
        double metres = 0;
        for (int bend = 1; bend < bends.size(); bend++) {
            metres += inverse(bends.get(bend - 1), bends.get(bend)).s12;
        }
        return metres;
    }

    private static GeodesicData inverse(Position a, Position b) {
        return Geodesic.WGS84.Inverse(a.lat(), a.lon(), b.lat(), b.lon());
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
        ties.sort(Comparator.comparingInt((SheathTie tie) -> 2 * tie.row() + (tie.out() ? 1 : 0)));
        return ties;
    }

    /** The place of so many meters of glass. */
    Found find(BigDecimal reading) {
        return find(reading, BigDecimal.ZERO, null);
    }

    /**
     * The place of a reading at 1550 nm.
     *
     * @param launch meters of launch fiber, of the glass that the path begins with
     * @param set the index set on the instrument; null: the reading is meters of glass
     */
    Found find(BigDecimal reading, BigDecimal launch, @Nullable BigDecimal set) {
        BigDecimal first = index(beads.isEmpty() ? null : beads.get(0).fiber);
        BigDecimal left =
                set == null ? reading.subtract(launch) : reading.multiply(set).subtract(launch.multiply(first));
        BigDecimal walked = BigDecimal.ZERO;
        for (Bead bead : beads) {
            BigDecimal used = set == null ? bead.glass : bead.glass.multiply(index(bead.fiber));
            if (left.compareTo(used) <= 0) {
                BigDecimal within = set == null ? left : left.divide(index(bead.fiber), EXACT);
                return in(bead, within, walked.add(within));
            }
            left = left.subtract(used);
            walked = walked.add(bead.glass);
        }
        if (set != null && !beads.isEmpty()) {
            left = left.divide(index(beads.get(beads.size() - 1).fiber), EXACT);
        }
        Found end;
        if (beads.isEmpty()) {
            end = new Found();
            end.lies = "tray";
            end.before = path.elements().get(0).structure().code();
            end.after = end.before;
        } else {
            Bead last = beads.get(beads.size() - 1);
            end = in(last, last.glass, walked);
        }
        end.over = left.doubleValue();
        return end;
    }

    private Found in(Bead bead, BigDecimal within, BigDecimal glass) {
        Found found = new Found();
        found.lies = bead.lies;
        found.before = bead.structure;
        found.after = bead.structure;
        found.glass = glass.doubleValue();
        Fiber fiber = bead.fiber;
        if (fiber == null) {
            return found;
        }
        BigDecimal walked = within.divide(ratio(fiber.cable()), EXACT);
        BigDecimal position = bead.lies.equals("tray")
                ? bead.from
                : fiber.ahead() ? bead.from.add(walked) : bead.from.subtract(walked);
        found.fiber = fiber.cable().code() + ":" + fiber.fiber();
        found.sheath = position.doubleValue();
        found.mark = mark(fiber.cable(), position);
        List<RunRow> run = records.runOf(fiber.cable().id());
        List<BigDecimal> positions = positions(fiber.cable(), run);
        if (bead.lies.equals("span")) {
            onSpan(found, bead, run, positions, position);
        } else if (bead.lies.equals("slack")) {
            inCoil(found, fiber, positions, bead.row, position);
        }
        return found;
    }

    private static void inCoil(Found found, Fiber fiber, List<BigDecimal> positions, int row, BigDecimal position) {
        double fromIn = position.subtract(positions.get(2 * row)).doubleValue();
        double toOut = positions.get(2 * row + 1).subtract(position).doubleValue();
        found.beyond = fiber.ahead() ? fromIn : toOut;
        found.shortOf = fiber.ahead() ? toOut : fromIn;
        if (positions.get(2 * row).compareTo(positions.get(2 * row + 1)) == 0) {
            found.lies = "structure";
        }
    }

    private void onSpan(Found found, Bead bead, List<RunRow> run, List<BigDecimal> positions, BigDecimal position) {
        RunRow row = run.get(bead.row);
        BigDecimal out = positions.get(2 * bead.row - 1);
        BigDecimal in = positions.get(2 * bead.row);
        boolean ahead = Objects.requireNonNull(bead.fiber).ahead();
        String start = structure(run.get(bead.row - 1));
        String end = structure(row);
        found.before = ahead ? start : end;
        found.after = ahead ? end : start;
        double fromStart = position.subtract(out).doubleValue();
        double toEnd = in.subtract(position).doubleValue();
        found.beyond = ahead ? fromStart : toEnd;
        found.shortOf = ahead ? toEnd : fromStart;
        Span span = records.spans().get(Objects.requireNonNull(row.span()));
        found.span = span.code();
        List<Position> bends = new ArrayList<>(bends(span));
        Position at =
                records.structures().get(run.get(bead.row - 1).structure()).position();
        Position other = records.structures().get(row.structure()).position();
        if (inverse(at, bends.get(0)).s12 + inverse(other, bends.get(bends.size() - 1)).s12
                > inverse(at, bends.get(bends.size() - 1)).s12 + inverse(other, bends.get(0)).s12) {
            Collections.reverse(bends);
        }
        along(found, bends, fromStart / (fromStart + toEnd) * metres(bends));
    }

    private static void along(Found found, List<Position> bends, double metres) {
        double left = metres;
        for (int bend = 1; bend < bends.size(); bend++) {
            GeodesicData leg = inverse(bends.get(bend - 1), bends.get(bend));
            if (left <= leg.s12 || bend == bends.size() - 1) {
                GeodesicData place = Geodesic.WGS84.Direct(leg.lat1, leg.lon1, leg.azi1, Math.min(left, leg.s12));
                found.lon = place.lon2;
                found.lat = place.lat2;
                return;
            }
            left -= leg.s12;
        }
    }

    /** In the unit of the print; null where there are fewer than two ties. */
    private @Nullable Double mark(Cable cable, BigDecimal position) {
        List<RunRow> run = records.runOf(cable.id());
        List<SheathTie> ties = ties(cable, run);
        if (ties.size() < 2) {
            return null;
        }
        List<BigDecimal> positions = positions(cable, run);
        double at = position.doubleValue();
        int next = 1;
        while (next < ties.size() - 1 && place(positions, ties.get(next)) < at) {
            next++;
        }
        SheathTie one = ties.get(next - 1);
        SheathTie other = ties.get(next);
        double from = place(positions, one);
        double to = place(positions, other);
        double metres;
        if (to > from) {
            double slope = (other.mark().metres() - one.mark().metres()) / (to - from);
            metres = one.mark().metres() + slope * (at - from);
        } else {
            metres = other.mark().metres() + way(ties) * (at - to);
        }
        return metres * 1e6 / other.unit().micrometres();
    }

    /** Whether a print rises (1) or falls: by its first two ties that differ; where none does, it rises. */
    private static int way(List<SheathTie> ties) {
        for (int tie = 1; tie < ties.size(); tie++) {
            int rises = ties.get(tie).mark().compareTo(ties.get(tie - 1).mark());
            if (rises != 0) {
                return rises < 0 ? -1 : 1;
            }
        }
        return 1;
    }

    private static double place(List<BigDecimal> positions, SheathTie tie) {
        return positions.get(2 * tie.row() + (tie.out() ? 1 : 0)).doubleValue();
    }
}
