package spanwright.sheet;

/**
 * What of a sheet cannot be understood, or cannot be so.
 *
 * @param place where it stands
 * @param code a stable code, such as {@code no-such-leg}
 * @param text what is wrong, in a sentence
 * @param mend what would be right, in a sentence
 */
public record Mistake(TextPlace place, String code, String text, String mend) {}
