package spanwright.network;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.stream.IntStream;
import spanwright.journal.RecordKind;
import spanwright.records.RecordsView;
import spanwright.records.Relation;

/** A state as lines of text, so that two states can be compared and a difference be read. */
public final class RecordsText {

    private RecordsText() {}

    /** Every record, every relation, and every path as the keys of its ends in order (either way round the same). */
    public static List<String> of(Snapshot snapshot) {
        List<String> lines = new ArrayList<>();
        RecordsView records = snapshot.records();
        for (RecordKind kind : RecordKind.values()) {
            lines.add(kind + " " + records.count(kind));
            IntStream.range(0, records.limit(kind))
                    .mapToObj(id -> records.record(kind, id))
                    .filter(Objects::nonNull)
                    .forEach(record -> lines.add(record.toString()));
        }
        records.plannedJobs()
                .forEach(job -> lines.add(
                        job + " " + records.plannedJoints(job).stream().sorted().toList()));
        for (Relation relation : Relation.values()) {
            for (int owner = 1; owner < 100; owner++) {
                int[] owned = records.owned(relation, owner);
                if (owned.length > 0) {
                    lines.add(relation + " " + owner + " "
                            + IntStream.of(owned).sorted().boxed().toList());
                }
            }
        }
        lines.addAll(paths(snapshot.network()));
        return lines;
    }

    private static List<String> paths(Network network) {
        List<String> lines = new ArrayList<>();
        for (int piece = 0; piece < network.pieces(); piece++) {
            if (network.alive(piece)) {
                lines.add(walk(network, piece));
            }
        }
        return lines.stream().sorted().toList();
    }

    private static String walk(Network network, int piece) {
        int path = network.paths().pathOf(piece);
        int joint = network.joint(2 * piece);
        int other = network.joint(2 * piece + 1);
        List<Long> keys = new ArrayList<>();
        for (int index = 0; index < network.paths().length(path); index++) {
            int end = network.paths().end(path, index);
            keys.add(Math.max(network.keyOf(end), network.keyOf(end ^ 1)));
        }
        return network.keyOf(2 * piece) + " joints " + joint + " " + other + " path "
                + keys.stream().sorted().toList();
    }
}
