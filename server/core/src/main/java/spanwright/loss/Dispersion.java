package spanwright.loss;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.plant.FiberType;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;

/**
 * How glass spreads a pulse.
 *
 * @param psPerNmOrNull chromatic dispersion in ps/nm, signed; null where a fiber type gives no zero-dispersion wavelength or
 *     slope
 * @param pmdPs2OrNull the square of the polarization mode dispersion in ps2; null where a fiber type gives none
 */
public record Dispersion(
        @Nullable Double psPerNmOrNull, @Nullable Double pmdPs2OrNull) {

    /** That of no glass. */
    public static final Dispersion NONE = new Dispersion(0.0, 0.0);

    /**
     * The chromatic dispersion of a type in ps/(nm km): S0 l / 4 (1 - (l0 / l)^4), the three-term Sellmeier form of ITU-T
     * G.652; none where the type does not give both constants.
     */
    public static Optional<Double> coefficient(FiberType type, Wavelength wavelength) {
        Double zero = type.zeroDispersionNm();
        Double slope = type.dispersionSlope();
        if (zero == null || slope == null) {
            return Optional.empty();
        }
        double nm = wavelength.nanometres();
        return Optional.of(slope * nm / 4 * (1 - Math.pow(zero / nm, 4)));
    }

    /** This and that of more glass of a type: chromatic adds up, PMD as a root of summed squares. */
    Dispersion plus(FiberType type, Length glass, Wavelength wavelength) {
        double km = glass.metres() / 1000;
        Double chromatic =
                coefficient(type, wavelength).map(perKm -> perKm * km).orElse(null);
        Double pmd = type.pmdPsPerSqrtKm();
        return new Dispersion(
                sum(psPerNmOrNull, chromatic), sum(pmdPs2OrNull, pmd == null ? null : Double.valueOf(pmd * pmd * km)));
    }

    private static @Nullable Double sum(@Nullable Double one, @Nullable Double other) {
        return one == null || other == null ? null : Double.valueOf(one + other);
    }

    /** Chromatic dispersion in ps/nm, where every type on the path gives it. */
    public Optional<Double> psPerNm() {
        return Optional.ofNullable(psPerNmOrNull);
    }

    /** Polarization mode dispersion in ps, where every type on the path gives it. */
    public Optional<Double> pmdPs() {
        return Optional.ofNullable(pmdPs2OrNull).map(Math::sqrt);
    }
}
