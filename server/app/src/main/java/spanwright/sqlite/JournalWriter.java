package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import spanwright.journal.Posting;
import spanwright.sqlite.rows.ChangePacker;

/** Appends postings to the journal. One thread's. */
final class JournalWriter {

    private final PreparedStatement head;
    private final PreparedStatement page;

    JournalWriter(Connection connection) throws SQLException {
        this.head = connection.prepareStatement("INSERT INTO posting"
                + " (number, posted_at, posted_by, reason, changes, hash) VALUES (?, ?, ?, ?, ?, ?)");
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
        head.executeUpdate();
        int number = 0;
        for (ChangePacker.Page rows : packed.pages()) {
            page.setInt(1, posting.number());
            page.setInt(2, ++number);
            page.setString(3, rows.table());
            page.setBytes(4, rows.rows());
            page.executeUpdate();
        }
    }
}
