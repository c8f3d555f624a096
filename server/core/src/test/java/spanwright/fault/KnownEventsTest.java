package spanwright.fault;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** Readings fitted to known joints, worked out by hand. */
class KnownEventsTest {

    private static final String PLANT = """
            cable F-1 1 over=1 : H1 1000 H2
            cable F-2 1 over=1 : H2 1000 H3
            cable F-3 1 over=1 : H3 1000 H4
            enclosure E1 H1 : F-1
            enclosure E2 H2 tray=2 : F-1 F-2
            enclosure E3 H3 tray=2 : F-2 F-3
            enclosure E4 H4 : F-3
            panel E1 P 1
            panel E4 P 1
            panel E4 Q 1
            term E1/P/1 = F-1 ahead 1 direct
            splice E2 : F-1 back 1 = F-2 ahead 1
            splice E3 : F-2 back 1 = F-3 ahead 1
            term E4/P/1 = F-3 back 1 direct
            jumper E4/P/1 = E4/Q/1 10
            """;

    @Test
    void between_the_port_and_an_event_glass_is_stretched_and_tray_glass_is_not() {
        // E2's joint is read at 1022: 1020 m of glass for 1000 m of sheath, then 2 m of tray.
        FaultText shot = FaultText.in(PLANT).event("E2", 1022);

        assertThat(shot.at("E1/P/1", 510)).isEqualTo("H1>H2 +500 -500 H1-H2 F-1:1@500 glass 510");
        assertThat(shot.at("E1/P/1", 1021)).isEqualTo("H2>H2 +0 -0 tray F-1:1@1000 glass 1021");
        assertThat(shot.at("E1/P/1", 1023.9)).isEqualTo("H2>H2 +0 -0 tray F-2:1@0 glass 1023.9");
        // Behind the last event the records' glass holds: 2 m of tray, then 1.01 m a meter.
        assertThat(shot.at("E1/P/1", 1024 + 505)).isEqualTo("H2>H3 +500 -500 H2-H3 F-2:1@500 glass 1529");
    }

    @Test
    void between_two_events_their_own_stretch_holds() {
        // From E2 at 1022 to E3 at 2046: 1024 - 4 of tray = 1020 m for 1000 m of sheath; before E2 1.02 as well.
        FaultText shot = FaultText.in(PLANT).event("E3", 2016).event("E2", 1022);

        // 994 - 4 = 990 m for 1000 m: half of it is 495 m behind 1024.
        assertThat(shot.at("E1/P/1", 1519)).isEqualTo("H2>H3 +500 -500 H2-H3 F-2:1@500 glass 1519");
        assertThat(shot.at("E1/P/1", 2018 + 1010 + 5)).isEqualTo("H4>H4 +0 -0 jumper glass 3033");
    }

    @Test
    void readings_of_events_hold_the_launch_fiber_and_the_index() {
        // Launch 100 m; index 1.4682 set, the glass's own 1.4682: as above, 100 m later.
        FaultText shot = FaultText.in(PLANT).launch(100).index(1.4682).event("E2", 1122);

        assertThat(shot.at("E1/P/1", 610)).isEqualTo("H1>H2 +500 -500 H1-H2 F-1:1@500 glass 510");
        // A wrong index on the instrument cancels between events: all readings are 1.4682 / 1.5 of the true ones.
        double wrong = 1.4682 / 1.5;
        FaultText other =
                FaultText.in(PLANT).index(1.5).event("E2", 1022 * wrong).event("E3", 2044 * wrong);
        assertThat(other.at("E1/P/1", 1533 * wrong)).isEqualTo("H2>H3 +500 -500 H2-H3 F-2:1@500 glass 1533");
    }

