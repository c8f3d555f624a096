package spanwright.records;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.RunRow;

/**
 * The rules by which changes enter the records, but for those of ends joined twice, which the network keeps.
 * A change is asked about before it is applied ({@link #refuse}), told when it has been ({@link #applied}),
 * and what only several rows together can break is asked at the end ({@link #finish}).
 *
 * <p>One thread's, for one posting.
 */
public final class EntryRules {

    private final RecordsView view;
    private final Set<Integer> touchedRuns = new LinkedHashSet<>();

    /**
     * Rules over a state that is being changed.
     *
     * @param view the state with all changes applied so far, as it is at each call
     */
    public EntryRules(RecordsView view) {
        this.view = view;
    }

    /** Why a change may not be applied to the state as it is; nothing where it may. Every broken rule at once. */
    public List<Refusal> refuse(Change change) {
        Recorded after = change.after();
        if (after == null) {
            return List.of();
        }
        List<Refusal> refusals = new ArrayList<>();
        CodeRules.ask(view, after, refusals);
        return refusals;
    }

    /** Notes a change that has been applied. */
    public void applied(Change change) {
        if (change.kind() == RecordKind.RUN_ROW) {
            touch(change.before());
            touch(change.after());
        }
    }

    private void touch(@Nullable Recorded record) {
        if (record instanceof RunRow row) {
            touchedRuns.add(row.cable());
        }
    }

    /** What is wrong with what the applied changes touched, seen as a whole; nothing where all is right. */
    public List<Refusal> finish() {
        List<Refusal> refusals = new ArrayList<>();
        for (int cable : touchedRuns) {
            RunRules.ask(view, view.runOf(cable), refusals);
        }
        return refusals;
    }
}
