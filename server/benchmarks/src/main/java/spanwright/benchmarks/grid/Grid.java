package spanwright.benchmarks.grid;

import java.util.Arrays;
import java.util.Random;

/**
 * The cables of the plant: between neighbouring nodes of a square grid. Every 8th line is a feeder road (288 to 864
 * fibers), every 4th distribution (96 to 288), the rest 12 to 96. Cable numbers are shuffled.
 */
final class Grid {

    private static final int[] FEEDER = {288, 432, 576, 864};
    private static final int[] DISTRIBUTION = {96, 144, 192, 288};
    private static final int[] SMALL = {12, 24, 36, 48, 72, 96};
    /** Mean fibers of a cable, by the shares of the lines. */
    private static final double MEAN = 540 / 8.0 + 180 / 8.0 + 48 * 0.75;

    /** East, south, west, north: a cable's node, and which way it goes there. */
    static final int EAST = 0;

    static final int SOUTH = 1;
    static final int WEST = 2;
    static final int NORTH = 3;

    final int side;
    final int cables;
    final int sections;
    /** Fibers by cable, from 0. */
    final int[] fibers;
    /** First section of a cable, from 0. */
    final int[] firstSection;
    /** The node where a cable begins; it ends one step east or south of it. */
    final int[] from;

    final int[] to;
    /** Cable by node and direction, or -1. */
    private final int[] cableAt;

    Grid(int targetSections, Random random) {
        side = Math.max(2, (int) Math.round((1 + Math.sqrt(1 + 2 * targetSections / MEAN)) / 2));
        cables = 2 * side * (side - 1);
        fibers = new int[cables];
        firstSection = new int[cables];
        from = new int[cables];
        to = new int[cables];
        cableAt = new int[4 * side * side];
        Arrays.fill(cableAt, -1);
        int[] order = shuffled(cables, random);
        int next = 0;
        for (int row = 0; row < side; row++) {
            for (int column = 0; column < side; column++) {
                int node = row * side + column;
                if (column + 1 < side) {
                    lay(order[next++], node, node + 1, EAST, row, random);
                }
                if (row + 1 < side) {
                    lay(order[next++], node, node + side, SOUTH, column, random);
                }
            }
        }
        int section = 0;
        for (int cable = 0; cable < cables; cable++) {
            firstSection[cable] = section;
            section += fibers[cable];
        }
        sections = section;
    }

    private void lay(int cable, int begin, int end, int direction, int line, Random random) {
        int[] sizes = line % 8 == 0 ? FEEDER : line % 4 == 0 ? DISTRIBUTION : SMALL;
        fibers[cable] = sizes[random.nextInt(sizes.length)];
        from[cable] = begin;
        to[cable] = end;
        cableAt[4 * begin + direction] = cable;
        cableAt[4 * end + (direction + 2) % 4] = cable;
    }

    static int[] shuffled(int count, Random random) {
        int[] order = new int[count];
        for (int place = 0; place < count; place++) {
            int other = random.nextInt(place + 1);
            order[place] = order[other];
            order[other] = place;
        }
        return order;
    }

    int nodes() {
        return side * side;
    }

    /** The cable that leaves a node in a direction, or -1. */
    int cable(int node, int direction) {
        return cableAt[4 * node + direction];
    }

    /** The node at the other end of a cable. */
    int across(int cable, int node) {
        return from[cable] == node ? to[cable] : from[cable];
    }

    /** The cable that a section is of. */
    int cableOf(int section) {
        int found = Arrays.binarySearch(firstSection, section);
        return found >= 0 ? found : -found - 2;
    }
}
