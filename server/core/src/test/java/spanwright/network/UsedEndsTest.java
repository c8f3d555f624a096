package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import spanwright.journal.Change;
import spanwright.plant.FiberRange;
import spanwright.plant.RunRow;
import spanwright.plants.Drawing;
import spanwright.records.Refusal;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Ends that joints and circuits use are not taken away. */
class UsedEndsTest {

    private static final Snapshot PLANT = Drawing.of("""
            cable F-1 6 : H1 100 H2 100 H3
            cable F-2 6 : H2 100 H4
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1 F-2
            enclosure E3 H3 : F-1
            splitter E2 S1 2x4
            panel E1 P 6
            panel E1 Q 6
            panel E1 R 6
            splice E2 : F-1 back 1 = F-2 ahead 1
            splice E2 : F-1 ahead 5-6 = S1 out 4-3 trust=planned
            splice E2 : F-1 ahead 4 = S1 in 2
            term E1/P/3-4 = F-1 ahead 1-2
            jumper E1/P/6 = E1/Q/5
            circuit C-1 E1/R/4-5 E1/Q/2-1
            """);

    private final SnapshotEditor editor = PLANT.edit();

    private List<String> refused(Change change) {
        return editor.apply(change).stream()
                .map(refusal -> refusal.code() + ": " + refusal.sentence())
                .toList();
    }

    private static Panel panel(String code) {
        return PLANT.records()
                .findPanel(PLANT.records().enclosures().find("E1").orElseThrow().id(), code)
                .orElseThrow();
    }

    private static Change ports(Panel panel, int ports) {
        return Change.replace(panel, new Panel(panel.id(), panel.enclosure(), panel.code(), ports, panel.connector()));
    }

    @Test
    void a_cable_leaves_an_enclosure_once_its_fibers_there_are_free() {
        assertThat(refused(Change.remove(PLANT.records().passes().get(2))))
                .containsExactly(
                        "end-in-use: F-1 back 1 @ E2 is joined; free it first",
                        "end-in-use: F-1 ahead 4 @ E2 is joined; free it first",
                        "end-in-use: F-1 ahead 5 @ E2 is joined; free it first");
        for (int joint = 1; joint <= 3; joint++) {
            assertThat(refused(Change.remove(PLANT.records().joints().get(joint))))
                    .isEmpty();
        }
        assertThat(refused(Change.remove(PLANT.records().passes().get(2)))).isEmpty();
    }

    @Test
    void a_splitter_keeps_the_ends_that_are_joined() {
        Splitter splitter = PLANT.records().splitters().get(1);

        assertThat(refused(Change.replace(splitter, new Splitter(1, splitter.enclosure(), "S1", 1, 3, null, Map.of()))))
                .containsExactly(
                        "end-in-use: S1 in 2 @ E2 is joined; free it first",
                        "end-in-use: S1 out 4 @ E2 is joined; free it first");
        assertThat(refused(Change.remove(splitter)))
                .containsExactly(
                        "end-in-use: S1 in 2 @ E2 is joined; free it first",
                        "end-in-use: S1 out 3 @ E2 is joined; free it first");
        assertThat(refused(Change.replace(splitter, new Splitter(1, splitter.enclosure(), "S1", 2, 8, null, Map.of()))))
                .isEmpty();
    }

    @Test
    void a_panel_keeps_the_ports_that_are_used() {
        assertThat(refused(ports(panel("P"), 3)))
                .containsExactly(
                        "end-in-use: E1/P/4 rear is joined; free it first",
                        "end-in-use: E1/P/6 is joined; free it first");
        assertThat(refused(ports(panel("Q"), 4))).containsExactly("end-in-use: E1/Q/5 is joined; free it first");
        assertThat(refused(ports(panel("R"), 4)))
                .containsExactly("end-in-use: circuit C-1 ends on port 5; free it first");
        assertThat(refused(ports(panel("R"), 5))).isEmpty();
        assertThat(refused(ports(panel("P"), 8))).isEmpty();
    }

    @Test
    void a_run_does_not_end_before_glass_that_is_joined() {
        Joint splice = PLANT.records().joints().get(1);
        RunRow last = PLANT.records().runOf(1).get(2);
        Joint ahead = new Joint(
                99,
                splice.type(),
                splice.enclosure(),
                new EndRange(
                        new Leg(LegKind.AHEAD, PLANT.records().runOf(1).get(1).id()), FiberRange.of(1)),
                new EndRange(
                        new Leg(LegKind.AHEAD, PLANT.records().runOf(2).get(0).id()), FiberRange.of(2)),
                splice.facts());
        assertThat(refused(Change.add(ahead))).isEmpty();
        assertThat(refused(Change.remove(PLANT.records().passesOf(1).get(2)))).isEmpty();
        assertThat(refused(Change.remove(last))).isEmpty();

        assertThat(editor.finish())
                .extracting(Refusal::code, Refusal::sentence)
                .contains(tuple(
                        "end-in-use",
                        "the run of cable F-1 would end at row 1, but glass beyond it is joined; free it first"));
    }
}
