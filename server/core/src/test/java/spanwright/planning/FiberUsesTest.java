package spanwright.planning;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.network.Block;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.FiberRange;
import spanwright.plant.Pass;
import spanwright.plant.Trust;
import spanwright.plants.Drawing;
import spanwright.records.RecordsView;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

class FiberUsesTest {

    private static final LocalDate SEEN = LocalDate.of(2026, 3, 31);

    /** Fibers 1 to 8 of F-1 from port to port; they pass E2, whose tube is closed. */
    private static final String FEEDER = """
            structure H1 0 0
            structure H2 0.001 0
            structure H3 0.002 0
            cable F-1 8 : H1 100 H2 100 H3
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1
            enclosure E3 H3 : F-1
            panel E1 P 8
            panel E1 Q 8
            panel E3 P 8
            """;

    private static final String POSTED = FEEDER + """
            term E1/P/1-8 = F-1 ahead 1-8
            term E3/P/1-8 = F-1 back 1-8
            """;

    @Test
    void glass_with_a_circuit_is_in_use_whatever_is_flagged() {
        Snapshot snapshot = flagged(Drawing.of(POSTED + "circuit C-1 E1/P/1 E3/P/1"), Flag.DEAD, 1, null, null);

        assertThat(uses(snapshot, 0)).startsWith("in_use", "spare");
    }

    @Test
    void a_jumper_without_a_circuit_says_that_somebody_uses_it() {
        assertThat(uses(Drawing.of(POSTED + "jumper E1/P/2 = E1/Q/2"), 0))
                .containsSubsequence("spare", "jumpered", "spare");
    }

    @Test
    void flags_hold_between_their_enclosures_and_the_gravest_counts() {
        Snapshot snapshot = Drawing.of(POSTED);
        snapshot = flagged(snapshot, Flag.RESERVED, 1, null, null);
        snapshot = flagged(snapshot, Flag.SUSPECT, 1, null, null);
        snapshot = flagged(snapshot, Flag.LEASED, 2, "E2", "E3");
        snapshot = flagged(snapshot, Flag.DEAD, 3, "E1", "E2");

        assertThat(uses(snapshot, 0)).startsWith("suspect", "spare", "dead", "spare");
        assertThat(uses(snapshot, 1)).startsWith("suspect", "leased", "spare", "spare");
        assertThat(new FiberUses(snapshot).flags(1, 1, 0, 2))
                .extracting(FiberFlag::flag)
                .containsExactly(Flag.SUSPECT, Flag.RESERVED);
    }

    @Test
    void glass_is_verified_where_every_joint_is() {
        Snapshot snapshot = Drawing.of(FEEDER + """
                term E1/P/1 = F-1 ahead 1 trust=verified
                term E3/P/1 = F-1 back 1 trust=verified
                term E1/P/2 = F-1 ahead 2 trust=verified
                term E3/P/2 = F-1 back 2
                term E1/P/3 = F-1 ahead 3 trust=unknown
                term E3/P/3 = F-1 back 3
                """);

        assertThat(uses(snapshot, 0)).startsWith("spare_verified", "spare", "spare_unknown");
    }

    @Test
    void an_end_of_which_nothing_is_recorded_is_not_known() {
        Snapshot snapshot = Drawing.of(FEEDER + "term E1/P/1-8 = F-1 ahead 1-8 trust=verified");
        assertThat(uses(snapshot, 0)).containsOnly("spare_unknown");

        snapshot = ended(snapshot, "E3", LegKind.BACK, 2, 1, EndCondition.CAPPED, Trust.VERIFIED);
        snapshot = ended(snapshot, "E3", LegKind.BACK, 2, 2, EndCondition.CAPPED, Trust.POSTED);
        snapshot = ended(snapshot, "E3", LegKind.BACK, 2, 3, EndCondition.UNKNOWN, Trust.POSTED);
        snapshot = ended(snapshot, "E3", LegKind.BACK, 2, 4, EndCondition.STORED, Trust.UNKNOWN);

        assertThat(uses(snapshot, 0)).startsWith("spare_verified", "spare", "spare_unknown", "spare_unknown");
        Block section = snapshot.network().sectionsOf(1).get(0);
        assertThat(new FiberUses(snapshot).of(section, 1).verifiedOn()).isNull();
    }

    @Test
    void uncut_glass_in_an_opened_tube_is_not_known_until_somebody_says_that_it_passes() {
        Snapshot snapshot = Drawing.of(POSTED);
        Pass closed = pass(snapshot, "E2");
        Pass opened = new Pass(
                closed.id(), closed.enclosure(), closed.cable(), closed.runRow(), List.of(), List.of(FiberRange.of(1)));
        snapshot = with(snapshot, Change.replace(closed, opened));
        assertThat(uses(snapshot, 0)).containsOnly("spare_unknown");

        snapshot = ended(snapshot, "E2", LegKind.BACK, 1, 1, EndCondition.THROUGH, Trust.POSTED);
        snapshot = ended(snapshot, "E2", LegKind.AHEAD, 1, 1, EndCondition.THROUGH, Trust.POSTED);

        assertThat(uses(snapshot, 0)).startsWith("spare", "spare_unknown");
    }

    private static List<String> uses(Snapshot snapshot, int section) {
        FiberUses uses = new FiberUses(snapshot);
        Block block = snapshot.network().sectionsOf(1).get(section);
        List<String> words = new ArrayList<>();
        for (int fiber = 1; fiber <= block.count(); fiber++) {
            words.add(uses.of(block, fiber).use().word());
        }
        return words;
    }

    private static Snapshot flagged(
            Snapshot snapshot, Flag flag, int fiber, @Nullable String from, @Nullable String to) {
        RecordsView records = snapshot.records();
        int id = records.fiberFlags().count() + 1;
        return with(
                snapshot,
                Change.add(new FiberFlag(
                        id, 1, FiberRange.of(fiber), flag, id(records, from), id(records, to), null, null, null)));
    }

    private static @Nullable Integer id(RecordsView records, @Nullable String enclosure) {
        return enclosure == null
                ? null
                : records.enclosures().find(enclosure).orElseThrow().id();
    }

    private static Snapshot ended(
            Snapshot snapshot,
            String enclosure,
            LegKind side,
            int seq,
            int fiber,
            EndCondition condition,
            Trust trust) {
        RecordsView records = snapshot.records();
        int row = records.runOf(1).get(seq).id();
        EndRange ends = new EndRange(new Leg(side, row), FiberRange.of(fiber));
        int at = records.enclosures().find(enclosure).orElseThrow().id();
        return with(
                snapshot, Change.add(new EndState(records.endStates().count() + 1, at, ends, condition, trust, SEEN)));
    }

    private static Pass pass(Snapshot snapshot, String enclosure) {
        int at = snapshot.records().enclosures().find(enclosure).orElseThrow().id();
        return snapshot.records()
                .passes()
                .list()
                .filter(pass -> pass.enclosure() == at)
                .findFirst()
                .orElseThrow();
    }

    private static Snapshot with(Snapshot snapshot, Change change) {
        SnapshotEditor editor = snapshot.edit();
        editor.replay(change);
        return editor.build(snapshot.records().posting() + 1);
    }
}
