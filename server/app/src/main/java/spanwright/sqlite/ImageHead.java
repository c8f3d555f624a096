package spanwright.sqlite;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.util.Arrays;
import java.util.Optional;
import java.util.zip.CRC32C;

/**
 * The head of the side file: whose image it is, and what each of its three sections must be like.
 *
 * @param posting the posting whose state it is
 * @param hash that posting's hash, which no other history has
 * @param records the records but for joints
 * @param joints the joints, in pages
 * @param network the network
 */
record ImageHead(int posting, PostingHash hash, Section records, Section joints, Section network) {

    /** How long the head is; the sections follow it one after another. */
    static final int BYTES = 128;

    private static final byte[] MAGIC = {'S', 'P', 'W', 'R', 'N', 'E', 'T', 2};
    private static final int HASH = 32;

    /**
     * A section.
     *
     * @param length in bytes
     * @param check their CRC-32C
     */
    record Section(long length, int check) {}

    /** How long the whole file is. */
    long fileLength() {
        return BYTES + records.length + joints.length + network.length;
    }

    byte[] write() {
        ByteBuffer head = ByteBuffer.allocate(BYTES).order(ByteOrder.LITTLE_ENDIAN);
        head.put(MAGIC).putInt(posting).put(hash.bytes());
        for (Section section : new Section[] {records, joints, network}) {
            head.putLong(section.length).putInt(section.check);
        }
        head.putInt(BYTES - Integer.BYTES, check(head.array()));
        return head.array();
    }

    /** The head in the first bytes of a file; nothing where there is none, or another program's, or a torn one. */
    static Optional<ImageHead> read(byte[] bytes) {
        try {
            ByteBuffer head = ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN);
            byte[] magic = new byte[MAGIC.length];
            head.get(magic);
            if (!Arrays.equals(magic, MAGIC) || head.getInt(BYTES - Integer.BYTES) != check(bytes)) {
                return Optional.empty();
            }
            int posting = head.getInt();
            byte[] hash = new byte[HASH];
            head.get(hash);
            return Optional.of(
                    new ImageHead(posting, PostingHash.read(hash), section(head), section(head), section(head)));
        } catch (BufferUnderflowException | IndexOutOfBoundsException torn) {
            return Optional.empty();
        }
    }

    private static Section section(ByteBuffer head) {
        return new Section(head.getLong(), head.getInt());
    }

    private static int check(byte[] head) {
        CRC32C check = new CRC32C();
        check.update(head, 0, BYTES - Integer.BYTES);
        return (int) check.getValue();
    }
}
