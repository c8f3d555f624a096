package spanwright.trace;

import spanwright.plant.Enclosure;
import spanwright.plant.Structure;
import spanwright.splicing.Splitter;

/**
 * A splitter crossed between one input and one output.
 *
 * @param splitter the splitter
 * @param enclosure where it is
 * @param structure where that is
 * @param input the input, from 1
 * @param output the output, from 1
 * @param towardOutput whether the walk goes from the input to the output
 */
public record SplitterCrossing(
        Splitter splitter, Enclosure enclosure, Structure structure, int input, int output, boolean towardOutput)
        implements Element {

    @Override
    public ElementKind kind() {
        return ElementKind.SPLITTER;
    }
}
