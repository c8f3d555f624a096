package spanwright.paper;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import spanwright.answers.FaultQuestion;
import spanwright.answers.FaultReply;
import spanwright.answers.View;
import spanwright.exchange.FolderLoad;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.plant.Cable;
import spanwright.plants.RandomPlant;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/** The crew's page of the demo's backhoe, whose place the scenario's generator reckoned, and of places everywhere. */
class CrewPaperTest {

    private static final Stamp STAMP = new Stamp("An owner", "Records as of posting 7", "Printed 2026-12-01");

    private static View demo;

    @BeforeAll
    static void load() {
        SnapshotEditor editor = Snapshot.empty().edit();
        Path folder = Path.of(System.getProperty("repository.root", "../.."), "demo-data", "sallowmere");
        assertThat(FolderLoad.load(folder, editor, FolderLoad.Progress.NONE)).isEmpty();
        demo = new View(editor.build(1), null);
    }

    @ParameterizedTest
    @EnumSource(PaperSize.class)
    void the_backhoe_is_one_page_with_place_marks_and_cautions(PaperSize size) {
        FaultQuestion.Shot shot = new FaultQuestion.Shot(BigDecimal.valueOf(7412), BigDecimal.ZERO, null, null);
        FaultQuestion question =
                new FaultQuestion("HE-1/FDR-S/72", null, null, shot, List.of("C-S03=6038", "C-S04=8155"), null);
        CrewPlace place =
                CrewPlace.of(FaultReply.of(demo, question).found().places().get(0));

        String html = new CrewPaper(demo, place).html(STAMP, size, "");
        PdfText text = PdfText.of(PdfPrinter.print(html), size);

        assertThat(text.pages()).hasSize(1);
        // The story: mark 19,784 ft, 136 ft past HH-S044; enclosures C-S03 at HH-S037 and C-S04 at HH-S049.
        assertThat(text.pages().get(0))
                .contains(
                        "136 ft past HH-S044 toward HH-S045",
                        "Mark on the sheath: 19784 ft, white ink; ",
                        "look from 198",
                        "C-S03 at HH-S037",
                        "C-S04 at HH-S049",
                        "100 ft at HH-S044",
                        "page 1 of 1",
                        "not a locate",
                        "never look into an open end",
                        "Dig ticket no.")
                .containsPattern("Within 2[4-8] ft either side");
        assertThat(html).contains("<svg").doesNotContain("<script", "style=\"");
    }

    @Test
    void any_place_of_any_plant_is_one_page() {
        int places = 0;
        for (long seed = 1; seed <= 12; seed++) {
            View view = new View(Snapshot.of(RandomPlant.of(seed).entered()), null);
            for (Cable cable : view.records().cables().list().limit(2).toList()) {
                Length end = view.lay(cable.id()).positions().length();
                for (double share : new double[] {0, 0.37, 1}) {
                    CrewPaper paper = new CrewPaper(view, CrewPlace.of(view, cable, end.times(share)));
                    PdfText text =
                            PdfText.of(PdfPrinter.print(paper.html(STAMP, PaperSize.LETTER, "")), PaperSize.LETTER);
                    assertThat(text.pages())
                            .as("seed %s, %s", seed, cable.code())
                            .hasSize(1);
                    assertThat(text.pages().get(0)).contains(cable.code());
                    places++;
                }
            }
        }
        assertThat(places).isGreaterThan(30);
    }

    @Test
    void route_lengths_are_those_of_the_run() {
        Cable cable = demo.records().cables().find("FDR-S-2").orElseThrow();
        CableLay lay = demo.lay(cable.id());
        int last = lay.rows().size() - 1;

        for (int row = 0; row <= last; row++) {
            assertThat(CrewPaper.route(lay, lay.positions().in(row))).isEqualTo(lay.routeTo(row));
        }
    }

    @Test
    void hostile_words_stay_words() {
        String hostile = "<script>alert(1)</script> " + "W".repeat(500);
        View view = new View(OneCable.of(24, 12, hostile), null);
        Cable cable = view.records().cables().get(1);

        String html =
                new CrewPaper(view, CrewPlace.of(view, cable, Length.ofMetres(20.0))).html(STAMP, PaperSize.A4, "");

        assertThat(html).doesNotContain("<script").contains("&lt;script&gt;");
        assertThat(PdfText.of(PdfPrinter.print(html), PaperSize.A4).pages()).hasSize(1);
    }

    @Test
    void the_square_code_holds_the_position_alone() {
        assertThat(SquareCode.content(new spanwright.plant.Position(-123.1234567, -48.7654321)))
                .isEqualTo("geo:-48.765432,-123.123457");
    }
}
