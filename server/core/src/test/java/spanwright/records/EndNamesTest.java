package spanwright.records;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import spanwright.network.Snapshot;
import spanwright.plant.FiberRange;
import spanwright.plants.Drawing;
import spanwright.splicing.EndRange;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

class EndNamesTest {

    private static final Snapshot PLANT = Drawing.of("""
            cable F-1 12 : H1 100 H2 100 H3
            enclosure E2 H2 : F-1
            enclosure E3 H3 : F-1
            splitter E2 S1 2x4
            panel E3 P 12
            """);
    private static final EndNames NAMES = new EndNames(PLANT.records());

    @Test
    void ends_within_their_enclosure() {
        assertThat(NAMES.end(leg(LegKind.AHEAD, row(1)).key(3))).isEqualTo("F-1 ahead 3");
        assertThat(NAMES.end(leg(LegKind.BACK, row(1)).key(3))).isEqualTo("F-1 back 3");
        assertThat(NAMES.end(leg(LegKind.IN, 1).key(1))).isEqualTo("S1 in");
        assertThat(NAMES.end(leg(LegKind.IN, 1).key(2))).isEqualTo("S1 in 2");
        assertThat(NAMES.end(leg(LegKind.OUT, 1).key(4))).isEqualTo("S1 out 4");
        assertThat(NAMES.end(leg(LegKind.REAR, 1).key(4))).isEqualTo("E3/P/4");
        assertThat(NAMES.end(leg(LegKind.FRONT, 1).key(4))).isEqualTo("E3/P/4");
    }

    @Test
    void ends_anywhere() {
        assertThat(NAMES.anywhere(leg(LegKind.AHEAD, row(1)).key(3))).isEqualTo("F-1 ahead 3 @ E2");
        assertThat(NAMES.anywhere(leg(LegKind.AHEAD, row(0)).key(3))).isEqualTo("F-1 start 3");
        assertThat(NAMES.bare(leg(LegKind.BACK, row(2)).key(3))).isEqualTo("F-1 end 3");
        assertThat(NAMES.anywhere(leg(LegKind.IN, 1).key(2))).isEqualTo("S1 in 2 @ E2");
        assertThat(NAMES.anywhere(leg(LegKind.OUT, 1).key(1))).isEqualTo("S1 out 1 @ E2");
        assertThat(NAMES.anywhere(leg(LegKind.REAR, 1).key(9))).isEqualTo("E3/P/9 rear");
        assertThat(NAMES.anywhere(leg(LegKind.FRONT, 1).key(9))).isEqualTo("E3/P/9");
    }

    @Test
    void ranges_ports_and_fibers() {
        assertThat(NAMES.ends(new EndRange(leg(LegKind.BACK, row(1)), new FiberRange(12, 1))))
                .isEqualTo("F-1 back 12-1");
        assertThat(NAMES.ends(new EndRange(leg(LegKind.OUT, 1), new FiberRange(1, 4))))
                .isEqualTo("S1 out 1-4");
        assertThat(NAMES.ends(new EndRange(leg(LegKind.IN, 1), new FiberRange(1, 2))))
                .isEqualTo("S1 in 1-2");
        assertThat(NAMES.ends(new EndRange(leg(LegKind.REAR, 1), new FiberRange(1, 12))))
                .isEqualTo("E3/P/1-12");
        assertThat(NAMES.port(1, 7)).isEqualTo("E3/P/7");
        assertThat(NAMES.ports(1, new FiberRange(2, 1))).isEqualTo("E3/P/2-1");
        assertThat(NAMES.fiber(1, 7)).isEqualTo("F-1:7");
    }

    private static Leg leg(LegKind kind, int owner) {
        return new Leg(kind, owner);
    }

    private static int row(int seq) {
        return PLANT.records().runOf(1).get(seq).id();
    }
}
