package spanwright.sqlite.rows;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/**
 * Gives a row, column by column in the order of its layout; each call passes to the next column. A call for a type
 * that the column does not hold is a fault of the caller. One thread's.
 */
public interface RowSource {

    /** Whether the next column holds nothing; if so it is passed. */
    boolean passNone();

    /** A whole number. */
    long integer();

    /** A double. */
    double real();

    /** Text. */
    String text();

    /** Bytes; not to be changed. */
    byte[] blob();

    /** A whole number that fits an int, such as an identity. */
    default int number() {
        return Math.toIntExact(integer());
    }

    /** Yes or no. */
    default boolean flag() {
        return integer() != 0;
    }

    /** A whole number or nothing. */
    default @Nullable Integer numberIfAny() {
        return passNone() ? null : (Integer) number();
    }

    /** A double or nothing. */
    default @Nullable Double realIfAny() {
        return passNone() ? null : (Double) real();
    }

    /** Text or nothing. */
    default @Nullable String textIfAny() {
        return passNone() ? null : text();
    }

    /** A length in micrometres. */
    default Length length() {
        return new Length(integer());
    }

    /** A length in micrometres, or nothing. */
    default @Nullable Length lengthIfAny() {
        return passNone() ? null : length();
    }

    /** A loss in microdecibels. */
    default Loss loss() {
        return new Loss(integer());
    }

    /** A loss in microdecibels, or nothing. */
    default @Nullable Loss lossIfAny() {
        return passNone() ? null : loss();
    }

    /** A date, or nothing. */
    default @Nullable LocalDate dateIfAny() {
        return passNone() ? null : LocalDate.parse(text());
    }
}
