package spanwright.trace;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.plant.LengthBasis;
import spanwright.plants.Drawing;

class TracerTest {

    @Test
    void from_a_port_over_a_cable_to_a_port() {
        Snapshot plant = Drawing.of("""
                cable F-1 12 over=1 : H1 1000 H2
                enclosure E1 H1 tray=1.5 : F-1
                enclosure E2 H2 tray=2 : F-1
                panel E1 P 12
                panel E2 P 12
                term E1/P/1-12 = F-1 ahead 1-12
                term E2/P/1-12 = F-1 back 1-12 direct
                circuit C-1 E2/P/3 E1/P/3
                """);

        String path = "(E1/P/3) | E1/P/3 ~ F-1 ahead 3 | F-1:3 E1>E2 1000/1013.5 | (E2/P/3)";
        assertThat(TraceText.ofPort(plant, "E1/P/3")).isEqualTo("E1/P/3 >> " + path + " >> E2/P/3 complete C-1");
        assertThat(TraceText.ofFiber(plant, "F-1", 3)).isEqualTo("E1/P/3 >> " + path + " >> E2/P/3 complete C-1");
        assertThat(TraceText.ofCircuit(plant, "C-1"))
                .isEqualTo("E2/P/3 >> (E2/P/3) | F-1:3 E2>E1 1000/1013.5 | F-1 ahead 3 ~ E1/P/3 | (E1/P/3)"
                        + " >> E1/P/3 complete C-1");
    }

    @Test
    void through_an_enclosure_uncut_and_on_over_a_splice_to_a_fiber_end() {
        Snapshot plant = Drawing.of("""
                cable F-1 12 over=2 : H1 100 H2 +10 100 H3
                cable D-7 6 : H3 50 H4
                enclosure E1 H1 tray=1 : F-1
                enclosure E2 H2 tray=1 : F-1/1(1-3)
                enclosure E3 H3 tray=1 : F-1 D-7
                enclosure E4 H4 : D-7
                panel E1 P 12
                term E1/P/1-12 = F-1 ahead 1-12
                splice E3 : F-1 back 4-6 = D-7 ahead 3-1 mechanical
                """);

        assertThat(TraceText.ofPort(plant, "E1/P/4"))
                .isEqualTo("E1/P/4 >> (E1/P/4) | E1/P/4 ~ F-1 ahead 4 | F-1:4 E1>E2 105/108.1 | through E2"
                        + " | F-1:4 E2>E3 105/108.1 | F-1 back 4 ~ D-7 ahead 3 | D-7:3 E3>E4 50/51 >> D-7 back 3 @ E4");
        assertThat(TraceText.ofPort(plant, "E1/P/3"))
                .isEqualTo("E1/P/3 >> (E1/P/3) | E1/P/3 ~ F-1 ahead 3 | F-1:3 E1>E2 105/109.1 >> F-1 back 3 @ E2");
        assertThat(TraceText.ofFiber(plant, "F-1", 3)).isEqualTo("""
                        E1/P/3 >> (E1/P/3) | E1/P/3 ~ F-1 ahead 3 | F-1:3 E1>E2 105/109.1 >> F-1 back 3 @ E2
                        F-1 ahead 3 @ E2 >> F-1:3 E2>E3 105/109.1 >> F-1 back 3 @ E3""");
    }

