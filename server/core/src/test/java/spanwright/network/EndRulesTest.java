package spanwright.network;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.FiberRange;
import spanwright.plants.Drawing;
import spanwright.records.Refusal;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;

/** Each end is joined once, none to itself; a front takes a jumper or circuits' ends; what is in use stays. */
class EndRulesTest {

    private static final String PLANT = """
            cable F-1 12 : H1 100 H2 100 H3
            cable F-2 12 : H2 100 H3
            cable P-1 12 planned : H2 100 H3
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1 F-2 P-1
            enclosure E3 H3 : F-1 F-2 P-1
            splitter E2 S1 2x4
            panel E1 P 12
            panel E1 Q 12
            panel E3 P 12
            """;

    private static String refusal(String... lines) {
        return Drawing.refusals(PLANT + String.join("\n", lines)).stream()
                .map(EndRulesTest::text)
                .collect(Collectors.joining("\n"));
    }

    private static String text(Refusal refusal) {
        String earlier = refusal.earlier() == null
                ? ""
                : " [" + refusal.earlier().kind() + " " + refusal.earlier().id() + "]";
        return refusal.code() + ": " + refusal.sentence() + earlier;
    }

    @Test
    void an_end_is_joined_once() {
        assertThat(refusal(
                        "splice E2 : F-1 back 1-6 = F-2 ahead 6-1",
                        "splice E2 : F-1 ahead 1 = F-1 ahead 2",
                        "splice E2 : F-1 ahead 8-3 = F-2 ahead 3-8"))
                .isEqualTo("""
                        end-joined-twice: F-2 ahead 3 @ E2 is joined already, to F-1 back 4; each end is joined once \
                        [JOINT 1]""");
    }

    @Test
    void every_earlier_joint_that_a_row_clashes_with_is_named() {
        assertThat(refusal(
                        "splice E2 : F-1 back 1 = F-2 ahead 1",
                        "splice E2 : F-1 back 2 = S1 in",
                        "splice E2 : F-1 back 1-3 = S1 out 1-3"))
                .isEqualTo("""
                        end-joined-twice: F-1 back 1 @ E2 is joined already, to F-2 ahead 1; each end is joined once \
                        [JOINT 1]
                        end-joined-twice: F-1 back 2 @ E2 is joined already, to S1 in; each end is joined once \
                        [JOINT 2]""");
    }

    @Test
    void a_splitter_end_is_joined_once() {
        assertThat(refusal("splice E2 : F-1 back 1 = S1 in 2", "splice E2 : F-1 back 2 = S1 in 2"))
                .isEqualTo("""
                        end-joined-twice: S1 in 2 @ E2 is joined already, to F-1 back 1; each end is joined once \
                        [JOINT 1]""");
        assertThat(refusal("splice E2 : F-1 back 1-4 = S1 out 1-4", "splice E2 : F-2 ahead 1 = S1 out 4"))
                .startsWith("end-joined-twice: S1 out 4 @ E2 is joined already, to F-1 back 4;");
    }

    @Test
    void a_rear_takes_one_end() {
        assertThat(refusal("term E1/P/1-6 = F-1 ahead 1-6", "term E1/P/6-8 = F-1 ahead 7-9"))
                .isEqualTo("""
                        end-joined-twice: the rear of E1/P/6 is terminated already, to F-1 ahead 6; a rear takes one \
                        end [JOINT 1]""");
    }

    @Test
    void a_front_takes_one_jumper() {
        assertThat(refusal("jumper E1/P/1 = E1/Q/1", "jumper E1/Q/1 = E1/P/2")).isEqualTo("""
                        end-joined-twice: E1/Q/1 has a jumper already, to E1/P/1; a front takes one jumper [JOINT 1]""");
    }

    @Test
    void no_end_is_joined_to_itself_or_stands_on_both_sides() {
        assertThat(refusal("splice E2 : F-1 back 5 = F-1 back 5"))
                .isEqualTo("end-joined-to-itself: F-1 back 5 @ E2 is joined to itself; name two different ends");
        assertThat(refusal("jumper E1/P/1 = E1/P/1"))
                .isEqualTo("end-joined-to-itself: E1/P/1 is joined to itself; name two different ends");
        assertThat(refusal("splice E2 : F-1 back 1-4 = F-1 back 4-7"))
                .isEqualTo("end-joined-twice: F-1 back 4 @ E2 stands on both sides of one row; each end is joined"
                        + " once, so name two ranges that do not meet");
        assertThat(refusal("splice E2 : F-1 back 1-4 = F-1 back 5-8")).isEmpty();
        assertThat(refusal("splice E2 : F-1 back 5 = F-1 ahead 5")).isEmpty();
    }

    @Test
    void a_front_takes_a_jumper_or_circuits_not_both() {
        assertThat(refusal(
                        "circuit C-1 E1/P/1-2 E3/P/1-2",
                        "circuit C-2 E1/P/1 E3/P/1",
                        "circuit C-3 E1/P/3 E3/P/3 retired",
                        "jumper E1/P/3 = E1/Q/3",
                        "jumper E1/Q/4 = E1/P/1"))
                .isEqualTo("""
                        front-with-jumper-and-circuit: circuit C-1 ends on E1/P/1; a front takes a jumper or \
                        circuits' ends, not both [CIRCUIT 1]
                        front-with-jumper-and-circuit: circuit C-2 ends on E1/P/1; a front takes a jumper or \
                        circuits' ends, not both [CIRCUIT 2]""");
        assertThat(refusal(
                        "jumper E1/P/3 = E1/Q/3", "circuit C-1 E1/P/3 E3/P/3 retired", "circuit C-2 E1/P/2-3 E3/P/2-3"))
                .isEqualTo("""
                        front-with-jumper-and-circuit: E1/P/3 has a jumper, to E1/Q/3; a circuit ends on a front \
                        without one [JOINT 1]""");
        assertThat(refusal("jumper E1/P/3 = E1/Q/3", "circuit C-2 E3/P/1 E1/Q/3"))
                .startsWith("front-with-jumper-and-circuit: E1/Q/3 has a jumper, to E1/P/3;");
    }

