package spanwright.fault;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import spanwright.plant.Position;
import spanwright.splicing.LegKind;

/** Places worked out by hand. */
class FaultFinderTest {

    /**
     * The marks of the worked example: positions 0 and 20, 1049.126 and 1080, 2120 and 2130 m; E1, E2, E3 at 0, 1064.563
     * and 2130 m. Fiber 1 goes through E2 uncut, fiber 2 is cut there.
     */
    private static final String LINE = """
            structure H1 0 0
            structure H2 0.01 0
            structure H3 0.02 0
            cable F-1 2 over=1 : H1 +20 1000 H2 +30 1000 H3 +10
            mark F-1 0 - 5000
            mark F-1 1 - 6060
            mark F-1 2 7100
            enclosure E1 H1 : F-1
            enclosure E2 H2 tray=1.5 : F-1
            enclosure E3 H3 tray=2 : F-1
            panel E1 P 2
            panel E3 P 2
            term E1/P/1-2 = F-1 ahead 1-2 direct
            term E3/P/1-2 = F-1 back 1-2 direct
            splice E2 : F-1 back 2 = F-1 ahead 2
            """;

    @Test
    void a_reading_is_meters_of_glass_where_no_index_is_told() {
        // 525.2 / 1.01 = 520 m of sheath, 500 beyond where it leaves the coil at H1; 1049.126 - 520 short of H2.
        assertThat(FaultText.in(LINE).at("E1/P/1", 525.2))
                .isEqualTo("H1>H2 +500 -529.126 H1-H2 F-1:1@520 mark 5500 m white glass 525.2");
        FaultPlace place = FaultText.in(LINE).place("E1/P/1", 525.2);
        assertThat(place.where().position().lon()).isCloseTo(0.01 * 500 / 1029.126214, within(1e-9));
        assertThat(place.where().position().lat()).isCloseTo(0, within(1e-9));
    }

    @Test
    void from_the_other_end_before_and_after_change_sides() {
        // 2 m in the tray at E3, then 2130 - 520 = 1610 m of sheath.
        assertThat(FaultText.in(LINE).at("E3/P/1", 2 + 1610 * 1.01))
                .isEqualTo("H2>H1 +529.126 -500 H1-H2 F-1:1@520 mark 5500 m white glass 1628.1");
    }

    @Test
    void in_a_coil_both_lengths_are_within_the_coil() {
        assertThat(FaultText.in(LINE).at("E1/P/1", 1060 * 1.01))
                .isEqualTo("H2>H2 +10.874 -20 slack F-1:1@1060 mark 6040 m white coil H2 glass 1070.6");
        assertThat(FaultText.in(LINE).at("E3/P/1", 2 + 1070 * 1.01))
                .isEqualTo("H2>H2 +20 -10.874 slack F-1:1@1060 mark 6040 m white coil H2 glass 1082.7");
        assertThat(FaultText.in(LINE).at("E1/P/1", 10.1))
                .isEqualTo("H1>H1 +10 -10 slack F-1:1@10 mark 4990 m white coil H1 glass 10.1");
    }

    @Test
    void tray_glass_is_at_the_structure() {
        assertThat(FaultText.in(LINE).at("E3/P/1", 1))
                .isEqualTo("H3>H3 +0 -0 tray F-1:1@2130 mark 7110 m white glass 1");
        // Cut at E2: its joint is 1064.563107 x 1.01 + 1.5 from the port; the tray lies from 1075.209 to 1078.209.
        assertThat(FaultText.in(LINE).at("E1/P/2", 1076.7))
                .isEqualTo("H2>H2 +0 -0 tray F-1:2@1064.563 mark 6044.563 m white glass 1076.7");
        assertThat(FaultText.in(LINE).at("E1/P/2", 1077.7))
                .isEqualTo("H2>H2 +0 -0 tray F-1:2@1064.563 mark 6044.563 m white glass 1077.7");
    }

    @Test
    void a_coil_is_walked_on_behind_a_cut_in_its_middle() {
        // 1.01 m of glass behind the second tray: 1 m of sheath behind the enclosure.
        assertThat(FaultText.in(LINE).at("E1/P/2", 1064.563107 * 1.01 + 3 + 1.01))
                .isEqualTo("H2>H2 +16.437 -14.437 slack F-1:2@1065.563 mark 6045.563 m white coil H2 glass 1079.219");
    }

