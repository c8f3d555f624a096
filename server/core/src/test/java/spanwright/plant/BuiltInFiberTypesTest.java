package spanwright.plant;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.quantity.Wavelength;

class BuiltInFiberTypesTest {

    /** Source: records-folder.md section 3, the table of built-in values. */
    @ParameterizedTest
    @ValueSource(strings = {"G.652.D", "G.657.A1"})
    void the_table_is_that_of_the_records_folder(String code) {
        FiberType type = BuiltInFiberTypes.find(code).orElseThrow();

        assertThat(type.values().stream()
                        .map(row -> row.wavelength().exactNanometres() + " "
                                + row.lossPerKm().decibels() + " "
                                + row.lossLimitPerKm().decibels() + " " + row.groupIndex())
                        .collect(Collectors.joining("; ")))
                .isEqualTo("1260 0.41 0.5 1.4676; 1270 0.4 0.5 1.4676; 1310 0.35 0.4 1.4676; 1383 0.34 0.4 1.4677; "
                        + "1490 0.24 0.4 1.468; 1529 0.22 0.4 1.4681; 1530 0.22 0.3 1.4681; 1550 0.22 0.3 1.4682; "
                        + "1565 0.22 0.3 1.4683; 1566 0.22 0.4 1.4683; 1577 0.22 0.4 1.4683; 1625 0.25 0.4 1.4686; "
                        + "1650 0.27 0.45 1.4688");
        assertThat(type.zeroDispersionNm()).isEqualTo(1310);
        assertThat(type.dispersionSlope()).isEqualTo(0.092);
        assertThat(type.pmdPsPerSqrtKm()).isEqualTo(0.2);
        assertThat(type.id()).isZero();
    }

    /**
     * The group index follows from the makers' at 1310 and 1550 nm and the dispersion: n(l) = n(anchor) + c x the
     * integral of D. Source of the formula: the three-term Sellmeier form, D = S0 l / 4 (1 - (l0 / l)^4); its integral
     * is S0 / 8 (l - l0^2 / l)^2.
     */
    @Test
    void the_group_index_follows_from_the_dispersion() {
        FiberType type = BuiltInFiberTypes.find("G.652.D").orElseThrow();
        double lightKmPerPs = 299_792.458e-12;

        for (FiberValues row : type.values()) {
            double nm = row.wavelength().nanometres();
            boolean near1310 = nm < 1430;
            double delayPsPerKm = delayPsPerKm(nm) - delayPsPerKm(near1310 ? 1310 : 1550);
            assertThat(Objects.requireNonNull(row.groupIndex()))
                    .isCloseTo((near1310 ? 1.4676 : 1.4682) + lightKmPerPs * delayPsPerKm, within(0.0001));
        }
    }

    private static double delayPsPerKm(double nm) {
        return 0.092 / 8 * Math.pow(nm - 1310.0 * 1310.0 / nm, 2);
    }

    @Test
    void every_value_says_its_source() {
        for (FiberType type : BuiltInFiberTypes.list()) {
            for (FiberValues row : type.values()) {
                FiberSources sources = BuiltInFiberTypes.findSources(type.code(), row.wavelength())
                        .orElseThrow();
                assertThat(List.of(sources.loss(), sources.limit(), sources.index(), sources.dispersion()))
                        .allSatisfy(source -> assertThat(source.text()).isNotBlank());
            }
        }
        FiberSources at1260 = BuiltInFiberTypes.findSources("G.652.D", Wavelength.ofNanometres(1260))
                .orElseThrow();
        assertThat(at1260.loss().status()).isEqualTo(SourceStatus.MEMORY);
        assertThat(at1260.limit().text()).isEqualTo("ITU-T G.652 (2016) Table 2 and Appendix I, from memory");
        assertThat(BuiltInFiberTypes.findSources("G.652.D", Wavelength.ofNanometres(1300)))
                .isEmpty();
        assertThat(BuiltInFiberTypes.findSources("G.655", Wavelength.ofNanometres(1550)))
                .isEmpty();
        assertThat(BuiltInFiberTypes.find("G.655")).isEmpty();
    }

    @Test
    void a_table_a_column_or_a_status_that_is_not_there_is_a_bug() {
        assertThatThrownBy(() -> BuiltInTable.read("nothing")).hasMessageContaining("nothing.csv");
        BuiltInTable.Row row = BuiltInTable.read("color_codes").get(0);
        assertThatThrownBy(() -> row.get("hue")).hasMessageContaining("hue");
        assertThatThrownBy(() -> row.source("color")).hasMessageContaining("no source blue");
        assertThatThrownBy(() -> SourceStatus.get("GUESS")).hasMessageContaining("GUESS");
    }
}
