package spanwright.check;

import java.time.LocalDate;
import java.util.List;
import java.util.function.Consumer;
import spanwright.network.Snapshot;

/** Asks every rule of the records that a person must judge. */
public final class Checker {

    private static final List<Rule> RULES = List.of(
            new MarkRules(),
            new CoilRules(),
            new ServiceRules(),
            new NearCodeRules(),
            new EnclosureRules(),
            new GlassRules(),
            new PortRules(),
            new EntrySlipRules(),
            new CircuitPathRules(),
            new CircuitFrontRules(),
            new MeasurementRules(),
            new DueRules());

    private Checker() {}

    /**
     * All findings, in the order of the rules.
     *
     * @param today the day by which what is due is judged, in the records' own zone
     * @param found hears each finding as it is found
     */
    public static void check(Snapshot snapshot, LocalDate today, Consumer<Finding> found) {
        Checked checked = new Checked(snapshot, today);
        RULES.forEach(rule -> rule.find(checked, found));
    }
}
