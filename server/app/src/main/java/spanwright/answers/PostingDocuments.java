package spanwright.answers;

import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.journal.Recorded;
import spanwright.network.Ledger;
import spanwright.records.Records;

/** The documents of the journal: postings, and the changes of one. */
public final class PostingDocuments {

    private final Views views;
    private final RowTexts rows;

    /** Of a ledger's journal. */
    public PostingDocuments(Views views, RowTexts rows) {
        this.views = views;
        this.rows = rows;
    }

    /**
     * Heads of postings, the latest first.
     *
     * @param before only postings with a lower number
     * @param limit how many at most
     */
    public void list(Json json, int before, int limit) {
        View now = views.now();
        List<Posting> found = views.ledger().postings(before, limit + 1);
        boolean more = found.size() > limit;
        List<Posting> shown = more ? found.subList(0, limit) : found;
        json.list("postings", shown, (item, posting) -> {
            head(item, now, posting);
            item.whole("changes", posting.changes());
        });
        json.whole("next", more ? (Integer) shown.get(limit - 1).number() : null);
    }

    private static void head(Json json, View view, Posting posting) {
        json.whole("posting", posting.number()).text("time", view.time(posting.at()));
        json.text("by", posting.by()).text("reason", posting.reason());
    }

    /**
     * A posting and a page of its changes, as rows of the records folder.
     *
     * @param from index of the first change listed
     * @param limit how many at most
     */
    public void one(Json json, Posting posting, int from, int limit) {
        Ledger ledger = views.ledger();
        List<Change> changes = ledger.changesOf(posting.number());
        Records before = ledger.asOf(posting.number() - 1).records();
        Records after = ledger.asOf(posting.number()).records();
        int end = (int) Math.min(changes.size(), (long) from + limit);
        head(json, views.now(), posting);
        json.whole("changes_total", changes.size()).whole("next_change", end < changes.size() ? (Integer) end : null);
        json.list("changes", items -> {
            for (int index = Math.min(from, end); index < end; index++) {
                int number = index;
                items.objectHere(item -> change(item, number, changes.get(number), before, after));
            }
        });
    }

    private void change(Json json, int number, Change change, Records before, Records after) {
        Recorded was = change.before();
        Recorded is = change.after();
        RowTexts.RowText old = was == null ? null : rows.of(before, was);
        RowTexts.RowText now = is == null ? null : rows.of(after, is);
        RowTexts.RowText either = now == null ? Objects.requireNonNull(old) : now;
        String both = old == null ? "add" : "change";
        json.whole("change", number).text("action", now == null ? "remove" : both);
        json.text("table", either.table()).text("code", either.code());
        columns(json, "before", old);
        columns(json, "after", now);
    }

    private static void columns(Json json, String name, RowTexts.@Nullable RowText row) {
        if (row == null) {
            json.none(name);
            return;
        }
        json.object(name, item -> {
            for (Map.Entry<String, String> column : row.columns().entrySet()) {
                item.text(column.getKey(), column.getValue());
            }
        });
    }
}
