package spanwright.exchange;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.Deque;
import org.jspecify.annotations.Nullable;

/** Decodes UTF-8 strictly: what is not UTF-8 is noted with its place, and a stand-in given for it. */
final class Utf8Reader {

    /** The least room for characters to be read into: one beyond the basic plane takes two. */
    static final int LEAST_ROOM = 2;

    private static final char STAND_IN = '\uFFFD';
    private static final int BYTES = 1 << 16;

    /**
     * Bytes that are not UTF-8.
     *
     * @param place index of the stand-in among all characters
     * @param first the first of the bytes, 0 to 255
     */
    record Malformed(long place, int first) {

        /** What is wrong and what would be right. */
        String sentence() {
            if (first == 0xFF || first == 0xFE) {
                return String.format("not UTF-8 (byte %02X, as UTF-16 begins); save the file as UTF-8", first);
            }
            return String.format("not UTF-8 (byte %02X); save the file as UTF-8", first);
        }
    }

    private final InputStream input;
    private final CharsetDecoder decoder = StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .onUnmappableCharacter(CodingErrorAction.REPORT);
    private final ByteBuffer bytes = ByteBuffer.allocate(BYTES).limit(0);
    private final Deque<Malformed> malformed = new ArrayDeque<>();
    private boolean begun;
    private boolean ended;
    private long given;

    Utf8Reader(InputStream input) {
        this.input = input;
    }

    /** Reads a character or more into the rest of an array, of {@link #LEAST_ROOM} at least; how many, or -1 at the end. */
    int read(char[] chars, int from) throws IOException {
        if (!begun) {
            begun = true;
            skipMark();
        }
        CharBuffer into = CharBuffer.wrap(chars, from, chars.length - from);
        while (into.position() == from) {
            if (ended && !bytes.hasRemaining()) {
                return -1;
            }
            if (!ended) {
                readBytes();
            }
            decode(into, from);
        }
        int got = into.position() - from;
        given += got;
        return got;
    }

    /** The first bytes before a place that were not UTF-8, or null; all before the place are forgotten. */
    @Nullable
    Malformed malformedBefore(long place) {
        Malformed first = null;
        while (!malformed.isEmpty() && malformed.getFirst().place() < place) {
            Malformed next = malformed.removeFirst();
            first = first == null ? next : first;
        }
        return first;
    }

    private void skipMark() throws IOException {
        while (!ended && bytes.remaining() < 3) {
            readBytes();
        }
        if (bytes.remaining() >= 3
                && bytes.get(0) == (byte) 0xEF
                && bytes.get(1) == (byte) 0xBB
                && bytes.get(2) == (byte) 0xBF) {
            bytes.position(3);
        }
    }

    private void readBytes() throws IOException {
        bytes.compact();
        int got = input.read(bytes.array(), bytes.position(), bytes.remaining());
        if (got > 0) {
            bytes.position(bytes.position() + got);
        }
        ended = got < 0;
        bytes.flip();
    }

    private void decode(CharBuffer into, int from) {
        CoderResult result = decoder.decode(bytes, into, ended);
        while (result.isError() && into.hasRemaining()) {
            malformed.add(new Malformed(given + into.position() - from, bytes.get(bytes.position()) & 0xFF));
            bytes.position(bytes.position() + result.length());
            into.put(STAND_IN);
            result = decoder.decode(bytes, into, ended);
        }
    }
}
