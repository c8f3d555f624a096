package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Walks light through the records and sums what it meets. */
public final class Network {
    private final Glass glass;
    private final Map<String, Sheath> sheaths = new HashMap<>();
    private final Map<String, Double> overlengths = new HashMap<>();
    private final Map<String, Double> trays = new HashMap<>();

    /** Builds the network of a folder. */
    public Network(RecordsFolder folder) {
        this(folder, new Glass(folder), new SpanLengths(folder));
    }

    Network(RecordsFolder folder, Glass glass, SpanLengths spans) {
        this.glass = glass;
        Map<String, List<Map<String, String>>> marks = folder.rowsBy("sheath_marks.csv", "cable");
        Map<String, List<Map<String, String>>> runs = folder.rowsBy("cable_runs.csv", "cable");
        Map<String, List<Map<String, String>>> types = folder.rowsBy("cable_types.csv", "cable_type");
        for (Map<String, String> cable : folder.rows("cables.csv")) {
            String code = cable.get("cable");
            String ink = cable.get("marks_ink").isEmpty() ? "white" : cable.get("marks_ink");
            List<Map<String, String>> governing = marks.getOrDefault(code, List.of()).stream()
                    .filter(mark -> (mark.get("ink").isEmpty() ? "white" : mark.get("ink")).equals(ink))
                    .toList();
            sheaths.put(code, new Sheath(runs.get(code), governing, spans));
            Map<String, String> type = types.get(cable.get("cable_type")).get(0);
            Map<String, String> from = cable.get("overlength_pct").isEmpty() ? type : cable;
            overlengths.put(code, SpanLengths.number(from, "overlength_pct"));
        }
        for (Map<String, String> enclosure : folder.rows("enclosures.csv")) {
            trays.put(enclosure.get("enclosure"), SpanLengths.number(enclosure, "tray_glass_m"));
        }
    }

    Sheath sheath(String cable) {
        return sheaths.get(cable);
    }

    double overlength(String cable) {
        return overlengths.get(cable);
    }

    /** The path from a port's front through its rear, upward through splitters, as far as it goes without a choice. */
    public Journey from(String port) {
        Journey journey = new Journey(port);
        String end = rear(port);
        journey.connectors++;
        while (end != null && journey.steps < 200) {
            journey.steps++;
            String peer = glass.peer(end);
            journey.end = end;
            if (peer == null) {
                break;
            }
            String kind = glass.kind(end);
            journey.splices += kind.equals("splice") || kind.equals("pigtail") ? 1 : 0;
            end = beyond(peer, journey);
        }
        return journey;
    }

    /** Crosses what an end belongs to; null where the path ends there. */
    private String beyond(String end, Journey journey) {
        String[] parts = end.split("\\|");
        switch (parts[2]) {
            case "rear" -> {
                journey.connectors++;
                String front = parts[0] + "|" + parts[1] + "|front|" + parts[3];
                String patched = glass.peer(front);
                journey.end = parts[0] + "/" + parts[1] + "/" + parts[3];
                if (patched == null) {
                    return null;
                }
                journey.connectors++;
                journey.jumpers++;
                return patched.replace("|front|", "|rear|");
            }
            case "out" -> {
                journey.splitters++;
                return parts[0] + "|" + parts[1] + "|in|1";
            }
            case "in" -> {
                journey.end = end;
                return null;
            }
            default -> {
                String far = glass.far(end);
                travel(end, far, journey);
                return far;
            }
        }
    }

    private void travel(String from, String to, Journey journey) {
        String[] a = from.split("\\|");
        String[] b = to.split("\\|", -1);
        Sheath sheath = sheaths.get(a[1]);
        int leaves = glass.seq(a[0], a[1]);
        int arrives = glass.seq(b[0], a[1]);
        double metres = Math.abs(sheath.enclosure(arrives) - sheath.enclosure(leaves));
        journey.sheath += metres;
        double tray = trays.getOrDefault(a[0], 0.0) + trays.getOrDefault(b[0], 0.0);
        journey.glass += metres * (1 + overlengths.get(a[1]) / 100) + tray;
        journey.events.put(b[0].isEmpty() ? to : b[0], journey.glass);
        journey.stretches.add(new Stretch(a[1], Integer.parseInt(a[3]), leaves, arrives));
    }

    private static String rear(String port) {
        return Glass.front(port).replace("|front|", "|rear|");
    }

    /** The first ports of a range of ports such as {@code E1/P/1-2}. */
    static List<String> ports(String range) {
        String[] parts = range.split("/");
        List<String> ports = new ArrayList<>();
        for (int number : Glass.numbers(parts[2])) {
            ports.add(parts[0] + "/" + parts[1] + "/" + number);
        }
        return ports;
    }
}
