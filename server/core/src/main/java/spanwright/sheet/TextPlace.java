package spanwright.sheet;

/**
 * Where something stands in a sheet.
 *
 * @param line from 1
 * @param column the first character, from 1
 * @param length how many characters, 0 for the place where something is missing
 */
public record TextPlace(int line, int column, int length) {

    /** From the beginning of one place to the end of another in the same line. */
    TextPlace to(TextPlace other) {
        return new TextPlace(line, column, other.column + other.length - column);
    }
}
