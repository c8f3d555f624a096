package spanwright.draft;

import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;

/** Where drafts are kept. Any number of threads may use it; what it says is kept is durable. */
public interface DraftBook {

    /** Every draft, the newest first. */
    List<Draft> list();

    /** The draft of a number, if there is one. */
    Optional<Draft> find(int id);

    /** Begins a draft. */
    DraftOutcome begin(DraftStart start);

    /**
     * Changes a draft.
     *
     * @param revision the revision upon which the change was made
     * @throws NoSuchElementException where there is no such draft
     */
    DraftOutcome change(int id, int revision, DraftStep step);
}