    @Test
    void a_planned_joint_uses_its_ends_within_its_job_alone() {
        assertThat(refusal(
                        "splice E2 : F-1 back 1 = F-2 ahead 1",
                        "splice E2 : F-1 back 1-2 = F-2 ahead 3-4 trust=planned",
                        "splice E2 : F-1 back 2 = F-2 ahead 5 trust=planned job=J-1",
                        "splice E2 : F-1 back 2 = F-2 ahead 2"))
                .isEmpty();
        assertThat(refusal(
                        "splice E2 : F-1 back 1-2 = F-2 ahead 3-4 trust=planned",
                        "splice E2 : F-1 ahead 2 = F-2 ahead 4 trust=planned job=planned"))
                .isEqualTo("""
                        end-joined-twice: F-2 ahead 4 @ E2 is joined already within job planned, to F-1 back 2; each \
                        end is joined once [JOINT 1]""");
    }

    @Test
    void an_end_that_is_not_in_service_is_joined_once_too() {
        assertThat(refusal("splice E2 : F-1 back 1-3 = P-1 ahead 1-3", "splice E2 : P-1 ahead 4-3 = F-2 ahead 4-3"))
                .isEqualTo("""
                        end-joined-twice: P-1 ahead 3 @ E2 is joined already, to F-1 back 3; each end is joined once \
                        [JOINT 1]""");
        assertThat(refusal("splice E2 : F-1 back 1-3 = P-1 ahead 1-3", "splice E2 : P-1 ahead 4-5 = F-2 ahead 4-5"))
                .isEmpty();
        assertThat(refusal("splice E2 : F-1 back 1-3 = P-1 ahead 1-3", "splice E2 : F-1 back 1 = F-2 ahead 4"))
                .startsWith("end-joined-twice: F-1 back 1 @ E2 is joined already, to P-1 ahead 1;");
    }

    @Test
    void a_joint_may_change_on_its_own_ends() {
        Snapshot plant = Drawing.of(PLANT + """
                splice E2 : F-1 back 1-3 = F-2 ahead 1-3
                splice E2 : F-1 back 4 = P-1 ahead 4-4
                splice E2 : F-1 back 5-6 = F-2 ahead 5-6 trust=planned
                """);
        for (int id = 1; id <= 3; id++) {
            Joint joint = plant.records().joints().get(id);
            FiberRange numbers = joint.b().numbers();
            EndRange turned =
                    new EndRange(joint.b().leg(), new FiberRange(numbers.at(numbers.count() - 1), numbers.at(0)));
            SnapshotEditor editor = plant.edit();

            assertThat(editor.apply(Change.replace(
                            joint,
                            new Joint(joint.id(), joint.type(), joint.enclosure(), joint.a(), turned, joint.facts()))))
                    .isEmpty();
        }
    }

    @Test
    void an_end_is_free_again_once_its_joint_is_removed() {
        Snapshot plant = Drawing.of(PLANT + """
                splice E2 : F-1 back 1 = F-2 ahead 1
                splice E2 : F-1 back 2 = F-2 ahead 2 trust=planned
                splice E2 : F-1 back 3 = P-1 ahead 3
                """);
        SnapshotEditor editor = plant.edit();
        for (int id = 1; id <= 3; id++) {
            Joint joint = plant.records().joints().get(id);
            int again = editor.records().newIdentity(RecordKind.JOINT);
            Change anew =
                    Change.add(new Joint(again, joint.type(), joint.enclosure(), joint.a(), joint.b(), joint.facts()));

            assertThat(editor.apply(anew)).extracting(Refusal::code).containsExactly("end-joined-twice");
            assertThat(editor.apply(Change.remove(joint))).isEmpty();
            assertThat(editor.apply(anew)).isEmpty();
        }
        assertThat(editor.changes()).hasSize(6);
    }

    @Test
    void a_refused_change_is_not_applied() {
        Snapshot plant = Drawing.of(PLANT + "circuit C-1 E1/P/1 E3/P/1");
        Circuit circuit = plant.records().circuits().get(1);
        SnapshotEditor editor = plant.edit();
        Circuit twin = new Circuit(
                2,
                circuit.code(),
                null,
                null,
                3,
                1,
                circuit.wavelengths(),
                null,
                null,
                circuit.a(),
                circuit.z(),
                circuit.status());

        assertThat(editor.apply(Change.add(twin))).extracting(Refusal::code).containsExactly("code-twice");
        assertThat(editor.changes()).isEmpty();
        assertThat(editor.records().circuits().count()).isEqualTo(1);
        assertThat(List.copyOf(Described.of(editor.build(2).network())))
                .isEqualTo(List.copyOf(Described.of(plant.network())));
    }
}
