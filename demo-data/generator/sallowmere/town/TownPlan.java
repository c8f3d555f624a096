package sallowmere.town;

import java.util.List;

/**
 * Where a cabinet and its part of a town lie.
 *
 * @param cabinet number of the cabinet
 * @param town name of the town
 * @param trunk FDR-N or FDR-S
 * @param tap code of the structure where the lateral leaves the feeder; null where it is told by kilometres
 * @param kilometres of route from the headend to that structure, where no code is given
 * @param side 1 left of the feeder as it leaves the headend, -1 right
 * @param turn degrees by which the way from tap to cabinet is turned to the left from square
 * @param lengths metres of route of the three distribution cables
 */
public record TownPlan(
        int cabinet,
        String town,
        String trunk,
        String tap,
        double kilometres,
        int side,
        int turn,
        List<Integer> lengths) {

    /** The twelve cabinets; lengths come to about 114 km. */
    public static List<TownPlan> all() {
        return List.of(
                new TownPlan(1, "Sallowmere", "FDR-N", null, 1.3, 1, 0, List.of(3240, 3160, 2850)),
                new TownPlan(2, "Little Thessle", "FDR-N", null, 4.8, -1, 0, List.of(3420, 3300, 2960)),
                new TownPlan(3, "Marl Hollow", "FDR-N", null, 6.9, 1, 0, List.of(3310, 3450, 3010)),
                new TownPlan(4, "Corbel Junction", "FDR-N", null, 8.9, -1, 0, List.of(3380, 3240, 2930)),
                new TownPlan(5, "Fennick", "FDR-N", null, 10.6, 1, 0, List.of(3290, 3350, 3060)),
                new TownPlan(6, "Bracken Forks", "FDR-N", null, 11.9, -1, 0, List.of(3180, 3020, 2820)),
                new TownPlan(7, "Sallowmere", "FDR-S", "HH-S008", 0, 1, 0, List.of(3260, 3220, 2880)),
                new TownPlan(8, "Upper Skarn", "FDR-S", "HH-S024", 0, -1, 0, List.of(3400, 3330, 3000)),
                new TownPlan(9, "Gantry Mills", "FDR-S", "HH-S049", 0, 1, 0, List.of(3370, 3280, 2950)),
                new TownPlan(10, "Wendlecote", "FDR-S", "HH-S061", 0, -1, -38, List.of(3350, 3300, 2980)),
                new TownPlan(11, "Oxbarrow", "FDR-S", "HH-S072", 0, 1, 18, List.of(3300, 3210, 2900)),
                new TownPlan(12, "Pinnock Ferry", "FDR-S", "HH-S075", 0, -1, 52, List.of(3120, 3080, 2790)));
    }
}
