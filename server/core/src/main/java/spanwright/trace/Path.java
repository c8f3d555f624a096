package spanwright.trace;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.quantity.Length;

/**
 * A path from end to end.
 *
 * @param ends its two ends; none for a circle
 * @param elements what it meets, in order
 * @param complete whether both ends are fronts, for a circuit that was asked for its a and its z
 * @param loop whether it runs in a circle
 * @param circuits the circuits whose ports its two ends are, whichever way round, by code
 * @param asked the circuit that was asked for, or null
 */
public record Path(
        List<PathEnd> ends,
        List<Element> elements,
        boolean complete,
        boolean loop,
        List<Circuit> circuits,
        @Nullable Circuit asked) {

    /** Keeps its own copies; refuses a path that is not a circle and has not two ends. */
    public Path {
        ends = List.copyOf(ends);
        elements = List.copyOf(elements);
        circuits = List.copyOf(circuits);
        if (ends.size() != (loop ? 0 : 2)) {
            throw new IllegalArgumentException("a path has two ends, a circle none: " + ends);
        }
    }

    /** The circuit whose wavelength and budget it is reckoned with: the one asked for, else the first on it. */
    public Optional<Circuit> governing() {
        return asked != null ? Optional.of(asked) : circuits.stream().findFirst();
    }

    /** Its glass, jumpers included. */
    public Length glass() {
        return sum(elements, Element::glass);
    }

    /** The sheath of its cables. */
    public Length sheath() {
        return sum(list(Fiber.class), Fiber::sheath);
    }

    /** The route that its cables travel, coils apart. */
    public Length route() {
        return sum(list(Fiber.class), Fiber::route);
    }

    private static <T> Length sum(List<T> parts, Function<T, Length> length) {
        return parts.stream().map(length).reduce(Length.ZERO, Length::plus);
    }

    /** Its elements of one type, in order. */
    public <T extends Element> List<T> list(Class<T> type) {
        return elements.stream().filter(type::isInstance).map(type::cast).toList();
    }

    /** How many of its elements are of a kind. */
    public int count(ElementKind kind) {
        return (int) elements.stream().filter(element -> element.kind() == kind).count();
    }

    /** The glass from the path's start to where each element begins, one an element. */
    public List<Length> glassBefore() {
        List<Length> before = new ArrayList<>();
        Length walked = Length.ZERO;
        for (Element element : elements) {
            before.add(walked);
            walked = walked.plus(element.glass());
        }
        return before;
    }
}
