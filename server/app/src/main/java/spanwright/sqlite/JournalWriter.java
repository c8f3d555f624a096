package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.util.List;
import spanwright.journal.Posting;
import spanwright.sqlite.rows.ChangePacker;

/**
 * Appends postings to the journal. One thread's.
 *
 * <p>The only page of a small posting stands with its head: one row and one page of the file less to make durable.
 */
final class JournalWriter {

    /** A page of more bytes than this would make the heads slow to read through. */
    private static final int SMALL = 1024;

    private final PreparedStatement head;
    private final PreparedStatement page;

    JournalWriter(Connection connection) throws SQLException {
        this.head = connection.prepareStatement("INSERT INTO posting"
                + " (number, posted_at, posted_by, reason, changes, hash, of_table, rows)"
                + " VALUES (?, ?, ?, ?, ?, ?, ?, ?)");
        this.page = connection.prepareStatement(
                "INSERT INTO posting_page (posting, page, of_table, rows) VALUES (?, ?, ?, ?)");
    }

    void write(PackedPosting packed) throws SQLException {
        Posting posting = packed.head();
        head.setInt(1, posting.number());
        head.setString(2, PostingTime.text(posting.at()));
        head.setString(3, posting.by());
        head.setString(4, posting.reason());
        head.setInt(5, posting.changes());
        head.setBytes(6, packed.hash().bytes());
        boolean small = packed.pages().size() == 1 && packed.pages().get(0).rows().length <= SMALL;
        head.setString(7, small ? packed.pages().get(0).table() : null);
        head.setBytes(8, small ? packed.pages().get(0).rows() : null);
        head.executeUpdate();
        if (!small) {
            writePages(posting.number(), packed.pages());
        }
    }

    private void writePages(int posting, List<ChangePacker.Page> pages) throws SQLException {
        int number = 0;
        for (ChangePacker.Page rows : pages) {
            page.setInt(1, posting);
            page.setInt(2, ++number);
            page.setString(3, rows.table());
            page.setBytes(4, rows.rows());
            page.executeUpdate();
        }
    }
}
