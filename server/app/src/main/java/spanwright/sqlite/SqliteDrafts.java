package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.util.List;
import java.util.NoSuchElementException;
import java.util.Optional;
import java.util.function.Supplier;
import org.jdbi.v3.core.Jdbi;
import spanwright.draft.Draft;
import spanwright.draft.DraftBook;
import spanwright.draft.DraftOutcome;
import spanwright.draft.DraftRules;
import spanwright.draft.DraftStart;
import spanwright.draft.DraftStep;
import spanwright.draft.DraftText;
import spanwright.records.Refusal;

/**
 * Drafts in a records file, written in turn with the postings by the connection that writes them. A file of a schema
 * before them, opened to be read only, holds none.
 */
final class SqliteDrafts implements DraftBook {

    /** The schema that brought the tables of drafts. */
    private static final int SCHEMA = 3;

    private static final String SELECT =
            "SELECT * FROM draft JOIN draft_version ON draft_version.draft = draft.id AND number = at";

    private final BookTurn turn;
    private final Jdbi jdbi;

    SqliteDrafts(BookTurn turn) {
        this.turn = turn;
        this.jdbi = Jdbi.create(turn.readers());
    }

    private boolean hasTables() {
        return turn.hasSchema(SCHEMA);
    }

    @Override
    public List<Draft> list() {
        if (!hasTables()) {
            return List.of();
        }
        return jdbi.withHandle(handle -> handle.createQuery(SELECT + " ORDER BY id DESC")
                .map((row, context) -> DraftRows.draft(row))
                .list());
    }

    @Override
    public Optional<Draft> find(int id) {
        if (!hasTables()) {
            return Optional.empty();
        }
        return jdbi.withHandle(handle -> handle.createQuery(SELECT + " WHERE id = :id")
                .bind("id", id)
                .map((row, context) -> DraftRows.draft(row))
                .findOne());
    }

    private Draft get(int id) {
        return find(id).orElseThrow(() -> new NoSuchElementException("There is no draft " + id + "."));
    }

    private DraftText version(int draft, int number) {
        return jdbi.withHandle(
                handle -> handle.createQuery("SELECT * FROM draft_version WHERE draft = :draft AND number = :number")
                        .bind("draft", draft)
                        .bind("number", number)
                        .map((row, context) -> DraftRows.text(row))
                        .one());
    }

    @Override
    public DraftOutcome begin(DraftStart start) {
        Optional<Refusal> refused = DraftRules.refuse(start);
        if (refused.isPresent()) {
            return new DraftOutcome.Refused(List.of(refused.get()));
        }
        return inTurn(() -> {
            int last = jdbi.withHandle(handle -> handle.createQuery("SELECT coalesce(max(id), 0) FROM draft")
                    .mapTo(Integer.class)
                    .one());
            Draft draft = DraftRules.begin(last + 1, start, turn.now());
            turn.store().commit(connection -> {
                DraftRows.insert(connection, draft);
                DraftRows.insertVersion(connection, draft);
            });
            return new DraftOutcome.Kept(draft);
        });
    }

    @Override
    public DraftOutcome change(int id, int revision, DraftStep step) {
        get(id);
        return inTurn(() -> {
            Draft draft = get(id);
            if (draft.revision() != revision) {
                return new DraftOutcome.Stale(draft);
            }
            Optional<Refusal> refused = DraftRules.refuse(draft, step);
            if (refused.isPresent()) {
                return new DraftOutcome.Refused(List.of(refused.get()));
            }
            Draft after = DraftRules.after(draft, step, turn.now(), number -> version(id, number));
            turn.store().commit(connection -> write(connection, after, step instanceof DraftStep.Save));
            return new DraftOutcome.Kept(after);
        });
    }

    private static void write(Connection connection, Draft draft, boolean saved) throws SQLException {
        DraftRows.update(connection, draft);
        if (saved) {
            try (PreparedStatement forget = connection.prepareStatement(
                    "DELETE FROM draft_version WHERE draft = ? AND (number < ? OR number >= ?)")) {
                forget.setInt(1, draft.id());
                forget.setInt(2, draft.steps().oldest());
                forget.setInt(3, draft.steps().at());
                // Where only the cursor moved, what was undone can still be done again.
                if (draft.steps().at() == draft.steps().newest()) {
                    forget.executeUpdate();
                } else {
                    DraftRows.deleteVersion(connection, draft);
                }
            }
            DraftRows.insertVersion(connection, draft);
        }
    }

    private DraftOutcome inTurn(Supplier<DraftOutcome> writing) {
        return turn.take(writing, refusal -> new DraftOutcome.Refused(List.of(refusal)));
    }
}
