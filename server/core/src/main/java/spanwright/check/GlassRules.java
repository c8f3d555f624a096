package spanwright.check;

import java.util.function.Consumer;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.network.PathIndex;
import spanwright.splicing.Splitter;

/** Glass that leads nowhere sensible: circles of joints, splitters that nothing feeds. */
final class GlassRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        circles(checked, found);
        checked.records()
                .splitters()
                .list()
                .forEach(splitter -> checked.network()
                        .splitterBlock(splitter.id())
                        .ifPresent(block -> unfed(checked, splitter, block, found)));
    }

    private static void circles(Checked checked, Consumer<Finding> found) {
        PathIndex paths = checked.network().paths();
        for (int path = 0; path < paths.limit(); path++) {
            if (paths.exists(path) && paths.circle(path)) {
                String piece = piece(checked, paths.firstEnd(path) >> 1);
                found.accept(new Finding(
                        Severity.ERROR,
                        "circle-of-joints",
                        "splices.csv",
                        piece,
                        "The glass of " + piece + " is joined in a circle of " + paths.length(path) + " pieces.",
                        "One of its joints is recorded wrongly: trace " + piece + " and look at each."));
            }
        }
    }

    private static String piece(Checked checked, int piece) {
        Block block = checked.network().blockOf(piece);
        String number = Integer.toString(piece - block.firstPiece() + 1);
        return block.kind() == BlockKind.SECTION
                ? checked.cable(block.owner()) + ":" + number
                : JointText.port(checked.records(), block.owner(), number);
    }

    private static void unfed(Checked checked, Splitter splitter, Block block, Consumer<Finding> found) {
        int fed = joined(checked.network(), block.firstPiece(), splitter.inputs());
        int used = joined(checked.network(), block.firstPiece() + splitter.inputs(), splitter.outputs());
        if (fed == 0 && used > 0) {
            String enclosure = checked.enclosure(splitter.enclosure()).code();
            found.accept(new Finding(
                    Severity.WARNING,
                    "splitter-not-fed",
                    "splitters.csv",
                    enclosure + "/" + splitter.code(),
                    "Nothing is joined to an input of " + splitter.code() + " @ " + enclosure + ", but to " + used
                            + " of its outputs.",
                    "Record the splice or termination of its input."));
        }
    }

    private static int joined(Network network, int firstPiece, int count) {
        int joined = 0;
        for (int piece = firstPiece; piece < firstPiece + count; piece++) {
            joined += network.joint(2 * piece) == 0 ? 0 : 1;
        }
        return joined;
    }
}
