package spanwright.exchange;

import java.io.EOFException;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.zip.CRC32;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;

/**
 * A file of a zip as it was packed: at its end, its size and its CRC-32 are those that the zip's directory states.
 * The JDK's own reader does not compare them.
 */
final class WholeEntry extends FilterInputStream {

    private final ZipEntry entry;
    private final CRC32 sum = new CRC32();
    private long size;

    WholeEntry(InputStream in, ZipEntry entry) {
        super(in);
        this.entry = entry;
    }

    @Override
    public int read() throws IOException {
        byte[] one = new byte[1];
        return read(one, 0, 1) < 0 ? -1 : one[0] & 0xFF;
    }

    @Override
    public int read(byte[] into, int from, int length) throws IOException {
        int got;
        try {
            got = super.read(into, from, length);
        } catch (ZipException | EOFException e) {
            throw damaged();
        }
        if (got < 0) {
            if (size != entry.getSize() || sum.getValue() != entry.getCrc()) {
                throw damaged();
            }
        } else {
            sum.update(into, from, got);
            size += got;
        }
        return got;
    }

    private static ZipException damaged() {
        return new ZipException("the zip is damaged here; pack the folder anew");
    }
}
