package spanwright.sqlite;

import java.io.EOFException;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.FileChannel;
import java.util.zip.CRC32C;
import spanwright.paged.IntSource;

/**
 * A section of the side file as ints, read once from its beginning to its end and checked on the way: what was read is
 * to be believed after {@link #end} only. Lost to this: mapping the file, where each page costs more than to copy it.
 */
final class SectionInts implements IntSource {

    private static final int BUFFER = 1 << 20;

    private final FileChannel file;
    private final ImageHead.Section section;
    private final ByteBuffer buffer =
            ByteBuffer.allocateDirect(BUFFER).order(ByteOrder.LITTLE_ENDIAN).limit(0);
    private final CRC32C check = new CRC32C();
    private long at;
    private long left;

    SectionInts(FileChannel file, long from, ImageHead.Section section) {
        this.file = file;
        this.section = section;
        this.at = from;
        this.left = section.length();
    }

    @Override
    public void get(int[] into, int count) throws IOException {
        int done = 0;
        while (done < count) {
            if (buffer.remaining() < Integer.BYTES) {
                fill();
            }
            int some = Math.min(count - done, buffer.remaining() / Integer.BYTES);
            buffer.asIntBuffer().get(into, done, some);
            buffer.position(buffer.position() + some * Integer.BYTES);
            done += some;
        }
    }

    private void fill() throws IOException {
        buffer.clear().limit((int) Math.min(BUFFER, left));
        while (buffer.hasRemaining()) {
            int read = file.read(buffer, at);
            if (read < 0) {
                break;
            }
            at += read;
        }
        buffer.flip();
        if (buffer.remaining() < Integer.BYTES) {
            throw new EOFException("the network ends too soon");
        }
        left -= buffer.remaining();
        check.update(buffer.duplicate());
    }

    /**
     * Says that all has been read.
     *
     * @throws IOException where there is more, or the bytes are not what they were
     */
    void end() throws IOException {
        if (left > 0 || buffer.hasRemaining() || (int) check.getValue() != section.check()) {
            throw new IOException("its bytes are not what they were");
        }
    }
}
