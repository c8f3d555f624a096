package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class TwoProcessesTest {

    @TempDir
    private Path folder;

    @Test
    void one_process_writes_another_reads_and_a_second_writer_is_told_who_writes() throws Exception {
        Path file = folder.resolve("plant");
        Process writer = PostingProcess.start(file, 1);
        try (BufferedReader lines = writer.inputReader(StandardCharsets.UTF_8)) {
            assertThat(lines.readLine()).isEqualTo("opened");
            assertThat(lines.readLine()).isEqualTo("posted 1");

            Opening.Unopened refusal = Ledgers.refusal(file, Access.WRITE);
            assertThat(refusal.code()).isEqualTo("records-taken");
            assertThat(refusal.sentence()).contains("process " + writer.pid()).contains("since 20");

            for (int reading = 0; reading < 5; reading++) {
                try (SqliteLedger reader = Ledgers.open(file, Access.READ)) {
                    assertThat(reader.current().records().posting()).isPositive();
                    assertThat(reader.current().records().structures().count()).isEqualTo(6);
                }
            }
        } finally {
            writer.destroyForcibly();
            writer.waitFor();
        }
        Ledgers.open(file, Access.WRITE).close();
    }

    @Test
    void a_process_is_refused_where_this_one_writes() throws Exception {
        Path file = folder.resolve("plant");
        try (SqliteLedger ledger = Ledgers.open(file, Access.WRITE)) {
            Ledgers.post(ledger, Ledgers.setting("a", "1"));
            Process second = PostingProcess.start(file, 1);
            try (BufferedReader lines = second.inputReader(StandardCharsets.UTF_8)) {
                assertThat(lines.readLine())
                        .contains("is being written by process "
                                + ProcessHandle.current().pid())
                        .contains("since 20");
            }
            assertThat(second.waitFor()).isZero();
        }
    }
}
