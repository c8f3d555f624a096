package spanwright.sqlite;

import java.io.IOException;
import java.nio.channels.ClosedByInterruptException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/**
 * What SQLite does not do for us on the disk. A thread that is interrupted meanwhile stays so, but what it does here is
 * done all the same: half a file moved into its place helps nobody.
 */
final class Disk {

    /** Something done to files. */
    @FunctionalInterface
    interface Action {
        /** Does it; done again from the start if the thread is interrupted in the middle. */
        void run() throws IOException;
    }

    private Disk() {}

    /** Does something to files that an interrupt does not break off. */
    static void uninterrupted(Action action) throws IOException {
        boolean interrupted = Thread.interrupted();
        try {
            while (true) {
                try {
                    action.run();
                    return;
                } catch (ClosedByInterruptException again) {
                    Thread.interrupted();
                    interrupted = true;
                }
            }
        } finally {
            if (interrupted) {
                Thread.currentThread().interrupt();
            }
        }
    }

    /** Puts a whole file in the place of another, or of none, so that it stays there whatever happens next. */
    static void moveInto(Path made, Path place) throws IOException {
        uninterrupted(() -> force(made, StandardOpenOption.WRITE));
        Files.move(made, place, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        Path folder = place.toAbsolutePath().getParent();
        if (folder != null && !System.getProperty("os.name", "").startsWith("Windows")) {
            uninterrupted(() -> force(folder, StandardOpenOption.READ));
        }
    }

    private static void force(Path path, StandardOpenOption how) throws IOException {
        try (FileChannel channel = FileChannel.open(path, how)) {
            channel.force(true);
        }
    }
}
