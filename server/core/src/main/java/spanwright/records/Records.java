package spanwright.records;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.IntConsumer;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;

/** The whole of the records at one posting. Immutable: any number of threads may read it. */
public final class Records extends RecordsView {

    private static final Records EMPTY = empty(RecordKind.values().length, Relation.values().length);

    private final int posting;
    final List<PagedRefs<Recorded>> byKind;
    final int[] counts;
    final int[] limits;
    final List<CodeIndex> codes;
    final List<OwnerIndex> owners;
    final Map<String, List<Integer>> planned;

    Records(
            int posting,
            List<PagedRefs<Recorded>> byKind,
            int[] counts,
            int[] limits,
            List<CodeIndex> codes,
            List<OwnerIndex> owners,
            Map<String, List<Integer>> planned) {
        this.posting = posting;
        this.byKind = List.copyOf(byKind);
        this.counts = counts;
        this.limits = limits;
        this.codes = List.copyOf(codes);
        this.owners = List.copyOf(owners);
        this.planned = planned;
    }

    private static Records empty(int kinds, int relations) {
        int[] limits = new int[kinds];
        Arrays.fill(limits, 1);
        return new Records(
                0,
                Collections.nCopies(kinds, PagedRefs.<Recorded>empty()),
                new int[kinds],
                limits,
                Collections.nCopies(kinds, CodeIndex.empty()),
                Collections.nCopies(relations, OwnerIndex.empty()),
                Map.of());
    }

    /** Records that hold nothing, at posting 0. */
    public static Records empty() {
        return EMPTY;
    }

    /** The last posting that they include; 0 where there is none. */
    public int posting() {
        return posting;
    }

    /**
     * Tells the identity of every record of a kind that other records hold otherwise, or not, or alone. It costs
     * what was changed in between, so neighbours in time are cheap to compare.
     */
    public void differing(RecordKind kind, Records other, IntConsumer hearer) {
        byKind.get(kind.ordinal()).differing(other.byKind.get(kind.ordinal()), hearer);
    }

    /** Begins the next state. */
    public RecordsEditor edit() {
        return new RecordsEditor(this);
    }

    @Override
    public @Nullable Recorded record(RecordKind kind, int id) {
        return byKind.get(kind.ordinal()).find(id);
    }

    @Override
    int identity(RecordKind kind, String code) {
        return codes.get(kind.ordinal()).find(code);
    }

    @Override
    public int limit(RecordKind kind) {
        return limits[kind.ordinal()];
    }

    @Override
    public int count(RecordKind kind) {
        return counts[kind.ordinal()];
    }

    @Override
    public int[] owned(Relation relation, int owner) {
        return owners.get(relation.ordinal()).find(owner);
    }

    @Override
    public List<Integer> plannedJoints(String job) {
        return Objects.requireNonNullElse(planned.get(job), List.of());
    }

    @Override
    public List<String> plannedJobs() {
        return planned.keySet().stream().sorted().toList();
    }
}