    @Test
    void beyond_the_end_it_is_that_end() {
        // 2130 x 1.01 + 2 = 2153.3 m in all.
        assertThat(FaultText.in(LINE).at("E1/P/1", 2160))
                .isEqualTo("H3>H3 +0 -0 tray F-1:1@2130 mark 7110 m white glass 2153.3 over 6.7");
        assertThat(FaultText.in(LINE).place("E1/P/1", 2153.3).pastEnd()).isFalse();
        // The very end of a cable that is cut without tray glass is at the joint, not in the coil.
        assertThat(FaultText.in(LINE).at("E3/P/1", 2160))
                .isEqualTo("H1>H1 +0 -0 tray F-1:1@0 mark 4980 m white glass 2153.3 over 6.7");
    }

    @Test
    void a_bare_end_is_in_its_coil() {
        FaultText bare = FaultText.in("""
                cable F-1 1 : H1 100 H2 +8
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1
                """);

        assertThat(bare.at("E1/P/1", 200)).isEqualTo("H2>H2 +8 -0 slack F-1:1@108 coil H2 glass 108 over 92");
    }

    @Test
    void a_port_with_nothing_behind_it_ends_where_it_begins() {
        FaultText empty = FaultText.in("""
                cable F-1 1 : H1 100 H2
                enclosure E1 H1 : F-1
                panel E1 P 1
                """);

        assertThat(empty.at("E1/P/1", 7)).isEqualTo("H1>H1 +0 -0 tray glass 0 over 7");
        assertThat(empty.at("E1/P/1", 0)).isEqualTo("H1>H1 +0 -0 tray glass 0");
    }

    @Test
    void the_launch_fiber_is_used_up_first_and_not_counted() {
        assertThat(FaultText.in(LINE).launch(500).at("E1/P/1", 1025.2))
                .isEqualTo("H1>H2 +500 -529.126 H1-H2 F-1:1@520 mark 5500 m white glass 525.2");
        assertThat(FaultText.in(LINE).launch(500).at("E1/P/1", 500))
                .isEqualTo("H1>H1 +0 -0 tray F-1:1@0 mark 4980 m white glass 0");
        assertThat(FaultText.in(LINE).launch(500).at("E1/P/1", 499.9))
                .isEqualTo("no: the reading of 499.9 m lies within the launch fiber of 500 m; read beyond it");
    }

    /** A reel with an index of its own, spliced to one that has its type's: 1.4682 at 1550 nm. */
    private static final String TWO_REELS = """
            cable F-1 1 : H1 1000 H2
            cable F-2 1 : H2 1000 H3
            reel F-1 1550 - 1.4700
            reel F-1 1650 - 1.4710
            enclosure E1 H1 : F-1
            enclosure E2 H2 tray=1 : F-1 F-2
            enclosure E3 H3 : F-2
            panel E1 P 1
            panel E3 P 1
            panel E3 Q 1
            term E1/P/1 = F-1 ahead 1 direct
            splice E2 : F-1 back 1 = F-2 ahead 1
            term E3/P/1 = F-2 back 1 direct
            jumper E3/P/1 = E3/Q/1 3
            """;

    @Test
    void with_an_index_each_piece_uses_up_its_length_times_its_own() {
        // 1500 x 1.4682 = 2202.3; launch 100 x 1.47 = 147; F-1 with its tray 1001 x 1.47 = 1471.47; 583.83 are left:
        // 397.65 m at 1.4682, 1 of them in the tray.
        assertThat(583.83 / 1.4682).isCloseTo(397.650, within(1e-3));
        assertThat(FaultText.in(TWO_REELS).index(1.4682).launch(100).at("E1/P/1", 1500))
                .isEqualTo("H2>H3 +396.65 -603.35 H2-H3 F-2:1@396.65 glass 1398.65");
        // From the other side the launch fiber has F-2's index: 100 m, then 1001 m, then 1 x 1.4682 / 1.47 of F-1's
        // tray.
        assertThat(FaultText.in(TWO_REELS).index(1.4682).launch(100).at("E3/P/1", 1102))
                .isEqualTo("H2>H2 +0 -0 tray F-1:1@1000 glass 1001.999");
        // At 1600 nm the reel's sheet is linear between its two wavelengths: 1.4705.
        assertThat(FaultText.in(TWO_REELS).index(1.4705).wavelength(1600).at("E1/P/1", 640))
                .isEqualTo("H1>H2 +640 -360 H1-H2 F-1:1@640 glass 640");
    }

