package sallowmere.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * The cut on FDR-S between HH-S044 and HH-S045, worked by the rules of the records folder: events at 6,038 m and
 * 8,155 m of glass, a reading of 7,412 m at mark 19,784, 136 ft past HH-S044.
 */
final class BackhoeRules {
    private static final double FOOT = 0.3048;

    private final RecordsFolder folder;
    private final Network network;
    private final SpanLengths spans;
    private final List<String> wrong = new ArrayList<>();

    private BackhoeRules(RecordsFolder folder, Network network, SpanLengths spans) {
        this.folder = folder;
        this.network = network;
        this.spans = spans;
    }

    static List<String> of(RecordsFolder folder, Network network, SpanLengths spans) {
        BackhoeRules rules = new BackhoeRules(folder, network, spans);
        rules.reading();
        rules.coils();
        return rules.wrong;
    }

    private void reading() {
        Journey dark = network.from("HE-1/FDR-S/72");
        double near = dark.events.get("C-S03");
        double far = dark.events.get("C-S04");
        near("C-S03, m of glass", near, 6_038, 0.5);
        near("C-S04, m of glass", far, 8_155, 0.5);
        double sheath = (7_412 - near - 1.5) / (1 + network.overlength("FDR-S-2") / 100);
        double mark = 24_220 - sheath / FOOT;
        near("mark of the reading of 7,412 m", mark, 19_784, 0.5);
        Sheath reel = network.sheath("FDR-S-2");
        int seq44 = seq("HH-S044");
        double past = (sheath - reel.out(seq44)) / FOOT;
        near("feet past HH-S044", past, 136, 0.5);
        double span = (reel.in(seq("HH-S045")) - reel.out(seq44)) / FOOT;
        near("sheath of the span, ft", span, 510, 0.01);
        double map = spans.of(span("HH-S045")) / FOOT;
        near("map of the span, ft", map, 503, 0.2);
        double ahead = route("FDR-S-1", "HH-S037") + route("FDR-S-2", "HH-S044") + past / span * map * FOOT;
        near("feet too far when laid along the map", (7_412 - ahead) / FOOT, 1_740, 3);
        near("coil at HH-S044, ft", (reel.out(seq44) - reel.in(seq44)) / FOOT, 100, 0.01);
    }

    /** Twelve coils of 100 ft lie between the headend and the cut. */
    private void coils() {
        double metres = 0;
        for (Map<String, String> row : folder.rows("cable_runs.csv")) {
            boolean first = row.get("cable").equals("FDR-S-1");
            boolean second = row.get("cable").equals("FDR-S-2") && Integer.parseInt(row.get("seq")) <= seq("HH-S044");
            metres += first || second ? SpanLengths.number(row, "slack_m") : 0;
        }
        near("coils of 100 ft before the cut", metres / (100 * FOOT), 12, 0.001);
    }

    private int seq(String structure) {
        return Integer.parseInt(row(structure).get("seq"));
    }

    private String span(String structure) {
        return row(structure).get("span");
    }

    private Map<String, String> row(String structure) {
        return folder.rows("cable_runs.csv").stream()
                .filter(row -> row.get("cable").equals("FDR-S-2")
                        && row.get("structure").equals(structure))
                .findFirst()
                .orElseThrow();
    }

    private double route(String cable, String structure) {
        double route = 0;
        for (Map<String, String> row : folder.rows("cable_runs.csv")) {
            if (row.get("cable").equals(cable)) {
                route += row.get("span").isEmpty() ? 0 : spans.of(row.get("span"));
                if (row.get("structure").equals(structure)) {
                    return route;
                }
            }
        }
        throw new IllegalStateException(cable + " does not visit " + structure);
    }

    private void near(String what, double value, double wanted, double within) {
        System.out.printf(Locale.ROOT, "%-40s %.2f%n", what, value);
        if (Math.abs(value - wanted) > within) {
            wrong.add(what + ": " + value + ", not " + wanted);
        }
    }
}
