package spanwright.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;

class PastedBlockTest {

    private static final Snapshot PLANT = Drawing.of("""
            cable F-1 24 tube=12 : H1 1000 H2 1000 H3
            cable D-7 24 tube=12 : H2 500 H4
            enclosure E2 H2 : F-1/1 D-7
            """);

    private static PastedBlock read(String text) {
        return PastedBlock.read(PLANT.records(), 1, text);
    }

    @Test
    void columns_are_known_by_their_header_and_rows_that_carry_on_become_one_line() {
        PastedBlock block = read("""
                From cable\tSide\tTube\tFiber\tTray\tTo cable\tTube\tFiber
                F-1\tback\tBL\tBL\t2\tD-7\tOR\tBL
                F-1\tback\tBL\tOR\t2\tD-7\tOR\tOR
                F-1\tback\t1\t3\t2\tD-7\t2\t3
                F-1\tahead\tOR\tAQ\t2\tD-7\tBL\tAQ
                F-1\tahead\tOR\tRS\t2\tD-7\tBL\tRS
                """);

        assertThat(block.doubts()).isEmpty();
        assertThat(block.lines())
                .containsExactly("F-1 back 1-3 = D-7 ahead 13-15", "F-1 ahead 24-23 = D-7 ahead 12-11");
    }

    @Test
    void columns_without_a_header_are_known_by_what_stands_in_them() {
        PastedBlock block = read("F-1,back,1,D-7,ahead,1\nF-1,back,2,D-7,ahead,2\n\n\"F-1\",back,7,D-7,ahead,9\n");

        assertThat(block.doubts()).isEmpty();
        assertThat(block.lines()).containsExactly("F-1 back 1-2 = D-7 ahead 1-2", "F-1 back 7 = D-7 ahead 9");
        assertThat(read("F-1\tback\tBL\tSL\tD-7\tOR\tSL").lines()).containsExactly("F-1 back 5 = D-7 ahead 17");
    }

    @Test
    void a_cell_that_is_not_understood_is_marked_and_its_row_makes_no_line() {
        PastedBlock block = read("""
                cable,side,fiber,cable,fiber
                F-1,back,1,D-7,1
                F-1,back,12-Jan,D-7,2
                F-1,,3,D-7,3
                F-9,back,4,D-7,4
                F-1,back,5,D-7,25
                """);

        assertThat(block.lines()).containsExactly("F-1 back 1 = D-7 ahead 1");
        assertThat(block.doubts())
                .extracting(doubt -> doubt.row() + ":" + doubt.column() + " " + doubt.text())
                .containsExactly("3:3 12-Jan", "4:2 ", "5:1 F-9", "6:5 25");
        assertThat(block.doubts().get(1).mend()).contains("F-1 ahead, toward H3");
    }
}
