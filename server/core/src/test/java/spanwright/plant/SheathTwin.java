package spanwright.plant;

import static java.util.Objects.requireNonNull;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import spanwright.quantity.Length;

/** Sheath positions reckoned the slow way: stretch by stretch, place by place, in decimal metres. */
public final class SheathTwin {

    private SheathTwin() {}

    /** In and out of each row, in metres to the micrometre. */
    public static List<BigDecimal> positions(List<Length> slack, List<Length> spans, List<SheathTie> ties) {
        List<BigDecimal> stretches = new ArrayList<>();
        for (int row = 0; row < slack.size(); row++) {
            if (row > 0) {
                stretches.add(spans.get(row - 1).exactMetres());
            }
            stretches.add(slack.get(row).exactMetres());
        }
        Map<Integer, BigDecimal> marks = new HashMap<>();
        for (SheathTie tie : ties) {
            marks.put(tie.row() * 2 + (tie.out() ? 1 : 0), tie.mark().exactMetres());
        }
        List<BigDecimal> positions = new ArrayList<>();
        positions.add(BigDecimal.ZERO);
        for (int place = 1; place <= stretches.size(); place++) {
            positions.add(position(place, positions, stretches, marks));
        }
        return positions;
    }

    private static BigDecimal position(
            int place, List<BigDecimal> before, List<BigDecimal> stretches, Map<Integer, BigDecimal> marks) {
        int from = place - 1;
        while (from >= 0 && !marks.containsKey(from)) {
            from--;
        }
        int to = place;
        while (to <= stretches.size() && !marks.containsKey(to)) {
            to++;
        }
        if (from < 0 || to > stretches.size()) {
            return before.get(place - 1).add(stretches.get(place - 1));
        }
        BigDecimal sheath = requireNonNull(marks.get(to))
                .subtract(requireNonNull(marks.get(from)))
                .abs();
        BigDecimal whole = sum(stretches, from, to);
        BigDecimal share = whole.signum() == 0
                ? sheath
                : sheath.multiply(sum(stretches, from, place)).divide(whole, 6, RoundingMode.HALF_UP);
        return before.get(from).add(share);
    }

    private static BigDecimal sum(List<BigDecimal> stretches, int from, int to) {
        return stretches.subList(from, to).stream().reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