    @Test
    void outside_of_the_tables_there_is_no_place_but_where_no_index_is_told() {
        assertThat(FaultText.in(TWO_REELS).index(1.4682).wavelength(1651).at("E1/P/1", 10))
                .startsWith("no: fiber type G.652.D gives no group index at 1651 nm");
        assertThat(FaultText.in(TWO_REELS).wavelength(1651).at("E1/P/1", 10)).startsWith("H1>H2 +10 ");
    }

    @Test
    void glass_beyond_the_reading_needs_no_index() {
        String drawing = TWO_REELS.replace("reel F-1 1650 - 1.4710", "reel F-1 1700 - 1.4710");

        // At 1680 nm F-1 has a sheet and F-2 nothing.
        assertThat(FaultText.in(drawing).index(1.47).wavelength(1680).at("E1/P/1", 500))
                .startsWith("H1>H2 +499.");
        assertThat(FaultText.in(drawing).index(1.47).wavelength(1680).at("E1/P/1", 1500))
                .startsWith("no: fiber type G.652.D gives no group index at 1680 nm");
    }

    @Test
    void a_jumper_is_at_its_structure_in_no_cable() {
        assertThat(FaultText.in(TWO_REELS).at("E1/P/1", 2004)).isEqualTo("H3>H3 +0 -0 jumper glass 2004");
        assertThat(FaultText.in(TWO_REELS).at("E1/P/1", 2006)).isEqualTo("H3>H3 +0 -0 jumper glass 2005 over 1");
    }

    @Test
    void falling_marks_in_feet_and_a_sheath_marked_anew() {
        FaultText plant = FaultText.in("""
                cable F-1 1 ink=yellow : H1 300 H2 300 H3
                mark F-1 0 - 100 ft
                mark F-1 2 2100 - ft
                mark F-1 0 - 9000 ft yellow
                mark F-1 1 8000 - ft yellow
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1 direct
                """);

        // Yellow governs: 1000 ft = 304.8 m from H1 to H2; behind the last tie 300 m nominal. 152.4 m = 500 ft.
        assertThat(plant.at("E1/P/1", 152.4))
                .isEqualTo("H1>H2 +152.4 -152.4 H1-H2 F-1:1@152.4 mark 8500 ft yellow glass 152.4");
        assertThat(plant.at("E1/P/1", 304.8 + 152.4))
                .isEqualTo("H2>H3 +152.4 -147.6 H2-H3 F-1:1@457.2 mark 7500 ft yellow glass 457.2");
    }

    @Test
    void one_tie_gives_no_mark() {
        String one = LINE.replace("mark F-1 1 - 6060\n", "").replace("mark F-1 2 7100\n", "");

        assertThat(FaultText.in(one).at("E1/P/1", 525.2)).isEqualTo("H1>H2 +500 -500 H1-H2 F-1:1@520 glass 525.2");
    }

    @Test
    void a_moved_coil_moves_the_place() {
        String nominal = LINE.replaceAll("mark.*\n", "");

        assertThat(FaultText.in(nominal).at("E1/P/1", 1313)).isEqualTo("H2>H3 +250 -750 H2-H3 F-1:1@1300 glass 1313");
        // 10 m pulled out of the coil at H2: the same reading lies 10 m further on.
        assertThat(FaultText.in(nominal.replace("+30", "+20")).at("E1/P/1", 1313))
                .isEqualTo("H2>H3 +260 -740 H2-H3 F-1:1@1300 glass 1313");
    }

    @Test
    void a_place_on_a_drawn_line_lies_at_the_same_fraction_of_it() {
        FaultText bent = FaultText.in("""
                structure H1 10 0
                structure H2 10.01 0.01
                span H1 H2 2300 10.01 0
                cable F-1 1 : H1 2300 H2
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1 direct
                """);

        // The first leg runs along the equator: 0.01 degrees x 6378137 m; the second up the meridian, 1105.743 m.
        double first = Math.toRadians(0.01) * 6_378_137;
        double whole = first + 1_105.742_7;
        Position place = bent.place("E1/P/1", 2300 * 0.25).where().position();
        assertThat(place.lat()).isCloseTo(0, within(1e-9));
        assertThat(place.lon()).isCloseTo(10 + 0.01 * 0.25 * whole / first, within(1e-8));
    }

