package sallowmere.check;

import java.util.List;
import java.util.Map;

/**
 * Sheath positions along one cable by the rules of the records folder: nominal positions from spans and coils, tied by
 * the marks of the governing ink, what lies between two ties shared out in proportion.
 */
final class Sheath {
    private static final double FOOT = 0.3048;

    private final double[] in;
    private final double[] out;

    /**
     * Reckons.
     *
     * @param runs rows of the cable's run in order
     * @param marks rows of its marks in the governing ink
     */
    Sheath(List<Map<String, String>> runs, List<Map<String, String>> marks, SpanLengths spans) {
        int rows = runs.size();
        double[] nominal = new double[2 * rows];
        for (int row = 0; row < rows; row++) {
            if (row > 0) {
                nominal[2 * row] = nominal[2 * row - 1] + spans.of(runs.get(row).get("span"));
            }
            nominal[2 * row + 1] = nominal[2 * row] + SpanLengths.number(runs.get(row), "slack_m");
        }
        double[] tied = tie(nominal, marks);
        in = new double[rows];
        out = new double[rows];
        for (int row = 0; row < rows; row++) {
            in[row] = tied[2 * row] - tied[0];
            out[row] = tied[2 * row + 1] - tied[0];
        }
    }

    private static double[] tie(double[] nominal, List<Map<String, String>> marks) {
        Double[] values = new Double[nominal.length];
        for (Map<String, String> mark : marks) {
            int seq = Integer.parseInt(mark.get("seq"));
            double unit = mark.get("unit").equals("ft") ? FOOT : 1;
            if (!mark.get("mark_in").isEmpty()) {
                values[2 * seq] = Double.parseDouble(mark.get("mark_in")) * unit;
            }
            if (!mark.get("mark_out").isEmpty()) {
                values[2 * seq + 1] = Double.parseDouble(mark.get("mark_out")) * unit;
            }
        }
        double[] tied = nominal.clone();
        int last = -1;
        for (int i = 0; i < values.length; i++) {
            if (values[i] == null) {
                if (last >= 0) {
                    tied[i] = tied[last] + nominal[i] - nominal[last];
                }
                continue;
            }
            if (last >= 0) {
                share(nominal, tied, last, i, Math.abs(values[i] - values[last]));
            }
            last = i;
        }
        return tied;
    }

    private static void share(double[] nominal, double[] tied, int from, int to, double sheath) {
        double whole = nominal[to] - nominal[from];
        for (int i = from + 1; i <= to; i++) {
            double part = i == to ? 1 : whole == 0 ? 0 : (nominal[i] - nominal[from]) / whole;
            tied[i] = tied[from] + sheath * part;
        }
    }

    double in(int row) {
        return in[row];
    }

    double out(int row) {
        return out[row];
    }

    /** Where an enclosure sits. */
    double enclosure(int row) {
        if (row == 0) {
            return in[0];
        }
        return row == in.length - 1 ? out[row] : (in[row] + out[row]) / 2;
    }
}
