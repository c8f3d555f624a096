package spanwright.check;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import spanwright.splicing.Measurement;

/** Measurements that cannot be summed: one way only, so that a difference of fibers looks like loss or gain. */
final class MeasurementRules implements Rule {

    @Override
    public void find(Checked checked, Consumer<Finding> found) {
        Map<List<Object>, List<Measurement>> groups = checked.records()
                .measurements()
                .list()
                .collect(Collectors.groupingBy(
                        measured -> List.of(measured.what(), measured.wavelength()),
                        LinkedHashMap::new,
                        Collectors.toList()));
        groups.values().stream().filter(MeasurementRules::oneWay).forEach(group -> {
            Measurement first = group.get(0);
            found.accept(new Finding(
                    Severity.NOTE,
                    "measured-one-way",
                    "measurements.csv",
                    first.what(),
                    first.what() + " was measured one way only at " + first.wavelength()
                            + ": the reading is shown, and not summed.",
                    "Measure the other way too and record both."));
        });
    }

    private static boolean oneWay(List<Measurement> group) {
        return group.stream().map(Measurement::direction).distinct().count() < 2;
    }
}
