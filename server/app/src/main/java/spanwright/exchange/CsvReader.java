package spanwright.exchange;

import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;
import org.jspecify.annotations.Nullable;

/**
 * Reads the rows of one file as RFC 4180 has them, strictly: a quote stands only around a whole field, a
 * carriage return only before a line feed or inside quotes, control characters nowhere. Bytes are UTF-8, a byte
 * order mark allowed. A row that is not so is reported at the line where it begins and passed over.
 *
 * <p>A row is read in place: its fields are slices of the buffer and hold until the next row. Rows above
 * {@value #MOST_CHARS} characters are passed over without being held, so memory is bounded.
 *
 * <p>Lost to this: FastCSV, which takes text after a closing quote as part of the field and makes a string of
 * every field.
 */
final class CsvReader {

    /** The most characters of one row that are held. */
    static final int MOST_CHARS = 1 << 22;

    /** The most characters of one field. */
    static final int MOST_FIELD_CHARS = 1_000_000;

    /** The most fields of one row. */
    static final int MOST_FIELDS = 1_000;

    private static final int FIRST_BUFFER = 1 << 16;
    private static final boolean[] PLAIN = plain();

    /** Hears what is wrong with a row. */
    interface Listener {
        /** A row that begins at a line is passed over. */
        void fault(int line, String text);
    }

    private final Utf8Reader input;
    private final Listener listener;
    private char[] buffer = new char[FIRST_BUFFER];
    private int limit;
    private int rowStart;
    private int at;
    private boolean ended;
    private long dropped;

    private int line = 1;
    private int rowLine = 1;
    private int[] starts = new int[64];
    private int[] ends = new int[64];
    private int fields;
    private @Nullable String problem;
    private boolean held;
    private boolean malformed;
    private boolean damaged;

    CsvReader(InputStream bytes, Listener listener) {
        this.input = new Utf8Reader(bytes);
        this.listener = listener;
    }

    private static boolean[] plain() {
        boolean[] plain = new boolean[128];
        Arrays.fill(plain, ' ', 127, true);
        plain['\t'] = true;
        plain[','] = false;
        plain['"'] = false;
        return plain;
    }

    /** Moves to the first row; false where there is none or it is passed over, and then nothing can be read on. */
    boolean first() throws IOException {
        return begin() && read();
    }

    /** Moves to the next whole row; false at the end of the file. */
    boolean next() throws IOException {
        while (begin()) {
            if (read()) {
                return true;
            }
        }
        return false;
    }

    private boolean begin() throws IOException {
        rowStart = at;
        rowLine = line;
        return more();
    }

    /** Reads a row; false where it is passed over. */
    private boolean read() throws IOException {
        fields = 0;
        problem = null;
        malformed = false;
        held = true;
        readRow();
        noteMalformed();
        if (problem != null) {
            damaged = true;
            listener.fault(rowLine, problem);
        }
        return problem == null;
    }

    /** Whether any row has been passed over. */
    boolean damaged() {
        return damaged;
    }

    /** The line where the row begins, from 1. */
    int line() {
        return rowLine;
    }

    /** How many fields the row has, at least one. */
    int fields() {
        return fields;
    }

    /** The characters that hold the row. */
    char[] chars() {
        return buffer;
    }

    /** Where a field begins within {@link #chars}. */
    int start(int field) {
        return rowStart + starts[field];
    }

    /** Where a field ends within {@link #chars}, exclusive. */
    int end(int field) {
        return rowStart + ends[field];
    }

    private void readRow() throws IOException {
        boolean another = true;
        while (another) {
            another = (more() && buffer[at] == '"') ? quoted() : unquoted();
        }
    }

    /** Reads a field without quotes and what follows it; false at the end of the row. */
    private boolean unquoted() throws IOException {
        int offset = at - rowStart;
        while (true) {
            int scan = at;
            char[] chars = buffer;
            int end = limit;
            while (scan < end && (chars[scan] >= 128 || PLAIN[chars[scan]])) {
                scan++;
            }
            at = scan;
            if (at < limit) {
                break;
            }
            if (!more()) {
                field(offset, at - rowStart);
                return false;
            }
        }
        field(offset, at - rowStart);
        return separator(
                "a quote inside a field without quotes; put the whole field in quotes and double those inside");
    }