    @Test
    void a_jumper_between_events_is_stretched_with_the_rest() {
        // 3 x 1010 m and 10 m of jumper lie before E4/Q/1, and 4 x 2 m of tray; all but the trays is 1.01 times as
        // long.
        FaultText shot = FaultText.in(PLANT).event("E4", 8 + 3040 * 1.01);

        assertThat(shot.at("E1/P/1", 505 * 1.01)).startsWith("H1>H2 +500 ");
        // The jumper begins at 8 + 3030 x 1.01 = 3068.3 and ends 10.1 m on.
        assertThat(shot.at("E1/P/1", 3078.3)).isEqualTo("H4>H4 +0 -0 jumper glass 3078.3");
    }

    @Test
    void an_event_where_the_shot_begins_must_be_read_there() {
        assertThat(FaultText.in(PLANT).launch(50).event("E1", 50).at("E1/P/1", 555))
                .startsWith("H1>H2 +500 ");
        assertThat(FaultText.in(PLANT).launch(50).event("E1", 53).at("E1/P/1", 555))
                .startsWith("no: no glass lies between E1 and where the shot begins");
    }

    @Test
    void events_that_contradict_the_path_are_refused() {
        assertThat(FaultText.in(PLANT).event("E2", 2000).event("E3", 1000).at("E1/P/1", 555))
                .startsWith("no: the path comes to E3 and E2 in another order");
        assertThat(FaultText.in(PLANT).event("E2", 2).at("E1/P/1", 555))
                .startsWith("no: E2 is read at 2 m, within the launch fiber");
        assertThat(FaultText.in(PLANT).launch(500).event("E2", 400).at("E1/P/1", 555))
                .startsWith("no: E2 is read at 400 m, within the launch fiber");
        assertThat(FaultText.in(PLANT).event("E2", 1000).event("E3", 1004).at("E1/P/1", 555))
                .startsWith("no: the path comes to E2 and E3 in another order, or too near each other");
        assertThat(FaultText.in(PLANT).event("E2", 1012).event("E2", 1013).at("E1/P/1", 555))
                .startsWith("no: no glass lies between E2 and where E2 is");
    }

    @Test
    void an_enclosure_met_twice_is_the_joint_whose_reading_is_nearer() {
        FaultText ring = FaultText.in("""
                cable F-1 2 : H1 1000 H2
                cable F-2 2 : H2 500 H3
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 F-2
                enclosure E3 H3 : F-2
                panel E1 P 2
                term E1/P/1-2 = F-1 ahead 1-2 direct
                splice E2 : F-1 back 1-2 = F-2 ahead 1-2
                splice E3 : F-2 back 1 = F-2 back 2
                """);

        // E2 is 1000 m and 2000 m from the port. At 2020 it is the second: 2020 / 2000 of glass a meter.
        assertThat(ring.event("E2", 2020).at("E1/P/1", 1010 + 252.5))
                .isEqualTo("H2>H3 +250 -250 H2-H3 F-2:1@250 glass 1262.5");
    }

    @Test
    void an_event_behind_one_output_is_left_out_behind_the_others() {
        FaultText split = FaultText.in("""
                cable F-1 1 : H1 1000 H2
                cable D-1 1 : H2 500 H3
                cable D-2 1 : H2 500 H4
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1 D-1 D-2
                enclosure E3 H3 : D-1
                enclosure E4 H4 : D-2
                splitter E2 S1 1x2
                panel E1 P 1
                panel E3 T 1
                panel E4 T 1
                term E1/P/1 = F-1 ahead 1 direct
                splice E2 : F-1 back 1 = S1 in
                splice E2 : S1 out 1 = D-1 ahead 1
                splice E2 : S1 out 2 = D-2 ahead 1
                term E3/T/1 = D-1 back 1 direct
                term E4/T/1 = D-2 back 1 direct
                """);

        assertThat(split.event("E2", 1000).event("E4", 1550).at("E1/P/1", 1110)).isEqualTo("""
                H2>H3 +110 -390 H2-H3 D-1:1@110 glass 1110
                H2>H4 +100 -400 H2-H4 D-2:1@100 glass 1110""");
    }
}
