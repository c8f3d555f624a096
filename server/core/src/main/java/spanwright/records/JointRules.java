package spanwright.records;

import java.util.EnumSet;
import java.util.Set;
import spanwright.plant.Enclosure;
import spanwright.quantity.Loss;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;

/** The rules of splices, terminations, jumpers and end states, but for ends joined twice. */
final class JointRules {

    private static final Set<LegKind> GLASS = EnumSet.of(LegKind.BACK, LegKind.AHEAD, LegKind.IN, LegKind.OUT);
    /** The least mean of both ways that a splice can have. */
    private static final Loss LEAST = new Loss(-100_000);

    private final RecordsView view;
    private final LegRules legs;

    JointRules(RecordsView view, LegRules legs) {
        this.view = view;
        this.legs = legs;
    }

    void ask(Joint joint, Refusals refusals) {
        switch (joint.type()) {
            case SPLICE -> askSplice(joint, refusals);
            case TERMINATION -> askTermination(joint, refusals);
            case JUMPER -> askJumper(joint, refusals);
        }
        Loss loss = joint.facts().loss();
        if (loss != null && loss.compareTo(LEAST) < 0) {
            refusals.add(
                    "loss-out-of-range",
                    "loss_db",
                    loss + " is out of range; the mean of both ways is -0.1 dB or above");
        }
    }

    private void askSplice(Joint joint, Refusals refusals) {
        askGlass(joint, joint.a().leg().kind(), "a", refusals);
        askGlass(joint, joint.b().leg().kind(), "b", refusals);
        legs.ask(joint.enclosure(), joint.a(), "a", refusals);
        legs.ask(joint.enclosure(), joint.b(), "b", refusals);
    }

    private static void askGlass(Joint joint, LegKind kind, String column, Refusals refusals) {
        if (!GLASS.contains(kind)) {
            refusals.add(
                    "not-spliced",
                    column,
                    "a port is not spliced; "
                            + (joint.type() == JointKind.SPLICE
                                    ? "enter a termination or a jumper"
                                    : "name a cable's fibers or a splitter's input or outputs"));
        }
    }

    private void askTermination(Joint joint, Refusals refusals) {
        if (joint.a().leg().kind() != LegKind.REAR) {
            refusals.add("not-terminated", "ports", "a termination ends at the rears of a panel's ports; name them");
        }
        askGlass(joint, joint.b().leg().kind(), "end", refusals);
        legs.ask(joint.enclosure(), joint.a(), "ports", refusals);
        legs.ask(joint.enclosure(), joint.b(), "end", refusals);
        if (joint.facts().method() == null && joint.facts().loss() != null) {
            refusals.add(
                    "loss-without-splice",
                    "loss_db",
                    "loss_db on a direct termination, which has no splice; leave it blank, or make the method pigtail");
        }
    }

    private void askJumper(Joint joint, Refusals refusals) {
        if (joint.a().leg().kind() != LegKind.FRONT || joint.b().leg().kind() != LegKind.FRONT) {
            refusals.add("not-patched", null, "a jumper joins the fronts of ports; name two");
            return;
        }
        Panel a = view.panels().get(joint.a().leg().owner());
        Panel b = view.panels().get(joint.b().leg().owner());
        legs.ask(a.enclosure(), joint.a(), "a", refusals);
        legs.ask(b.enclosure(), joint.b(), "b", refusals);
        Enclosure one = view.enclosures().get(a.enclosure());
        Enclosure other = view.enclosures().get(b.enclosure());
        if (one.structure() != other.structure()) {
            refusals.add(
                    "jumper-between-structures",
                    "b",
                    "a jumper joins ports of one structure, but " + one.code() + " is at "
                            + Names.structure(view, one.structure()) + " and " + other.code() + " at "
                            + Names.structure(view, other.structure()) + "; name two ports of one structure");
        }
    }

    void ask(EndState state, Refusals refusals) {
        askGlass(state, refusals);
        legs.ask(state.enclosure(), state.ends(), "end", refusals);
    }

    private static void askGlass(EndState state, Refusals refusals) {
        if (!GLASS.contains(state.ends().leg().kind())) {
            refusals.add("not-an-end", "end", "a port has no state; name a cable's fibers or a splitter's ends");
        }
    }
}
