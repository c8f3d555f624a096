package spanwright.records;

import java.util.Objects;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/**
 * A value made when it is first asked for, once, by whichever thread asks first.
 *
 * @param <T> what is made
 */
final class Later<T> implements Supplier<T> {

    private @Nullable Supplier<T> maker;
    private volatile @Nullable T value;

    private Later(@Nullable Supplier<T> maker, @Nullable T value) {
        this.maker = maker;
        this.value = value;
    }

    static <T> Later<T> by(Supplier<T> maker) {
        return new Later<>(maker, null);
    }

    /** A value that is there already. */
    static <T> Later<T> of(T value) {
        return new Later<>(null, value);
    }

    @Override
    public T get() {
        T made = value;
        return made == null ? make() : made;
    }

    private synchronized T make() {
        T made = value;
        if (made == null) {
            made = Objects.requireNonNull(maker).get();
            value = made;
            maker = null;
        }
        return made;
    }
}
