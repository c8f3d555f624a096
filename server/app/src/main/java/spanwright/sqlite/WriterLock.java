package spanwright.sqlite;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.BasicFileAttributes;
import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * The right to write a records file, held by one process and once within it: a lock on a file beside it, which the
 * system takes back when the process ends, however it ends. The file says who holds it.
 */
final class WriterLock implements AutoCloseable {

    // Within one process the system does not keep locks apart, and closing any channel on a file gives up all of the
    // process's locks on it: so who holds what here is kept here, and no second channel is opened.
    private static final Map<Path, String> HELD = new HashMap<>();

    private final Path file;
    private final Path key;
    private final FileChannel channel;

    private WriterLock(Path file, Path key, FileChannel channel) {
        this.file = file;
        this.key = key;
        this.channel = channel;
    }

    /** Why the right was not given: who holds it. */
    static final class Taken extends Exception {

        private static final long serialVersionUID = 1;

        Taken(String holder) {
            super(holder);
        }
    }

    /**
     * Takes the right to write.
     *
     * @param records the records file, there or not yet
     * @throws Taken where another process, or another part of this one, has it
     */
    static WriterLock take(Path records, Clock clock) throws IOException, Taken {
        Path file = RecordsFile.writing(records);
        Path folder = file.toAbsolutePath().getParent();
        Path key = (folder == null ? file.toAbsolutePath() : folder.toRealPath()).resolve(file.getFileName());
        synchronized (HELD) {
            String holder = HELD.get(key);
            if (holder != null) {
                throw new Taken(holder);
            }
            String me = "process " + ProcessHandle.current().pid() + " since "
                    + Instant.now(clock).truncatedTo(ChronoUnit.SECONDS);
            WriterLock lock = lock(file, key);
            lock.sign(me);
            HELD.put(key, me);
            return lock;
        }
    }

    private static WriterLock lock(Path file, Path key) throws IOException, Taken {
        while (true) {
            Object before = name(file);
            FileChannel channel = FileChannel.open(
                    file, StandardOpenOption.CREATE, StandardOpenOption.READ, StandardOpenOption.WRITE);
            boolean kept = false;
            try {
                FileLock lock = channel.tryLock();
                if (lock == null) {
                    throw new Taken(read(channel));
                }
                // Its last holder may have deleted it since it was opened: then the lock is on nothing.
                kept = before != null && before.equals(name(file));
                if (kept) {
                    return new WriterLock(file, key, channel);
                }
            } finally {
                if (!kept) {
                    channel.close();
                }
            }
        }
    }

    /** What the system calls the file behind a path; null where there is none. */
    private static @Nullable Object name(Path file) throws IOException {
        try {
            Object key = Files.readAttributes(file, BasicFileAttributes.class).fileKey();
            return key == null ? file : key;
        } catch (NoSuchFileException none) {
            return null;
        }
    }

    private static String read(FileChannel channel) throws IOException {
        ByteBuffer buffer = ByteBuffer.allocate(256);
        channel.read(buffer, 0);
        String text = new String(buffer.array(), 0, buffer.position(), StandardCharsets.UTF_8);
        return text.startsWith("process ") ? text : "another process";
    }

    private void sign(String holder) throws IOException {
        channel.truncate(0);
        channel.write(ByteBuffer.wrap(holder.getBytes(StandardCharsets.UTF_8)), 0);
    }

    /** Gives the right back, and leaves no file. */
    @Override
    public void close() throws IOException {
        synchronized (HELD) {
            if (channel.isOpen()) {
                HELD.remove(key);
                Files.deleteIfExists(file);
                channel.close();
            }
        }
    }
}
