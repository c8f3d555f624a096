package sallowmere.story;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import sallowmere.check.CircuitPaths;
import sallowmere.check.Network;
import sallowmere.check.RecordsFolder;
import sallowmere.folder.Table;

/** Writes the stories' alarms, readings and facts beside the records folder, out of the folder as it was read back. */
public final class Stories {
    private Stories() {}

    /**
     * Writes all stories.
     *
     * @param sheets the sheets that wait to be posted
     */
    public static void write(Path records, Path stories, Table sheets) {
        RecordsFolder folder = new RecordsFolder(records);
        Network network = new Network(folder);
        CircuitPaths paths = new CircuitPaths(folder, network);
        Backhoe.write(stories.resolve("1-backhoe"), network, paths);
        WrongTube.write(stories.resolve("2-wrong-tube"), network, paths);
        SeedWorks.write(stories.resolve("3-seed-works"), network);
        drop(stories.resolve("4-fence-anchor"), folder);
        repair(stories.resolve("5-repair-without-record"));
        sheets.write(stories);
    }

    /** One drop of a terminal is down, the others there are up. */
    private static void drop(Path into, RecordsFolder folder) {
        Alarms alarms = new Alarms("2026-11-24T15:20-08:00");
        List<Map<String, String>> there = folder.rows("circuits.csv").stream()
                .filter(circuit -> circuit.get("z").startsWith("DT-02-13/"))
                .toList();
        for (int i = 0; i < there.size(); i++) {
            if (i == 2) {
                alarms.down(there.get(i).get("circuit"));
            } else {
                alarms.up(there.get(i).get("circuit"), "");
            }
        }
        alarms.write(into);
    }

    /** What a shot from Bracken Forks shows that the records do not hold: two joints 46 m apart. */
    private static void repair(Path into) {
        Table table = new Table("readings.csv", "port", "wavelength_nm", "reading_m", "what", "loss_db");
        for (int port = 5; port <= 8; port++) {
            table.add("HUT-N/RNG-E/" + port, 1550, "3811", "joint that the records do not hold", "0.14");
            table.add("HUT-N/RNG-E/" + port, 1550, "3857", "joint that the records do not hold", "0.17");
        }
        table.write(into);
    }
}
