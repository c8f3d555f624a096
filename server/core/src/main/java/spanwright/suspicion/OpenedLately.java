package spanwright.suspicion;

import java.time.LocalDate;
import java.time.temporal.ChronoUnit;
import java.util.BitSet;
import java.util.HashMap;
import java.util.Map;
import java.util.TreeMap;
import spanwright.plant.CableType;
import spanwright.records.Records;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;

/** The enclosures that were opened lately, as a crew says or as joints made there tell, and the tubes spliced in them. */
final class OpenedLately {

    private final Records records;
    /** How likely a crossing made there comes to light only now: 1 tonight, less for every day since. */
    private final Map<Integer, Double> fresh = new TreeMap<>();
    /** Of each leg that is the a side of splices there, the tubes, bit t for tube t. */
    private final Map<Integer, Map<Leg, BitSet>> tubes = new HashMap<>();

    OpenedLately(Records records, Alarms alarms) {
        this.records = records;
        alarms.opened().forEach(enclosure -> fresh.put(enclosure, Likelihood.fresh(0)));
        if (alarms.today() != null) {
            splices(alarms.today());
            alarms.posted()
                    .forEach((enclosure, day) -> opened(enclosure, day, alarms.today(), Likelihood.POSTED_AFTER));
        }
        if (!fresh.isEmpty()) {
            records.joints()
                    .list()
                    .filter(joint -> joint.type() == JointKind.SPLICE && !joint.planned())
                    .filter(joint -> fresh.containsKey(joint.enclosure())
                            && glass(joint.a().leg()))
                    .forEach(joint -> tubes.computeIfAbsent(joint.enclosure(), key -> new HashMap<>())
                            .computeIfAbsent(joint.a().leg(), key -> new BitSet())
                            .or(tubesOf(joint.a())));
        }
    }

    private void splices(LocalDate today) {
        for (Joint joint : (Iterable<Joint>) records.joints().list()::iterator) {
            LocalDate made = joint.facts().splicedOn();
            if (made != null && joint.type() == JointKind.SPLICE && !joint.planned()) {
                opened(joint.enclosure(), made, today, 1);
            }
        }
    }

    /** Of several signs of one enclosure the likeliest counts. */
    private void opened(int enclosure, LocalDate day, LocalDate today, double share) {
        long before = ChronoUnit.DAYS.between(day, today);
        if (before >= 0 && before <= Likelihood.LATELY) {
            fresh.merge(enclosure, share * Likelihood.fresh((double) before), Math::max);
        }
    }

    private static boolean glass(Leg leg) {
        return leg.kind() == LegKind.BACK || leg.kind() == LegKind.AHEAD;
    }

    private BitSet tubesOf(EndRange range) {
        BitSet found = new BitSet();
        CableType type = type(range.leg());
        for (int index = 0; index < range.count(); index++) {
            found.set(type.tubeOf(range.numbers().at(index)));
        }
        return found;
    }

    /** The type of the cable to which a leg belongs. */
    CableType type(Leg leg) {
        int cable = records.runRows().get(leg.owner()).cable();
        return records.cableTypes().get(records.cables().get(cable).cableType());
    }

    boolean none() {
        return fresh.isEmpty();
    }

    /** How likely a crossing made in one of the enclosures comes to light only now; at most 1. */
    double fresh(int enclosure) {
        return fresh.getOrDefault(enclosure, 0.0);
    }

    Map<Leg, BitSet> tubes(int enclosure) {
        return tubes.getOrDefault(enclosure, Map.of());
    }

    Iterable<Integer> enclosures() {
        return fresh.keySet();
    }
}
