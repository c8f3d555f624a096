package spanwright.quantity;

import java.math.BigDecimal;
import java.math.RoundingMode;

/**
 * An optical loss, exact to the microdecibel; positive where light is lost.
 *
 * @param microdecibels the loss in millionths of a decibel
 */
public record Loss(long microdecibels) implements Comparable<Loss> {

    /** No loss. */
    public static final Loss ZERO = new Loss(0);

    /**
     * So many decibels, rounded half-even to the microdecibel.
     *
     * @throws IllegalArgumentException where the number is not finite or absurdly large
     */
    public static Loss ofDecibels(double decibels) {
        if (!Double.isFinite(decibels) || Math.abs(decibels) > 9e12) {
            throw new IllegalArgumentException("not a loss in dB: " + decibels);
        }
        return new Loss((long) Math.rint(decibels * 1e6));
    }

    /** So many decibels, rounded half-even to the microdecibel. */
    public static Loss ofDecibels(BigDecimal decibels) {
        return new Loss(
                decibels.movePointRight(6).setScale(0, RoundingMode.HALF_EVEN).longValueExact());
    }

    /** The sum of both. */
    public Loss plus(Loss other) {
        return new Loss(Math.addExact(microdecibels, other.microdecibels));
    }

    /** This less the other; may be negative. */
    public Loss minus(Loss other) {
        return new Loss(Math.subtractExact(microdecibels, other.microdecibels));
    }

    /** In decibels, for a formula or a screen. */
    public double decibels() {
        return microdecibels / 1e6;
    }

    /** In decibels, exact, without trailing zeros. */
    public BigDecimal exactDecibels() {
        BigDecimal plain = BigDecimal.valueOf(microdecibels, 6).stripTrailingZeros();
        return plain.scale() < 0 ? plain.setScale(0) : plain;
    }

    @Override
    public int compareTo(Loss other) {
        return Long.compare(microdecibels, other.microdecibels);
    }

    @Override
    public String toString() {
        return exactDecibels().toPlainString() + " dB";
    }
}
