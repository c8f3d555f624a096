package spanwright.check;

import spanwright.records.RecordsView;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;

/** Writes joints as a person does: {@code F-1 ahead 1-12 = D-7 ahead 1-12}. */
final class JointText {

    private JointText() {}

    static String of(Checked checked, Joint joint) {
        return side(checked.records(), joint.a()) + " = " + side(checked.records(), joint.b());
    }

    static String file(Joint joint) {
        return switch (joint.type()) {
            case SPLICE -> "splices.csv";
            case TERMINATION -> "terminations.csv";
            case JUMPER -> "jumpers.csv";
        };
    }

    static String side(RecordsView records, EndRange ends) {
        return leg(records, ends.leg(), ends.numbers().toString());
    }

    static String leg(RecordsView records, Leg leg, String numbers) {
        return switch (leg.kind()) {
            case BACK -> cable(records, leg) + " back " + numbers;
            case AHEAD -> cable(records, leg) + " ahead " + numbers;
            case IN -> records.splitters().get(leg.owner()).code() + " in " + numbers;
            case OUT -> records.splitters().get(leg.owner()).code() + " out " + numbers;
            case REAR, FRONT -> port(records, leg.owner(), numbers);
        };
    }

    static String port(RecordsView records, int panel, String numbers) {
        var found = records.panels().get(panel);
        return records.enclosures().get(found.enclosure()).code() + "/" + found.code() + "/" + numbers;
    }

    private static String cable(RecordsView records, Leg leg) {
        return records.cables().get(records.runRows().get(leg.owner()).cable()).code();
    }
}
