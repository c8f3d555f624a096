package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.network.Snapshot;
import spanwright.plant.FiberType;
import spanwright.plants.Drawing;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;

class DispersionTest {

    /** Reckoned from the three-term Sellmeier form of ITU-T G.652, ps/(nm km). */
    @ParameterizedTest
    @CsvSource({
        "1270, -3.8575, -2.8593, -5.2939, -4.2006, -4.1041",
        "1310, 0.0000, 0.9095, -1.3088, -1.0385, -0.1864",
        "1490, 13.7936, 14.4117, 12.9041, 10.2391, 13.8168",
        "1550, 17.4606, 18.0097, 16.6705, 13.2277, 17.5379",
        "1577, 19.0000, 19.5213, 18.2498, 14.4808, 19.0996",
        "1625, 21.5897, 22.0662, 20.9040, 16.5869, 21.7267"
    })
    void the_table_of_the_formula(int nm, double typical, double most, double least, double flat, double older) {
        assertThat(coefficient(1310, 0.092, nm)).isCloseTo(typical, within(0.00005));
        assertThat(coefficient(1300, 0.092, nm)).isCloseTo(most, within(0.00005));
        assertThat(coefficient(1324, 0.092, nm)).isCloseTo(least, within(0.00005));
        assertThat(coefficient(1324, 0.073, nm)).isCloseTo(flat, within(0.00005));
        assertThat(coefficient(1312, 0.093, nm)).isCloseTo(older, within(0.00005));
    }

    /** A maker's data sheet: at most 18 at 1550 and 22 at 1625 nm for a slope of at most 0.091. */
    @Test
    void the_corner_of_a_data_sheet_keeps_its_limits() {
        assertThat(coefficient(1300, 0.091, 1550))
                .isCloseTo(17.81, within(0.005))
                .isLessThan(18);
        assertThat(coefficient(1300, 0.091, 1625))
                .isCloseTo(21.83, within(0.005))
                .isLessThan(22);
    }

    /** W12, companion code to Mynbaev and Scheiner, Fiber-Optic Communications Technology, example 4.6.1: 7.55 ns/km. */
    @Test
    void spread_of_a_diode_at_850() {
        double perKm = coefficient(1343, 0.097, 850);

        assertThat(perKm).isCloseTo(-107.845, within(0.0005));
        assertThat(-perKm * 70 / 1000).isCloseTo(7.55, within(0.005));
    }

    /** W13, Senior, Optical Fiber Communications, example 3.11 (from memory): -2.8 at 1280, 17.1 at 1550, 3.2 of waveguide. */
    @Test
    void dispersion_of_a_standard_fiber() {
        assertThat(coefficient(1310, 0.09, 1280)).isCloseTo(-2.8, within(0.05));
        assertThat(coefficient(1310, 0.09, 1550)).isCloseTo(17.1, within(0.05));
        assertThat(coefficient(1310, 0.09, 1550) - 13.5 - 0.4).isCloseTo(3.2, within(0.05));
    }

    /** W10, companion code to Mynbaev and Scheiner, examples 5.3.4 and 5.3.6: 0.5 ps/root km over 100 km is 5 ps, 50 Gb/s. */
    @Test
    void polarization_mode_dispersion_goes_with_the_root_of_the_length() {
        double ps = Dispersion.NONE
                .plus(type(1310.0, 0.092, 0.5), Length.ofMetres(100_000), Wavelength.ofNanometres(1550))
                .pmdPs()
                .orElseThrow();

        assertThat(ps).isCloseTo(5, within(1e-9));
        assertThat(1 / (4 * ps * 1e-12)).isCloseTo(50e9, within(1.0));
    }

    /** Rule stated in an IETF contribution: mean PMD at most a tenth of the bit, added as a root of squares: 10 ps at 10 Gb/s. */
    @Test
    void spans_add_as_a_root_of_squares() {
        Wavelength at = Wavelength.ofNanometres(1550);
        double ps = Dispersion.NONE
                .plus(type(1310.0, 0.092, 0.5), Length.ofMetres(320_000), at)
                .plus(type(1310.0, 0.092, 0.5), Length.ofMetres(80_000), at)
                .pmdPs()
                .orElseThrow();

        assertThat(ps).isCloseTo(10, within(1e-9));
    }

    @Test
    void a_path_sums_its_glass_and_is_silent_where_a_type_is() {
        Snapshot plant = Drawing.of("""
                cable F-1 1 : H1 10000 H2
                enclosure E1 H1 : F-1
                enclosure E2 H2 : F-1
                panel E1 P 1
                panel E2 P 1
                panel E2 Q 1
                term E1/P/1 = F-1 ahead 1
                term E2/P/1 = F-1 back 1
                jumper E2/P/1 = E2/Q/1 3
                """);

        Dispersion dispersion = LossText.loss(plant, "E1/P/1", 1550).dispersion();
        assertThat(dispersion.psPerNm().orElseThrow()).isCloseTo(17.4606 * 10.003, within(0.001));
        assertThat(dispersion.pmdPs().orElseThrow()).isCloseTo(0.2 * Math.sqrt(10.003), within(1e-9));
        Wavelength at = Wavelength.ofNanometres(1550);
        Length km = Length.ofMetres(1000);
        assertThat(dispersion.plus(type(null, 0.09, null), km, at)).isEqualTo(new Dispersion(null, null));
        assertThat(dispersion.plus(type(1310.0, null, null), km, at).psPerNm()).isEmpty();
        assertThat(dispersion.plus(type(null, null, 0.1), km, at).pmdPs()).isPresent();
        assertThat(new Dispersion(null, null).plus(type(1310.0, 0.09, 0.1), km, at))
                .isEqualTo(new Dispersion(null, null));
    }

    private static double coefficient(double zero, double slope, int nm) {
        return Dispersion.coefficient(type(zero, slope, null), Wavelength.ofNanometres(nm))
                .orElseThrow();
    }

    private static FiberType type(@Nullable Double zero, @Nullable Double slope, @Nullable Double pmd) {
        return new FiberType(1, "T", List.of(), zero, slope, pmd);
    }
}
