package spanwright.sqlite;

import java.io.IOException;
import java.nio.file.Path;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Keeps the image beside a records file near the journal's end: writes it once much has changed, beside everything
 * else, and at the end. That it cannot be written is logged and does no harm: it is made again at the next opening.
 */
final class ImageKeeper {

    private static final Logger LOG = LoggerFactory.getLogger(ImageKeeper.class);

    /** After so many changes the image is written anew. */
    private static final int MUCH = Draft.BULK;

    private final Path file;
    private int posting;
    private long changes;
    private @Nullable Thread writing;

    /**
     * A keeper.
     *
     * @param posting the posting of the image that is there; -1 where there is none
     */
    ImageKeeper(Path file, int posting) {
        this.file = file;
        this.posting = posting;
    }

    /** Is told of each commit: where the journal ends now, and how many changes it held. One thread's at a time. */
    void committed(Tip tip, int changed) {
        changes += changed;
        if (changes >= MUCH) {
            changes = 0;
            begin(tip);
        }
    }

    /** Begins to write an image, on a thread of its own. */
    void begin(Tip tip) {
        finish();
        Thread thread = new Thread(() -> write(tip), "image of posting " + tip.number());
        writing = thread;
        thread.start();
    }

    /** Waits for the image that is being written, and writes the last one if it is of an older state. */
    void close(Tip tip) {
        finish();
        if (posting != tip.number() && tip.number() > 0) {
            write(tip);
        }
    }

    /** Waits for the image that is being written, if one is. */
    void finish() {
        Thread thread = writing;
        writing = null;
        boolean interrupted = false;
        while (thread != null && thread.isAlive()) {
            try {
                thread.join();
            } catch (InterruptedException patience) {
                interrupted = true;
            }
        }
        if (interrupted) {
            Thread.currentThread().interrupt();
        }
    }

    private void write(Tip tip) {
        try {
            Image.write(file, tip);
            posting = tip.number();
        } catch (IOException | RuntimeException fault) {
            LOG.warn("{} was not written: {}", RecordsFile.network(file), fault.toString());
        }
    }
}
