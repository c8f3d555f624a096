package spanwright.sheet;

/**
 * A cell of a pasted block that is not understood.
 *
 * @param row the row of the block, from 1
 * @param column the cell in the row, from 1
 * @param text what stands in it
 * @param mend what would be right, in a sentence
 */
public record CellDoubt(int row, int column, String text, String mend) {}
