package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.SQLException;
import java.time.Duration;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.network.Outcome;
import spanwright.network.RecordsText;
import spanwright.records.Refusal;

class OpeningTest {

    @TempDir
    private Path folder;

    private Path plant() {
        return folder.resolve("plant.spanwright");
    }

    private Path made(int postings) {
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            Ledgers.postAtRandom(ledger, 1, postings);
        }
        return plant();
    }

    private List<String> files() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3})
    void a_file_opened_again_holds_the_same(long seed) {
        List<String> before;
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            Ledgers.postAtRandom(ledger, seed, 30);
            before = RecordsText.of(ledger.current());
        }
        for (Access access : Access.values()) {
            try (SqliteLedger ledger = Ledgers.open(plant(), access)) {
                assertThat(RecordsText.of(ledger.current())).as("seed %d", seed).isEqualTo(before);
            }
        }
    }

    @Test
    void a_file_opened_again_goes_on_where_it_was() {
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            Ledgers.post(
                    ledger,
                    editor -> editor.apply(
                            Change.remove(editor.records().settings().get(1))));
        }
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            Outcome.Posted posted = Ledgers.post(ledger, Ledgers.setting("b", "2"));

            assertThat(posted.posting().number()).isEqualTo(3);
            assertThat(posted.snapshot()
                            .records()
                            .settings()
                            .find("b")
                            .orElseThrow()
                            .id())
                    .as("an identity is never given twice")
                    .isEqualTo(2);
        }
    }

    @Test
    void a_posting_needs_its_file_to_be_there_only_once_it_is_made() throws IOException {
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            assertThat(plant()).doesNotExist();
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            assertThat(plant()).exists();
        }
        assertThat(files()).contains("plant.spanwright").noneMatch(name -> name.contains("making"));
    }

    @Test
    void a_first_posting_refused_leaves_no_file_at_all() throws IOException {
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.WRITE)) {
            Refusal refusal = new Refusal("no", "No.", null, null, null);
            assertThat(ledger.post("Ana", "as built", editor -> List.of(refusal)))
                    .isInstanceOf(Outcome.Refused.class);
        }
        assertThat(files()).isEmpty();
    }

    @Test
    void an_empty_file_is_one_not_made_yet() throws IOException {
        Files.createFile(plant());

        assertThat(Ledgers.refusal(plant(), Access.READ).code()).isEqualTo("records-missing");
        made(1);
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.READ)) {
            assertThat(ledger.current().records().posting()).isPositive();
        }
    }

    @Test
    void what_a_broken_off_making_left_behind_is_cleared_away() throws IOException {
        Files.writeString(RecordsFile.making(plant()), "half a file");
        made(1);
        assertThat(files()).noneMatch(name -> name.contains("making"));

        Files.writeString(RecordsFile.making(plant()), "half a file");
        made(0);
        assertThat(files()).noneMatch(name -> name.contains("making"));
    }

    @Test
    void a_file_that_is_not_there_is_not_read() throws IOException {
        Opening.Unopened refusal = Ledgers.refusal(plant(), Access.READ);

        assertThat(refusal.code()).isEqualTo("records-missing");
        assertThat(refusal.sentence()).contains("plant.spanwright");
        assertThat(files()).isEmpty();
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_file_in_a_folder_that_is_not_there_is_refused(Access access) {
        Path lost = folder.resolve("nowhere").resolve("plant.spanwright");

        assertThat(Ledgers.refusal(lost, access).sentence()).contains("nowhere");
        assertThat(folder.resolve("nowhere")).doesNotExist();
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_folder_is_refused(Access access) throws IOException {
        Files.createDirectory(plant());

        assertThat(Ledgers.refusal(plant(), access).code()).isEqualTo("records-unreadable");
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_file_that_is_not_SQLites_is_refused_and_left_alone(Access access) throws IOException {
        Files.writeString(plant(), "cable,fibers\nF-1,12\n".repeat(200));

        assertThat(Ledgers.refusal(plant(), access).code()).isEqualTo("records-not-sqlite");
        assertThat(plant()).hasContent("cable,fibers\nF-1,12\n".repeat(200));
        assertThat(files()).containsExactly("plant.spanwright");
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void another_programs_database_is_refused_and_left_alone(Access access) throws IOException, SQLException {
        Ledgers.run(plant(), "CREATE TABLE recipe (name TEXT)");
        byte[] before = Files.readAllBytes(plant());

        Opening.Unopened refusal = Ledgers.refusal(plant(), access);
        assertThat(refusal.code()).isEqualTo("records-foreign");
        assertThat(refusal.sentence()).contains("the mark 0,").contains("53505752");
        assertThat(plant()).hasBinaryContent(before);

        Ledgers.run(plant(), "PRAGMA application_id = 77");
        assertThat(Ledgers.refusal(plant(), access).sentence()).contains("the mark 4d");
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_newer_schema_is_refused(Access access) throws SQLException {
        Ledgers.run(made(1), "PRAGMA user_version = 99");

        Opening.Unopened refusal = Ledgers.refusal(plant(), access);
        assertThat(refusal.code()).isEqualTo("records-newer");
        assertThat(refusal.sentence()).contains("99").contains("newer version");
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_file_cut_short_is_refused(Access access) throws IOException {
        long whole = Files.size(made(10));
        for (long length : new long[] {whole - 1, whole - 4096, whole / 2, 5000, 100}) {
            try (RandomAccessFile file = new RandomAccessFile(plant().toFile(), "rw")) {
                file.setLength(length);
            }
            Opening.Unopened refusal = Ledgers.refusal(plant(), access);
            assertThat(refusal.code()).as("%d of %d bytes", length, whole).isEqualTo("records-torn");
            assertThat(refusal.sentence()).contains("damaged").contains("backup");
        }
    }

    @ParameterizedTest
    @EnumSource(Access.class)
    void a_file_whose_pages_make_no_sense_is_refused(Access access) throws IOException {
        made(10);
        try (RandomAccessFile file = new RandomAccessFile(plant().toFile(), "rw")) {
            file.seek(4096);
            file.write(new byte[(int) (file.length() - 4096)]);
        }

        assertThat(Ledgers.refusal(plant(), access).code()).isEqualTo("records-torn");
    }

    @Test
    void damage_within_the_file_is_found_beside_the_work() throws IOException, SQLException {
        made(10);
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.READ)) {
            assertThat(ledger.integrity().toCompletableFuture().join().sound()).isTrue();
        }
        Ledgers.run(plant(), "DELETE FROM enclosure WHERE id = 1");
        try (SqliteLedger ledger = Ledgers.open(plant(), Access.READ)) {
            Integrity integrity = ledger.integrity().toCompletableFuture().join();
            assertThat(integrity.sound()).isFalse();
            assertThat(integrity.findings()).anyMatch(line -> line.contains("panel") && line.contains("enclosure"));
        }
    }

    @Test
    void a_check_not_begun_before_the_end_is_given_up() {
        made(1);
        SqliteLedger ledger = Ledgers.open(plant(), Access.READ);
        ledger.close();

        assertThat(ledger.integrity().toCompletableFuture())
                .failsWithin(Duration.ofSeconds(10))
                .withThrowableThat()
                .withMessageContaining("closed");
    }

    @Test
    void a_second_writer_is_told_who_the_first_is_and_a_reader_is_not_kept_out() {
        made(1);
        try (SqliteLedger first = Ledgers.open(plant(), Access.WRITE)) {
            Opening.Unopened refusal = Ledgers.refusal(plant(), Access.WRITE);
            assertThat(refusal.code()).isEqualTo("records-taken");
            assertThat(refusal.sentence())
                    .contains("process " + ProcessHandle.current().pid())
                    .contains("since 20");
            try (SqliteLedger reader = Ledgers.open(plant(), Access.READ)) {
                Ledgers.post(first, Ledgers.setting("later", "x"));
                assertThat(reader.current().records().settings().find("later")).isEmpty();
                assertThat(reader.postings(Integer.MAX_VALUE, 1).get(0).number())
                        .isEqualTo(reader.current().records().posting());
                Outcome refused = reader.post("Ana", "no", Ledgers.setting("b", "2"));
                assertThat(((Outcome.Refused) refused).refusals())
                        .extracting(Refusal::code)
                        .containsExactly("records-read-only");
            }
        }
        Ledgers.open(plant(), Access.WRITE).close();
    }
}
