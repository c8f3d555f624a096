package spanwright.records;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;
import spanwright.splicing.Joint;

/**
 * Builds the next state of the records from changes. It keeps the indexes right and checks nothing: the rules
 * of entry are asked before a change is applied. One thread's; dead after {@link #build}.
 */
public final class RecordsEditor extends RecordsView {

    private final List<PagedRefs.Editor<Recorded>> byKind;
    private final List<CodeIndex.Editor> codes;
    private final List<OwnerIndex.Editor> owners;
    private final int[] counts;
    private final int[] limits;
    private Map<String, List<Integer>> planned;
    private boolean plannedOwned;

    RecordsEditor(Records base) {
        this.byKind = each(base.byKind, PagedRefs::edit);
        this.codes = each(base.codes, CodeIndex::edit);
        this.owners = each(base.owners, OwnerIndex::edit);
        this.counts = base.counts.clone();
        this.limits = base.limits.clone();
        this.planned = base.planned;
    }

    private static <A, B> List<B> each(List<A> list, Function<A, B> how) {
        // Plain loops: each posting makes and builds these lists.
        List<B> made = new ArrayList<>(list.size());
        for (A one : list) {
            made.add(how.apply(one));
        }
        return made;
    }

    /** Gives the next identity of a kind, never given before. */
    public int newIdentity(RecordKind kind) {
        return limits[kind.ordinal()]++;
    }

    /** Puts one change into effect. */
    public void apply(Change change) {
        Recorded before = change.before();
        if (before != null) {
            forget(before);
        }
        Recorded after = change.after();
        if (after != null) {
            keep(after);
        }
    }

    private void keep(Recorded record) {
        int kind = record.kind().ordinal();
        byKind.get(kind).set(record.id(), record);
        counts[kind]++;
        limits[kind] = Math.max(limits[kind], record.id() + 1);
        index(record);
    }

    private void index(Recorded record) {
        String code = Codes.of(record);
        if (code != null) {
            codes.get(record.kind().ordinal()).put(code, record.id());
        }
        Ownership.tell(
                record, (relation, owner) -> owners.get(relation.ordinal()).add(owner, record.id()));
        if (record instanceof Joint joint && joint.planned()) {
            plannedOf(joint.plannedJob()).add(joint.id());
        }
    }

    private void forget(Recorded record) {
        int kind = record.kind().ordinal();
        byKind.get(kind).set(record.id(), null);
        counts[kind]--;
        String code = Codes.of(record);
        if (code != null) {
            codes.get(kind).remove(code);
        }
        Ownership.tell(
                record, (relation, owner) -> owners.get(relation.ordinal()).remove(owner, record.id()));
        if (record instanceof Joint joint && joint.planned()) {
            List<Integer> ids = plannedOf(joint.plannedJob());
            ids.remove((Integer) joint.id());
            if (ids.isEmpty()) {
                planned.remove(joint.plannedJob());
            }
        }
    }

    private List<Integer> plannedOf(String job) {
        if (!plannedOwned) {
            Map<String, List<Integer>> copy = new HashMap<>();
            planned.forEach((name, ids) -> copy.put(name, new ArrayList<>(ids)));
            planned = copy;
            plannedOwned = true;
        }
        return planned.computeIfAbsent(job, name -> new ArrayList<>());
    }

    /**
     * Takes a whole register as it stands in a trusted store, perhaps loaded page by page. Its records are indexed when
     * an index is first asked. Planned joints are named apart. Only on an editor that holds no record of the kind.
     *
     * @param register all records of the kind by identity
     * @param count how many there are
     * @param limit one more than the largest identity ever given
     */
    public void adopt(RecordKind kind, PagedRefs<Recorded> register, int count, int limit) {
        int place = kind.ordinal();
        byKind.set(place, register.edit());
        counts[place] = count;
        limits[place] = limit;
        Supplier<Stream<Recorded>> records = () ->
                IntStream.range(0, register.size()).mapToObj(register::find).filter(Objects::nonNull);
        codes.set(place, CodeIndex.later(records).edit());
        for (Relation relation : Ownership.relationsOf(kind)) {
            owners.set(relation.ordinal(), OwnerIndex.later(relation, records).edit());
        }
    }

    /** Says that a joint of an adopted register is planned. */
    public void adoptPlanned(Joint joint) {
        plannedOf(joint.plannedJob()).add(joint.id());
    }

    /** Says that identities of a kind below a limit have been given, though their records may be gone. */
    public void reserveIdentities(RecordKind kind, int limit) {
        limits[kind.ordinal()] = Math.max(limits[kind.ordinal()], limit);
    }

    /** The changed records; this editor is not used again. */
    public Records build(int posting) {
        return new Records(
                posting,
                each(byKind, PagedRefs.Editor::build),
                counts,
                limits,
                each(codes, CodeIndex.Editor::build),
                each(owners, OwnerIndex.Editor::build),
                planned);
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
