package spanwright.suspicion;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** A cause that is weighed: its units, how likely it is before any alarm, and the listed circuits that it takes. */
final class Candidate {

    final Suspect.Kind kind;
    /** Bit i for the listed circuit i. */
    final BitSet circuits = new BitSet();
    /** Units in order along the first circuit's route. */
    final Set<Integer> units = new LinkedHashSet<>();

    final List<String> tubes = new ArrayList<>();
    private final List<Integer> members = new ArrayList<>();
    private double prior;
    private int explains;
    private int contradicts;
    private int guide = -1;

    Candidate(Suspect.Kind kind) {
        this.kind = kind;
    }

    void add(int unit, double probability) {
        members.add(unit);
        prior += probability;
    }

    void counts(int down, int up) {
        explains = down;
        contradicts = up;
    }

    /** A circuit lives on one of its units; the first to do so gives them their order. */
    void met(int circuit, int unit) {
        circuits.set(circuit);
        if (guide < 0) {
            guide = circuit;
        }
        if (guide == circuit) {
            units.add(unit);
        }
    }

    /** Its units in the order of their numbers. */
    List<Integer> members() {
        return members;
    }

    double prior() {
        return prior;
    }

    int explains() {
        return explains;
    }

    int contradicts() {
        return contradicts;
    }

    double score() {
        return Likelihood.score(prior, explains, contradicts);
    }
}
