package spanwright.check;

import java.util.function.Consumer;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.FiberRange;
import spanwright.splicing.Panel;

/** Ports whose front is patched while nobody knows what is behind. */
final class PortRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        checked.records()
                .panels()
                .list()
                .forEach(panel -> checked.network()
                        .panelBlock(panel.id())
                        .ifPresent(block -> ports(checked, panel, block, found)));
    }

    private static void ports(Checked checked, Panel panel, Block block, Consumer<Finding> found) {
        Network network = checked.network();
        for (int port = 1; port <= block.count(); port++) {
            int rear = 2 * (block.firstPiece() + port - 1);
            boolean patched = network.joint(rear + 1) != 0;
            if (patched && network.joint(rear) == 0) {
                String name = JointText.port(
                        checked.records(), panel.id(), FiberRange.of(port).toString());
                found.accept(new Finding(
                        Severity.WARNING,
                        "jumper-without-rear",
                        "jumpers.csv",
                        name,
                        "The front of " + name + " bears a jumper, but nothing is recorded at its rear.",
                        "Record the termination at its rear, or remove the jumper."));
            }
        }
    }
}
