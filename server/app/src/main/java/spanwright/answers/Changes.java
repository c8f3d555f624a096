package spanwright.answers;

import java.util.Optional;
import spanwright.journal.Posting;
import spanwright.journal.RecordKind;

/** Says by which posting a record was last changed. */
public final class Changes {

    private final View view;
    private final Finder finder;

    /** Of what a view shows. */
    public Changes(View view, Finder finder) {
        this.view = view;
        this.finder = finder;
    }

    void write(Json json, String name, RecordKind kind, int id) {
        reference(json, name, finder.find(kind, id, view.posting()));
    }

    /** The head of a posting, or null. */
    void reference(Json json, String name, Optional<Posting> posting) {
        if (posting.isEmpty()) {
            json.none(name);
        } else {
            json.object(name, head -> head(head, posting.get()));
        }
    }

    private void head(Json json, Posting posting) {
        json.whole("posting", posting.number()).text("time", view.time(posting.at()));
        json.text("by", posting.by()).text("reason", posting.reason());
    }

    /** Looks a change up in the journal. */
    public interface Finder {

        /** The last posting, up to one and including it, that changed a record; empty where it is not known. */
        Optional<Posting> find(RecordKind kind, int id, int upTo);
    }
}
