package spanwright.temporary;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import spanwright.circuits.Circuit;
import spanwright.network.Snapshot;
import spanwright.outage.Cut;
import spanwright.planning.NewJoint;
import spanwright.plants.Drawing;
import spanwright.quantity.Loss;
import spanwright.records.EndNames;
import spanwright.splicing.Panel;

/** Light another way in small plants whose answers are plain to see. */
class TemporaryPathsTest {

    /** A ring: F-1 the short way from HE to HUT, N-1 and R-1 the long way round by MID. */
    private static final String RING = """
            structure HE 0 0
            structure MID 0.01 0.01
            structure HUT 0.02 0
            cable F-1 4 : HE 1000 HUT
            cable N-1 4 : HE 9000 MID
            cable R-1 4 : MID 9000 HUT
            enclosure A HE : F-1 N-1
            enclosure M MID : N-1 R-1
            enclosure Z HUT : F-1 R-1
            panel A F 4
            panel A N 4
            panel M N 4
            panel M R 4
            panel Z F 4
            panel Z R 4
            term A/F/1-4 = F-1 ahead 1-4 trust=verified
            term Z/F/1-4 = F-1 back 1-4 trust=verified
            term A/N/1-4 = N-1 ahead 1-4 trust=verified
            term M/N/1-4 = N-1 back 1-4 trust=verified
            term M/R/1-4 = R-1 ahead 1-4 trust=verified
            term Z/R/1-4 = R-1 back 1-4 trust=verified
            """;

    private static LightAnswer ask(Snapshot snapshot, String span, List<Panel> panels, boolean verified) {
        ClosedPlant cut = new ClosedPlant(snapshot);
        cut.cut(List.of(new Cut.OfSpan(
                snapshot.records().spans().find(span).orElseThrow().id())));
        List<Circuit> down = snapshot.records().circuits().list().toList();
        return TemporaryPaths.find(snapshot, new LightQuestion(down, cut, panels, verified, Loss.ZERO, 3));
    }

    private static String joints(Snapshot snapshot, LightOffer offer) {
        EndNames names = new EndNames(snapshot.records());
        Stream<NewJoint> joints = offer.ways().stream().flatMap(way -> way.joints().stream());
        return String.join(
                "; ",
                joints.map(joint -> joint.kind() + " "
                                + names.end(snapshot.network().keyOf(joint.a())) + " = "
                                + names.end(snapshot.network().keyOf(joint.b())))
                        .toList());
    }

    @Test
    void the_plugs_move_and_a_jumper_joins_the_two_cables() {
        Snapshot snapshot = Drawing.of(RING + "circuit C-1 A/F/1-2 Z/F/1-2 budget=20");

        LightAnswer answer = ask(snapshot, "HE-HUT", List.of(), true);

        LightOffer offer = answer.groups().get(0).offers().get(0);
        assertThat(joints(snapshot, offer)).isEqualTo("JUMPER M/N/1 = M/R/1; JUMPER M/N/2 = M/R/2");
        assertThat(offer.moves()).singleElement().satisfies(circuit -> {
            EndNames names = new EndNames(snapshot.records());
            assertThat(names.ports(circuit.a().panel(), circuit.a().ports())).isEqualTo("A/N/1-2");
            assertThat(names.ports(circuit.z().panel(), circuit.z().ports())).isEqualTo("Z/R/1-2");
        });
        assertThat(offer.work().visits()).isEqualTo(3);
        assertThat(offer.work().patches()).isEqualTo(6);
        // 18 km at 0.35 dB, 4 connector pairs at 0.5, 4 pigtails at 0.1, 3 m of jumper.
        assertThat(Objects.requireNonNull(offer.lit().loss()).decibels()).isBetween(6.3 + 2 + 0.4, 6.3 + 2 + 0.402);
        assertThat(answer.shared()).hasSize(1);
    }

