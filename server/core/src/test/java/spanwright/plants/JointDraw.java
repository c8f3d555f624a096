package spanwright.plants;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;

/** Draws splices, terminations and jumpers between free ends, in ranges rising and falling, circles too. */
final class JointDraw {

    private static final String IN_GLASS = "";

    private final PlantDraft draft;
    private final Chance chance;
    private final FactsDraw facts;
    private final Map<String, Set<Long>> usedByJob = new HashMap<>();

    JointDraw(PlantDraft draft, Chance chance) {
        this.draft = draft;
        this.chance = chance;
        this.facts = new FactsDraw(chance);
    }

    void draw(RecordsView soFar) {
        Sides all = new Sides(soFar, chance);
        draft.enclosures.forEach(this::loopBack);
        for (Enclosure enclosure : draft.enclosures) {
            List<Sides.Side> sides = all.in(enclosure.id());
            for (int tries = 3 * sides.size(); tries > 0 && sides.size() > 1; tries--) {
                Sides.Side one = chance.of(sides);
                Sides.Side other = chance.of(sides);
                if (!one.port() || !other.port()) {
                    add(all.joint(draft.next(RecordKind.JOINT), enclosure.id(), one, other, chance.in(15)));
                }
            }
        }
        draft.panels.forEach(this::jumpers);
    }

    private void add(JointKind type, int enclosure, EndRange a, EndRange b, JointFacts known) {
        add(new Joint(draft.next(RecordKind.JOINT), type, enclosure, a, b, known));
    }

    /** Adds a joint if all its ends are free, in the glass or within its job. */
    private void add(Joint joint) {
        Set<Long> keys = new HashSet<>();
        for (int index = 0; index < joint.count(); index++) {
            keys.add(joint.a().key(index));
            keys.add(joint.b().key(index));
        }
        Set<Long> used =
                usedByJob.computeIfAbsent(joint.planned() ? joint.plannedJob() : IN_GLASS, job -> new HashSet<>());
        if (keys.size() < 2 * joint.count() || keys.stream().anyMatch(used::contains)) {
            return;
        }
        used.addAll(keys);
        draft.add(joint);
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
        add(JointKind.SPLICE, enclosure, one(leg, 1), one(leg, 2), facts.splice(false));
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
                        facts.termination(false, false));
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
                facts.jumper());
    }
}
