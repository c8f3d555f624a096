package spanwright.exchange;

import static java.util.Objects.requireNonNull;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.stream.Collectors;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.network.BlockKind;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.outage.Cut;
import spanwright.quantity.Loss;
import spanwright.splicing.Panel;
import spanwright.temporary.ClosedPlant;
import spanwright.temporary.DownCircuits;
import spanwright.temporary.GroupLight;
import spanwright.temporary.LightAnswer;
import spanwright.temporary.LightOffer;
import spanwright.temporary.LightQuestion;
import spanwright.temporary.Refused;
import spanwright.temporary.TemporaryPaths;

/** Light another way for the backhoe of the demo. */
class DemoLightTest {

    private static final Path ROOT = Path.of(System.getProperty("repository.root", "../.."), "demo-data");

    private static Snapshot demo;

    @BeforeAll
    static void load() {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(ROOT.resolve("sallowmere"), editor, FolderLoad.Progress.NONE))
                .isEmpty();
        demo = editor.build(1);
    }

    private static ClosedPlant cut() {
        ClosedPlant cut = new ClosedPlant(demo);
        cut.cut(List.of(new Cut.OfSpan(
                demo.records().spans().find("HH-S044_HH-S045").orElseThrow().id())));
        return cut;
    }

    private static LightQuestion question(String codes, List<Panel> from) {
        List<Circuit> down = DownCircuits.of(demo, cut()).stream()
                .filter(circuit -> circuit.code().matches(codes))
                .toList();
        return new LightQuestion(down, cut(), from, false, Loss.ZERO, 1);
    }

    private static Panel olt() {
        return demo.records()
                .panels()
                .list()
                .filter(panel -> panel.code().equals("OLT"))
                .findFirst()
                .orElseThrow();
    }

    private static GroupLight group(LightAnswer answer, String code) {
        return answer.groups().stream()
                .filter(each -> each.group().circuits().stream()
                        .anyMatch(circuit -> circuit.code().equals(code)))
                .findFirst()
                .orElseThrow();
    }

    private static Set<String> cables(LightOffer offer) {
        return offer.pieces().stream()
                .map(piece -> demo.network().blockOf(piece))
                .filter(block -> block.kind() == BlockKind.SECTION)
                .map(block -> demo.records().cables().get(block.owner()).code().replaceAll("-[0-9]+$", ""))
                .collect(Collectors.toSet());
    }

    /**
     * By hand: 8464.279 m of glass at 0.35 dB/km are 2.9625 dB; one splitter of 32 is 17.5 dB, four connectors of
     * 0.35 dB are 1.4 dB, five fusion splices of 0.1 dB are 0.5 dB; 22.3625 dB in all.
     */
    @Test
    void splitters_are_fed_from_the_eight_ports_of_the_hut_and_circuits_come_round_the_ring() {
        LightAnswer answer = TemporaryPaths.find(demo, question(".*", List.of(olt())));

        LightOffer far = group(answer, "PON-09-129").offers().get(0);
        assertThat(requireNonNull(far.lit().loss()).decibels()).isCloseTo(22.3625, within(0.01));
        assertThat(cables(far)).contains("FDR-S").doesNotContain("FDR-N");
        LightOffer water = group(answer, "GOV-03").offers().get(0);
        assertThat(cables(water)).containsExactlyInAnyOrder("FDR-N", "RNG-E");
        List<LightOffer> fed = answer.shared().stream()
                .filter(offer -> offer.group().circuits().get(0).code().startsWith("PON-"))
                .toList();
        assertThat(fed).hasSize(8);
        assertThat(fed.stream().map(offer -> offer.ways().get(0).start().end())).doesNotHaveDuplicates();
    }

    /** The story's number for the way round the ring is 35.6 dB, against 28 dB. */
    @Test
    void a_splitter_is_not_fed_round_the_ring() {
        LightAnswer answer = TemporaryPaths.find(demo, question("PON-09-.*", List.of()));

        GroupLight group = group(answer, "PON-09-129");
        assertThat(group.offers()).isEmpty();
        assertThat(group.refused().stream()
                        .filter(refused -> refused.why() == Refused.Why.OVER_BUDGET)
                        .map(refused -> requireNonNull(
                                        requireNonNull(refused.lit()).loss())
                                .decibels()))
                .singleElement()
                .satisfies(loss -> assertThat(loss).isCloseTo(35.6, within(0.05)));
    }

    @Test
    void an_answer_that_takes_too_long_is_stopped() {
        LightQuestion question = question("GOV-.*", List.of());

        assertThatThrownBy(() -> TemporaryPaths.find(demo, question, () -> {
                    throw new CancellationException("time is up");
                }))
                .isInstanceOf(CancellationException.class);
    }
}
