package sallowmere.town;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.Predicate;
import sallowmere.geo.Point;
import sallowmere.land.Landscape;
import sallowmere.plant.Plant;
import sallowmere.ring.Ring;

/**
 * A part of a town in which the demo's plant ends at a site and no subscriber is served: streets for the map alone.
 *
 * @param town the town
 * @param centre its middle
 * @param streets its streets
 */
public record Quarter(String town, Point centre, List<Street> streets) {
    private static final double OFF_OTHER_STREETS = 85;

    /** Keeps its own copy of the streets. */
    public Quarter {
        streets = List.copyOf(streets);
    }

    /** Grows the quarters around the headend and the huts, clear of the districts' streets. */
    public static List<Quarter> grow(Plant plant, Ring ring, Landscape land, List<District> districts, long seed) {
        List<Point> taken = new ArrayList<>();
        districts.forEach(district -> district.streets().forEach(street -> taken.addAll(street.line())));
        List<Quarter> quarters = new ArrayList<>();
        String[] sites = {"HE-1", "HUT-N", "HUT-S"};
        String[] towns = {"Sallowmere", "Bracken Forks", "Pinnock Ferry"};
        double[] radii = {980, 720, 560};
        for (int i = 0; i < sites.length; i++) {
            Point centre = plant.structureOf(sites[i]).at();
            Predicate<Point> ground = place -> land.dry(place, 80)
                    && land.sameBank(place, centre)
                    && ring.south().road().distance(place) > 45
                    && ring.north().road().distance(place) > 45
                    && ring.east().road().distance(place) > 45
                    && taken.stream().allMatch(street -> street.to(place) > OFF_OTHER_STREETS);
            Random random = new Random(seed + i);
            StreetNetwork network =
                    StreetNetwork.grow(centre, radii[i], radii[i] * 0.88, i, ground, List.of(centre), random);
            quarters.add(
                    new Quarter(towns[i], centre, Streets.name(network, random).list()));
        }
        return quarters;
    }
}
