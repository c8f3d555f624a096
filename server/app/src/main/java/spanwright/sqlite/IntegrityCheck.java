package spanwright.sqlite;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionStage;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Reads the whole file beside everything else, and says whether it is sound. */
final class IntegrityCheck {

    private static final Logger LOG = LoggerFactory.getLogger(IntegrityCheck.class);

    private final Readers readers;
    private final CompletableFuture<Integrity> result = new CompletableFuture<>();
    private boolean begun;
    private @Nullable Statement running;

    IntegrityCheck(Readers readers) {
        this.readers = readers;
    }

    /** Begins the check unless it has begun. */
    synchronized CompletionStage<Integrity> begin() {
        if (!begun) {
            begun = true;
            Thread thread = new Thread(this::run, "integrity check");
            thread.setDaemon(true);
            thread.start();
        }
        return result.minimalCompletionStage();
    }

    private void run() {
        try {
            Integrity found = new Integrity(readers.ask(this::check));
            if (!found.sound()) {
                LOG.error("The records file is damaged: {}. Go back to a backup.", String.join("; ", found.findings()));
            }
            result.complete(found);
        } catch (RuntimeException fault) {
            // Given up because the file is being closed, or unreadable, which whoever reads it is told as well.
            result.completeExceptionally(fault);
        }
    }

    private List<String> check(Connection connection) throws SQLException {
        List<String> findings = new ArrayList<>();
        try (Statement statement = connection.createStatement()) {
            synchronized (this) {
                running = statement;
            }
            for (String question : List.of("PRAGMA integrity_check", "PRAGMA foreign_key_check")) {
                try (ResultSet rows = statement.executeQuery(question)) {
                    while (rows.next()) {
                        findings.add(question.endsWith("foreign_key_check") ? reference(rows) : rows.getString(1));
                    }
                }
            }
        } finally {
            synchronized (this) {
                running = null;
            }
        }
        findings.remove("ok");
        return findings;
    }

    private static String reference(ResultSet row) throws SQLException {
        return row.getString(1) + " row " + row.getLong(2) + " refers to what is not in " + row.getString(3);
    }

    /** Gives the check up if it is still running. */
    synchronized void stop() throws SQLException {
        if (!begun) {
            begun = true;
            result.completeExceptionally(new CancellationException("the file was closed"));
        }
        Statement statement = running;
        if (statement != null) {
            statement.cancel();
        }
    }
}
