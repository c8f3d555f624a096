package spanwright.exchange;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.channels.SeekableByteChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.zip.ZipException;

/**
 * The central directory at the end of a zip, looked at before anything else is: how many entries there are, and
 * whether any is of a kind that a records folder never holds. Layout: PKWARE APPNOTE 6.3, sections 4.3.12 to 4.3.16;
 * the upper half of the external attributes is a Unix mode where a Unix program packed (from memory).
 *
 * <p>What is bounded here is bounded before it is held.
 */
final class ZipDirectory {

    /** The most entries. */
    static final int MOST_ENTRIES = 10_000;

    /** The most bytes of the directory: the entries with names and notes as long as anybody gives them. */
    static final int MOST_BYTES = 8 << 20;

    private static final int END = 0x06054B50;
    private static final int END_BYTES = 22;
    private static final int END_64 = 0x06064B50;
    private static final int END_64_BYTES = 56;
    private static final int LOCATOR_64 = 0x07064B50;
    private static final int LOCATOR_64_BYTES = 20;
    private static final int ENTRY = 0x02014B50;
    private static final int ENTRY_BYTES = 46;
    private static final int ENCRYPTED = 1;
    private static final int STORED = 0;
    private static final int DEFLATED = 8;
    private static final int KIND_OF_FILE = 0xF000;
    private static final int LINK = 0xA000;

    private final SeekableByteChannel zip;

    private ZipDirectory(SeekableByteChannel zip) {
        this.zip = zip;
    }

    /**
     * Looks at the directory of a zip.
     *
     * @throws IOException where it has none, or one that is refused; the message says what would be right
     */
    static void ask(Path path) throws IOException {
        try (SeekableByteChannel zip = Files.newByteChannel(path)) {
            new ZipDirectory(zip).ask();
        }
    }

    private void ask() throws IOException {
        long end = end();
        ByteBuffer record = read(end, END_BYTES);
        long entries = Short.toUnsignedInt(record.getShort(10));
        long bytes = Integer.toUnsignedLong(record.getInt(12));
        if (end >= LOCATOR_64_BYTES) {
            ByteBuffer locator = read(end - LOCATOR_64_BYTES, LOCATOR_64_BYTES);
            if (locator.getInt(0) == LOCATOR_64) {
                end = locator.getLong(8);
                ByteBuffer large = read(end, END_64_BYTES);
                if (large.getInt(0) != END_64) {
                    throw damaged();
                }
                entries = large.getLong(32);
                bytes = large.getLong(40);
            }
        }
        if (entries < 0 || entries > MOST_ENTRIES || bytes < 0 || bytes > MOST_BYTES) {
            throw new ZipException("it holds more than 10,000 files, or their list is longer than 8 MiB;"
                    + " pack the records folder alone");
        }
        askEntries(read(end - bytes, (int) bytes), entries);
    }

    /** Where the end record begins; the zip ends with it and its note. */
    private long end() throws IOException {
        long size = zip.size();
        long from = Math.max(0, size - END_BYTES - 0xFFFF);
        if (size < END_BYTES) {
            throw new ZipException("it is no zip");
        }
        ByteBuffer tail = read(from, (int) (size - from));
        for (int at = tail.limit() - END_BYTES; at >= 0; at--) {
            if (tail.getInt(at) == END
                    && at + END_BYTES + Short.toUnsignedInt(tail.getShort(at + 20)) == tail.limit()) {
                return from + at;
            }
        }
        throw new ZipException("it is no zip, or its end is cut off");
    }

    private ByteBuffer read(long from, int length) throws IOException {
        if (from < 0 || from > zip.size() - length) {
            throw damaged();
        }
        ByteBuffer bytes = ByteBuffer.allocate(length).order(ByteOrder.LITTLE_ENDIAN);
        zip.position(from);
        while (bytes.hasRemaining()) {
            if (zip.read(bytes) < 0) {
                throw damaged();
            }
        }
        return bytes.flip();
    }

    private static void askEntries(ByteBuffer directory, long entries) throws IOException {
        int at = 0;
        for (long entry = 0; entry < entries; entry++) {
            if (at > directory.limit() - ENTRY_BYTES || directory.getInt(at) != ENTRY) {
                throw damaged();
            }
            int name = Short.toUnsignedInt(directory.getShort(at + 28));
            int more =
                    Short.toUnsignedInt(directory.getShort(at + 30)) + Short.toUnsignedInt(directory.getShort(at + 32));
            if (name + more > directory.limit() - ENTRY_BYTES - at) {
                throw damaged();
            }
            askEntry(directory, at);
            at += ENTRY_BYTES + name + more;
        }
        if (at != directory.limit()) {
            // More entries than the end says: some would be seen by one program and not by the next.
            throw damaged();
        }
    }

    private static void askEntry(ByteBuffer directory, int at) throws IOException {
        if ((directory.getShort(at + 8) & ENCRYPTED) != 0) {
            throw new ZipException("it is locked with a password; pack it without one");
        }
        int method = directory.getShort(at + 10);
        if (method != STORED && method != DEFLATED) {
            throw new ZipException("it is packed in a way that is not read here; pack it as an ordinary zip (deflate)");
        }
        if (((directory.getInt(at + 38) >>> 16) & KIND_OF_FILE) == LINK) {
            throw new ZipException("it holds a link to another file; pack the file itself");
        }
    }

    private static ZipException damaged() {
        return new ZipException("its list of files is damaged; pack the folder anew");
    }
}
