package spanwright.plants;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsView;
import spanwright.splicing.Direction;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Measurement;
import spanwright.splicing.Panel;
import spanwright.splicing.PlanningValue;

/** Draws what lives on the glass and what is said of it: circuits, end states, measurements, flags, planning values. */
final class ServiceDraw {

    private final PlantDraft draft;
    private final Chance chance;
    private final Set<Long> jumpered = new HashSet<>();
    private final Set<Long> joined = new HashSet<>();

    ServiceDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
    }

    /** Draws all; circuits lie on the paths that the glass has from front to front, and some where no path is. */
    void draw(RecordsView soFar) {
        for (Joint joint : draft.joints) {
            for (int index = 0; index < joint.count() && !joint.planned(); index++) {
                Set<Long> ends = joint.type() == JointKind.JUMPER ? jumpered : joined;
                ends.add(joint.a().key(index));
                ends.add(joint.b().key(index));
            }
        }
        draft.passes.forEach(this::endState);
        draft.passes.forEach(this::measurement);
        draft.cables.forEach(cable -> flag(cable.id()));
        circuits(new PlainGlass(soFar));
        planningValues();
    }

    private void endState(Pass pass) {
        RunRow row = draft.row(pass);
        Leg leg = new Leg(draft.lastRow(row) ? LegKind.BACK : LegKind.AHEAD, row.id());
        int fiber = chance.between(1, draft.fibers(draft.cable(pass.cable())));
        if (chance.in(30) && !joined.contains(leg.key(fiber))) {
            draft.add(new EndState(
                    draft.next(RecordKind.END_STATE),
                    pass.enclosure(),
                    new EndRange(leg, FiberRange.of(fiber)),
                    chance.of(EndCondition.values()),
                    chance.of(Trust.POSTED, Trust.VERIFIED, Trust.UNKNOWN),
                    chance.perhaps(40, chance::day)));
        }
    }

    private void measurement(Pass pass) {
        RunRow row = draft.row(pass);
        String cable = draft.cable(pass.cable()).code();
        int fiber = chance.between(1, draft.fibers(draft.cable(pass.cable())));
        String side = draft.lastRow(row) ? " back " : " ahead ";
        if (chance.in(30)) {
            draft.add(new Measurement(
                    draft.next(RecordKind.MEASUREMENT),
                    chance.in(50)
                            ? cable + ":" + fiber
                            : cable + side + fiber + " @ "
                                    + draft.enclosure(pass.enclosure()).code(),
                    Wavelength.ofNanometres(chance.of(1310, 1550)),
                    chance.perhaps(60, () -> chance.of(Direction.values())),
                    chance.decibels(0.01, 0.4),
                    chance.perhaps(60, chance::day),
                    chance.perhaps(60, () -> "Ida B."),
                    chance.perhaps(30, () -> "shot " + fiber + ".sor")));
        }
    }

    private void flag(int cable) {
        List<Pass> passes =
                draft.passes.stream().filter(pass -> pass.cable() == cable).toList();
        if (!chance.in(25)) {
            return;
        }
        int fibers = draft.fibers(draft.cable(cable));
        int first = chance.between(1, fibers);
        boolean whole = passes.size() < 2 || chance.in(50);
        draft.add(new FiberFlag(
                draft.next(RecordKind.FIBER_FLAG),
                cable,
                new FiberRange(first, chance.between(first, fibers)),
                chance.of(Flag.values()),
                whole ? null : Integer.valueOf(passes.get(0).enclosure()),
                whole ? null : Integer.valueOf(passes.get(1).enclosure()),
                chance.perhaps(30, () -> "Lowland Power"),
                chance.perhaps(30, () -> "held for \"phase 2\", east"),
                chance.perhaps(40, chance::day)));
    }

    private void circuits(PlainGlass glass) {
        for (long end : glass.ends()) {
            if (EndKey.kind(end) == LegKind.FRONT && glass.peer(end) == null && chance.in(60)) {
                List<Long> fronts = frontsFrom(glass, end);
                if (!fronts.isEmpty()) {
                    long far = chance.of(fronts);
                    circuit(one(end), one(far));
                    if (chance.in(50)) {
                        circuit(one(far), one(end));
                    }
                }
            }
        }
        for (int more = draft.panels.size(); more > 1; more--) {
            anywhere();
        }
    }

    /** The fronts where a path from a front ends, beyond splitters too. */
    private List<Long> frontsFrom(PlainGlass glass, long front) {
        List<Long> fronts = new ArrayList<>();
        List<Long> starts = new ArrayList<>(List.of(front));
        Set<Long> seen = new HashSet<>();
        while (!starts.isEmpty()) {
            long start = starts.remove(starts.size() - 1);
            List<Long> walk = glass.walk(start);
            long last = walk.get(walk.size() - 1);
            long out = glass.across(last);
            if (out == PlainGlass.NO_END && seen.add(last)) {
                starts.addAll(otherSide(glass, last));
            } else if (out != PlainGlass.NO_END && EndKey.kind(out) == LegKind.FRONT && out != front) {
                fronts.add(out);
            }
        }
        return fronts;
    }

    private static List<Long> otherSide(PlainGlass glass, long terminal) {
        LegKind beyond = EndKey.kind(terminal) == LegKind.IN ? LegKind.OUT : LegKind.IN;
        return glass.ends().stream()
                .filter(end -> EndKey.kind(end) == beyond && EndKey.owner(end) == EndKey.owner(terminal))
                .map(glass::peer)
                .flatMap(Stream::ofNullable)
                .toList();
    }

    private static PortRange one(long front) {
        return new PortRange(EndKey.owner(front), FiberRange.of(EndKey.number(front)));
    }

    private void anywhere() {
        Panel a = chance.of(draft.panels);
        Panel z = chance.of(draft.panels);
        int count = a.id() == z.id() ? 1 : Math.min(2, Math.min(a.ports(), z.ports()));
        if (a.id() == z.id() && a.ports() < 2) {
            return;
        }
        FiberRange falling = new FiberRange(z.ports(), z.ports() - count + 1);
        circuit(new PortRange(a.id(), new FiberRange(1, count)), new PortRange(z.id(), falling));
    }

    private void circuit(PortRange a, PortRange z) {
        int id = draft.next(RecordKind.CIRCUIT);
        CircuitStatus status =
                chance.of(CircuitStatus.WORKING, CircuitStatus.WORKING, CircuitStatus.PLANNED, CircuitStatus.RETIRED);
        if (status != CircuitStatus.RETIRED && (takesJumper(a) || takesJumper(z))) {
            return;
        }
        draft.add(new Circuit(
                id,
                "C-" + (1000 - 7 * id),
                chance.perhaps(50, () -> "internet"),
                chance.perhaps(50, () -> "Customer, \"A\" " + id),
                chance.between(1, 5),
                chance.between(0, 40),
                chance.in(50)
                        ? List.of(Wavelength.ofNanometres(1310))
                        : List.of(Wavelength.ofNanometres(1550), Wavelength.ofNanometres(1310)),
                chance.perhaps(60, () -> chance.of("B+", "28.5")),
                chance.perhaps(30, () -> "G" + chance.between(1, 4)),
                a,
                z,
                status));
    }

    private boolean takesJumper(PortRange ports) {
        for (int index = 0; index < ports.ports().count(); index++) {
            if (jumpered.contains(
                    EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().at(index)))) {
                return true;
            }
        }
        return false;
    }

    private void planningValues() {
        if (chance.in(50)) {
            draft.add(new PlanningValue(
                    draft.next(RecordKind.PLANNING_VALUE),
                    "splice.fusion",
                    chance.decibels(0.03, 0.1),
                    chance.perhaps(50, () -> chance.decibels(0.1, 0.3)),
                    chance.perhaps(50, () -> chance.decibels(0.01, 0.05)),
                    chance.perhaps(50, () -> "own records, 2024")));
        }
    }
}
