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
import sallowmere.plant.Row;
import sallowmere.plant.Structure;
import sallowmere.ring.Ring;
import sallowmere.town.District;
import sallowmere.town.Quarter;
import sallowmere.town.Street;

/** The invented map under the plant: water, woods, streets, buildings and names of places. */
public final class BaseMap {
    private static final List<String> WOODS = List.of(
            "Skarn Wood", "Harrow Copse", "Thessle Plantation", "Gallow Hanger", "Priory Wood", "Long Covert",
            "Fennick Carr", "Oxbarrow Spinney", "Raven Holt", "Marl Coppice", "Upper Chase", "Lower Chase",
            "Bracken Wood", "Ferry Alders", "Wendle Shaw", "Corbel Thicket", "Hanging Wood", "Outer Holt");

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
        base.roads(ring, plant);
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
            map.shape("water", List.of("Gantry Pond", "Fennick Pool", "Far Tarn").get(i),
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

    private void roads(Ring ring, Plant plant) {
        map.line("street", "Valley Road", sampled(ring.south().road()));
        map.line("street", "Thessle Road", sampled(ring.north().road()));
        map.line("street", "Eastern Drove", sampled(ring.east().road()));
        map.line("street", "Ferry Loop", List.of(plant.structureOf("MH-9").at(), plant.structureOf("HUT-S").at()));
        Point entrance = plant.structureOf("EV-1").at();
        country("County Road 2", entrance, new Point(-10_800, 900), new Point(Landscape.WEST, 1_900));
        country("Skarn Road", new Point(-11_800, -4_700), new Point(-9_300, -4_000), districts.get(7).centre(),
                new Point(-4_300, -4_600), districts.get(9).centre());
        country("Hollow Road", new Point(-10_800, 900), new Point(-9_900, 4_400), new Point(-6_400, 6_200),
                districts.get(2).centre(), new Point(-1_800, 7_400), new Point(-2_600, Landscape.NORTH));
        country("Mid Valley Road", districts.get(6).centre(), new Point(-5_200, 300), new Point(-3_300, 1_000),
                districts.get(1).centre());
        country("Corbel Drove", districts.get(3).centre(), new Point(400, 1_700), new Point(-200, -500),
                districts.get(8).centre());
        country("Oxbarrow Drove", districts.get(10).centre(), new Point(3_200, -1_200), new Point(3_900, 1_600),
                districts.get(5).centre());
        country("Wendle Bank", plant.structureOf("MH-8").at(), new Point(-1_600, -4_950), new Point(-5_000, -5_300),
                new Point(-8_000, -5_200), new Point(-11_800, -6_300));
        country("County Road 9", plant.structureOf("P-E107").at(), new Point(9_600, 700), new Point(12_200, -1_500),
                new Point(Landscape.EAST, -2_100));
        country("County Road 7", entrance, new Point(-9_200, -2_600), new Point(-11_800, -4_700),
                new Point(Landscape.WEST, -4_400));
        Point north = plant.structureOf("HUT-N").at();
        country("Forks Road", north, new Point(5_100, 8_300), new Point(5_900, Landscape.NORTH));
        country("County Road 11", plant.structureOf("HH-E020").at(), new Point(10_400, 3_900),
                new Point(Landscape.EAST, 4_600));
        Point south = plant.structureOf("HUT-S").at();
        country("Ferry Road", south, new Point(900, -7_400), new Point(300, Landscape.SOUTH));
        country("County Road 4", south, new Point(4_300, -7_900), new Point(9_400, -8_300),
                new Point(Landscape.EAST, -7_600));
        for (District district : districts) {
            List<Point> line = new ArrayList<>();
            for (Row row : district.lateral().rows()) {
                line.add(row.structure().at());
            }
            map.line("street", district.plan().town() + " Lane", line);
        }
    }

    private void country(String name, Point... places) {
        map.line("street", name, sampled(Curve.through(List.of(places))));
    }

    private static List<Point> sampled(Curve curve) {
        List<Point> points = new ArrayList<>();
        int count = (int) Math.ceil(curve.length() / 70);
        for (int i = 0; i <= count; i++) {
            points.add(curve.at(curve.length() * i / count));
        }
        return points;
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
        landmark("Kestrelby Emergency Communications", plant.structureOf("HUT-S").at().plus(new Point(60, -75)), 21, 14);
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
        map.line("street", "Wendlecote Bridge",
                List.of(plant.structureOf("MH-8").at(), bridge.at(), plant.structureOf("MH-9").at()));
        map.point("place", "Wendlecote Bridge", bridge.at());
        map.point("place", "Kestrelby County", new Point(-11_000, -8_600));
    }
}
