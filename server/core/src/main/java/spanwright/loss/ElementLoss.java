package spanwright.loss;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.quantity.Loss;
import spanwright.splicing.Measurement;
import spanwright.trace.Element;

/**
 * What an element of a path loses.
 *
 * @param element the element
 * @param expected expected loss; measured where it was, which may be below 0
 * @param limit the most it may lose; the measured loss where it was measured
 * @param sd standard deviation of an unmeasured splice or connector pair, or null: none
 * @param basis what both rest on
 * @param source where both come from, for a person
 * @param oneWay measurements of it at this wavelength that are shown and not summed, for want of the other way
 */
public record ElementLoss(
        Element element,
        Loss expected,
        Loss limit,
        @Nullable Loss sd,
        LossBasis basis,
        String source,
        List<Measurement> oneWay) {

    /** Keeps its own copy of the list. */
    public ElementLoss {
        oneWay = List.copyOf(oneWay);
    }
}
