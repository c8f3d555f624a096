package spanwright.quantity;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * A vacuum wavelength, exact to the picometre.
 *
 * @param picometres the wavelength in picometres, above 0
 */
public record Wavelength(long picometres) implements Comparable<Wavelength> {

    /** Refuses a wavelength of nothing or less. */
    public Wavelength {
        if (picometres <= 0) {
            throw new IllegalArgumentException("not a wavelength: " + picometres + " pm");
        }
    }

    /** So many nanometres. */
    public static Wavelength ofNanometres(long nanometres) {
        return new Wavelength(Math.multiplyExact(nanometres, 1_000));
    }

    /** So many nanometres, rounded half-even to the picometre. */
    public static Wavelength ofNanometres(BigDecimal nanometres) {
        return new Wavelength(
                nanometres.movePointRight(3).setScale(0, RoundingMode.HALF_EVEN).longValueExact());
    }

    /** In nanometres, for a formula. */
    public double nanometres() {
        return picometres / 1e3;
    }

    /** In nanometres, exact, without trailing zeros. */
    public BigDecimal exactNanometres() {
        BigDecimal plain = BigDecimal.valueOf(picometres, 3).stripTrailingZeros();
        return plain.scale() < 0 ? plain.setScale(0) : plain;
    }

    @Override
    public int compareTo(Wavelength other) {
        return Long.compare(picometres, other.picometres);
    }

    @Override
    public String toString() {
        return exactNanometres().toPlainString() + " nm";
    }
}
