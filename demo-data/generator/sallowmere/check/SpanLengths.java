package sallowmere.check;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import sallowmere.geo.Frame;

/** Lengths of spans as their rows give them, and whether their lines fit. */
final class SpanLengths {
    private final Map<String, Double> lengths = new HashMap<>();
    private final List<String> wrong = new ArrayList<>();

    SpanLengths(RecordsFolder folder) {
        Map<String, double[]> places = new HashMap<>();
        for (Map<String, String> row : folder.rows("structures.csv")) {
            places.put(row.get("structure"), new double[] {number(row, "lon"), number(row, "lat")});
        }
        for (Map<String, String> row : folder.rows("spans.csv")) {
            measure(row, places.get(row.get("from")), places.get(row.get("to")));
        }
    }

    private void measure(Map<String, String> row, double[] from, double[] to) {
        if (from == null || to == null) {
            wrong.add("spans.csv: " + row.get("span") + " joins structures that are not there");
            return;
        }
        List<double[]> line = line(row.get("line"));
        if (line.isEmpty()) {
            line = List.of(from, to);
        }
        if (apart(line.get(0), from) > 1 || apart(line.get(line.size() - 1), to) > 1) {
            wrong.add("spans.csv: the line of " + row.get("span") + " does not fit its structures");
        }
        double length = 0;
        for (int i = 1; i < line.size(); i++) {
            length += apart(line.get(i - 1), line.get(i));
        }
        if (length <= 0) {
            wrong.add("spans.csv: " + row.get("span") + " has no length");
        }
        lengths.put(row.get("span"), row.get("length_m").isEmpty() ? length : number(row, "length_m"));
    }

    private static List<double[]> line(String text) {
        List<double[]> line = new ArrayList<>();
        if (!text.isEmpty()) {
            String inner = text.substring(text.indexOf('(') + 1, text.indexOf(')'));
            for (String place : inner.split(",")) {
                String[] parts = place.trim().split(" ");
                line.add(new double[] {Double.parseDouble(parts[0]), Double.parseDouble(parts[1])});
            }
        }
        return line;
    }

    private static double apart(double[] p, double[] q) {
        return Frame.distance(p[0], p[1], q[0], q[1]);
    }

    static double number(Map<String, String> row, String column) {
        String text = row.get(column);
        return text.isEmpty() ? 0 : Double.parseDouble(text);
    }

    double of(String span) {
        Double length = lengths.get(span);
        if (length == null) {
            throw new IllegalStateException("no span " + span);
        }
        return length;
    }

    List<String> wrong() {
        return wrong;
    }
}
