package spanwright.paper;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import spanwright.answers.Unanswerable;
import spanwright.answers.View;
import spanwright.exchange.FolderLoad;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.outage.Cut;
import spanwright.outage.CutSection;
import spanwright.outage.HitCircuit;
import spanwright.outage.Impact;
import spanwright.plant.CableType;
import spanwright.plant.FiberColors;
import spanwright.plants.RandomPlant;

/** The cut list against the records, the network and the impact that it is of. */
class CutListPaperTest {

    private static final Stamp STAMP = new Stamp("An owner", "Records as of posting 7", "Printed 2026-12-01");

    private static Snapshot random(long seed) {
        return Snapshot.of(RandomPlant.of(seed).entered());
    }

    /** Cuts of each span of a plant, and all of it at once. */
    private static List<List<Cut>> cuts(Snapshot snapshot) {
        List<List<Cut>> all = new ArrayList<>();
        snapshot.records().spans().list().limit(5).forEach(span -> all.add(List.of(new Cut.OfSpan(span.id()))));
        all.add(snapshot.records()
                .cables()
                .list()
                .<Cut>map(cable -> new Cut.OfCable(cable.id()))
                .toList());
        return all;
    }

    @Test
    void lists_every_fiber_of_a_cut_section_once_with_what_the_network_joins_it_to() {
        int fibers = 0;
        for (long seed = 1; seed <= 40; seed++) {
            Snapshot snapshot = random(seed);
            for (List<Cut> cuts : cuts(snapshot)) {
                Impact impact = Impact.of(snapshot, cuts);
                View view = new View(snapshot, null);
                List<CutSheath> sheaths = new CutListPaper(view, impact).sheaths();
                assertThat(sheaths).as("seed %s", seed).hasSameSizeAs(impact.sections());
                for (int index = 0; index < sheaths.size(); index++) {
                    fibers += hold(view, impact.sections().get(index), sheaths.get(index), "seed " + seed);
                }
            }
        }
        assertThat(fibers).isGreaterThan(1_500);
    }

    private static int hold(View view, CutSection cut, CutSheath sheath, String seed) {
        assertThat(sheath.fibers().stream().map(CutSheath.Fiber::number).sorted())
                .as(seed)
                .isEqualTo(cut.fibers());
        Block section = cut.section();
        CableType type = view.lay(section.owner()).type();
        for (CutSheath.Fiber fiber : sheath.fibers()) {
            String of = seed + ", " + sheath.cable() + ":" + fiber.number();
            assertThat(fiber.tube()).as(of).isEqualTo((fiber.number() - 1) / type.fibersPerTube() + 1);
            int near = 2 * (section.firstPiece() + fiber.number() - 1);
            assertThat(fiber.near().to()).as(of).isEqualTo(joined(view, near));
            assertThat(fiber.far().to()).as(of).isEqualTo(joined(view, near + 1));
        }
        return sheath.fibers().size();
    }

    /** What the network says that an end is joined to, in the fewest words. */
    private static String joined(View view, int end) {
        Network network = view.network();
        if (network.peer(end) != Network.NONE) {
            return network.joint(end) == 0 ? "through" : view.names().end(network.keyOf(network.peer(end)));
        }
        long key = network.keyOf(end);
        if (network.joint(end) != 0) {
            var joint = view.records().joints().get(network.joint(end));
            return IntStream.range(0, joint.count())
                    .boxed()
                    .flatMap(index -> joint.a().key(index) == key
                            ? Stream.of(joint.b().key(index))
                            : joint.b().key(index) == key ? Stream.of(joint.a().key(index)) : Stream.<Long>of())
                    .map(view.names()::end)
                    .findFirst()
                    .orElseThrow();
        }
        if (view.names().anywhere(key).contains(" start ")
                || view.names().anywhere(key).contains(" end ")) {
            return "bare end";
        }
        var state = view.endStates().find(key);
        return state == null ? "not joined" : state.condition().word();
    }

    @Test
    void restores_in_the_order_of_the_impact() {
        int listings = 0;
        for (long seed = 1; seed <= 40; seed++) {
            Snapshot snapshot = random(seed);
            for (List<Cut> cuts : cuts(snapshot)) {
                Impact impact = Impact.of(snapshot, cuts);
                List<RestoreOrder.Row> rows = RestoreOrder.of(impact);
                List<HitCircuit> listed =
                        rows.stream().flatMap(row -> row.circuits().stream()).toList();
                assertThat(listed).as("seed %s", seed).containsExactlyInAnyOrderElementsOf(impact.circuits());
                assertThat(listed.stream().map(CutListPaperTest::rank))
                        .as("seed %s", seed)
                        .isEqualTo(impact.circuits().stream()
                                .map(CutListPaperTest::rank)
                                .toList());
                assertThat(rows.stream().map(row -> impact.circuits().indexOf(row.first())))
                        .as("seed %s", seed)
                        .isSorted();
                assertThat(rows)
                        .allMatch(row -> row.circuits().stream()
                                        .map(HitCircuit::at)
                                        .distinct()
                                        .count()
                                == 1);
                listings += listed.size();
            }
        }
        assertThat(listings).isGreaterThan(20);
    }

    /** What places a circuit in the order before its code does. */
    private static List<Object> rank(HitCircuit hit) {
        return List.of(hit.circuit().priority(), hit.single(), hit.circuit().customersServed());
    }

