package spanwright.sqlite;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.zip.CRC32C;
import spanwright.paged.IntSink;

/** Writes one section of the side file, and keeps count of its length and its check. One thread's. */
final class SectionWriter implements IntSink {

    private static final int BUFFER = 1 << 20;

    private final OutputStream out;
    private final ByteBuffer buffer = ByteBuffer.allocate(BUFFER).order(ByteOrder.LITTLE_ENDIAN);
    private final CRC32C check = new CRC32C();
    private long length;

    SectionWriter(OutputStream out) {
        this.out = out;
    }

    @Override
    public void put(int[] ints, int count) throws IOException {
        int done = 0;
        while (done < count) {
            if (buffer.remaining() < Integer.BYTES) {
                flush();
            }
            int some = Math.min(count - done, buffer.remaining() / Integer.BYTES);
            buffer.asIntBuffer().put(ints, done, some);
            buffer.position(buffer.position() + some * Integer.BYTES);
            done += some;
        }
    }

    void put(byte[] bytes, int count) throws IOException {
        int done = 0;
        while (done < count) {
            if (!buffer.hasRemaining()) {
                flush();
            }
            int some = Math.min(count - done, buffer.remaining());
            buffer.put(bytes, done, some);
            done += some;
        }
    }

    /** How much has been put so far. */
    long length() {
        return length + buffer.position();
    }

    private void flush() throws IOException {
        check.update(buffer.array(), 0, buffer.position());
        out.write(buffer.array(), 0, buffer.position());
        length += buffer.position();
        buffer.clear();
    }

    /** Ends the section. */
    ImageHead.Section end() throws IOException {
        flush();
        return new ImageHead.Section(length, (int) check.getValue());
    }
}
