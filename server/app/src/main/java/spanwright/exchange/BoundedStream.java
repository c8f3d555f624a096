package spanwright.exchange;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;

/** Ends in an exception, which says why, where more comes than a bound allows. */
final class BoundedStream extends FilterInputStream {

    private final long most;
    private final String refusal;
    private long read;

    BoundedStream(InputStream in, long most, String refusal) {
        super(in);
        this.most = most;
        this.refusal = refusal;
    }

    @Override
    public int read() throws IOException {
        int value = super.read();
        count(value < 0 ? 0 : 1);
        return value;
    }

    @Override
    public int read(byte[] into, int from, int length) throws IOException {
        int got = super.read(into, from, length);
        count(Math.max(got, 0));
        return got;
    }

    private void count(int more) throws IOException {
        read += more;
        if (read > most) {
            throw new IOException(refusal);
        }
    }
}
