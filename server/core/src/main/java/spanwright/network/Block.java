package spanwright.network;

/**
 * Neighbouring pieces: the fibers 1, 2 ... of one cable section, the ports of one panel, or the terminals of one
 * splitter (inputs first, then outputs).
 *
 * @param kind what they are
 * @param owner identity of the cable, panel or splitter
 * @param fromRow identity of the run row where a section begins; 0 for others
 * @param toRow identity of the run row where a section ends; 0 for others
 * @param firstPiece the first of the pieces
 * @param count how many
 * @param inputs how many of a splitter's terminals are inputs; 0 for others
 */
public record Block(BlockKind kind, int owner, int fromRow, int toRow, int firstPiece, int count, int inputs) {

    /** The piece of a fiber, port or terminal, numbered from 1 to count. */
    public int piece(int number) {
        return firstPiece + number - 1;
    }

    /** The fiber, port or terminal of a piece, from 1. */
    public int number(int piece) {
        return piece - firstPiece + 1;
    }
}
