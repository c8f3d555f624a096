package spanwright.sqlite.rows;

import java.time.LocalDate;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Length;
import spanwright.quantity.Loss;

/** Takes a row, column by column in the order of its layout. One thread's. */
public interface RowSink {

    /** A whole number. */
    void integer(long value);

    /** A double. */
    void real(double value);

    /** Text. */
    void text(String value);

    /** Bytes; not to be changed afterwards. */
    void blob(byte[] value);

    /** Nothing. */
    void none();

    /** Text out of a small vocabulary, such as a kind or a state. */
    default void word(String value) {
        text(value);
    }

    /** A word or nothing. */
    default void wordIfAny(@Nullable String value) {
        if (value == null) {
            none();
        } else {
            word(value);
        }
    }

    /** Yes or no, as 1 or 0. */
    default void flag(boolean value) {
        integer(value ? 1 : 0);
    }

    /** A whole number or nothing. */
    default void integerIfAny(@Nullable Integer value) {
        if (value == null) {
            none();
        } else {
            integer(value);
        }
    }

    /** A double or nothing. */
    default void realIfAny(@Nullable Double value) {
        if (value == null) {
            none();
        } else {
            real(value);
        }
    }

    /** Text or nothing. */
    default void textIfAny(@Nullable String value) {
        if (value == null) {
            none();
        } else {
            text(value);
        }
    }

    /** A length in micrometres, or nothing. */
    default void lengthIfAny(@Nullable Length value) {
        if (value == null) {
            none();
        } else {
            integer(value.micrometres());
        }
    }

    /** A loss in microdecibels, or nothing. */
    default void lossIfAny(@Nullable Loss value) {
        if (value == null) {
            none();
        } else {
            integer(value.microdecibels());
        }
    }

    /** A date, or nothing. */
    default void dateIfAny(@Nullable LocalDate value) {
        if (value == null) {
            none();
        } else {
            text(value.toString());
        }
    }
}
