package spanwright.sqlite;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.ArrayDeque;
import java.util.Deque;
import org.jdbi.v3.core.ConnectionFactory;

/** Connections for reading, lent and taken back; as many as are read from at once. Safe for any number of threads. */
final class Readers implements ConnectionFactory, AutoCloseable {

    /** A question put to the file. */
    @FunctionalInterface
    interface Question<T> {
        /** Asks; the connection is given back afterwards. */
        T ask(Connection connection) throws SQLException;
    }

    private final Path file;
    private final Deque<Connection> idle = new ArrayDeque<>();
    private boolean closed;

    Readers(Path file) {
        this.file = file;
    }

    <T> T ask(Question<T> question) {
        try {
            Connection connection = openConnection();
            try {
                return question.ask(connection);
            } finally {
                closeConnection(connection);
            }
        } catch (SQLException fault) {
            throw new StorageFault(fault);
        }
    }

    @Override
    public Connection openConnection() throws SQLException {
        synchronized (this) {
            Connection connection = idle.poll();
            if (connection != null) {
                return connection;
            }
        }
        return Connections.reading(file);
    }

    @Override
    public void closeConnection(Connection connection) throws SQLException {
        synchronized (this) {
            if (!closed) {
                idle.push(connection);
                return;
            }
        }
        connection.close();
    }

    @Override
    public synchronized void close() throws SQLException {
        closed = true;
        while (!idle.isEmpty()) {
            idle.pop().close();
        }
    }
}
