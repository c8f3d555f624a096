package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.mapper.RowMapper;
import spanwright.journal.Change;
import spanwright.journal.Posting;
import spanwright.sqlite.rows.ChangePacker;

/**
 * Reads the journal. Safe for any number of threads.
 *
 * <p>What people ask of it now and then goes through Jdbi, for the named parameters and the mapping. Pages of changes,
 * as all that is written, go by plain JDBC: there may be thousands, and they are read within a caller's transaction.
 */
final class Journal {

    private static final String HEAD = "SELECT number, posted_at, posted_by, reason, changes FROM posting ";
    private static final String SMALL = "SELECT of_table, rows FROM posting WHERE number = ? AND of_table IS NOT NULL";
    private static final String PAGES = "SELECT of_table, rows FROM posting_page WHERE posting = ? ORDER BY page";
    private static final RowMapper<Posting> POSTING = (row, context) -> posting(row);

    private final Readers readers;
    private final Jdbi jdbi;

    Journal(Readers readers) {
        this.readers = readers;
        this.jdbi = Jdbi.create(readers);
    }

    private static Posting posting(ResultSet row) throws SQLException {
        return new Posting(
                row.getInt(1), PostingTime.parse(row.getString(2)), row.getString(3), row.getString(4), row.getInt(5));
    }

    List<Posting> list(int before, int limit) {
        return jdbi.withHandle(
                handle -> handle.createQuery(HEAD + "WHERE number < :before ORDER BY number DESC LIMIT :limit")
                        .bind("before", before)
                        .bind("limit", limit)
                        .map(POSTING)
                        .list());
    }

    Optional<Posting> find(int number) {
        return jdbi.withHandle(handle -> handle.createQuery(HEAD + "WHERE number = :number")
                .bind("number", number)
                .map(POSTING)
                .findOne());
    }

    /** The number of the last posting made at an instant or before it; 0 where there is none. */
    int numberAt(Instant at) {
        return jdbi.withHandle(
                handle -> handle.createQuery("SELECT coalesce(max(number), 0) FROM posting" + " WHERE posted_at <= :at")
                        .bind("at", PostingTime.text(at))
                        .mapTo(Integer.class)
                        .one());
    }

    /** How many changes the postings after one, up to another, hold together. */
    long changesBetween(int after, int upTo) {
        return jdbi.withHandle(handle -> handle.createQuery(
                        "SELECT coalesce(sum(changes), 0) FROM posting" + " WHERE number > :after AND number <= :upTo")
                .bind("after", after)
                .bind("upTo", upTo)
                .mapTo(Long.class)
                .one());
    }

    /** The changes of a posting, in order; none where there is no such posting. */
    List<Change> changesOf(int posting) {
        return readers.ask(connection -> changes(connection, posting));
    }

    static List<Change> changes(Connection connection, int posting) throws SQLException {
        List<Change> small = unpack(connection, SMALL, posting);
        return small.isEmpty() ? unpack(connection, PAGES, posting) : small;
    }

    private static List<Change> unpack(Connection connection, String question, int posting) throws SQLException {
        List<Change> changes = new ArrayList<>();
        try (PreparedStatement pages = connection.prepareStatement(question)) {
            pages.setInt(1, posting);
            try (ResultSet rows = pages.executeQuery()) {
                while (rows.next()) {
                    changes.addAll(ChangePacker.unpack(new ChangePacker.Page(rows.getString(1), rows.getBytes(2))));
                }
            }
        }
        return changes;
    }
}
