package spanwright.planning;

import java.util.BitSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import spanwright.quantity.Wavelength;

/**
 * A search for a path over spare glass. No end is both a start and a goal. Bit sets are shared, not copied: whoever made them leaves them alone.
 *
 * @param starts where it may begin, any of them
 * @param goals where it may end, any of them
 * @param wavelength at which losses are summed
 * @param mostLoss the most it may lose, in microdecibels; {@link #UNBOUNDED} for any
 * @param verifiedOnly whether spare glass must be verified
 * @param own pieces that may be used though not spare: what is left of the path that is down
 * @param closed pieces that may not be used
 * @param closedEnclosures enclosures in which nothing may be crossed or joined
 * @param taken pieces that others have taken
 * @param visited structures where hands work anyway: a visit there costs nothing
 * @param shunned what the path may not meet
 */
public record SpareQuery(
        List<SpareStart> starts,
        List<SpareGoal> goals,
        Wavelength wavelength,
        long mostLoss,
        boolean verifiedOnly,
        BitSet own,
        BitSet closed,
        BitSet closedEnclosures,
        Set<Integer> taken,
        Set<Integer> visited,
        Set<SpareStretch> shunned) {

    /** No bound of loss. */
    public static final long UNBOUNDED = Long.MAX_VALUE;

    /** Keeps its own copies of the lists and sets. */
    public SpareQuery {
        starts = List.copyOf(starts);
        goals = List.copyOf(goals);
        taken = Set.copyOf(taken);
        visited = Set.copyOf(visited);
        shunned = Set.copyOf(shunned);
    }

    /** From anywhere to anywhere named, over any spare glass. */
    public static SpareQuery of(List<SpareStart> starts, List<SpareGoal> goals, Wavelength wavelength) {
        return new SpareQuery(
                starts,
                goals,
                wavelength,
                UNBOUNDED,
                false,
                new BitSet(),
                new BitSet(),
                new BitSet(),
                Set.of(),
                Set.of(),
                Set.of());
    }

    /** The same with other ends. */
    public SpareQuery between(List<SpareStart> from, List<SpareGoal> to) {
        return new SpareQuery(
                from, to, wavelength, mostLoss, verifiedOnly, own, closed, closedEnclosures, taken, visited, shunned);
    }

    /** The same within another bound of loss, in microdecibels. */
    public SpareQuery within(long most) {
        return new SpareQuery(
                starts, goals, wavelength, most, verifiedOnly, own, closed, closedEnclosures, taken, visited, shunned);
    }

    /** The same with spare glass verified, or not. */
    public SpareQuery verified(boolean only) {
        return new SpareQuery(
                starts, goals, wavelength, mostLoss, only, own, closed, closedEnclosures, taken, visited, shunned);
    }

    /** The same with other pieces of its own, and others closed. */
    public SpareQuery over(BitSet ownPieces, BitSet closedPieces, BitSet enclosures) {
        return new SpareQuery(
                starts,
                goals,
                wavelength,
                mostLoss,
                verifiedOnly,
                ownPieces,
                closedPieces,
                enclosures,
                taken,
                visited,
                shunned);
    }

    /** The same with more pieces taken, and more structures visited anyway. */
    public SpareQuery beside(Set<Integer> pieces, Set<Integer> structures) {
        Set<Integer> more = new HashSet<>(taken);
        more.addAll(pieces);
        Set<Integer> visits = new HashSet<>(visited);
        visits.addAll(structures);
        return new SpareQuery(
                starts,
                goals,
                wavelength,
                mostLoss,
                verifiedOnly,
                own,
                closed,
                closedEnclosures,
                more,
                visits,
                shunned);
    }

    /** The same without these stretches. */
    SpareQuery shunning(Set<SpareStretch> stretches) {
        return new SpareQuery(
                starts,
                goals,
                wavelength,
                mostLoss,
                verifiedOnly,
                own,
                closed,
                closedEnclosures,
                taken,
                visited,
                stretches);
    }
}
