package spanwright.sqlite;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Posting;
import spanwright.sqlite.rows.ByteWriter;
import spanwright.sqlite.rows.ChangePacker;

/**
 * The hash of a posting: SHA-256 over the hash of the posting before, the head and the pages. So the last hash names
 * the whole history, and a side file that bears it belongs to this file and no other.
 */
final class PostingHash {

    /** What stands before the first posting. */
    static final PostingHash NONE = new PostingHash(new byte[32]);

    private final byte[] bytes;

    private PostingHash(byte[] bytes) {
        this.bytes = bytes;
    }

    /** A hash as it was kept. */
    static PostingHash read(byte[] bytes) {
        return new PostingHash(bytes);
    }

    static PostingHash of(PostingHash before, Posting head, List<ChangePacker.Page> pages) {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            ByteWriter text = new ByteWriter(256);
            text.raw(before.bytes, 0, before.bytes.length);
            text.varint(head.number());
            text.text(PostingTime.text(head.at()));
            text.text(head.by());
            text.text(head.reason());
            text.varint(head.changes());
            digest.update(text.array(), 0, text.size());
            for (ChangePacker.Page page : pages) {
                digest.update(page.table().getBytes(StandardCharsets.UTF_8));
                digest.update(page.rows());
            }
            return new PostingHash(digest.digest());
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java platform has SHA-256", impossible);
        }
    }

    /** Its bytes; not to be changed. */
    byte[] bytes() {
        return bytes;
    }

    @Override
    public boolean equals(@Nullable Object other) {
        return other instanceof PostingHash hash && Arrays.equals(bytes, hash.bytes);
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(bytes);
    }

    @Override
    public String toString() {
        return HexFormat.of().formatHex(bytes);
    }
}
