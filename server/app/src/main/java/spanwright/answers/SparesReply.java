package spanwright.answers;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Unanswerable.Kind;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.network.Network;
import spanwright.planning.Avoided;
import spanwright.planning.SpareOption;
import spanwright.planning.SpareOptions;
import spanwright.planning.SpareQuestion;
import spanwright.planning.SpareRun;
import spanwright.plant.Structure;

/**
 * Spare fibers from one structure to another.
 *
 * @param view the view that it was asked of
 * @param options the best first
 */
public record SparesReply(View view, List<SpareOption> options) {

    /**
     * What is asked, as a person writes it.
     *
     * @param from code of a structure
     * @param to code of another
     * @param fibers how many
     * @param sameTube whether in one tube throughout each cable
     * @param avoid code of a circuit whose path is not to be met, or null
     */
    public record Asked(
            String from,
            String to,
            int fibers,
            boolean sameTube,
            @Nullable String avoid) {}

    /** Answers a question. */
    public static SparesReply of(View view, Asked asked) {
        References references = new References(view.records());
        Structure from = references.namedStructure(asked.from(), "from");
        Structure to = references.namedStructure(asked.to(), "to");
        if (from.id() == to.id()) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST, "Both ends are " + from.code() + "; name two different structures.", "to");
        }
        if (asked.fibers() < 1 || asked.fibers() > SpareQuestion.MOST_FIBERS) {
            throw new Unanswerable(
                    Kind.BAD_REQUEST,
                    "The number of fibers is a whole number from 1 to " + SpareQuestion.MOST_FIBERS + ", not "
                            + asked.fibers() + ".",
                    "fibers");
        }
        Avoided avoided = asked.avoid() == null
                ? Avoided.NOTHING
                : Avoided.of(view.snapshot(), references.namedCircuit(asked.avoid(), "avoid_circuit"));
        return new SparesReply(
                view,
                new SpareOptions(view.snapshot())
                        .list(new SpareQuestion(from.id(), to.id(), asked.fibers(), asked.sameTube(), avoided)));
    }

    /** The glass of a path in order, as {@code F-1:229}; a fiber that goes on in its own cable stands once. */
    public List<String> glass(SpareRun run) {
        List<String> glass = new ArrayList<>();
        for (int entered : run.entered()) {
            Block block = view.network().blockOf(entered >> 1);
            String fiber = view.cable(block.owner()) + ":" + block.number(entered >> 1);
            if (glass.isEmpty() || !glass.get(glass.size() - 1).equals(fiber)) {
                glass.add(fiber);
            }
        }
        return glass;
    }

    /** Where a path begins and ends: a port, if it has one, else the end of a fiber. */
    public List<String> ends(SpareRun run) {
        return List.of(end(run.first()), end(run.last()));
    }

    private String end(int end) {
        int peer = view.network().peer(end);
        boolean port = peer != Network.NONE && view.network().blockOf(peer >> 1).kind() == BlockKind.PANEL;
        // A port is written as its front is: E1/P/1.
        return view.names().anywhere(view.network().keyOf(port ? peer ^ 1 : end));
    }

    /** The codes of the enclosures in which new splices are made. */
    public List<String> opened(SpareOption option) {
        return option.opened().stream().map(view::enclosure).toList();
    }

    /** The codes of the spans, in order. */
    public List<String> spans(SpareOption option) {
        return option.spans().stream()
                .map(span -> view.records().spans().get(span).code())
                .toList();
    }
}
