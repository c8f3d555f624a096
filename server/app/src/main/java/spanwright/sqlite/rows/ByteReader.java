package spanwright.sqlite.rows;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * Reads what {@link ByteWriter} wrote. Bytes that end too soon throw {@link IndexOutOfBoundsException}. One thread's.
 */
public final class ByteReader {

    private final byte[] bytes;
    private int at;

    /** From an index on. */
    public ByteReader(byte[] bytes, int from) {
        this.bytes = bytes;
        this.at = from;
    }

    /** The index of the next byte. */
    public int position() {
        return at;
    }

    /** One byte, 0 to 255. */
    public int octet() {
        return bytes[at++] & 0xFF;
    }

    /** An unsigned number. */
    public long varint() {
        long value = 0;
        int shift = 0;
        byte octet = bytes[at++];
        while (octet < 0) {
            value |= (octet & 0x7FL) << shift;
            shift += 7;
            octet = bytes[at++];
        }
        return value | (long) octet << shift;
    }

    /** An unsigned number that fits an int, such as a count. */
    public int count() {
        return Math.toIntExact(varint());
    }

    /** Eight bytes. */
    public long fixed() {
        long value = 0;
        for (int shift = 0; shift < 64; shift += 8) {
            value |= (bytes[at++] & 0xFFL) << shift;
        }
        return value;
    }

    /** Bytes as they are. */
    public byte[] raw(int count) {
        if (count > bytes.length - at) {
            throw new IndexOutOfBoundsException("bytes end after " + (bytes.length - at) + " of " + count);
        }
        byte[] copy = Arrays.copyOfRange(bytes, at, at + count);
        at += count;
        return copy;
    }

    /** Text. */
    public String text() {
        int length = count();
        if (length > bytes.length - at) {
            throw new IndexOutOfBoundsException("text ends after " + (bytes.length - at) + " of " + length);
        }
        String text = new String(bytes, at, length, StandardCharsets.UTF_8);
        at += length;
        return text;
    }
}
