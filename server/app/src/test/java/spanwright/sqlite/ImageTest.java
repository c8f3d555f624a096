package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.read.ListAppender;
import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.slf4j.LoggerFactory;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.network.RandomPostings;
import spanwright.network.RecordsText;
import spanwright.plant.Setting;

/** Invariant 5 of the package: the side file speeds an opening up, and nothing depends on it. */
class ImageTest {

    private final ListAppender<ILoggingEvent> log = new ListAppender<>();

    @TempDir
    private Path folder;

    private Path file;

    @BeforeEach
    void listen() {
        file = folder.resolve("plant");
        log.start();
        logger().addAppender(log);
        logger().setLevel(Level.INFO);
    }

    @AfterEach
    void hush() {
        logger().detachAppender(log);
        logger().setLevel(null);
    }

    private static Logger logger() {
        return (Logger) LoggerFactory.getLogger("spanwright.sqlite");
    }

    private List<String> make(long seed, int postings) {
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.postAtRandom(ledger, seed, postings);
            return RecordsText.of(ledger.current());
        }
    }

    private Path image() {
        return RecordsFile.network(file);
    }

    /** Opens the file, and says whether its tables had to be read. */
    private boolean readsTables(Access access, List<String> expected) {
        log.list.clear();
        try (SqliteLedger ledger = Ledgers.open(file, access)) {
            assertThat(RecordsText.of(ledger.current())).isEqualTo(expected);
        }
        return said("is read from its tables");
    }

    private boolean said(String words) {
        return log.list.stream().anyMatch(event -> event.getFormattedMessage().contains(words));
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3, 4})
    void an_opening_from_the_image_is_the_same_as_one_from_the_tables(long seed) throws IOException {
        List<String> state = make(seed, 40);

        assertThat(readsTables(Access.READ, state)).isFalse();
        Files.delete(image());
        assertThat(readsTables(Access.READ, state)).isTrue();
        assertThat(readsTables(Access.WRITE, state)).as("it was made again").isFalse();
    }

    @Test
    void what_was_posted_after_the_image_is_made_again_upon_it() throws IOException {
        make(1, 10);
        Path older = folder.resolve("older");
        Files.copy(image(), older);
        List<String> state;
        int last;
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            RandomPostings postings = new RandomPostings(99);
            for (int posting = 0; posting < 20; posting++) {
                ledger.post("Ana", "later", postings.next());
            }
            state = RecordsText.of(ledger.current());
            last = ledger.current().records().posting();
        }
        Files.move(older, image(), StandardCopyOption.REPLACE_EXISTING);

        assertThat(readsTables(Access.READ, state)).isFalse();
        assertThat(readsTables(Access.WRITE, state)).isFalse();
        assertThat(ImageHead.read(Files.readAllBytes(image())).orElseThrow().posting())
                .as("brought up to date at the close")
                .isEqualTo(last);
    }

    @Test
    void an_image_too_far_behind_is_not_used() throws IOException {
        make(1, 10);
        Path older = folder.resolve("older");
        Files.copy(image(), older);
        List<String> state;
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, editor -> {
                for (int count = 0; count < 6_000; count++) {
                    int id = editor.records().newIdentity(RecordKind.SETTING);
                    editor.replay(Change.add(new Setting(id, "s" + id, "x")));
                }
                return List.of();
            });
            state = RecordsText.of(ledger.current());
        }
        Files.move(older, image(), StandardCopyOption.REPLACE_EXISTING);

        assertThat(readsTables(Access.READ, state)).isTrue();
    }

    @Test
    void an_image_of_another_file_is_not_used() throws IOException {
        make(1, 20);
        Path other = folder.resolve("other");
        Files.move(image(), other);
        Files.delete(file);
        List<String> state = make(2, 30);
        Files.move(other, image(), StandardCopyOption.REPLACE_EXISTING);

        assertThat(readsTables(Access.READ, state)).isTrue();
        assertThat(said("another records file")).isTrue();
    }

    @Test
    void an_image_of_a_history_that_this_file_has_not_yet_is_not_used() throws IOException {
        List<String> before = make(1, 5);
        Path copy = folder.resolve("copy");
        Files.copy(file, copy);
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("later", "x"));
        }
        Files.move(copy, file, StandardCopyOption.REPLACE_EXISTING);

        assertThat(readsTables(Access.READ, before)).isTrue();
        assertThat(said("another history")).isTrue();
    }

    @Test
    void a_torn_image_is_not_used_wherever_it_is_torn() throws IOException {
        List<String> state = make(1, 20);
        byte[] whole = Files.readAllBytes(image());
        for (int length : new int[] {0, 1, 60, ImageHead.BYTES, whole.length / 2, whole.length - 1, whole.length + 1}) {
            Files.write(image(), Arrays.copyOf(whole, length));
            assertThat(readsTables(Access.READ, state))
                    .as("%d of %d bytes", length, whole.length)
                    .isTrue();
            assertThat(said("is not used and is made again")).isTrue();
            assertThat(readsTables(Access.READ, state)).as("it was made again").isFalse();
        }
    }

    @Test
    void an_image_with_a_bit_turned_is_not_used_wherever_it_is() throws IOException {
        List<String> state = make(1, 20);
        byte[] whole = Files.readAllBytes(image());
        Random random = new Random(20260331);
        for (int turn = 0; turn < 30; turn++) {
            int at = turn < 5 ? turn * 20 : random.nextInt(whole.length);
            Files.write(image(), whole);
            try (RandomAccessFile bytes = new RandomAccessFile(image().toFile(), "rw")) {
                bytes.seek(at);
                bytes.write(whole[at] ^ 1 << random.nextInt(8));
            }
            assertThat(readsTables(Access.READ, state))
                    .as("byte %d of %d", at, whole.length)
                    .isTrue();
        }
    }

    @Test
    void much_changed_at_once_the_image_is_written_without_waiting_for_the_end() throws Exception {
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, editor -> {
                for (int count = 0; count < Draft.BULK; count++) {
                    int id = editor.records().newIdentity(RecordKind.SETTING);
                    editor.replay(Change.add(new Setting(id, "s" + id, "x")));
                }
                return List.of();
            });
            while (!Files.exists(image())) {
                Thread.sleep(5);
            }
            assertThat(readsTables(Access.READ, RecordsText.of(ledger.current())))
                    .isFalse();
        }
    }

    @Test
    void an_image_that_cannot_be_written_does_no_harm() throws IOException {
        Files.createDirectory(image());
        Files.createFile(image().resolve("in the way"));
        List<String> state = make(1, 20);

        assertThat(said("was not written")).isTrue();
        assertThat(readsTables(Access.WRITE, state)).isTrue();
        try (Stream<Path> files = Files.list(folder)) {
            assertThat(files.map(path -> path.getFileName().toString()))
                    .containsExactlyInAnyOrder("plant", "plant.network");
        }
    }
}
