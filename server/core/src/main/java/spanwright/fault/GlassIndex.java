package spanwright.fault;

import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.loss.GlassValues;
import spanwright.loss.LossBasis;
import spanwright.loss.TableValue;
import spanwright.quantity.Wavelength;
import spanwright.trace.Element;
import spanwright.trace.Fiber;

/** The group index by which a shot uses up glass; 1 throughout where no index is told. One thread's. */
final class GlassIndex {

    private final GlassValues values;
    private final @Nullable Double set;
    private final Wavelength wavelength;

    GlassIndex(GlassValues values, @Nullable Double set, Wavelength wavelength) {
        this.values = values;
        this.set = set;
        this.wavelength = wavelength;
    }

    /** What a meter on the instrument is worth. */
    double set() {
        return set == null ? 1 : set;
    }

    /** The index of a fiber's or a jumper's glass; none outside of its tables. */
    Optional<Double> find(Element element) {
        return set == null ? Optional.of(1.0) : table(element).map(TableValue::value);
    }

    /** The index of a jumper's glass, which the launch fiber has where the path has no glass at all. */
    Optional<Double> findJumpers() {
        return set == null
                ? Optional.of(1.0)
                : values.findJumperIndex(wavelength).map(TableValue::value);
    }

    /** Why there is none, for a person. */
    String whyNot(Element element) {
        return element instanceof Fiber fiber
                ? values.whyNoIndex(fiber.cable(), wavelength)
                : values.whyNoJumperIndex(wavelength);
    }

    /** Whether an element's index is told by its reel's own sheet, and the shot regards it. */
    boolean ofReel(Element element) {
        return set != null
                && table(element)
                        .filter(value -> value.basis() == LossBasis.SHEET)
                        .isPresent();
    }

    private Optional<TableValue> table(Element element) {
        return element instanceof Fiber fiber
                ? values.findIndex(fiber.cable(), wavelength)
                : values.findJumperIndex(wavelength);
    }
}