    @Test
    void an_end_without_an_enclosure_is_bare() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2 100 H3
                enclosure E2 H2 tray=1 : F-1
                enclosure E3 H3 planned : F-1
                """);

        assertThat(TraceText.ofFiber(plant, "F-1", 1))
                .isEqualTo("F-1 start 1 >> F-1:1 ->E2 100/100 | through E2 | F-1:1 E2>- 100/100 >> F-1 end 1");
    }

    @Test
    void a_planned_cable_is_not_walked() {
        Snapshot plant = Drawing.of("cable F-1 2 planned : H1 100 H2");

        assertThat(TraceText.ofFiber(plant, "F-1", 1)).isEmpty();
    }

    @Test
    void a_port_with_nothing_at_its_rear_ends_there() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1
                panel E1 P 2
                panel E1 Q 1
                jumper E1/P/2 = E1/Q/1
                """);

        assertThat(TraceText.ofPort(plant, "E1/P/1")).isEqualTo("E1/P/1 >> (E1/P/1) >> E1/P/1 rear");
        assertThat(TraceText.ofPort(plant, "E1/P/2")).isEqualTo("E1/P/2 >> (E1/P/2) >> E1/P/2 rear");
    }

    @Test
    void a_port_not_in_service_leads_nowhere() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1 planned
                enclosure E2 H1
                panel E1 P 1
                panel E2 P 1
                circuit C-1 E1/P/1 E2/P/1
                circuit C-2 E2/P/1 E1/P/1
                """);

        assertThat(TraceText.ofPort(plant, "E1/P/1")).isEqualTo("E1/P/1 >>  >> E1/P/1");
        assertThat(TraceText.ofCircuit(plant, "C-1")).isEqualTo("E1/P/1 >>  >> E1/P/1");
        assertThat(TraceText.ofCircuit(plant, "C-2")).isEqualTo("E2/P/1 >> (E2/P/1) >> E2/P/1 rear");
    }

    @Test
    void jumpers_join_fronts_and_a_jumper_on_the_first_front_is_not_followed() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2
                cable D-1 2 : H1 200 H3
                enclosure E1 H1 : F-1 D-1
                panel E1 P 2
                panel E1 Q 2
                term E1/P/1 = F-1 ahead 1 direct
                term E1/Q/2 = D-1 ahead 1 direct
                jumper E1/P/1 = E1/Q/2 4.5
                """);

        assertThat(TraceText.ofFiber(plant, "F-1", 1))
                .isEqualTo("D-1 end 1 >> D-1:1 ->E1 200/200 | (E1/Q/2) | E1/Q/2 -4.5- E1/P/1 | (E1/P/1)"
                        + " | F-1:1 E1>- 100/100 >> F-1 end 1");
        assertThat(TraceText.ofPort(plant, "E1/P/1")).isEqualTo("E1/P/1 >> (E1/P/1) | F-1:1 E1>- 100/100 >> F-1 end 1");
    }

    @Test
    void behind_a_splitters_input_there_is_a_path_an_output_those_that_lead_nowhere_too() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2
                cable D-1 2 : H2 50 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-1
                enclosure E3 H3 : D-1
                panel E1 P 1
                panel E3 P 2
                splitter E2 S1 1x4
                term E1/P/1 = F-1 ahead 1 direct
                splice E2 : F-1 back 1 = S1 in
                splice E2 : S1 out 3-2 = D-1 ahead 1-2
                term E3/P/1-2 = D-1 back 1-2
                circuit C-1 E1/P/1 E3/P/1
                circuit C-2 E3/P/2 E1/P/1
                circuit C-0 E3/P/2 E1/P/1
                circuit C-9 E3/P/2 E1/P/1 retired
                """);

        String feeder = "(E1/P/1) | F-1:1 E1>E2 100/100 | F-1 back 1 ~ S1 in | ";
        String third = "S1 in>out 3 | S1 out 3 ~ D-1 ahead 1 | D-1:1 E2>E3 50/50 | D-1 back 1 ~ E3/P/1 | (E3/P/1)";
        String second = "S1 in>out 2 | S1 out 2 ~ D-1 ahead 2 | D-1:2 E2>E3 50/50 | D-1 back 2 ~ E3/P/2 | (E3/P/2)";
        assertThat(TraceText.ofPort(plant, "E1/P/1"))
                .isEqualTo("E1/P/1 >> " + feeder + "S1 in>out 1 >> S1 out 1 @ E2\n"
                        + "E1/P/1 >> " + feeder + second + " >> E3/P/2 complete C-0,C-2\n"
                        + "E1/P/1 >> " + feeder + third + " >> E3/P/1 complete C-1\n"
                        + "E1/P/1 >> " + feeder + "S1 in>out 4 >> S1 out 4 @ E2");
        assertThat(TraceText.ofFiber(plant, "D-1", 1))
                .isEqualTo("E1/P/1 >> " + feeder + third + " >> E3/P/1 complete C-1");
        assertThat(TraceText.ofFiber(plant, "F-1", 1)).isEqualTo(TraceText.ofPort(plant, "E1/P/1"));
        assertThat(TraceText.ofCircuit(plant, "C-1"))
                .isEqualTo("E1/P/1 >> " + feeder + third + " >> E3/P/1 complete C-1");
        assertThat(TraceText.ofCircuit(plant, "C-2"))
                .isEqualTo("E3/P/2 >> (E3/P/2) | E3/P/2 ~ D-1 back 2 | D-1:2 E3>E2 50/50 | D-1 ahead 2 ~ S1 out 2"
                        + " | S1 out 2>in | S1 in ~ F-1 back 1 | F-1:1 E2>E1 100/100 | (E1/P/1)"
                        + " >> E1/P/1 complete C-0,C-2");
        assertThat(TraceText.ofCircuit(plant, "C-9")).endsWith("complete C-0,C-2,C-9");
    }

    @Test
    void an_output_leads_to_the_inputs_only() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1
                panel E1 P 9
                splitter E1 S1 1x2
                splitter E1 S2 2x4
                term E1/P/1 = S1 out 1 direct
                term E1/P/2 = S1 out 2 direct
                splice E1 : S1 in = S2 out 3
                term E1/P/4 = S2 in 2 direct
                circuit C-1 E1/P/1 E1/P/4
                circuit C-2 E1/P/1 E1/P/2
                circuit C-3 E1/P/4 E1/P/9
                """);

        String up = "E1/P/1 >> (E1/P/1) | S1 out 1>in | S1 in ~ S2 out 3";
        assertThat(TraceText.ofPort(plant, "E1/P/1"))
                .isEqualTo(up + " | S2 out 3>in >> S2 in @ E1\n" + up
                        + " | S2 out 3>in 2 | (E1/P/4) >> E1/P/4 complete C-1");
        assertThat(TraceText.ofCircuit(plant, "C-1"))
                .isEqualTo(up + " | S2 out 3>in 2 | (E1/P/4) >> E1/P/4 complete C-1");
        assertThat(TraceText.ofCircuit(plant, "C-2")).isEqualTo(up + " >> S2 out 3 @ E1");
        assertThat(TraceText.ofCircuit(plant, "C-3")).isEqualTo("E1/P/4 >> (E1/P/4) >> S2 in 2 @ E1");
    }

    @Test
    void splitters_in_a_row_give_every_output_in_order() {
        Snapshot plant = Drawing.of("""
                enclosure E1 H1
                panel E1 P 1
                splitter E1 S1 1x2
                splitter E1 S2 1x2
                term E1/P/1 = S1 in direct
                splice E1 : S1 out 1 = S2 in
                """);

        String start = "E1/P/1 >> (E1/P/1) | S1 in>out ";
        assertThat(TraceText.ofPort(plant, "E1/P/1"))
                .isEqualTo(start + "1 | S1 out 1 ~ S2 in | S2 in>out 1 >> S2 out 1 @ E1\n"
                        + start + "1 | S1 out 1 ~ S2 in | S2 in>out 2 >> S2 out 2 @ E1\n"
                        + start + "2 >> S1 out 2 @ E1");
    }

    @Test
    void a_circuit_on_two_fibers_has_a_path_a_fiber_in_its_order() {
        Snapshot plant = Drawing.of("""
                cable F-1 4 : H1 100 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                panel E1 P 4
                panel E2 P 4
                term E1/P/1-4 = F-1 ahead 1-4 direct
                term E2/P/1-3 = F-1 back 4-2 direct
                circuit C-1 E1/P/1-2 E2/P/4-3
                """);

        assertThat(TraceText.ofCircuit(plant, "C-1")).isEqualTo("""
                        E1/P/1 >> (E1/P/1) | F-1:1 E1>E2 100/100 >> F-1 back 1 @ E2
                        E1/P/2 >> (E1/P/2) | F-1:2 E1>E2 100/100 | (E2/P/3) >> E2/P/3 complete C-1""");
        assertThat(TraceText.ofPort(plant, "E1/P/3"))
                .isEqualTo("E1/P/3 >> (E1/P/3) | F-1:3 E1>E2 100/100 | (E2/P/2) >> E2/P/2 complete");
        assertThat(TraceText.ofPort(plant, "E2/P/3")).endsWith(">> E1/P/2 complete C-1");
    }

    @Test
    void a_circuit_whose_path_leads_elsewhere_is_not_complete() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                panel E1 P 2
                panel E2 P 2
                term E1/P/1-2 = F-1 ahead 1-2 direct
                term E2/P/1-2 = F-1 back 2-1 direct
                circuit C-1 E1/P/1 E2/P/1
                """);

        assertThat(TraceText.ofCircuit(plant, "C-1"))
                .isEqualTo("E1/P/1 >> (E1/P/1) | F-1:1 E1>E2 100/100 | (E2/P/2) >> E2/P/2");
    }

    @Test
    void a_ring_leaves_its_enclosure_ahead_from_its_first_row_and_back_from_its_last() {
        Snapshot plant = Drawing.of("""
                cable R-1 2 : H1 100 H2 100 H3 150 H1
                enclosure E1 H1 tray=1 : R-1/0 R-1/3
                enclosure E2 H2 tray=1 : R-1
                panel E1 P 2
                term E1/P/1 = R-1 ahead 1 direct
                term E1/P/2 = R-1 back 1 direct
                """);

        assertThat(TraceText.ofPort(plant, "E1/P/2"))
                .isEqualTo("E1/P/2 >> (E1/P/2) | R-1:1 E1>E2 250/251 | through E2 | R-1:1 E2>E1 100/101 | (E1/P/1)"
                        + " >> E1/P/1 complete");
    }

    @Test
    void a_circle_of_splices_begins_at_the_piece_asked_for() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2 100 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                enclosure E3 H3 : F-1
                splice E1 : F-1 ahead 1 = F-1 ahead 2
                splice E3 : F-1 back 1 = F-1 back 2
                """);

        assertThat(TraceText.ofFiber(plant, "F-1", 1))
                .isEqualTo("circle: F-1:1 E1>E2 100/100 | through E2 | F-1:1 E2>E3 100/100 | F-1 back 1 ~ F-1 back 2"
                        + " | F-1:2 E3>E2 100/100 | through E2 | F-1:2 E2>E1 100/100 | F-1 ahead 2 ~ F-1 ahead 1");
        assertThat(TraceText.ofFiber(plant, "F-1", 2)).startsWith("circle: F-1:2 E1>E2 100/100 | through E2");
    }

    @Test
    void a_circle_over_a_jumper_begins_at_the_port_asked_for() {
        Snapshot plant = Drawing.of("""
                cable R-1 1 : H1 100 H2 100 H3 100 H1
                enclosure E1 H1 : R-1/0 R-1/3
                panel E1 P 2
                term E1/P/1 = R-1 ahead 1 direct
                term E1/P/2 = R-1 back 1 direct
                jumper E1/P/2 = E1/P/1
                """);

        assertThat(TraceText.ofPort(plant, "E1/P/1"))
                .isEqualTo("circle: (E1/P/1) | R-1:1 E1>E1 300/300 | (E1/P/2) | E1/P/2 -3- E1/P/1");
    }

    @Test
    void an_output_that_leads_back_to_its_own_splitter_is_a_circle() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 100 H2 100 H1
                enclosure E1 H1 : F-1/0 F-1/2
                panel E1 P 2
                splitter E1 S1 1x4
                splice E1 : S1 in = F-1 ahead 1
                splice E1 : S1 out 3 = F-1 back 1
                term E1/P/1 = S1 out 1 direct
                """);

        String crossed = "(E1/P/1) | S1 out 1>in | S1 in ~ F-1 ahead 1 | F-1:1 E1>E1 200/200 | F-1 back 1 ~ S1 out 3";
        assertThat(TraceText.ofPort(plant, "E1/P/1")).isEqualTo("circle: " + crossed);
        assertThat(TraceText.ofFiber(plant, "F-1", 1))
                .isEqualTo("circle: F-1:1 E1>E1 200/200 | F-1 back 1 ~ S1 out 3 | S1 out 3>in | S1 in ~ F-1 ahead 1");
    }

    @Test
    void a_planned_joint_is_walked_only_as_if_its_job_were_built() {
        String drawing = """
                cable F-1 2 : H1 100 H2
                cable D-1 2 : H2 100 H3
                enclosure E2 H2 : F-1 D-1
                splice E2 : F-1 back 1 = D-1 ahead 1 trust=planned job=J-1
                """;

        assertThat(TraceText.ofFiber(Drawing.of(drawing), "F-1", 1))
                .isEqualTo("F-1 start 1 >> F-1:1 ->E2 100/100 >> F-1 back 1 @ E2");
        assertThat(TraceText.ofFiber(Drawing.asIf("J-1", drawing), "F-1", 1))
                .isEqualTo("F-1 start 1 >> F-1:1 ->E2 100/100 | F-1 back 1 ~ D-1 ahead 1 | D-1:1 E2>- 100/100"
                        + " >> D-1 end 1");
    }

    @Test
    void few_lays_kept_at_hand_change_nothing() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 100 H2
                cable D-1 1 : H2 50 H3
                enclosure E2 H2 : F-1 D-1
                splice E2 : F-1 back 1 = D-1 ahead 1
                """);
        int cable = plant.records().cables().find("F-1").orElseThrow().id();

        assertThat(TraceText.lines(new Tracer(plant, new Walker(plant.network()), 1).ofFiber(cable, 1)))
                .isEqualTo(TraceText.ofFiber(plant, "F-1", 1));
    }

    @Test
    void a_fiber_cut_and_joined_to_itself_is_one_path_though_two_pieces() {
        Snapshot plant = Drawing.of("""
                cable F-1 2 : H1 100 H2 100 H3
                enclosure E2 H2 : F-1
                splice E2 : F-1 back 1 = F-1 ahead 1
                """);

        assertThat(TraceText.ofFiber(plant, "F-1", 1))
                .isEqualTo("F-1 start 1 >> F-1:1 ->E2 100/100 | F-1 back 1 ~ F-1 ahead 1 | F-1:1 E2>- 100/100"
                        + " >> F-1 end 1");
    }

    @Test
    void a_path_is_governed_by_the_circuit_asked_for_else_by_the_first_on_it() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 100 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                panel E1 P 1
                panel E2 P 1
                term E1/P/1 = F-1 ahead 1
                term E2/P/1 = F-1 back 1 direct
                circuit C-2 E1/P/1 E2/P/1
                circuit C-1 E1/P/1 E2/P/1
                """);
        Tracer tracer = new Tracer(plant);
        Circuit asked = plant.records().circuits().find("C-2").orElseThrow();
        Path path = tracer.fromPort(1, 1).get(0);

        assertThat(tracer.ofCircuit(asked).get(0).governing()).contains(asked);
        assertThat(path.governing().map(Circuit::code)).contains("C-1");
        assertThat(path.list(Splice.class).get(0).pigtail()).isTrue();
        assertThat(path.list(Fiber.class).get(0).lengthBasis()).isEqualTo(LengthBasis.NOMINAL);
        assertThat(path.list(Fiber.class).get(0).lengthSource()).startsWith("Route lengths");
        assertThat(path.list(Fiber.class).get(0).tubeColor()).isEqualTo("blue");
        assertThat(path.list(Connector.class).get(0).directTermination()).isNull();
        assertThat(path.list(Connector.class).get(1).directTermination()).isNotNull();
        assertThatThrownBy(() -> new Path(List.of(), List.of(), false, false, List.of(), null))
                .hasMessageContaining("two ends");
    }
}
