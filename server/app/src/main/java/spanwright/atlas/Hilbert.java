package spanwright.atlas;

/** The Hilbert curve over a grid of 2^15 x 2^15 cells. */
final class Hilbert {

    private static final int BITS = 15;

    private Hilbert() {}

    /**
     * How far along the curve a cell lies, 0 to 2^30 - 1; cells next to each other on the curve share a side. The
     * quadrants are walked from the largest down, each turned as its place in the curve demands (Hilbert, "Ueber die
     * stetige Abbildung einer Linie auf ein Flaechenstueck", 1891).
     *
     * @param x 0 to 32,767
     * @param y 0 to 32,767
     */
    static long position(int x, int y) {
        long along = 0;
        int column = x;
        int row = y;
        for (int side = 1 << (BITS - 1); side > 0; side >>= 1) {
            boolean right = (column & side) != 0;
            boolean upper = (row & side) != 0;
            along += (long) side * side * (right ? (upper ? 2 : 3) : (upper ? 1 : 0));
            if (!upper) {
                int mask = side - 1;
                int turned = right ? mask - (column & mask) : column & mask;
                column = right ? mask - (row & mask) : row & mask;
                row = turned;
            }
        }
        return along;
    }
}
