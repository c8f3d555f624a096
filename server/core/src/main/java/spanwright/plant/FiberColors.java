package spanwright.plant;

import java.util.List;

/**
 * A colour order carried on beyond its own list: the next round bears one tracer, the round after it two, and so on.
 * For the order of 7 CFR 1755.200 Table 7 (which ends at 24) that is the reading of TIA-598-C by a secondary page.
 *
 * @param code code of the order
 * @param colors colour in words; the first is position 1
 * @param tracers the tracer's colour for each of them
 */
public record FiberColors(String code, List<String> colors, List<String> tracers) {

    /** Keeps its own copies; refuses an empty order and tracers unlike in count. */
    public FiberColors {
        colors = List.copyOf(colors);
        tracers = List.copyOf(tracers);
        if (colors.isEmpty() || colors.size() != tracers.size()) {
            throw new IllegalArgumentException("not a colour order: " + code);
        }
    }

    /** A recorded order: tracers are black, on black they are yellow. */
    public static FiberColors of(ColorCode code) {
        List<String> tracers = code.colors().stream()
                .map(color -> color.equals("black") ? "yellow" : "black")
                .toList();
        return new FiberColors(code.code(), code.colors(), tracers);
    }

    /**
     * The colour at a position, such as {@code blue}, {@code black with yellow tracer}, {@code blue with 2 black
     * tracers}.
     *
     * @param position from 1
     * @throws IllegalArgumentException below 1
     */
    public String at(int position) {
        if (position < 1) {
            throw new IllegalArgumentException("positions start at 1: " + position);
        }
        int index = (position - 1) % colors.size();
        int stripes = (position - 1) / colors.size();
        String color = colors.get(index);
        return switch (stripes) {
            case 0 -> color;
            case 1 -> color + " with " + tracers.get(index) + " tracer";
            default -> color + " with " + stripes + " " + tracers.get(index) + " tracers";
        };
    }
}
