package spanwright.plants;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import java.util.Random;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/** Draws from a seeded random. */
final class Chance {

    private final Random random;

    Chance(long seed) {
        this.random = new Random(seed);
    }

    /** From {@code least} to {@code most}, both included. */
    int between(int least, int most) {
        return least + random.nextInt(most - least + 1);
    }

    boolean in(int outOfHundred) {
        return random.nextInt(100) < outOfHundred;
    }

    <T> T of(List<T> list) {
        return list.get(random.nextInt(list.size()));
    }

    @SafeVarargs
    final <T> T of(T... values) {
        return values[random.nextInt(values.length)];
    }

    <T> @Nullable T perhaps(int outOfHundred, Supplier<T> what) {
        return in(outOfHundred) ? what.get() : null;
    }

    LocalDate day() {
        return LocalDate.of(2019, 1, 1).plusDays(random.nextInt(2500));
    }

    /** To the millimetre. */
    Length metres(double least, double most) {
        return new Length(1000 * Math.round(1000 * (least + random.nextDouble() * (most - least))));
    }

    /** To the thousandth of a decibel. */
    Loss decibels(double least, double most) {
        return new Loss(1000 * Math.round(1000 * (least + random.nextDouble() * (most - least))));
    }

    /** To the ten-millionth of a degree. */
    double degrees(double least, double most) {
        return Math.round(1e7 * (least + random.nextDouble() * (most - least))) / 1e7;
    }

    BigDecimal tenths(int least, int most) {
        return BigDecimal.valueOf(between(10 * least, 10 * most), 1);
    }
}
