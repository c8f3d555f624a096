package spanwright.network;

import java.util.ArrayList;
import java.util.List;
import spanwright.records.Refusal;

/** The rules of a posting, the same for every ledger. */
public final class PostingRules {

    private PostingRules() {}

    /** Why a posting cannot be made by this person for this reason; empty where it can. */
    public static List<Refusal> refuse(String by, String reason) {
        List<Refusal> refusals = new ArrayList<>();
        if (by.isBlank()) {
            refusals.add(new Refusal(
                    "posting-by-nobody", "A posting is made by a person: say who posts.", null, null, null));
        }
        if (reason.isBlank()) {
            refusals.add(new Refusal(
                    "posting-without-reason", "A posting has a reason: say why it is made.", null, null, null));
        }
        return refusals;
    }

    /**
     * Enters a posting, and asks the rules over several rows whether the entry did or not.
     *
     * @return why it cannot be posted; empty where it can
     */
    public static List<Refusal> enter(Ledger.Entry entry, SnapshotEditor editor) {
        List<Refusal> refusals = entry.enter(editor);
        return refusals.isEmpty() ? editor.finish() : refusals;
    }
}
