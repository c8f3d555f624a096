package spanwright.check;

import java.time.LocalDate;
import java.util.List;
import java.util.stream.IntStream;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plant.FiberRange;
import spanwright.plant.RunRow;
import spanwright.records.RecordsView;

/**
 * What the rules look at.
 *
 * @param snapshot the records and their network
 * @param today the day by which what is due is judged, in the records' own zone
 */
record Checked(Snapshot snapshot, LocalDate today) {

    RecordsView records() {
        return snapshot.records();
    }

    Network network() {
        return snapshot.network();
    }

    String cable(int id) {
        return records().cables().get(id).code();
    }

    String structure(RunRow row) {
        return records().structures().get(row.structure()).code();
    }

    Enclosure enclosure(int id) {
        return records().enclosures().get(id);
    }

    /** {@code 1-12, 25}: rising numbers as ranges. */
    static String ranges(IntStream rising) {
        return String.join(
                ", ",
                FiberRange.listOf(rising).stream().map(FiberRange::toString).toList());
    }

    static String ranges(List<Integer> rising) {
        return ranges(rising.stream().mapToInt(Integer::intValue));
    }
}
