package spanwright.loss;

import java.util.List;

/**
 * The loss of a path is not known at a wavelength.
 *
 * @param reasons each says what is missing and what would mend it; at least one, each once
 */
public record LossUnknown(List<String> reasons) implements Reckoning {

    /** Keeps its own copy; refuses to say nothing. */
    public LossUnknown {
        reasons = reasons.stream().distinct().toList();
        if (reasons.isEmpty()) {
            throw new IllegalArgumentException("a loss that is not known has a reason");
        }
    }

    /** All reasons as one sentence. */
    public String sentence() {
        return String.join("; ", reasons);
    }
}
