package sallowmere.basemap;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.land.Landscape;
import sallowmere.plant.Plant;
import sallowmere.plant.Structure;
import sallowmere.ring.Ring;
import sallowmere.town.District;
import sallowmere.town.Quarter;
import sallowmere.town.Street;

/** The invented map under the plant: water, woods, streets, buildings and names of places. */
public final class BaseMap {
    private static final List<String> WOODS = List.of(
            "Skarn Wood",
            "Harrow Copse",
            "Thessle Plantation",
            "Gallow Hanger",
            "Priory Wood",
            "Long Covert",
            "Fennick Carr",
            "Oxbarrow Spinney",
            "Raven Holt",
            "Marl Coppice",
            "Upper Chase",
            "Lower Chase",
            "Bracken Wood",
            "Ferry Alders",
            "Wendle Shaw",
            "Corbel Thicket",
            "Hanging Wood",
            "Outer Holt");

    private final GeoJson map = new GeoJson();
    private final Landscape land;
    private final List<District> districts;
    private final List<Quarter> quarters;
    private final Random random;

    private BaseMap(Landscape land, List<District> districts, List<Quarter> quarters, Random random) {
        this.land = land;
        this.districts = districts;
        this.quarters = quarters;
        this.random = random;
    }

    /** Draws the map and writes it. */
    public static void write(
            Path folder,
            Plant plant,
            Ring ring,
            Landscape land,
            List<District> districts,
            List<Quarter> quarters,
            Random random) {
        BaseMap base = new BaseMap(land, districts, quarters, random);
        base.woods(ring);
        base.water();
        Roads.draw(base.map, plant, ring, districts);
        base.towns();
        base.landmarks(plant);
        base.places(plant);
        base.map.write(folder.resolve("basemap.geojson"));
    }

    private void water() {
        Curve river = land.river();
        List<Point> north = new ArrayList<>();
        List<Point> south = new ArrayList<>();
        for (double arc = 0; arc <= river.length(); arc += 60) {
            Point across = river.heading(arc).left().times(land.riverWidth(arc) / 2);
            north.add(0, river.at(arc).plus(across));
            south.add(river.at(arc).minus(across));
        }
        List<Point> banks = new ArrayList<>(south);
        banks.addAll(north);
        banks.add(south.get(0));
        map.shape("water", "River Wendle", banks);
        map.shape("water", "Sallow Mere", land.lake());
        for (int i = 0; i < 3; i++) {
            Point pond = new Point(-12_000 + 10_500 * i, 8_100 - 1_300 * i + 600 * random.nextDouble());
            map.shape(
                    "water",
                    List.of("Gantry Pond", "Fennick Pool", "Far Tarn").get(i),
                    Landscape.blob(pond, 330, 190, i, random));
        }
    }

    private void woods(Ring ring) {
        int drawn = 0;
        for (int tries = 0; tries < 4_000 && drawn < WOODS.size(); tries++) {
            double x = Landscape.WEST + 1_000 + random.nextDouble() * (Landscape.EAST - Landscape.WEST - 2_000);
            double y = Landscape.SOUTH + 900 + random.nextDouble() * (Landscape.NORTH - Landscape.SOUTH - 1_800);
            double major = 450 + 750 * random.nextDouble();
            Point centre = new Point(x, y);
            boolean free = land.dry(centre, major)
                    && districts.stream().allMatch(d -> d.centre().to(centre) > 1_150 + major)
                    && quarters.stream().allMatch(q -> q.centre().to(centre) > 1_000 + major)
                    && land.lake().stream().allMatch(shore -> shore.to(centre) > major)
                    && ring.east().road().distance(centre) > major * 0.7;
            if (free) {
                double turn = Math.PI * random.nextDouble();
                map.shape("wood", WOODS.get(drawn), Landscape.blob(centre, major, major * 0.6, turn, random));
                drawn++;
            }
        }
    }

    private void towns() {
        for (Quarter quarter : quarters) {
            town(quarter.streets(), quarter.centre());
        }
        for (District district : districts) {
            town(district.streets(), district.centre());
        }
    }

    private void town(List<Street> streets, Point centre) {
        Buildings buildings = new Buildings(land, streets, random);
        for (Street street : streets) {
            map.line("street", street.name(), street.line());
            List<List<Point>> houses = buildings.along(street, centre);
            if (!houses.isEmpty()) {
                map.shapes("building", "", houses);
            }
        }
    }

    private void landmarks(Plant plant) {
        landmark("Sallowmere exchange", plant.structureOf("HE-1").at(), 17, 11);
        landmark("Bracken Forks hut", plant.structureOf("HUT-N").at(), 4, 3);
        landmark("Pinnock Ferry hut", plant.structureOf("HUT-S").at(), 4, 3);
        landmark(
                "Kestrelby Emergency Communications",
                plant.structureOf("HUT-S").at().plus(new Point(60, -75)),
                21,
                14);
        landmark("Sallowmere Memorial Hospital", districts.get(8).centre().plus(new Point(240, 620)), 44, 26);
        landmark("Kestrelby County Courthouse", plant.structureOf("HE-1").at().plus(new Point(-160, -130)), 22, 16);
        landmark("Oxbarrow Seed Works", districts.get(10).cabinet().at().plus(new Point(65, 50)), 38, 20);
    }

    private void landmark(String name, Point place, double half, double depth) {
        map.shape("building", name, Buildings.rectangle(place, new Point(0.94, 0.342), half, depth));
    }

    private void places(Plant plant) {
        Map<String, Point> towns = new TreeMap<>();
        districts.forEach(district -> towns.putIfAbsent(district.plan().town(), district.centre()));
        towns.put("Sallowmere", plant.structureOf("EV-1").at());
        towns.forEach((name, place) -> map.point("place", name, place));
        Structure bridge = plant.structureOf("BR-1");
        map.point("place", "Wendlecote Bridge", bridge.at());
        map.point("place", "Kestrelby County", new Point(-11_000, -8_600));
    }
}
