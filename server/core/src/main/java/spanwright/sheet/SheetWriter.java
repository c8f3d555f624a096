package spanwright.sheet;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.network.Snapshot;
import spanwright.plant.Trust;
import spanwright.records.EndNames;
import spanwright.records.RecordsView;
import spanwright.records.Relation;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;
import spanwright.splicing.SpliceMethod;

/** Writes the joints and states of an enclosure as the lines of a sheet. */
public final class SheetWriter {

    private static final int USUAL_JUMPER = 3_000_000;

    private final RecordsView records;
    private final EndNames names;

    /** Writes by the codes of these records. */
    public SheetWriter(RecordsView records) {
        this.records = records;
        this.names = new EndNames(records);
    }

    /**
     * The lines of all that is recorded in an enclosure: joints by their ends, then states.
     *
     * @param enclosure identity of the enclosure
     */
    public static List<String> present(Snapshot snapshot, int enclosure) {
        SheetWriter writer = new SheetWriter(snapshot.records());
        List<String> lines = new ArrayList<>();
        PresentJoints.list(snapshot, enclosure).forEach(joint -> lines.add(writer.line(joint)));
        lines.addAll(writer.states(enclosure));
        return lines;
    }

    private List<String> states(int enclosure) {
        List<EndState> states = records.endStates()
                .owned(Relation.ENCLOSURE_END_STATES, enclosure)
                .toList();
        EnclosureLegs legs = new EnclosureLegs(records, enclosure);
        Set<EndState> written = new HashSet<>();
        List<String> lines = new ArrayList<>();
        for (EndState state : states) {
            EndState twin = twin(state, states, legs);
            if (written.contains(state)) {
                continue;
            }
            written.add(state);
            if (twin == null || written.contains(twin)) {
                lines.add(names.ends(state.ends()) + " " + behind(state));
            } else {
                written.add(twin);
                String cable = names.ends(state.ends()).split(" ", 2)[0];
                lines.add(cable + " " + state.ends().numbers() + " " + behind(state));
            }
        }
        return lines;
    }

    /** The state of the same fibers on the other side, where both say through alike. */
    private static @Nullable EndState twin(EndState state, List<EndState> states, EnclosureLegs legs) {
        if (state.condition() != EndCondition.THROUGH) {
            return null;
        }
        CableLeg leg = legs.find(state.ends().leg()).orElse(null);
        return leg == null || !leg.middle()
                ? null
                : states.stream()
                        .filter(other -> other.condition() == EndCondition.THROUGH
                                && other.ends().leg().owner()
                                        == state.ends().leg().owner()
                                && other.ends().leg().kind()
                                        != state.ends().leg().kind()
                                && other.ends().numbers().equals(state.ends().numbers())
                                && other.trust() == state.trust()
                                && Objects.equals(other.verifiedOn(), state.verifiedOn()))
                        .findFirst()
                        .orElse(null);
    }

    private static String behind(EndState state) {
        StringBuilder text = new StringBuilder(state.condition().word());
        trust(text, state.trust());
        say(text, "seen", state.verifiedOn());
        return text.toString();
    }

    /** A range of joints as a line. */
    public String line(Joint joint) {
        return line(joint.a(), joint.b()) + behind(joint);
    }

    /** Ends joined, and nothing else. */
    String line(EndRange a, EndRange b) {
        return names.ends(a) + " = " + names.ends(b);
    }

    private static String behind(Joint joint) {
        JointFacts facts = joint.facts();
        StringBuilder text = new StringBuilder();
        say(text, "tray", facts.tray());
        method(text, joint);
        say(
                text,
                "loss",
                facts.loss() == null ? null : facts.loss().exactDecibels().toPlainString());
        trust(text, facts.trust());
        say(text, "seen", facts.verifiedOn());
        say(text, "spliced", facts.splicedOn());
        say(text, "by", facts.splicedBy());
        say(text, "until", facts.temporaryUntil());
        say(text, "job", facts.job());
        if (facts.jumperLength() != null && facts.jumperLength().micrometres() != USUAL_JUMPER) {
            text.append("; jumper ").append(facts.jumperLength());
        }
        return text.toString();
    }

    private static void method(StringBuilder text, Joint joint) {
        SpliceMethod method = joint.facts().method();
        boolean termination = joint.type() == JointKind.TERMINATION;
        LegKind glass = joint.b().leg().kind();
        boolean ofSplitter = glass == LegKind.IN || glass == LegKind.OUT;
        if (termination && ofSplitter != (method == null)) {
            text.append(method == null ? "; direct" : "; pigtail");
        }
        if (method == SpliceMethod.MECHANICAL) {
            text.append("; mechanical");
        }
    }

    private static void trust(StringBuilder text, Trust trust) {
        if (trust != Trust.POSTED) {
            text.append("; trust ").append(trust.word());
        }
    }

    private static void say(StringBuilder text, String key, @Nullable Object value) {
        if (value != null) {
            text.append("; ").append(key).append(' ').append(quoted(value.toString()));
        }
    }

    private static String quoted(String text) {
        boolean plain = text.chars().noneMatch(letter -> letter == ';' || letter == '"' || letter == '#')
                && text.equals(text.strip())
                && text.chars().noneMatch(letter -> Character.isWhitespace(letter) && letter != ' ')
                && !text.contains("  ");
        return plain ? text : "\"" + text.replace("\"", "\"\"") + "\"";
    }
}
