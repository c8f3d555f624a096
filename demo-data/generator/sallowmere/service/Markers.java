package sallowmere.service;

import sallowmere.folder.Table;

/** Flags on fibers, other numberings, measurements, planning values and settings. */
public final class Markers {
    private Markers() {}

    /** The flags: nine dead fibers, a lease, suspects, eleven lapsed reservations and six that still hold. */
    public static Table flags() {
        Table flags = new Table("fiber_flags.csv", "cable", "fibers", "flag", "from", "to", "owner", "reason", "until");
        dead(flags);
        flags.add("FDR-S-1", "109-112", "leased", "", "", "Thornmere Rural Cooperative", "dark lease of 2019", "");
        flags.add("FDR-S-2", "109-112", "leased", "", "", "Thornmere Rural Cooperative", "dark lease of 2019", "");
        flags.add("FDR-N-2", "171", "suspect", "", "", "", "0.8 dB step at C-N02 in the test of 2024", "");
        flags.add("RNG-E-2", "65-66", "suspect", "", "", "", "light seen on the wrong fiber in 2025", "");
        lapsed(flags);
        held(flags);
        return flags;
    }

    private static void dead(Table flags) {
        dead(flags, "FDR-S-1", "233", "no light beyond HH-S021, test of 2025-06-12");
        dead(flags, "FDR-S-2", "271", "broken in a tray at C-S03");
        dead(flags, "FDR-N-1", "150", "no light, test of 2022-09-30");
        dead(flags, "FDR-N-2", "205", "crushed near P-N131, test of 2023-04-18");
        dead(flags, "FDR-N-2", "206", "crushed near P-N131, test of 2023-04-18");
        dead(flags, "RNG-E-1", "97", "no light, test of 2024-02-06");
        dead(flags, "RNG-E-3", "140", "high loss at the bridge, test of 2024-02-07");
        dead(flags, "LAT-04", "19", "broken in the cabinet's tray");
        dead(flags, "DST-06B", "88", "broken at the first pole");
    }

    private static void dead(Table flags, String cable, String fiber, String reason) {
        flags.add(cable, fiber, "dead", "", "", "", reason, "");
    }

    private static void lapsed(Table flags) {
        reserved(flags, "FDR-S-1", "236", "planning", "quote Q-2025-044, Oxbarrow cold store", "2026-03-31");
        reserved(flags, "FDR-S-1", "157-160", "planning", "quote Q-2024-019, Upper Skarn quarry", "2025-01-31");
        reserved(flags, "FDR-S-2", "181-182", "planning", "quote Q-2025-007, ferry landing", "2025-09-30");
        reserved(flags, "FDR-S-2", "205-208", "engineering", "fourth lateral study", "2024-12-31");
        reserved(flags, "FDR-N-1", "145-148", "planning", "quote Q-2023-031, tower at Marl Hollow", "2024-06-30");
        reserved(flags, "FDR-N-1", "193-196", "engineering", "cut-over of 2024, never released", "2024-10-15");
        reserved(flags, "FDR-N-3", "217-220", "planning", "quote Q-2025-052, sawmill second pair", "2026-06-30");
        reserved(flags, "RNG-E-1", "37-40", "planning", "quote Q-2024-063, pump stations", "2025-04-30");
        reserved(flags, "RNG-E-2", "85-86", "engineering", "ring upgrade study", "2025-12-31");
        reserved(flags, "RNG-E-3", "121-124", "planning", "quote Q-2026-002, neighbor cooperative", "2026-08-31");
        reserved(flags, "LAT-09", "13-16", "planning", "quote Q-2025-038, Gantry Mills clinic", "2026-01-31");
    }

    private static void reserved(Table flags, String cable, String fibers, String owner, String reason, String until) {
        flags.add(cable, fibers, "reserved", "", "", owner, reason, until);
    }

    private static void held(Table flags) {
        reserved(flags, "FDR-N-1", "133-136", "planning", "quote Q-2026-057, Corbel Junction depot", "2027-01-15");
        reserved(flags, "FDR-N-2", "133-136", "planning", "quote Q-2026-057, Corbel Junction depot", "2027-01-15");
        reserved(flags, "RNG-E-1", "25-28", "engineering", "maintenance pair of the ring", "2027-06-30");
        String growth = "further splitters of CAB-11";
        reserved(flags, "FDR-S-1", "92-96", "engineering", growth, "2028-12-31");
        reserved(flags, "FDR-S-2", "92-96", "engineering", growth, "2028-12-31");
        reserved(flags, "LAT-11", "8-12", "engineering", growth, "2028-12-31");
    }

    /** The laterals' fibers by the feeder's count. */
    public static Table counts() {
        Table counts = new Table("counts.csv", "cable", "fibers", "name", "numbers");
        for (int cabinet = 1; cabinet <= 12; cabinet++) {
            int first = ((cabinet <= 6 ? cabinet : cabinet - 6) + 2) * 12 + 1;
            counts.add(
                    "LAT-" + (cabinet < 10 ? "0" : "") + cabinet,
                    "1-12",
                    cabinet <= 6 ? "FDR-N" : "FDR-S",
                    first + "-" + (first + 11));
        }
        return counts;
    }

    /** Losses measured one way or both; the last rows are the trace of a repair that nobody wrote down. */
    public static Table measurements() {
        Table table =
                new Table("measurements.csv", "what", "wavelength_nm", "direction", "loss_db", "on", "by", "file");
        double[][] losses = {{0.06, 0.04}, {0.11, 0.03}, {0.05, 0.07}, {0.02, 0.08}};
        for (int i = 0; i < losses.length; i++) {
            String end = "FDR-S-2 ahead " + (i + 1) + " @ C-S03";
            table.add(end, 1550, "ab", losses[i][0], "2025-03-11", "crew 2", "cs03-ab-1550.sor");
            table.add(end, 1550, "ba", losses[i][1], "2025-03-12", "crew 2", "cs03-ba-1550.sor");
        }
        table.add("FDR-N-2 ahead 1 @ C-N02", 1550, "ab", "0.09", "2025-03-18", "crew 4", "cn02-ab-1550.sor");
        for (int fiber = 5; fiber <= 8; fiber++) {
            table.add("RNG-E-1:" + fiber, 1550, "ab", "1.71", "2026-04-22", "crew 3", "rnge1-" + fiber + ".sor");
        }
        return table;
    }

    /** What the demo plans with. */
    public static Table planningValues() {
        Table table = new Table("planning_values.csv", "item", "expected_db", "limit_db", "sd_db", "source");
        String source = "demo planning values";
        table.add("splice.fusion", "0.1", "0.3", "0.05", source);
        table.add("connector", "0.35", "0.75", "0.15", source);
        table.add("splitter.32", "17.5", "17.8", "", source);
        return table;
    }

    /** The records' own settings. */
    public static Table settings() {
        Table table = new Table("settings.csv", "name", "value");
        table.add("owner", "Sallowmere Valley Fiber Cooperative");
        table.add("time_zone", "America/Los_Angeles");
        table.add("unit", "ft");
        table.add("invented", "yes");
        return table;
    }
}
