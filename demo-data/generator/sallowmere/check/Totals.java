package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;

/** Counts and lengths against the figures that the demo is to have. */
final class Totals {
    private final RecordsFolder folder;
    private final List<String> wrong = new ArrayList<>();

    private Totals(RecordsFolder folder) {
        this.folder = folder;
    }

    static List<String> of(RecordsFolder folder, SpanLengths spans, Glass glass) {
        Totals totals = new Totals(folder);
        totals.structures();
        totals.routes(spans);
        totals.cables(spans);
        totals.joints(glass);
        totals.trust();
        totals.circuits();
        totals.flags();
        totals.within("unknown coils, per cent", totals.unknownCoils(), 5, 7);
        totals.within("bytes of the folder", folder.size(), 0, 12_000_000);
        totals.within("bytes of the base map", folder.size("basemap.geojson"), 100_000, 3_000_000);
        return totals.wrong;
    }

    private void structures() {
        Map<String, Integer> kinds = tally("structures.csv", "kind");
        within("poles", kinds.get("pole"), 2_140, 2_220);
        within("joint-use poles", tally("structures.csv", "note").get("joint use"), 1_500, 1_500);
        within("handholes", kinds.get("handhole"), 392, 408);
        within("manholes", kinds.get("manhole"), 9, 9);
        within("bridges", kinds.get("point"), 1, 1);
        within("entrance vaults", kinds.get("vault"), 2, 2);
        within("cabinets", kinds.get("cabinet"), 12, 12);
        within("huts", kinds.get("hut"), 2, 2);
        Map<String, Integer> enclosures = tally("enclosures.csv", "kind");
        within("closures of feeders and ring", enclosures.get("closure"), 34, 34);
        within("distribution terminals", enclosures.get("terminal"), 168, 168);
        within("splitters 1:32", folder.rows("splitters.csv").size(), 78, 78);
    }

    private void routes(SpanLengths spans) {
        Map<String, Double> metres = new HashMap<>();
        for (Map<String, String> span : folder.rows("spans.csv")) {
            metres.merge(span.get("placement"), spans.of(span.get("span")), Double::sum);
        }
        double all = metres.values().stream().mapToDouble(x -> x).sum();
        within("route, km", all / 1000, 155.5, 160.5);
        within("aerial, per cent", 100 * metres.get("aerial") / all, 61, 63);
    }

    private void cables(SpanLengths spans) {
        Map<String, Double> metres = new TreeMap<>();
        Map<String, Integer> counts = new TreeMap<>();
        folder.rowsBy("cable_runs.csv", "cable").forEach((cable, rows) -> {
            String group = cable.startsWith("DST") || cable.startsWith("LAT")
                    ? cable.substring(0, 3)
                    : cable.substring(0, cable.length() - 2);
            double route = rows.stream()
                    .filter(row -> !row.get("span").isEmpty())
                    .mapToDouble(row -> spans.of(row.get("span")))
                    .sum();
            metres.merge(group, route / 1000, Double::sum);
            counts.merge(group, 1, Integer::sum);
        });
        within("FDR-N, km", metres.get("FDR-N"), 14.15, 14.25);
        within("FDR-S, km", metres.get("FDR-S"), 11.85, 11.95);
        within("RNG-E, km", metres.get("RNG-E"), 17.55, 17.65);
        within("laterals, km", metres.get("LAT"), 6.6, 7.8);
        within("distribution, km", metres.get("DST"), 112, 116);
        within("reels of FDR-N", counts.get("FDR-N"), 3, 3);
        within("reels of FDR-S", counts.get("FDR-S"), 2, 2);
        within("reels of RNG-E", counts.get("RNG-E"), 3, 3);
        within("laterals", counts.get("LAT"), 12, 12);
        within("distribution cables", counts.get("DST"), 36, 36);
    }

    /** Joints made by fusion: splices, and pigtails of terminations. */
    private void joints(Glass glass) {
        within("joints", glass.count("splice") + glass.count("pigtail"), 6_650, 6_800);
    }

    private void trust() {
        Map<String, Integer> joints = new TreeMap<>();
        folder.rows("splices.csv").forEach(row -> joints.merge(row.get("trust"), count(row.get("a")), Integer::sum));
        for (Map<String, String> row : folder.rows("terminations.csv")) {
            if (row.get("method").equals("pigtail")) {
                joints.merge(row.get("trust"), Glass.numbers(row.get("ports")).size(), Integer::sum);
            }
        }
        joints.remove("planned");
        double all = joints.values().stream().mapToInt(x -> x).sum();
        within("posted, per cent", 100 * joints.get("posted") / all, 69, 71);
        within("verified, per cent", 100 * joints.get("verified") / all, 17, 19);
        within("unverified legacy, per cent", 100 * joints.get("reported") / all, 8.3, 9.7);
        within("unknown, per cent", 100 * joints.get("unknown") / all, 2.5, 3.5);
    }

    private static int count(String ends) {
        String[] parts = ends.split(" ");
        return parts.length == 2 ? 1 : Glass.numbers(parts[2]).size();
    }

    private void circuits() {
        int subscribers = 0;
        int others = 0;
        int voice = 0;
        for (Map<String, String> row : folder.rows("circuits.csv")) {
            boolean subscriber = row.get("circuit").startsWith("PON-");
            subscribers += subscriber ? 1 : 0;
            others += subscriber ? 0 : 1;
            boolean cut = row.get("circuit").matches("PON-(09|10|11|12)-.*");
            voice += cut && row.get("service").contains("voice") ? 1 : 0;
        }
        within("subscribers", subscribers, 1_620, 1_620);
        within("circuits from point to point", others, 31, 31);
        within("voice lines behind CAB-09 to CAB-12", voice, 410, 410);
    }

    private void flags() {
        int dead = 0;
        int lapsed = 0;
        for (Map<String, String> row : folder.rows("fiber_flags.csv")) {
            dead += row.get("flag").equals("dead")
                    ? Glass.numbers(row.get("fibers")).size()
                    : 0;
            boolean over = !row.get("until").isEmpty() && row.get("until").compareTo("2026-12-01") < 0;
            lapsed += row.get("flag").equals("reserved") && over ? 1 : 0;
        }
        within("dead fibers", dead, 9, 9);
        within("lapsed reservations", lapsed, 11, 11);
        long sheets = folder.rows("terminations.csv").stream()
                .filter(row -> row.get("trust").equals("planned"))
                .map(row -> row.get("job"))
                .distinct()
                .count();
        within("sheets that wait", sheets, 14, 14);
    }

    private double unknownCoils() {
        Map<String, Integer> trust = tally("cable_runs.csv", "slack_trust");
        int all = trust.values().stream().mapToInt(x -> x).sum() - trust.get("");
        return 100.0 * trust.get("unknown") / all;
    }

    private Map<String, Integer> tally(String file, String column) {
        Map<String, Integer> tally = new HashMap<>();
        folder.rows(file).forEach(row -> tally.merge(row.get(column), 1, Integer::sum));
        return tally;
    }

    private void within(String what, double value, double least, double most) {
        System.out.printf(Locale.ROOT, "%-40s %.2f%n", what, value);
        if (value < least || value > most) {
            wrong.add(what + ": " + value + " is not from " + least + " to " + most);
        }
    }
}
