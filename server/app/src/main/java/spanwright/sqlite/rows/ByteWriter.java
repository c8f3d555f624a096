package spanwright.sqlite.rows;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/** Bytes that grow as they are written. One thread's. */
public final class ByteWriter {

    private byte[] bytes;
    private int size;

    /** No bytes yet. */
    public ByteWriter(int expected) {
        this.bytes = new byte[Math.max(16, expected)];
    }

    /** How many there are. */
    public int size() {
        return size;
    }

    /** Forgets all. */
    public void clear() {
        size = 0;
    }

    /** A copy of all. */
    public byte[] copy() {
        return Arrays.copyOf(bytes, size);
    }

    /** The bytes themselves, those past {@link #size} without meaning; not to be changed or kept. */
    public byte[] array() {
        return bytes;
    }

    private void reserve(int more) {
        if (bytes.length - size < more) {
            bytes = Arrays.copyOf(bytes, Math.max(bytes.length * 2, size + more));
        }
    }

    /** One byte. */
    public void octet(int value) {
        reserve(1);
        bytes[size++] = (byte) value;
    }

    /** An unsigned number, seven bits a byte, the lowest first. */
    public void varint(long value) {
        reserve(10);
        long rest = value;
        while ((rest & ~0x7FL) != 0) {
            bytes[size++] = (byte) (rest | 0x80);
            rest >>>= 7;
        }
        bytes[size++] = (byte) rest;
    }

    /** Eight bytes, the lowest first. */
    public void fixed(long value) {
        reserve(8);
        for (int shift = 0; shift < 64; shift += 8) {
            bytes[size++] = (byte) (value >>> shift);
        }
    }

    /** Bytes as they are. */
    public void raw(byte[] source, int from, int count) {
        reserve(count);
        System.arraycopy(source, from, bytes, size, count);
        size += count;
    }

    /** Text: its length in bytes, then UTF-8. */
    public void text(String text) {
        byte[] utf8 = text.getBytes(StandardCharsets.UTF_8);
        varint(utf8.length);
        raw(utf8, 0, utf8.length);
    }
}
