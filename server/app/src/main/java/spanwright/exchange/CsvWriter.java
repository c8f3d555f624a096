package spanwright.exchange;

import java.io.BufferedWriter;
import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;

/** Writes rows as RFC 4180 has them: CR LF behind each, quotes around a field only where it needs them. */
final class CsvWriter implements Closeable {

    private final Writer writer;

    CsvWriter(OutputStream bytes) {
        this.writer = new BufferedWriter(new OutputStreamWriter(bytes, StandardCharsets.UTF_8), 1 << 16);
    }

    /** Writes one row. */
    void row(Iterable<String> fields) throws IOException {
        boolean first = true;
        for (String field : fields) {
            if (!first) {
                writer.write(',');
            }
            first = false;
            field(field);
        }
        writer.write("\r\n");
    }

    private void field(String field) throws IOException {
        if (!needsQuotes(field)) {
            writer.write(field);
            return;
        }
        writer.write('"');
        writer.write(field.replace("\"", "\"\""));
        writer.write('"');
    }

    private static boolean needsQuotes(String field) {
        for (int index = 0; index < field.length(); index++) {
            char c = field.charAt(index);
            if (c == ',' || c == '"' || c == '\n' || c == '\r') {
                return true;
            }
        }
        return false;
    }

    @Override
    public void close() throws IOException {
        writer.close();
    }
}
