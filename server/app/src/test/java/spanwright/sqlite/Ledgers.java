package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.Ledger;
import spanwright.network.Outcome;
import spanwright.network.RandomPostings;
import spanwright.plant.Setting;

/** What the tests of the records file do again and again. */
final class Ledgers {

    private Ledgers() {}

    /** Opens a file which can be opened. */
    static SqliteLedger open(Path file, Access access) {
        Opening opening = SqliteLedger.open(file, access);
        assertThat(opening).isInstanceOf(Opening.Opened.class);
        return ((Opening.Opened) opening).ledger();
    }

    /** Opens a file which cannot be opened, and says why. */
    static Opening.Unopened refusal(Path file, Access access) {
        Opening opening = SqliteLedger.open(file, access);
        if (opening instanceof Opening.Opened opened) {
            opened.ledger().close();
        }
        assertThat(opening).isInstanceOf(Opening.Unopened.class);
        return (Opening.Unopened) opening;
    }

    /** An entry of one setting. */
    static Ledger.Entry setting(String name, String value) {
        return editor ->
                editor.apply(Change.add(new Setting(editor.records().newIdentity(RecordKind.SETTING), name, value)));
    }

    /** Posts what is not refused. */
    static Outcome.Posted post(Ledger ledger, Ledger.Entry entry) {
        Outcome outcome = ledger.post("Ana", "as built", entry);
        assertThat(outcome).isInstanceOf(Outcome.Posted.class);
        return (Outcome.Posted) outcome;
    }

    /** Posts a small plant and some changes to it. */
    static void postAtRandom(Ledger ledger, long seed, int postings) {
        RandomPostings random = new RandomPostings(seed);
        post(ledger, random.foundation());
        for (int posting = 0; posting < postings; posting++) {
            ledger.post("Ana", "at random", random.next());
        }
    }

    /** Runs statements past the program. */
    static void run(Path file, String sql) throws SQLException {
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file);
                Statement statement = connection.createStatement()) {
            statement.executeUpdate(sql);
        }
    }

    /** Every row of every table of the state, in the order of its key. */
    static List<String> state(Path file) throws SQLException {
        List<String> lines = new ArrayList<>();
        try (Connection connection = DriverManager.getConnection("jdbc:sqlite:" + file)) {
            for (String table : rows(
                    connection, "SELECT name FROM sqlite_schema WHERE type = 'table' AND name NOT LIKE 'posting%'")) {
                lines.add("-- " + table);
                lines.addAll(rows(connection, "SELECT * FROM " + table + " ORDER BY 1, 2"));
            }
        }
        return lines;
    }

    /** The rows of an answer, each as one line. */
    static List<String> rows(Connection connection, String sql) throws SQLException {
        List<String> lines = new ArrayList<>();
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery(sql)) {
            int columns = rows.getMetaData().getColumnCount();
            while (rows.next()) {
                StringBuilder line = new StringBuilder();
                for (int column = 1; column <= columns; column++) {
                    line.append(column == 1 ? "" : "|").append(rows.getString(column));
                }
                lines.add(line.toString());
            }
        }
        return lines;
    }
}
