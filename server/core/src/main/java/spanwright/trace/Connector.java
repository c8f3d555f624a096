package spanwright.trace;

import org.jspecify.annotations.Nullable;
import spanwright.plant.Enclosure;
import spanwright.plant.Structure;
import spanwright.splicing.Joint;
import spanwright.splicing.Panel;

/**
 * A port crossed: one connector pair.
 *
 * @param name the port, such as {@code E1/P/1}
 * @param panel its panel
 * @param port its number
 * @param enclosure where it is
 * @param structure where that is
 * @param termination the termination at its rear, or null where nothing is joined to it
 */
public record Connector(
        String name,
        Panel panel,
        int port,
        Enclosure enclosure,
        Structure structure,
        @Nullable Joint termination) implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.CONNECTOR;
    }

    /** The termination at its rear where that has no pigtail, so no splice of its own; null where there is none. */
    public @Nullable Joint directTermination() {
        return termination == null || termination.facts().method() != null ? null : termination;
    }
}
