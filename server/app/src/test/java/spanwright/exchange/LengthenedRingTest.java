package spanwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanwright.exchange.RowChange.Action;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/** A ring is in one enclosure with its first and its last row; made longer, that row is the last no more. */
class LengthenedRingTest {

    private static final Map<String, String> FILES = Map.of(
            "structures.csv", "structure,kind,lon,lat\nA,hut,0,0\nB,pole,0.01,0\nC,pole,0.01,0.01\nD,pole,0,0.01\n",
            "spans.csv", "span,from,to,placement\nAB,A,B,aerial\nBC,B,C,aerial\nCA,C,A,aerial\nAD,A,D,aerial\n",
            "cable_types.csv", "cable_type,fibers,fibers_per_tube,fiber_type\nF12,12,12,G.652.D\n",
            "cables.csv", "cable,cable_type\nF-1,F12\n",
            "cable_runs.csv", "cable,seq,structure\nF-1,0,A\nF-1,1,B\nF-1,2,C\nF-1,3,A\n",
            "enclosures.csv", "enclosure,structure,kind\nE1,A,frame\nE2,A,frame\n",
            "enclosure_cables.csv", "enclosure,cable,seq\nE1,F-1,0\nE1,F-1,3\n");

    private static final RowChange LONGER = new RowChange(
            Action.ADD, "cable_runs", Map.of(), Map.of("cable", "F-1", "seq", "4", "structure", "D", "span", "AD"));
    private static final RowChange OUT = new RowChange(
            Action.REMOVE, "enclosure_cables", Map.of("enclosure", "E1", "cable", "F-1", "seq", "3"), Map.of());

    private static SnapshotEditor ring() {
        Map<String, byte[]> bytes = new LinkedHashMap<>();
        FILES.forEach((name, text) -> bytes.put(name, text.getBytes(UTF_8)));
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(new FolderBytes(bytes, "nothing"), editor)).isEmpty();
        return editor.build(1).edit();
    }

    private static List<String> faults(RowChange... changes) {
        return PostingRows.enter(ring(), List.of(changes)).stream()
                .map(fault -> String.valueOf(fault.text()))
                .toList();
    }

    @Test
    void is_refused_while_the_old_last_row_is_in_the_enclosure() {
        assertThat(faults(LONGER))
                .singleElement()
                .asString()
                .contains("cable F-1 is in enclosure E1 already; only its first and its last row may both be there");
    }

    @Test
    void is_entered_once_that_row_is_taken_out_of_it() {
        assertThat(faults(OUT, LONGER)).isEmpty();
    }

    @Test
    void by_a_folder_is_refused_too() {
        Map<String, byte[]> more = Map.of("cable_runs.csv", "cable,seq,structure,span\nF-1,4,D,AD\n".getBytes(UTF_8));
        List<Fault> faults = new ArrayList<>(FolderLoad.load(new FolderBytes(more, "nothing"), ring()));
        assertThat(faults).isNotEmpty();
    }
}