    @Test
    void puts_the_tube_first_that_holds_what_is_restored_first() {
        int tubes = 0;
        for (long seed = 1; seed <= 40; seed++) {
            Snapshot snapshot = random(seed);
            for (List<Cut> cuts : cuts(snapshot)) {
                for (CutSheath sheath : CutSheath.of(new View(snapshot, null), Impact.of(snapshot, cuts))) {
                    List<Integer> firsts = new ArrayList<>();
                    List<Integer> seen = new ArrayList<>();
                    for (CutSheath.Fiber fiber : sheath.fibers()) {
                        int priority = fiber.priority() == null ? 99 : fiber.priority();
                        if (!seen.contains(fiber.tube())) {
                            seen.add(fiber.tube());
                            firsts.add(priority);
                        }
                        int last = firsts.size() - 1;
                        assertThat(seen.get(last)).as("tube by tube").isEqualTo(fiber.tube());
                        firsts.set(last, Math.min(firsts.get(last), priority));
                    }
                    assertThat(firsts).as("seed %s, %s", seed, sheath.cable()).isSorted();
                    tubes += seen.size();
                }
            }
        }
        assertThat(tubes).isGreaterThan(300);
    }

    @Test
    void subscribers_behind_one_splitter_share_a_row() {
        SnapshotEditor editor = Snapshot.empty().edit();
        Path demo = Path.of(System.getProperty("repository.root", "../.."), "demo-data", "sallowmere");
        assertThat(FolderLoad.load(demo, editor, FolderLoad.Progress.NONE)).isEmpty();
        Snapshot snapshot = editor.build(1);
        int span =
                snapshot.records().spans().find("HH-S044_HH-S045").orElseThrow().id();
        Impact impact = Impact.of(snapshot, List.of(new Cut.OfSpan(span)));
        CutListPaper paper = new CutListPaper(new View(snapshot, null), impact);

        String html = paper.html("span HH-S044_HH-S045", STAMP, PaperSize.LETTER, "");
        PdfText text = PdfText.of(PdfPrinter.print(html), PaperSize.LETTER);

        // 553 circuits that alarms told, 2 of the lease, 2 left single; 540 of them subscribers, of two priorities,
        // behind
        // 7 splitters of each of 4 cabinets.
        assertThat(impact.circuits()).hasSize(557);
        assertThat(paper.restored().size()).isBetween(17 + 4 * 7, 17 + 2 * 4 * 7);
        assertThat(text.pages()).hasSize(3 + 288 / CutListPaper.ROWS);
        assertThat(text.pages().get(0)).contains("GOV-01", "sheriff radio", "orange / blue", "RC-01", "SINGLE");
        // The tubes in the order of the story: 2 is down, 1 works single, then 3, the cabinets' by count, the rest.
        assertThat(paper.sheaths()).hasSize(1);
        assertThat(paper.sheaths().get(0).fibers().stream()
                        .map(CutSheath.Fiber::tube)
                        .distinct()
                        .limit(3))
                .containsExactly(2, 1, 3);
    }

    @ParameterizedTest
    @EnumSource(PaperSize.class)
    void a_cable_of_864_fibers_fills_36_pages_of_24_and_no_more(PaperSize size) {
        Snapshot snapshot = OneCable.of(864, 12, "A very large cable");
        Impact impact = Impact.of(snapshot, List.of(new Cut.OfCable(1)));
        CutListPaper paper = new CutListPaper(new View(snapshot, null), impact);

        PdfText text = PdfText.of(PdfPrinter.print(paper.html("cable F-1", STAMP, size, "")), size);

        assertThat(text.pages()).hasSize(1 + 36);
        for (int page = 1; page <= 37; page++) {
            assertThat(text.pages().get(page - 1))
                    .contains("page " + page + " of 37", "cable F-1", "Records as of posting 7", "not a locate");
        }
        FiberColors colors = FiberColors.of(OneCable.plainColors());
        for (int fiber = 1; fiber <= 864; fiber++) {
            String page = text.pages().get((fiber - 1) / 24 + 1);
            assertThat(page).containsPattern("\\b" + fiber + "\\b");
            assertThat(page.replaceAll("\\s+", " ")).contains(colors.at((fiber - 1) / 12 % 12 + 1));
        }
    }

    @ParameterizedTest
    @EnumSource(PaperSize.class)
    void hostile_words_stay_words_and_stay_on_their_pages(PaperSize size) {
        String hostile = "<script>alert('1')</script>\u202e\u0000&" + "WM".repeat(400) + " \uD83D\uDE00";
        Snapshot snapshot = OneCable.of(30, 1, hostile);
        Impact impact = Impact.of(snapshot, List.of(new Cut.OfCable(1)));
        CutListPaper paper = new CutListPaper(new View(snapshot, null), impact);
        Stamp stamp = new Stamp(hostile, hostile, hostile);

        String html = paper.html(hostile, stamp, size, "/paper?x=\"><script>");
        PdfText text = PdfText.of(PdfPrinter.print(html), size);

        assertThat(html).doesNotContain("<script", "\u202e", "\u0000").contains("&lt;script&gt;");
        assertThat(text.pages()).hasSize(1 + 2);
    }

    @Test
    void refuses_a_list_that_nobody_carries() {
        Snapshot snapshot = OneCable.of(24 * 150 + 1, 12, "x");
        Impact impact = Impact.of(snapshot, List.of(new Cut.OfCable(1)));

        assertThatThrownBy(() -> new CutListPaper(new View(snapshot, null), impact))
                .isInstanceOf(Unanswerable.class)
                .hasMessageContaining("151 pages");
    }
}
