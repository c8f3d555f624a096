package spanwright.plants;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Trust;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** Draws splices, terminations and jumpers between free ends, in ranges rising and falling, circles too. */
final class JointDraw {

    private static final String IN_GLASS = "";

    private final PlantDraft draft;
    private final Chance chance;
    private final Map<String, Set<Long>> usedByJob = new HashMap<>();

    JointDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
    }

    /** A side with its count of ends. */
    private record Side(Leg leg, int count) {

        boolean port() {
            return leg.kind() == LegKind.REAR;
        }

        boolean splitter() {
            return leg.kind() == LegKind.IN || leg.kind() == LegKind.OUT;
        }
    }

    void draw() {
        draft.enclosures.forEach(this::loopBack);
        for (Enclosure enclosure : draft.enclosures) {
            List<Side> sides = sidesIn(enclosure.id());
            for (int tries = 3 * sides.size(); tries > 0 && sides.size() > 1; tries--) {
                join(enclosure.id(), chance.of(sides), chance.of(sides), chance.in(15));
            }
        }
        draft.panels.forEach(this::jumpers);
    }

    private List<Side> sidesIn(int enclosure) {
        List<Side> sides = new ArrayList<>();
        for (Pass pass : draft.passes) {
            RunRow row = draft.row(pass);
            if (pass.enclosure() == enclosure) {
                int fibers = draft.fibers(draft.cable(pass.cable()));
                if (!draft.firstRow(row)) {
                    sides.add(new Side(new Leg(LegKind.BACK, row.id()), fibers));
                }
                if (!draft.lastRow(row)) {
                    sides.add(new Side(new Leg(LegKind.AHEAD, row.id()), fibers));
                }
            }
        }
        for (Splitter splitter : draft.splitters) {
            if (splitter.enclosure() == enclosure) {
                sides.add(new Side(new Leg(LegKind.IN, splitter.id()), splitter.inputs()));
                sides.add(new Side(new Leg(LegKind.OUT, splitter.id()), splitter.outputs()));
            }
        }
        for (Panel panel : draft.panels) {
            if (panel.enclosure() == enclosure) {
                sides.add(new Side(new Leg(LegKind.REAR, panel.id()), panel.ports()));
            }
        }
        return sides;
    }

    private void join(int enclosure, Side one, Side other, boolean planned) {
        if (one.port() && other.port()) {
            return;
        }
        Side a = other.port() ? other : one;
        Side b = other.port() ? one : other;
        boolean singles = a.leg().kind() == LegKind.IN || b.leg().kind() == LegKind.IN;
        int count = singles ? 1 : chance.between(1, Math.min(8, Math.min(a.count(), b.count())));
        JointFacts facts = a.port() ? termination(planned, b.splitter()) : splice(planned);
        add(a.port() ? JointKind.TERMINATION : JointKind.SPLICE, enclosure, ends(a, count), ends(b, count), facts);
    }

    private EndRange ends(Side side, int count) {
        int first = chance.between(1, side.count() - count + 1);
        int last = first + count - 1;
        return new EndRange(side.leg(), chance.in(70) ? new FiberRange(first, last) : new FiberRange(last, first));
    }

    private Trust trust(boolean planned) {
        return planned
                ? Trust.PLANNED
                : chance.of(Trust.POSTED, Trust.POSTED, Trust.VERIFIED, Trust.REPORTED, Trust.UNKNOWN);
    }

    private @Nullable String job() {
        return chance.of("J-1", "J-2", "");
    }

    private JointFacts splice(boolean planned) {
        String job = planned || chance.in(20) ? job() : "";
        return new JointFacts(
                chance.perhaps(60, () -> "T" + chance.between(1, 4)),
                chance.of(SpliceMethod.FUSION, SpliceMethod.FUSION, SpliceMethod.MECHANICAL),
                chance.perhaps(40, () -> chance.decibels(-0.05, 0.3)),
                trust(planned),
                chance.perhaps(30, chance::day),
                chance.perhaps(30, chance::day),
                chance.perhaps(30, () -> "Ida B."),
                chance.perhaps(5, chance::day),
                "".equals(job) ? null : job,
                null);
    }

    private JointFacts termination(boolean planned, boolean splitter) {
        String job = planned ? job() : "";
        boolean direct = splitter || chance.in(30);
        return new JointFacts(
                null,
                direct ? null : SpliceMethod.FUSION,
                direct ? null : chance.perhaps(30, () -> chance.decibels(0, 0.3)),
                trust(planned),
                chance.perhaps(30, chance::day),
                null,
                null,
                null,
                "".equals(job) ? null : job,
                null);
    }

    /** Adds a joint if all its ends are free, in the glass or within its job. */
    private boolean add(JointKind type, int enclosure, EndRange a, EndRange b, JointFacts facts) {
        Joint joint = new Joint(draft.next(RecordKind.JOINT), type, enclosure, a, b, facts);
        Set<Long> keys = new HashSet<>();
        for (int index = 0; index < joint.count(); index++) {
            keys.add(a.key(index));
            keys.add(b.key(index));
        }
        Set<Long> used =
                usedByJob.computeIfAbsent(joint.planned() ? joint.plannedJob() : IN_GLASS, job -> new HashSet<>());
        if (keys.size() < 2 * joint.count() || keys.stream().anyMatch(used::contains)) {
            return false;
        }
        used.addAll(keys);
        draft.add(joint);
        return true;
    }

    /** Two fibers of one cable spliced to each other at two enclosures: a circle where nothing else cuts them. */
    private void loopBack(Enclosure enclosure) {
        List<Pass> here = draft.passes.stream()
                .filter(pass -> pass.enclosure() == enclosure.id() && draft.fibers(draft.cable(pass.cable())) > 1)
                .toList();
        if (here.isEmpty() || chance.in(50)) {
            return;
        }
        Pass near = chance.of(here);
        List<Pass> there = draft.passes.stream()
                .filter(pass -> pass.cable() == near.cable()
                        && draft.row(pass).seq() > draft.row(near).seq())
                .toList();
        if (!there.isEmpty()) {
            Pass far = chance.of(there);
            splicePair(far.enclosure(), new Leg(LegKind.BACK, far.runRow()));
            Leg ahead = new Leg(LegKind.AHEAD, near.runRow());
            if (chance.in(50)) {
                splicePair(near.enclosure(), ahead);
            } else {
                jumperPair(near.enclosure(), ahead);
            }
        }
    }

    private void splicePair(int enclosure, Leg leg) {
        add(JointKind.SPLICE, enclosure, one(leg, 1), one(leg, 2), splice(false));
    }

    private static EndRange one(Leg leg, int number) {
        return new EndRange(leg, FiberRange.of(number));
    }

    private void jumperPair(int enclosure, Leg leg) {
        for (Panel panel : draft.panels) {
            if (panel.enclosure() == enclosure && panel.ports() > 1) {
                Leg rear = new Leg(LegKind.REAR, panel.id());
                FiberRange both = new FiberRange(1, 2);
                add(
                        JointKind.TERMINATION,
                        enclosure,
                        new EndRange(rear, both),
                        new EndRange(leg, both),
                        termination(false, false));
                jumper(panel, 1, panel, 2);
                return;
            }
        }
    }

    private void jumpers(Panel panel) {
        for (int port = 1; port <= panel.ports(); port++) {
            if (chance.in(20)) {
                Panel other = chance.of(draft.panels);
                int structure = draft.enclosure(panel.enclosure()).structure();
                if (draft.enclosure(other.enclosure()).structure() == structure) {
                    jumper(panel, port, other, chance.between(1, other.ports()));
                }
            }
        }
    }

    private void jumper(Panel a, int portA, Panel b, int portB) {
        add(
                JointKind.JUMPER,
                a.enclosure(),
                one(new Leg(LegKind.FRONT, a.id()), portA),
                one(new Leg(LegKind.FRONT, b.id()), portB),
                new JointFacts(null, null, null, Trust.POSTED, null, null, null, null, null, chance.metres(1, 20)));
    }
}
