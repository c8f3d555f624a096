package spanwright.network;

import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.records.EntryRules;
import spanwright.records.LaterChanges;
import spanwright.records.RecordsEditor;
import spanwright.records.Refusal;
import spanwright.splicing.Leg;

/** Builds the next snapshot from changes. One thread's; dead after {@link #build(int)}. */
public final class SnapshotEditor {

    private final RecordsEditor records;
    private final NetworkEditor network;
    private final EntryRules entryRules;
    private final EndRules endRules;
    private final List<Change> changes = new ArrayList<>();
    private final int base;
    private boolean asIf;

    SnapshotEditor(Snapshot base) {
        this.base = base.records().posting();
        this.records = base.records().edit();
        this.network = new NetworkEditor(base.network(), records);
        this.entryRules = new EntryRules(records);
        this.endRules = new EndRules(records, network);
    }

    /** The records as changed so far, to read and to ask for identities; changes go through {@link #apply}. */
    public RecordsEditor records() {
        return records;
    }

    /**
     * Applies a change if the rules of entry and the rules of ends allow it.
     *
     * @return every rule it breaks, and then it is not applied; nothing where it is
     */
    public List<Refusal> apply(Change change) {
        List<Refusal> refusals = new ArrayList<>(entryRules.refuse(change));
        refusals.addAll(endRules.refuse(change));
        if (refusals.isEmpty()) {
            replay(change);
            entryRules.applied(change);
            endRules.applied(change);
        }
        return refusals;
    }

    /** The number of the posting that this goes on from. */
    public int base() {
        return base;
    }

    /**
     * Takes a posting back: applies the inverse of its changes, the last first, by the same rules as any change.
     *
     * @param posted its changes, in the order in which they were entered
     * @return why it cannot be taken back: what was changed again since, or a rule that breaks; nothing where it is
     */
    public List<Refusal> takeBack(List<Change> posted) {
        List<Refusal> refusals = new ArrayList<>(LaterChanges.ask(records, posted));
        for (int index = posted.size() - 1; index >= 0 && refusals.isEmpty(); index--) {
            refusals.addAll(apply(posted.get(index).inverse()));
        }
        return refusals;
    }

    /** What is wrong with what the applied changes touched, seen as a whole; nothing where all is right. */
    public List<Refusal> finish() {
        List<Refusal> refusals = new ArrayList<>(entryRules.finish());
        if (refusals.isEmpty()) {
            refusals.addAll(endRules.finish());
        }
        return refusals;
    }

    /** The joint in the glass that an end is in, all changes regarded; 0 where it is in none. */
    public int findJoint(Leg leg, int number) {
        return endRules.users().inGlass(leg, number);
    }

    /** The joint planned within a job that an end is in, all changes regarded; 0 where it is in none. */
    public int findPlanned(String job, Leg leg, int number) {
        return endRules.users().planned(job, leg.key(number));
    }

    /** All changes applied or replayed, in order. */
    public List<Change> changes() {
        return List.copyOf(changes);
    }

    /**
     * Applies a change without asking the rules: one that was asked about when it was posted, or the inverse of such.
     *
     * @throws IllegalStateException after {@link #build(String)}
     */
    public void replay(Change change) {
        if (asIf) {
            throw new IllegalStateException("a planned job is built here already");
        }
        network.prepare(change);
        records.apply(change);
        network.follow(change);
        changes.add(change);
    }

    /**
     * Builds a planned job, for an answer as if: its planned joints are in the glass, and each wins over what its ends
     * are in now. The records stay as they are, and no change may follow. A job that nothing names builds nothing.
     */
    public void build(String job) {
        asIf = true;
        for (int joint : records.plannedJoints(job)) {
            network.buildPlanned(records.joints().get(joint));
        }
    }

    /** The changed snapshot; this editor is not used again. */
    public Snapshot build(int posting) {
        Network built = LivingPlant.of(network.build());
        return new Snapshot(records.build(posting), built);
    }
}
