package sallowmere.story;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.StringJoiner;
import sallowmere.check.CircuitPaths;
import sallowmere.check.Journey;
import sallowmere.check.Network;
import sallowmere.folder.Figures;
import sallowmere.folder.Table;

/** Story 2: tubes 7 and 19 crossed at C-N02 during a pole transfer; the records hold the right joint. */
final class WrongTube {
    private WrongTube() {}

    static void write(Path folder, Network network, CircuitPaths paths) {
        Alarms alarms = new Alarms("2026-12-03T02:10-08:00");
        for (String circuit : paths.circuits()) {
            if (circuit.startsWith("PON-04")) {
                alarms.down(circuit);
            } else if (!circuit.startsWith("LSE")) {
                alarms.up(circuit, "");
            }
        }
        alarms.write(folder);
        Table table = new Table("readings.csv", "port", "wavelength_nm", "reading_m", "records_m", "records_end");
        for (int fiber = 80; fiber <= 84; fiber++) {
            shot(table, network, fiber, fiber + 144);
        }
        shot(table, network, 217, 73);
        shot(table, network, 228, 84);
        table.write(folder);
        Facts facts = new Facts();
        facts.add("closure opened that night", "C-N02");
        facts.add("joined in the glass", "FDR-N-1 back 73-84 = FDR-N-2 ahead 217-228");
        facts.add("joined in the glass", "FDR-N-1 back 217-228 = FDR-N-2 ahead 73-84");
        facts.add("joined in the records", "FDR-N-1 back 73-84 = FDR-N-2 ahead 73-84");
        facts.add("joined in the records", "FDR-N-1 back 217-228 = FDR-N-2 ahead 217-228");
        facts.add("subscribers down", alarms.downCount(), "");
        facts.write(folder);
        sheet(folder);
    }

    /**
     * The crew's sheet as the clerk posts it in the morning: every tube to its own, as the crew believes. It bears no day,
     * as sheets do, so that the posting's own time tells when the closure was opened.
     */
    private static void sheet(Path folder) {
        StringJoiner changes = new StringJoiner(",\n  ", "[\n  ", "\n ]");
        for (int first = 1; first <= 288; first += 12) {
            String a = "FDR-N-1 back " + Figures.range(first, first + 11);
            changes.add("{\"action\": \"change\", \"table\": \"splices\", \"key\": {\"enclosure\": \"C-N02\", \"a\": \"" + a
                    + "\"}, \"row\": {\"spliced_on\": null, \"spliced_by\": \"crew 7\", \"trust\": \"posted\","
                    + " \"verified_on\": null}}");
        }
        String sheet = "{\"by\": \"N. Ashby\", \"reason\": \"Pole transfer at P-N080, night of the 3rd: C-N02 made anew\",\n"
                + " \"changes\": " + changes + "}\n";
        try {
            Files.writeString(folder.resolve("sheet.json"), sheet);
        } catch (IOException unwritable) {
            throw new UncheckedIOException(unwritable);
        }
    }

    /** A shot on one fiber, which beyond C-N02 is the other; the far end is what the other's records say. */
    private static void shot(Table table, Network network, int fiber, int other) {
        String port = "HE-1/FDR-N/" + fiber;
        Journey own = network.from(port);
        Journey crossed = network.from("HE-1/FDR-N/" + other);
        double reading = end(own.events(), "C-N02") + crossed.glass() - end(crossed.events(), "C-N02");
        table.add(
                port,
                1550,
                Figures.decimal(reading, 0),
                Figures.decimal(own.glass(), 1),
                own.end().replace('|', ' '));
    }

    private static double end(Map<String, Double> events, String enclosure) {
        return events.get(enclosure);
    }
}
