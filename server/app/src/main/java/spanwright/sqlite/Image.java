package spanwright.sqlite;

import java.io.FileOutputStream;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import java.util.function.IntFunction;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import spanwright.network.Network;
import spanwright.network.NetworkImage;
import spanwright.network.Snapshot;
import spanwright.records.Records;

/** The side file: an image of a state as it is in memory, from which a records file opens fast. */
final class Image {

    private static final Logger LOG = LoggerFactory.getLogger(Image.class);

    private Image() {}

    /**
     * Writes the image of a state, and puts it in the place of the one before.
     *
     * @param file the records file
     */
    static void write(Path file, Tip tip) throws IOException {
        Path place = RecordsFile.network(file);
        // A name of its own, as a process that reads and one that writes may both make an image.
        Path making = place.resolveSibling(
                place.getFileName() + "." + ProcessHandle.current().pid() + "." + tip.number());
        try {
            writeTo(making, tip);
            Disk.moveInto(making, place);
        } finally {
            Files.deleteIfExists(making);
        }
    }

    private static void writeTo(Path making, Tip tip) throws IOException {
        Records records = tip.snapshot().records();
        ImageHead head;
        try (FileOutputStream out = new FileOutputStream(making.toFile())) {
            out.write(new byte[ImageHead.BYTES]);
            SectionWriter plant = new SectionWriter(out);
            PlantPages.write(records, plant);
            ImageHead.Section plantEnd = plant.end();
            SectionWriter joints = new SectionWriter(out);
            PlantPages.writeJoints(records, joints);
            ImageHead.Section jointsEnd = joints.end();
            SectionWriter network = new SectionWriter(out);
            NetworkImage.write(tip.snapshot().network(), network);
            head = new ImageHead(tip.number(), tip.hash(), plantEnd, jointsEnd, network.end());
        }
        try (RandomAccessFile file = new RandomAccessFile(making.toFile(), "rw")) {
            file.write(head.write());
        }
    }

    /**
     * Reads the image beside a records file.
     *
     * @param hashes gives the hash of a posting in the records file, null where there is none of that number
     * @return the state that it is of, perhaps an older one; nothing where there is no image, or it is torn, of
     *     another file or another version, which the log says
     */
    static Optional<Snapshot> read(Path file, IntFunction<Optional<PostingHash>> hashes) {
        Path place = RecordsFile.network(file);
        if (!Files.exists(place)) {
            return Optional.empty();
        }
        try (FileChannel channel = FileChannel.open(place, StandardOpenOption.READ)) {
            ImageHead head = head(channel);
            if (!hashes.apply(head.posting()).equals(Optional.of(head.hash()))) {
                throw new IOException("it is of another records file, or of another history of this one");
            }
            return Optional.of(read(channel, head));
        } catch (IOException | RuntimeException fault) {
            LOG.warn("{} is not used and is made again: {}", place, fault.getMessage());
            return Optional.empty();
        }
    }

    private static ImageHead head(FileChannel channel) throws IOException {
        ByteBuffer bytes = ByteBuffer.allocate(ImageHead.BYTES);
        channel.read(bytes, 0);
        ImageHead head = ImageHead.read(bytes.array())
                .orElseThrow(() -> new IOException("its head is torn, or of another version"));
        if (channel.size() != head.fileLength()) {
            throw new IOException("it is " + channel.size() + " bytes long, not " + head.fileLength());
        }
        return head;
    }

    /** Reads the network beside the records, on a thread of its own. */
    private static Snapshot read(FileChannel channel, ImageHead head) throws IOException {
        long joints = ImageHead.BYTES + head.records().length();
        long network = joints + head.joints().length();
        CompletableFuture<Records> records = CompletableFuture.supplyAsync(() -> {
            try {
                return PlantPages.read(
                        SectionBytes.open(channel, ImageHead.BYTES, head.records()),
                        SectionBytes.open(channel, joints, head.joints()),
                        head.posting());
            } catch (IOException fault) {
                throw new CompletionException(fault);
            }
        });
        try {
            SectionInts ints = new SectionInts(channel, network, head.network());
            Network joined = NetworkImage.read(ints);
            ints.end();
            return NetworkImage.beside(records.join(), joined);
        } catch (CompletionException fault) {
            throw new IOException(fault.getCause());
        } finally {
            records.exceptionally(ignored -> Records.empty()).join();
        }
    }
}
