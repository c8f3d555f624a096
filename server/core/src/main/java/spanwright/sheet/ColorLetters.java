package spanwright.sheet;

import java.util.Locale;
import java.util.Map;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import spanwright.plant.FiberColors;

/**
 * Colours by letters: {@code BL} for blue, {@code BL/BK} for blue with black tracer, {@code BL/2BK} for blue with 2 black
 * tracers. The letters of the twelve colours of TIA-598 are common practice; a colour of another order has its first two
 * letters.
 */
final class ColorLetters {

    private static final Map<String, String> TWELVE = Map.ofEntries(
            Map.entry("blue", "BL"),
            Map.entry("orange", "OR"),
            Map.entry("green", "GR"),
            Map.entry("brown", "BR"),
            Map.entry("slate", "SL"),
            Map.entry("white", "WH"),
            Map.entry("red", "RD"),
            Map.entry("black", "BK"),
            Map.entry("yellow", "YL"),
            Map.entry("violet", "VI"),
            Map.entry("rose", "RS"),
            Map.entry("aqua", "AQ"));

    private ColorLetters() {}

    /** The letters of a position in an order. */
    static String of(FiberColors colors, int position) {
        String[] words = colors.at(position).split(" ", -1);
        String base = letters(words[0]);
        return switch (words.length) {
            case 1 -> base;
            case 4 -> base + "/" + letters(words[2]);
            case 5 -> base + "/" + words[2] + letters(words[3]);
            default -> base;
        };
    }

    private static String letters(String color) {
        String known = TWELVE.get(color.toLowerCase(Locale.ROOT));
        return known == null ? color.substring(0, Math.min(2, color.length())).toUpperCase(Locale.ROOT) : known;
    }

    /** The one position up to a last one that bears these letters, or this whole word; none where none or several do. */
    static OptionalInt find(FiberColors colors, int last, String letters) {
        int[] found = IntStream.rangeClosed(1, last)
                .filter(position -> of(colors, position).equalsIgnoreCase(letters)
                        || colors.at(position).equalsIgnoreCase(letters))
                .limit(2)
                .toArray();
        return found.length == 1 ? OptionalInt.of(found[0]) : OptionalInt.empty();
    }

    /** {@code BL OR GR}: all letters up to a last position. */
    static String list(FiberColors colors, int last) {
        return IntStream.rangeClosed(1, last)
                .mapToObj(position -> of(colors, position))
                .collect(Collectors.joining(" "));
    }
}
