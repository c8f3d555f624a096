package spanwright.records;

import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.plant.FiberRange;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** The rules of what names fibers, outputs or ports by number: there are as many. */
final class FiberRules {

    private FiberRules() {}

    static void ask(RecordsView view, FiberFlag flag, Refusals refusals) {
        askFibers(view, flag.cable(), flag.fibers(), refusals);
        askThere(view, flag, flag.from(), "from", refusals);
        askThere(view, flag, flag.to(), "to", refusals);
    }

    private static void askThere(
            RecordsView view, FiberFlag flag, @Nullable Integer enclosure, String column, Refusals refusals) {
        if (enclosure != null
                && view.passes()
                        .owned(Relation.CABLE_PASSES, flag.cable())
                        .noneMatch(pass -> pass.enclosure() == enclosure)) {
            refusals.add(
                    "cable-not-there",
                    column,
                    "cable " + Names.cable(view, flag.cable()) + " is not in enclosure "
                            + Names.enclosure(view, enclosure) + "; name one that it is in, or leave it blank");
        }
    }

    static void ask(RecordsView view, FiberCount count, Refusals refusals) {
        askFibers(view, count.cable(), count.fibers(), refusals);
        if (count.fibers().count() != count.numbers().count()) {
            refusals.add(
                    "sides-unlike",
                    "numbers",
                    "there are " + count.fibers().count() + " fibers and "
                            + count.numbers().count() + " numbers; both have the same count");
        }
    }

    private static void askFibers(RecordsView view, int cable, FiberRange fibers, Refusals refusals) {
        int most = view.cableTypes().get(view.cables().get(cable).cableType()).fibers();
        if (fibers.first() > most || fibers.last() > most) {
            refusals.add(
                    "number-above-count",
                    "fibers",
                    fibers + " is too large; the fibers of cable " + Names.cable(view, cable) + " are 1 to " + most);
        }
    }

    static void ask(Splitter splitter, Refusals refusals) {
        splitter.outputLosses().forEach((output, loss) -> {
            if (output < 1 || output > splitter.outputs()) {
                refusals.add(
                        "number-above-count",
                        "output",
                        "output " + output + " is out of range; the outputs of splitter " + splitter.code()
                                + " are 1 to " + splitter.outputs());
            }
        });
    }

    static void ask(RecordsView view, Circuit circuit, Refusals refusals) {
        askPorts(view, circuit.a(), "a", refusals);
        askPorts(view, circuit.z(), "z", refusals);
    }

    private static void askPorts(RecordsView view, PortRange ports, String column, Refusals refusals) {
        Panel panel = view.panels().get(ports.panel());
        if (ports.ports().first() > panel.ports() || ports.ports().last() > panel.ports()) {
            refusals.add(
                    "number-above-count",
                    column,
                    ports.ports() + " is too large; the ports of panel " + panel.code() + " are 1 to " + panel.ports());
        }
    }
}
