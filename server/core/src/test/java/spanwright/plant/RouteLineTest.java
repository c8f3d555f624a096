package spanwright.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.sf.geographiclib.Geodesic;
import net.sf.geographiclib.GeodesicData;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.quantity.Length;

class RouteLineTest {

    /**
     * Lines on WGS 84 with published lengths: GL-J = test set of GeographicLib-Java 2.1 (GeodesicTest), GL-C = the
     * GeodSolve manual, MEM = a secondary page, to be taken as from memory.
     */
    @ParameterizedTest(name = "{0}")
    @CsvSource({
        "G2 JFK-CDG (GL-J GeodSolve0), 40.6, -73.8, 49.01666667, 2.55, 5853226, 0.5",
        "G3 JFK-Singapore (GL-C GeodSolve.pod), 40.639722222, -73.778888889, 1.359166667, 103.989444444, 15347628, 0.5",
        "G5 tiny (GL-J GeodSolve92), 37.757540000000006, -122.47018, 37.75754, -122.470177, 0.264, 0.0005",
        "G6 tiny (GL-J GeodSolve4), 36.493349428792, 0, 36.49334942879201, 8e-7, 0.072, 0.0005",
        "G7 date line (GL-J GeodSolve29), 0, 179, 0, -179, 222639, 0.5",
        "G8 polyline edge (GL-J Planimeter19), 1, 1, 2, 2, 156876.149, 0.0005",
        "G10 Lands End-John o Groats (MEM), 50.06632, -5.71475, 58.64402, -3.07009, 969954.166314, 0.000001",
        "G11 Moscow-St Petersburg (MEM), 55.755837, 37.617683, 59.930950, 30.361865, 633278.594, 0.0005",
        "K1 (GL-J testcases), 35.60777, -139.44815, -11.17491, -69.95921, 8935244.5604818305, 0.000001",
        "K2 (GL-J testcases), 55.52454, 106.05087, 77.03196, 197.18234, 4105086.1713924406, 0.000001"
    })
    void a_straight_span_is_as_long_as_the_published_geodesic(
            String line, double lat1, double lon1, double lat2, double lon2, double metres, double within) {
        Position from = new Position(lon1, lat1);
        Position to = new Position(lon2 > 180 ? lon2 - 360 : lon2, lat2);
        RouteLength route = RouteLength.of(span(null, null), from, to);

        assertThat(route.basis()).isEqualTo(LengthBasis.GEODESIC);
        assertThat(route.line().metres()).isCloseTo(metres, within(within));
        assertThat(route.length().metres()).isCloseTo(metres, within(within + 5e-7));
        assertThat(RouteLine.metres(from, route.line().at(0.25)))
                .isCloseTo(metres / 4, within(Math.max(within, 1e-6 * metres)));
    }

    /** Azimuths published with K1 and K2 (GeographicLib-Java test set): 2 is forward at the far end. */
    @ParameterizedTest
    @CsvSource({
        "35.60777, -139.44815, -11.17491, -69.95921, 111.098748429560326, 129.289270889708762",
        "55.52454, 106.05087, 77.03196, 197.18234, 22.020059880982801, 109.112041110671519"
    })
    void the_library_gives_the_published_azimuths(
            double lat1, double lon1, double lat2, double lon2, double azimuth1, double azimuth2) {
        GeodesicData line = Geodesic.WGS84.Inverse(lat1, lon1, lat2, lon2);

        assertThat(line.azi1).isCloseTo(azimuth1, within(1e-9));
        assertThat(line.azi2).isCloseTo(azimuth2, within(1e-9));
    }

    /** Geoscience Australia's Flinders Peak to Buninyong on GRS 80 (a secondary page, to be taken as from memory). */
    @Test
    void flinders_peak_to_buninyong_on_GRS_80() {
        Geodesic grs80 = new Geodesic(6_378_137, 1 / 298.257222101);
        GeodesicData line = grs80.Inverse(
                -degrees(37, 57, 3.72030), degrees(144, 25, 29.52440),
                -degrees(37, 39, 10.15610), degrees(143, 55, 35.38390));

        assertThat(line.s12).isCloseTo(54972.271, within(0.0005));
        assertThat(line.azi1 + 360).isCloseTo(degrees(306, 52, 5.37), within(0.005 / 3600));
        assertThat(line.azi2 + 180).isCloseTo(degrees(127, 10, 25.07), within(0.005 / 3600));
    }