    private static final String SPLIT = """
            cable F-1 1 : H1 1000 H2
            cable D-1 4 : H2 200 H3
            cable D-2 4 : H2 500 H4
            enclosure E1 H1 : F-1
            enclosure E2 H2 : F-1 D-1 D-2
            enclosure E3 H3 : D-1
            enclosure E4 H4 : D-2
            splitter E2 S1 1x4
            panel E1 P 1
            panel E3 T 4
            panel E4 T 4
            term E1/P/1 = F-1 ahead 1
            splice E2 : F-1 back 1 = S1 in
            splice E2 : S1 out 1 = D-1 ahead 1
            splice E2 : S1 out 3 = D-2 ahead 1
            term E3/T/1 = D-1 back 1 direct
            term E4/T/1 = D-2 back 1 direct
            """;

    @Test
    void before_a_splitter_there_is_one_place() {
        assertThat(FaultText.in(SPLIT).at("E1/P/1", 400)).isEqualTo("H1>H2 +400 -600 H1-H2 F-1:1@400 glass 400");
    }

    @Test
    void behind_a_splitter_there_is_one_place_an_output_that_leads_somewhere() {
        assertThat(FaultText.in(SPLIT).at("E1/P/1", 1300)).isEqualTo("""
                H3>H3 +0 -0 tray D-1:1@200 glass 1200 over 100
                H2>H4 +300 -200 H2-H4 D-2:1@300 glass 1300""");
    }

    @Test
    void the_way_behind_a_splitter_may_be_told() {
        FaultText split = FaultText.in(SPLIT);

        assertThat(split.to("E4/T/1").at("E1/P/1", 1300)).isEqualTo("H2>H4 +300 -200 H2-H4 D-2:1@300 glass 1300");
        assertThat(split.to("E4/T/2").at("E1/P/1", 1300)).isEqualTo("no: the path from E1/P/1 does not reach E4/T/2");
        assertThat(split.toEnd(split.terminal("S1", LegKind.OUT, 1)).at("E1/P/1", 1300))
                .isEqualTo("H3>H3 +0 -0 tray D-1:1@200 glass 1200 over 100");
        assertThat(split.toEnd(split.end("D-2", LegKind.AHEAD, 1, "E2")).at("E1/P/1", 1300))
                .startsWith("H2>H4 +300");
        // An output that leads nowhere can still be asked for.
        assertThat(split.toEnd(split.terminal("S1", LegKind.OUT, 2)).at("E1/P/1", 1300))
                .isEqualTo("H2>H2 +0 -0 tray F-1:1@1000 glass 1000 over 300");
    }

    @Test
    void a_shot_may_begin_at_any_end() {
        FaultText split = FaultText.in(SPLIT);

        assertThat(split.at(split.end("D-2", LegKind.AHEAD, 1, "E2"), 100))
                .isEqualTo("H2>H4 +100 -400 H2-H4 D-2:1@100 glass 100");
        // From a splitter's output to its input, and up the feeder.
        assertThat(split.at(split.terminal("S1", LegKind.OUT, 3), 100))
                .isEqualTo("H2>H1 +100 -900 H1-H2 F-1:1@900 glass 100");
        assertThat(split.at(split.terminal("S1", LegKind.IN, 1), 250)).isEqualTo("""
                H3>H3 +0 -0 tray D-1:1@200 glass 200 over 50
                H2>H4 +250 -250 H2-H4 D-2:1@250 glass 250""");
        assertThat(split.at("E4/T/1", 600)).isEqualTo("H2>H1 +100 -900 H1-H2 F-1:1@900 glass 600");
    }

    @Test
    void where_no_output_leads_anywhere_the_splitter_is_the_end() {
        String dark = SPLIT.replaceAll("splice E2 : S1.*\n", "");

        assertThat(FaultText.in(dark).at("E1/P/1", 1300)).isEqualTo("H2>H2 +0 -0 tray F-1:1@1000 glass 1000 over 300");
    }

    @Test
    void an_end_not_in_service_is_no_place_to_shoot_from() {
        FaultText planned = FaultText.in("""
                cable F-1 1 : H1 100 H2
                enclosure E1 H1 planned : F-1
                panel E1 P 1
                """);

        assertThat(planned.at("E1/P/1", 5)).startsWith("no: no glass in service begins at E1/P/1");
    }
}