    @Test
    void what_loses_too_much_is_refused_and_says_by_how_much() {
        Snapshot snapshot = Drawing.of(RING + "circuit C-1 A/F/1 Z/F/1 budget=8");

        GroupLight light = ask(snapshot, "HE-HUT", List.of(), true).groups().get(0);

        // A splice at MID in place of two connector pairs and a jumper saves 1.1 dB; the jumper would be less work.
        assertThat(light.offers()).hasSize(1);
        assertThat(joints(snapshot, light.offers().get(0))).isEqualTo("SPLICE N-1 back 1 = R-1 ahead 1");
        assertThat(light.refused().get(0).why()).isEqualTo(Refused.Why.OVER_BUDGET);
        assertThat(light.refused().get(0).text()).startsWith("C-1 would be over its budget by 0.71 dB");
    }

    @Test
    void spare_glass_that_nobody_verified_is_refused_unless_it_is_asked_for() {
        String posted = RING.replace("term M/R/1-4 = R-1 ahead 1-4 trust=verified", "term M/R/1-4 = R-1 ahead 1-4");
        Snapshot snapshot = Drawing.of(posted + "circuit C-1 A/F/1 Z/F/1");

        GroupLight light = ask(snapshot, "HE-HUT", List.of(), true).groups().get(0);

        assertThat(light.offers()).isEmpty();
        assertThat(light.refused().get(0).why()).isEqualTo(Refused.Why.UNVERIFIED);
        assertThat(ask(snapshot, "HE-HUT", List.of(), false).groups().get(0).offers())
                .isNotEmpty();
    }

    @Test
    void a_splitter_is_fed_from_a_panel_that_the_dispatcher_names_and_no_other() {
        String tree = RING.replace("term Z/F/1-4 = F-1 back 1-4 trust=verified", "")
                .replace("enclosure Z HUT : F-1 R-1", "cable D-1 2 : HUT 100 END\nenclosure Z HUT : F-1 R-1 D-1");
        Snapshot snapshot = Drawing.of(tree + """
                enclosure E END : D-1
                splitter Z S1 1x2
                panel Z OLT 1
                panel E D 2
                splice Z : F-1 back 1 = S1 in
                splice Z : S1 out 1-2 = D-1 ahead 1-2
                term E/D/1-2 = D-1 back 1-2
                circuit C-1 A/F/1 E/D/1 budget=B+
                circuit C-2 A/F/1 E/D/2 budget=B+
                """);
        int hut = snapshot.records().enclosures().find("Z").orElseThrow().id();
        Panel olt = snapshot.records().findPanel(hut, "OLT").orElseThrow();

        GroupLight fed = ask(snapshot, "HE-HUT", List.of(olt), true).groups().get(0);
        GroupLight around = ask(snapshot, "HE-HUT", List.of(), true).groups().get(0);

        assertThat(fed.group().circuits()).hasSize(2);
        assertThat(joints(snapshot, fed.offers().get(0))).isEqualTo("TERMINATION Z/OLT/1 = S1 in");
        assertThat(fed.offers().get(0).work().visits()).isEqualTo(1);
        assertThat(joints(snapshot, around.offers().get(0)))
                .isEqualTo("JUMPER M/N/1 = M/R/1; SPLICE R-1 back 1 = S1 in");
    }

    @Test
    void spare_fibers_go_to_the_first_priority_when_there_are_too_few() {
        String few = RING.replace("cable N-1 4", "cable N-1 2")
                .replace("A/N/1-4 = N-1 ahead 1-4", "A/N/1-2 = N-1 ahead 1-2")
                .replace("M/N/1-4 = N-1 back 1-4", "M/N/1-2 = N-1 back 1-2");
        Snapshot snapshot = Drawing.of(few + """
                circuit C-1 A/F/1 Z/F/1
                circuit C-2 A/F/2 Z/F/2
                circuit C-3 A/F/3 Z/F/3
                """);

        LightAnswer answer = ask(snapshot, "HE-HUT", List.of(), true);

        assertThat(answer.groups()).hasSize(3);
        assertThat(answer.shared()).hasSize(2);
        assertThat(answer.unserved()).hasSize(1);
        assertThat(answer.proven()).isTrue();
        assertThat(answer.shared().stream().flatMap(offer -> offer.pieces().stream()))
                .doesNotHaveDuplicates();
    }
}
