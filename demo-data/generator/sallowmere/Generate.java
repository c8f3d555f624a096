package sallowmere;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import sallowmere.basemap.BaseMap;
import sallowmere.check.Checks;
import sallowmere.folder.Table;
import sallowmere.geo.Point;
import sallowmere.glass.DistrictGlass;
import sallowmere.glass.Glasswork;
import sallowmere.glass.TakeUp;
import sallowmere.glass.TrunkGlass;
import sallowmere.land.Landscape;
import sallowmere.plant.Plant;
import sallowmere.plant.PlantTables;
import sallowmere.ring.Ring;
import sallowmere.service.Circuits;
import sallowmere.service.Markers;
import sallowmere.service.Sheets;
import sallowmere.story.Stories;
import sallowmere.town.District;
import sallowmere.town.Districts;
import sallowmere.town.Quarter;

/** Writes the demo's records folder and its stories, then reads the folder back and checks it. */
public final class Generate {
    private static final long SEED = 20_261_201L;

    private Generate() {}

    /**
     * Generates.
     *
     * @param arguments the folder to write the records folder {@code sallowmere} and the {@code stories} into
     */
    public static void main(String[] arguments) {
        if (arguments.length != 1) {
            System.err.println("usage: generate, with the folder to write into");
            System.exit(2);
        }
        Path into = Path.of(arguments[0]);
        Path folder = into.resolve("sallowmere");
        Plant plant = new Plant();
        Ring ring = Ring.build(plant);
        Point road = plant.structureOf("MH-9")
                .at()
                .minus(plant.structureOf("MH-8").at())
                .unit();
        Landscape land = Landscape.around(plant.structureOf("BR-1").at(), road, new Random(SEED + 1));
        List<District> districts = Districts.grow(plant, ring, land, SEED);
        Table sheets = records(folder, plant, ring, districts);
        List<Quarter> quarters = Quarter.grow(plant, ring, land, districts, SEED + 6);
        BaseMap.write(folder, plant, ring, land, districts, quarters, new Random(SEED + 2));
        List<String> wrong = Checks.of(folder);
        wrong.forEach(System.err::println);
        if (!wrong.isEmpty()) {
            System.exit(1);
        }
        Stories.write(folder, into.resolve("stories"), sheets);
    }

    /** Writes all tables but the base map; answers the sheets that wait. */
    private static Table records(Path folder, Plant plant, Ring ring, List<District> districts) {
        Glasswork glass = new Glasswork(new Random(SEED + 3));
        TrunkGlass.fill(plant, ring, glass);
        List<TakeUp> takeUps = new ArrayList<>();
        for (District district : districts) {
            TakeUp takeUp = TakeUp.draw(
                    district, new Random(SEED + 100 + district.plan().cabinet()));
            takeUps.add(takeUp);
            DistrictGlass.fill(district, takeUp, glass);
        }
        Table sheets = Sheets.waiting(districts, takeUps, glass, new Random(SEED + 4));
        String mixed = ring.north().at(13.4).code();
        List<Table> tables = new ArrayList<>(PlantTables.of(plant, mixed, new Random(SEED + 5)));
        tables.addAll(glass.tables());
        tables.addAll(List.of(
                Markers.settings(),
                Markers.flags(),
                Markers.counts(),
                Markers.measurements(),
                Markers.planningValues(),
                Circuits.of(takeUps)));
        tables.forEach(table -> table.write(folder));
        return sheets;
    }
}