    /**
     * Vincenty 1975, Survey Review XXIII(176), Table II, lines c to e on the International ellipsoid (read on a
     * secondary page, to be taken as from memory). Line c differs from the exact geodesic by 0.7 mm.
     */
    @ParameterizedTest
    @CsvSource({
        "35, 16, 11.24862, 67, 22, 14.77638, 137, 47, 28.31435, 8084823.839, 0.001",
        "1, 0, 0, 0, -59, -53.83076, 179, 17, 48.02997, 19960000.000, 0.0005",
        "1, 0, 0, 1, 1, 15.18952, 179, 46, 17.84244, 19780006.558, 0.001"
    })
    void vincentys_long_lines_on_the_international_ellipsoid(
            double d1,
            double m1,
            double s1,
            double d2,
            double m2,
            double s2,
            double dl,
            double ml,
            double sl,
            double metres,
            double within) {
        Geodesic international = new Geodesic(6_378_388, 1 / 297.0);

        GeodesicData line = international.Inverse(degrees(d1, m1, s1), 0, degrees(d2, m2, s2), degrees(dl, ml, sl));

        assertThat(line.s12).isCloseTo(metres, within(within));
    }

    @Test
    void a_measured_length_goes_before_the_line() {
        RouteLength route =
                RouteLength.of(span(Length.ofMetres(120), null), new Position(0, 0), new Position(0.001, 0));

        assertThat(route.length()).isEqualTo(Length.ofMetres(120));
        assertThat(route.basis()).isEqualTo(LengthBasis.MEASURED);
        assertThat(route.line().metres()).isCloseTo(111.319, within(0.001));
    }

    @Test
    void a_drawn_line_is_measured_bend_by_bend_and_turned_to_begin_at_its_structure() {
        Position from = new Position(0, 0);
        Position bend = new Position(0.001, 0);
        Position to = new Position(0.001, 0.003);
        Line backward = new Line(List.of(to, bend, from));

        RouteLength route = RouteLength.of(span(null, backward), from, to);

        double first = RouteLine.metres(from, bend);
        double second = RouteLine.metres(bend, to);
        assertThat(route.line().positions()).containsExactly(from, bend, to);
        assertThat(route.length()).isEqualTo(Length.ofMetres(first + second));
        assertThat(route.line().fractionOf(0)).isZero();
        assertThat(route.line().fractionOf(1)).isCloseTo(first / (first + second), within(1e-12));
        assertThat(route.line().fractionOf(2)).isEqualTo(1);
        assertThat(route.reversed().line().positions()).containsExactly(to, bend, from);
        assertThat(route.reversed().length()).isEqualTo(route.length());
        assertThat(RouteLength.of(span(null, new Line(List.of(from, bend, to))), from, to))
                .extracting(same -> same.line().positions())
                .isEqualTo(List.of(from, bend, to));
    }

    @Test
    void a_place_lies_at_its_share_of_the_length() {
        Position bend = new Position(0.001, 0);
        Position to = new Position(0.001, 0.003);
        RouteLine line = RouteLine.along(List.of(new Position(0, 0), bend, to));

        double toBend = line.fractionOf(1);
        assertThat(line.at(toBend / 2).lon()).isCloseTo(0.0005, within(1e-12));
        assertThat(line.at(toBend)).isEqualTo(bend);
        assertThat(line.at((1 + toBend) / 2).lat()).isCloseTo(0.0015, within(1e-9));
        assertThat(line.at(-1)).isEqualTo(new Position(0, 0));
        assertThat(line.at(2)).isEqualTo(to);
    }

    @Test
    void a_line_at_one_place_has_no_length() {
        Position here = new Position(5, 5);
        RouteLine line = RouteLine.along(List.of(here, here, here));

        assertThat(line.metres()).isZero();
        assertThat(line.fractionOf(1)).isEqualTo(0.5);
        assertThat(line.at(0.7)).isEqualTo(here);
        assertThatThrownBy(() -> RouteLine.along(List.of(here))).hasMessageContaining("two positions");
    }

    private static double degrees(double degrees, double minutes, double seconds) {
        return degrees + minutes / 60 + seconds / 3600;
    }

    private static Span span(@Nullable Length measured, @Nullable Line line) {
        return new Span(1, "S", 1, 2, Placement.AERIAL, measured, line, PlantState.IN_SERVICE, List.of(), null);
    }
}
