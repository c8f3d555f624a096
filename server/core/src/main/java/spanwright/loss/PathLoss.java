package spanwright.loss;

import java.util.List;
import java.util.function.Function;
import spanwright.plant.Trust;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.trace.Connector;
import spanwright.trace.ElementKind;
import spanwright.trace.Path;
import spanwright.trace.Splice;

/**
 * What a path loses at one wavelength.
 *
 * @param path the path
 * @param wavelength the wavelength
 * @param elements one an element of the path, in order
 * @param dispersion its dispersion
 */
public record PathLoss(Path path, Wavelength wavelength, List<ElementLoss> elements, Dispersion dispersion)
        implements Reckoning {

    private static final int DEVIATIONS = 3;

    /** Keeps its own copy of the list. */
    public PathLoss {
        elements = List.copyOf(elements);
    }

    /** The sum of the expected losses. */
    public Loss expected() {
        return sum(ElementLoss::expected);
    }

    /** The sum of the limits. */
    public Loss limit() {
        return sum(ElementLoss::limit);
    }

    private Loss sum(Function<ElementLoss, Loss> part) {
        return elements.stream().map(part).reduce(Loss.ZERO, Loss::plus);
    }

    /**
     * The expected sum and three times the root of the summed squares of the standard deviations of unmeasured splices
     * and connector pairs, at most the limit sum.
     */
    public Loss statistical() {
        double variance = 0;
        for (ElementLoss element : elements) {
            Loss sd = element.sd();
            if (sd != null) {
                variance += sd.decibels() * sd.decibels();
            }
        }
        Loss spread = expected().plus(Loss.ofDecibels(DEVIATIONS * Math.sqrt(variance)));
        return spread.compareTo(limit()) < 0 ? spread : limit();
    }

    /** How many splices, connector pairs and splitters are reckoned at planning values. */
    public int unmeasured() {
        return (int) elements.stream()
                .filter(element -> element.basis() == LossBasis.PLANNING)
                .count();
    }

    /** How many splices and direct terminations are not verified. */
    public int unverified() {
        return (int) path.elements().stream()
                .map(element -> element.kind() == ElementKind.SPLICE
                        ? ((Splice) element).joint()
                        : element instanceof Connector connector ? connector.directTermination() : null)
                .filter(joint -> joint != null && joint.facts().trust() != Trust.VERIFIED)
                .count();
    }
}
