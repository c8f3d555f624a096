package spanwright.sheet;

import java.util.List;
import spanwright.splicing.EndRange;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;

/** Tells what two sides with an = between them are: a splice, a termination or a jumper. */
final class JoinReader {

    LineSaid join(TextPlace place, SaidSide a, SaidSide b, JointWords words) throws MistakeFound {
        if (a.isRest() != b.isRest()) {
            SaidSide rest = a.isRest() ? a : b;
            throw new MistakeFound(
                    rest.place(),
                    "rest-and-range",
                    "The rest is on one side only, so it is not clear which fiber joins which.",
                    "Write rest on both sides, or a range on both.");
        }
        if (a.isPort() || b.isPort()) {
            return new LineSaid.Whole(List.of(withPorts(place, a, b, words)));
        }
        refuse(words.direct() != null, place, "direct and pigtail are said of terminations.", "Leave it out.");
        refuse(words.length() != null, place, "A length is said of a jumper between two ports.", "Leave it out.");
        if (a.isRest()) {
            return new LineSaid.Rest(place, a, b, null, words);
        }
        return new LineSaid.Whole(List.of(
                joins(place, a, b, JointKind.SPLICE, a.leg().kind(), b.leg().kind(), words)));
    }

    private static void refuse(boolean wrong, TextPlace place, String text, String mend) throws MistakeFound {
        if (wrong) {
            throw new MistakeFound(place, "word-not-here", text, mend);
        }
    }

    private static Statement withPorts(TextPlace place, SaidSide a, SaidSide b, JointWords words) throws MistakeFound {
        if (a.isPort() && b.isPort()) {
            SaidSide rear = a.face() == LegKind.REAR ? a : b;
            if (rear.face() == LegKind.REAR) {
                throw new MistakeFound(
                        rear.place(),
                        "rear-or-front",
                        "A rear takes a fiber or a splitter's end, and a port joins another port by a jumper between"
                                + " their fronts.",
                        "Leave rear out for a jumper, or name fibers on the other side.");
            }
            return joins(place, a, b, JointKind.JUMPER, LegKind.FRONT, LegKind.FRONT, words);
        }
        SaidSide ports = a.isPort() ? a : b;
        SaidSide glass = a.isPort() ? b : a;
        if (ports.face() == LegKind.FRONT) {
            throw new MistakeFound(
                    ports.place(),
                    "rear-or-front",
                    "A front takes a jumper or a circuit; fibers are brought to the rear.",
                    "Write rear, or nothing.");
        }
        refuse(words.length() != null, place, "A length is said of a jumper between two ports.", "Leave it out.");
        return joins(
                place,
                ports,
                glass,
                JointKind.TERMINATION,
                LegKind.REAR,
                glass.leg().kind(),
                words);
    }

    private static Statement joins(
            TextPlace place, SaidSide a, SaidSide b, JointKind type, LegKind aKind, LegKind bKind, JointWords words)
            throws MistakeFound {
        EndRange one = a.ends(aKind);
        EndRange other = b.ends(bKind);
        if (one.count() != other.count()) {
            throw new MistakeFound(
                    b.place(),
                    "sides-unlike",
                    "There are " + one.count() + " on one side and " + other.count() + " on the other."
                            + tubeSizes(a, b),
                    "Both sides have the same count: split the line, and say of the ends left over that they are"
                            + " capped or stored.");
        }
        return new Statement.Joins(place, a.place(), b.place(), type, one, other, words);
    }

    private static String tubeSizes(SaidSide a, SaidSide b) {
        CableLeg one = a.cable();
        CableLeg other = b.cable();
        if (one == null
                || other == null
                || one.type().fibersPerTube() == other.type().fibersPerTube()) {
            return "";
        }
        return " A tube of " + one.cable().code() + " holds " + one.type().fibersPerTube() + " fibers, one of "
                + other.cable().code() + " " + other.type().fibersPerTube() + ".";
    }
}
