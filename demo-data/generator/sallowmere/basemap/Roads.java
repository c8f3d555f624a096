package sallowmere.basemap;

import java.util.ArrayList;
import java.util.List;
import sallowmere.geo.Curve;
import sallowmere.geo.Point;
import sallowmere.land.Landscape;
import sallowmere.plant.Plant;
import sallowmere.plant.Row;
import sallowmere.ring.Ring;
import sallowmere.town.District;

/** Roads outside the towns: those that the trunks follow, lanes to the cabinets, and country roads between. */
final class Roads {
    private final GeoJson map;
    private final Plant plant;
    private final List<District> districts;

    private Roads(GeoJson map, Plant plant, List<District> districts) {
        this.map = map;
        this.plant = plant;
        this.districts = districts;
    }

    static void draw(GeoJson map, Plant plant, Ring ring, List<District> districts) {
        Roads roads = new Roads(map, plant, districts);
        roads.trunks(ring);
        roads.lanes();
        roads.west();
        roads.middle();
        roads.east();
    }

    private void trunks(Ring ring) {
        map.line("street", "Valley Road", sampled(ring.south().road()));
        map.line("street", "Thessle Road", sampled(ring.north().road()));
        map.line("street", "Eastern Drove", sampled(ring.east().road()));
        map.line("street", "Ferry Loop", List.of(site("MH-9"), site("HUT-S")));
        map.line("street", "Wendlecote Bridge", List.of(site("MH-8"), site("BR-1"), site("MH-9")));
    }

    private void lanes() {
        for (District district : districts) {
            List<Point> line = new ArrayList<>();
            for (Row row : district.lateral().rows()) {
                line.add(row.structure().at());
            }
            map.line("street", district.plan().town() + " Lane", line);
        }
    }

    private void west() {
        Point fork = new Point(-10_800, 900);
        Point cross = new Point(-11_800, -4_700);
        country("County Road 2", site("EV-1"), fork, new Point(Landscape.WEST, 1_900));
        country("County Road 7", site("EV-1"), new Point(-9_200, -2_600), cross, new Point(Landscape.WEST, -4_400));
        country("Skarn Road", cross, new Point(-9_300, -4_000), town(8), new Point(-4_300, -4_600), town(10));
        country("Hollow Road", fork, new Point(-9_900, 4_400), new Point(-6_400, 6_200), town(3));
        country("North Road", town(3), new Point(-1_800, 7_400), new Point(-2_600, Landscape.NORTH));
        country("Wendle Bank", site("MH-8"), new Point(-1_600, -4_950), new Point(-5_000, -5_300));
        country("Lower Bank", new Point(-5_000, -5_300), new Point(-8_000, -5_200), new Point(-11_800, -6_300));
    }

    private void middle() {
        country("Mid Valley Road", town(7), new Point(-5_200, 300), new Point(-3_300, 1_000), town(2));
        country("Corbel Drove", town(4), new Point(400, 1_700), new Point(-200, -500), town(9));
        country("Oxbarrow Drove", town(11), new Point(3_200, -1_200), new Point(3_900, 1_600), town(6));
    }

    private void east() {
        Point edge = new Point(Landscape.EAST, 4_600);
        country("Forks Road", site("HUT-N"), new Point(5_100, 8_300), new Point(5_900, Landscape.NORTH));
        country("County Road 11", site("HH-E020"), new Point(10_400, 3_900), edge);
        country("County Road 9", site("P-E107"), new Point(9_600, 700), new Point(Landscape.EAST, -2_100));
        country("Ferry Road", site("HUT-S"), new Point(900, -7_400), new Point(300, Landscape.SOUTH));
        country("County Road 4", site("HUT-S"), new Point(4_300, -7_900), new Point(Landscape.EAST, -7_600));
    }

    private Point site(String structure) {
        return plant.structureOf(structure).at();
    }

    private Point town(int cabinet) {
        return districts.get(cabinet - 1).centre();
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
}