    /** Reads a field in quotes and what follows it; false at the end of the row. */
    private boolean quoted() throws IOException {
        at++;
        int offset = at - rowStart;
        int write = offset;
        while (more()) {
            char c = buffer[at++];
            if (c == '"') {
                if (!more() || buffer[at] != '"') {
                    field(offset, write);
                    return separator("text after the closing quote of a field; double the quotes inside a field");
                }
                at++;
            } else if (c == '\n') {
                line++;
            } else if ((c < ' ' && c != '\r' && c != '\t') || c == 127) {
                problem(control(c));
            }
            if (held) {
                // Doubled quotes are taken out in place; what is not held is overwritten anyway.
                buffer[rowStart + write++] = c;
            }
        }
        problem("the quote that opens a field of this row is never closed; close it, and double the quotes inside");
        return false;
    }

    /** Reads what ends a field; false where the row ends with it. */
    private boolean separator(String whenText) throws IOException {
        if (!more()) {
            return false;
        }
        char c = buffer[at];
        if (c == ',') {
            at++;
            if (!more()) {
                field(at - rowStart, at - rowStart);
                return false;
            }
            return true;
        }
        if (c == '\r') {
            at++;
            if (more() && buffer[at] == '\n') {
                c = '\n';
            } else {
                problem("a carriage return without a line feed; end the lines with CR LF or with LF alone");
            }
        }
        if (c == '\n') {
            at++;
            line++;
            return false;
        }
        problem(c < ' ' || c == 127 ? control(c) : whenText);
        skipLine();
        return false;
    }

    private static String control(char c) {
        return String.format("a control character U+%04X; take it out", (int) c);
    }

    private void skipLine() throws IOException {
        while (more()) {
            if (buffer[at++] == '\n') {
                line++;
                return;
            }
        }
    }

    private void problem(String text) {
        if (problem == null) {
            problem = text;
        }
    }

    private void field(int from, int to) {
        if (!held) {
            return;
        }
        if (to - from > MOST_FIELD_CHARS) {
            problem("a field of more than 1,000,000 characters; no field needs as many - is a quote left open?");
        }
        if (fields == MOST_FIELDS) {
            problem("more than 1,000 fields; take out the commas that are too many");
            return;
        }
        if (fields == starts.length) {
            starts = Arrays.copyOf(starts, 2 * fields);
            ends = Arrays.copyOf(ends, 2 * fields);
        }
        starts[fields] = from;
        ends[fields] = to;
        fields++;
    }

    /** Whether there is a character at the place reached, after reading on if need be. */
    private boolean more() throws IOException {
        return at < limit || (!ended && fill());
    }

    private void noteMalformed() {
        Utf8Reader.Malformed bad = input.malformedBefore(dropped + at);
        if (bad != null && !malformed) {
            // Whatever else seems wrong with the row may come of its bytes.
            malformed = true;
            problem = bad.sentence();
        }
    }

    private boolean fill() throws IOException {
        noteMalformed();
        if (held && at - rowStart >= MOST_CHARS) {
            held = false;
            problem("a row of more than 4,194,304 characters; no row needs as many - is a quote left open?");
        }
        int keepFrom = held ? rowStart : at;
        if (keepFrom > 0) {
            System.arraycopy(buffer, keepFrom, buffer, 0, limit - keepFrom);
            dropped += keepFrom;
            limit -= keepFrom;
            at -= keepFrom;
            rowStart = 0;
        }
        if (limit + Utf8Reader.LEAST_ROOM > buffer.length) {
            buffer = Arrays.copyOf(buffer, 2 * buffer.length);
        }
        int got = input.read(buffer, limit);
        ended = got < 0;
        limit += Math.max(got, 0);
        return !ended;
    }
}
