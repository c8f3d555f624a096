package sallowmere.story;

import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import sallowmere.check.CircuitPaths;
import sallowmere.check.Network;
import sallowmere.folder.Figures;
import sallowmere.folder.Table;

/** Story 1: a backhoe cuts FDR-S between HH-S044 and HH-S045. */
final class Backhoe {
    private static final double FOOT = 0.3048;
    private static final String SPAN = "HH-S044_HH-S045";
    private static final double READING = 7_412;
    private static final double SECOND_BREAK_FEET = 40;
    private static final double RATIO = 1.015;
    private static final double TRAY = 1.5;

    private Backhoe() {}

    static void write(Path folder, Network network, CircuitPaths paths) {
        Set<String> cut = Set.copyOf(paths.on(SPAN));
        Alarms alarms = new Alarms("2026-12-01T10:42-08:00");
        for (String circuit : paths.circuits()) {
            boolean group = circuit.equals("RC-01") || circuit.equals("RC-02");
            if (circuit.startsWith("LSE")) {
                continue;
            }
            if (cut.contains(circuit) && !group) {
                alarms.down(circuit);
            } else {
                alarms.up(circuit, group ? "running on protection" : "");
            }
        }
        alarms.write(folder);
        readings(folder, network);
        facts(folder, alarms, cut, paths);
    }

    private static void readings(Path folder, Network network) {
        Table table =
                new Table("readings.csv", "port", "wavelength_nm", "reading_m", "what", "mark_ft", "past_hh_s044_ft");
        var dark = network.from("HE-1/FDR-S/72");
        double joint = dark.events().get("C-S03");
        table.add("HE-1/FDR-S/72", 1550, "6038", "known joint C-S03", "", "");
        table.add("HE-1/FDR-S/72", 1550, "8155", "known joint C-S04, seen before the cut", "", "");
        double sheath = (READING - joint - TRAY) / RATIO / FOOT;
        double mark = 24_220 - sheath;
        table.add("HE-1/FDR-S/72", 1550, "7412", "break", Figures.decimal(mark, 1), Figures.decimal(19_920 - mark, 1));
        double second = mark - SECOND_BREAK_FEET;
        double whole = network.from("HUT-S/FDR-S/12").events().get("C-S03");
        double back = whole - TRAY - (24_220 - second) * FOOT * RATIO;
        table.add(
                "HUT-S/FDR-S/12",
                1550,
                Figures.decimal(back, 1),
                "second break, where the bucket dragged the cable",
                Figures.decimal(second, 1),
                Figures.decimal(19_920 - second, 1));
        table.write(folder);
    }

    private static void facts(Path folder, Alarms alarms, Set<String> cut, CircuitPaths paths) {
        Facts facts = new Facts();
        Set<String> suspects = paths.suspects(
                circuit -> cut.contains(circuit) && circuit.startsWith("PON"),
                circuit -> circuit.startsWith("PON") && !cut.contains(circuit));
        List<String> order = List.copyOf(suspects);
        if (suspects.size() != 25 || !suspects.contains(SPAN)) {
            throw new IllegalStateException("the suspects of story 1 are " + order);
        }
        long subscribers =
                cut.stream().filter(circuit -> circuit.startsWith("PON")).count();
        if (subscribers != 540) {
            throw new IllegalStateException(subscribers + " subscribers are down, not 540");
        }
        facts.add("span cut", SPAN);
        facts.add("subscribers down", subscribers, "");
        facts.add("circuits down by alarm", alarms.downCount(), "");
        facts.add("circuits on the span, leases and protected ones too", cut.size(), "");
        facts.add("spans that the alarms do not tell apart", suspects.size(), "");
        facts.add("fibers cut", 288, "");
        facts.add("joints of a repair by a new section", 576, "");
        facts.add("window of the break, either side", 26, "ft");
        facts.add("slack left at HH-S044 after the repair", 35, "ft");
        facts.write(folder);
    }
}
