package spanwright.trace;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.plant.Enclosure;
import spanwright.plants.Drawing;
import spanwright.quantity.Length;

class GlassTrackTest {

    private static final String PLANT = """
            structure H1 10 0
            structure H2 10.004 0
            structure H3 10.004 0.002
            structure H4 10.008 0.002
            span H1 H2 400 10.001 0.0005 10.003 0.0005
            cable F-1 2 over=1 : H1 +20 0 H2 +30 200 H3
            cable D-1 2 over=0 : H4 300 H3 +10
            enclosure E1 H1 tray=1 : F-1
            enclosure E2 H2 : F-1
            enclosure E3 H3 tray=2 : F-1 D-1
            enclosure E4 H4 : D-1
            panel E1 P 2
            panel E1 Q 2
            term E1/P/1 = F-1 ahead 1
            jumper E1/P/1 = E1/Q/1 5
            splice E3 : F-1 back 1 = D-1 back 1
            """;

    @Test
    void every_bend_every_coil_every_tray_is_a_point() {
        GlassTrack track = track(Drawing.of(PLANT), "E1/Q/1", true);

        // Nothing is at the rear of Q/1, so the path from P/1 shows the cables.
        assertThat(points(track)).isEqualTo("0/0/0 10,0");
        assertThat(points(track(Drawing.of(PLANT), "E1/P/1", false))).isEqualTo("""
                        0/0/0 10,0
                        1/0/0 10,0
                        21.2/20/0 10,0
                        127.76/125.51/105.51 10.001,0.0005
                        318.64/314.49/294.49 10.003,0.0005
                        425.2/420/400 10.004,0
                        440.35/435/400 10.004,0
                        455.5/450/400 10.004,0
                        657.5/650/600 10.004,0.002
                        659.5/650/600 10.004,0.002
                        661.5/650/600 10.004,0.002
                        671.5/660/600 10.004,0.002
                        971.5/960/900 10.008,0.002""");
    }

    @Test
    void stations_are_the_structures_in_order_at_the_middle_of_their_coils() {
        assertThat(stations(track(Drawing.of(PLANT), "E1/P/1", false))).isEqualTo("""
                        H1 E1 at 11.1/10/0 coil 20
                        H2 E2 at 440.35/435/400 coil 30
                        H3 E3 at 666.5/655/600 coil 10
                        H4 E4 at 971.5/960/900 coil 0""");
    }

    @Test
    void a_structure_passed_without_an_enclosure_is_a_station_too() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 100 H2 100 H3 +8 100 H4
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1 direct
                """);

        assertThat(stations(track(plant, "E1/P/1", false))).isEqualTo("""
                        H1 E1 at 0/0/0 coil 0
                        H2 - at 100/100/100 coil 0
                        H3 - at 204/204/200 coil 8
                        H4 - at 308/308/300 coil 0""");
    }

    @Test
    void two_enclosures_of_one_structure_are_two_stations_and_a_jumper_stays() {
        Snapshot plant = Drawing.of("""
                span H1 H1 30
                cable T-1 1 : H1 30 H1
                enclosure E1 H1 : T-1/0
                enclosure E2 H1 : T-1/1
                panel E1 P 2
                panel E2 P 2
                panel E2 Q 1
                splitter E2 S1 1x2
                term E1/P/1 = T-1 ahead 1 direct
                term E2/P/1 = T-1 back 1 direct
                jumper E2/P/1 = E2/P/2 2
                term E2/P/2 = S1 out 1 direct
                term E2/Q/1 = S1 in direct
                """);

        GlassTrack track = track(plant, "E1/P/1", false);
        assertThat(points(track)).isEqualTo("""
                        0/0/0 0,0
                        30/30/30 0,0
                        32/30/30 0,0""");
        assertThat(stations(track)).isEqualTo("""
                        H1 E1 at 0/0/0 coil 0
                        H1 E2 at 30/30/30 coil 0""");
    }

    @Test
    void glass_counts_from_the_paths_start_to_each_element() {
        Snapshot plant = Drawing.of(PLANT);
        Path path = path(plant, "E1/P/1");

        assertThat(path.glassBefore().stream().map(GlassTrackTest::plain))
                .containsExactly("0", "0", "0", "440.35", "440.35", "659.5", "659.5");
        assertThat(plain(path.glass()) + " " + plain(path.sheath()) + " " + plain(path.route()))
                .isEqualTo("971.5 960 900");
    }

    private static Path path(Snapshot plant, String port) {
        PortRange ports = Drawing.ports(plant.records(), port);
        return new Tracer(plant).fromPort(ports.panel(), ports.ports().first()).get(0);
    }

    private static GlassTrack track(Snapshot plant, String port, boolean single) {
        GlassTrack track = GlassTrack.of(path(plant, port));
        assertThat(track.points().size() == 1).isEqualTo(single);
        return track;
    }

    private static String points(GlassTrack track) {
        return track.points().stream().map(GlassTrackTest::text).collect(Collectors.joining("\n"));
    }

    private static String text(TrackPoint point) {
        return lengths(point) + " " + degrees(point.position().lon()) + ","
                + degrees(point.position().lat());
    }

    private static String lengths(TrackPoint point) {
        return List.of(point.glass(), point.sheath(), point.route()).stream()
                .map(GlassTrackTest::plain)
                .collect(Collectors.joining("/"));
    }

    /** To a centimetre. */
    private static String plain(Length length) {
        return Length.ofMetres(Math.rint(length.metres() * 100) / 100)
                .exactMetres()
                .toPlainString();
    }

    private static String degrees(double degrees) {
        return BigDecimal.valueOf(Math.round(degrees * 1e6), 6)
                .stripTrailingZeros()
                .toPlainString();
    }

    private static String stations(GlassTrack track) {
        return track.stations().stream().map(GlassTrackTest::text).collect(Collectors.joining("\n"));
    }

    private static String text(Station station) {
        return station.structure().code() + " "
                + station.enclosure().map(Enclosure::code).orElse("-") + " at " + lengths(station.at()) + " coil "
                + plain(station.coil());
    }
}
