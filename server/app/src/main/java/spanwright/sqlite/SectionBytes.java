package spanwright.sqlite;

import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.util.zip.CRC32C;

/** A section of the side file, checked when it is opened. Its bytes may be read by any number of threads. */
final class SectionBytes {

    /** Up to this long a section is copied: a file that is not mapped can be replaced on every system. */
    private static final int COPIED = 1 << 24;

    private final ByteBuffer bytes;

    private SectionBytes(ByteBuffer bytes) {
        this.bytes = bytes.order(ByteOrder.LITTLE_ENDIAN);
    }

    /**
     * Opens a section that begins somewhere in a file.
     *
     * @throws IOException where it cannot be read, or is not what it was
     */
    static SectionBytes open(FileChannel file, long from, ImageHead.Section section) throws IOException {
        ByteBuffer bytes;
        if (section.length() <= COPIED) {
            bytes = ByteBuffer.allocate((int) section.length());
            while (bytes.hasRemaining()) {
                if (file.read(bytes, from + bytes.position()) < 0) {
                    throw new EOFException("the file ends too soon");
                }
            }
            bytes.flip();
        } else {
            bytes = file.map(FileChannel.MapMode.READ_ONLY, from, section.length());
        }
        CRC32C check = new CRC32C();
        check.update(bytes.duplicate());
        if ((int) check.getValue() != section.check()) {
            throw new IOException("its bytes are not what they were");
        }
        return new SectionBytes(bytes);
    }

    /** How many bytes there are. */
    int length() {
        return bytes.limit();
    }

    /** A copy of some of them. */
    byte[] copy(int from, int count) {
        byte[] some = new byte[count];
        bytes.get(from, some);
        return some;
    }

    long longAt(int index) {
        return bytes.getLong(index);
    }
}
