package spanwright.incident;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A count that grows by so much a minute from one moment to the next, such as user-minutes. */
public final class Accrual {

    private static final int DIGITS = 6;
    private static final BigDecimal NANOS_A_MINUTE =
            BigDecimal.valueOf(Duration.ofMinutes(1).toNanos());

    private final List<Instant> from = new ArrayList<>();
    private final List<BigDecimal> rates = new ArrayList<>();

    Accrual() {}

    /** From a moment on, which is not before the last, it grows by so much a minute. */
    Accrual then(Instant moment, BigDecimal rate) {
        from.add(moment);
        rates.add(rate);
        return this;
    }

    /** How much there is of it at a moment, to the millionth. */
    public BigDecimal at(Instant moment) {
        BigDecimal nanos = BigDecimal.ZERO;
        for (int step = 0; step < from.size(); step++) {
            nanos = nanos.add(rates.get(step).multiply(nanos(from.get(step), earlier(end(step), moment))));
        }
        return nanos.divide(NANOS_A_MINUTE, DIGITS, RoundingMode.HALF_EVEN);
    }

    private Instant end(int step) {
        return step + 1 < from.size() ? from.get(step + 1) : Instant.MAX;
    }

    private static Instant earlier(Instant one, Instant other) {
        return one.isBefore(other) ? one : other;
    }

    private static BigDecimal nanos(Instant start, Instant end) {
        return start.isBefore(end)
                ? BigDecimal.valueOf(Duration.between(start, end).toNanos())
                : BigDecimal.ZERO;
    }

    /** By how much it grows a minute at a moment. */
    public BigDecimal rate(Instant moment) {
        BigDecimal rate = BigDecimal.ZERO;
        for (int step = 0; step < from.size() && !from.get(step).isAfter(moment); step++) {
            rate = rates.get(step);
        }
        return rate;
    }

    /** When it reaches a limit above 0, going on as it last does; empty where it never does. */
    public Optional<Instant> reaches(BigDecimal limit) {
        BigDecimal left = limit.multiply(NANOS_A_MINUTE);
        for (int step = 0; step < from.size(); step++) {
            BigDecimal rate = rates.get(step);
            if (rate.signum() > 0) {
                BigDecimal needed = left.divide(rate, 0, RoundingMode.CEILING);
                boolean last = step + 1 == from.size();
                BigDecimal there = last ? needed : nanos(from.get(step), end(step));
                if (needed.compareTo(there) <= 0) {
                    return after(from.get(step), needed);
                }
                left = left.subtract(rate.multiply(there));
            }
        }
        return Optional.empty();
    }

    /** A time too far off to be told is never. */
    private static Optional<Instant> after(Instant start, BigDecimal nanos) {
        BigDecimal furthest = BigDecimal.valueOf(Long.MAX_VALUE);
        return nanos.compareTo(furthest) > 0 ? Optional.empty() : Optional.of(start.plusNanos(nanos.longValue()));
    }
}
