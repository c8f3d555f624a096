package spanwright.boot;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.BufferedReader;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The packed program, as people run it. */
class JarIT {

    private static final Path JAVA = Path.of(System.getProperty("java.home"), "bin", "java");

    @TempDir
    private Path folder;

    private static List<String> command(String... args) {
        List<String> command = new ArrayList<>(List.of(JAVA.toString(), "-jar", System.getProperty("spanwright.jar")));
        command.addAll(List.of(args));
        return command;
    }

    private Ran run(String... args) throws IOException, InterruptedException {
        Path out = folder.resolve("out.txt");
        Path err = folder.resolve("err.txt");
        Process process = new ProcessBuilder(command(args))
                .redirectOutput(out.toFile())
                .redirectError(err.toFile())
                .start();
        assertThat(process.waitFor(5, TimeUnit.MINUTES)).isTrue();
        return new Ran(process.exitValue(), Files.readString(out), Files.readString(err));
    }

    /** What a process did. */
    private record Ran(int status, String out, String err) {}

    @Test
    void loads_a_folder_and_traces_it_as_worked_by_hand() throws Exception {
        String records = folder.resolve("records.db").toString();
        Ran loaded = run("load", Cases.WORKED.toString(), "--records", records);
        assertThat(loaded.status()).as(loaded.err()).isZero();
        assertThat(loaded.out()).isEmpty();

        Ran traced = run("trace", "--circuit", "C-1", "--records", records, "--json");
        assertThat(traced.status()).as(traced.err()).isZero();
        assertThat(traced.err()).isEmpty();
        Expected.assertHeldBy(
                Expected.read(traced.out()), Expected.read(Cases.WORKED.resolve("expected-circuit-C-1.json")));

        Ran missing = run("trace", "--circuit", "C-7", "--records", records, "--json");
        assertThat(missing.status()).isEqualTo(1);
        assertThat(missing.out()).isEmpty();
        assertThat(missing.err()).startsWith("There is no circuit C-7.");
        assertThat(run("trace", "--records", records).status()).isEqualTo(2);
    }

    @Test
    void a_folder_with_a_fault_leaves_no_records_file() throws Exception {
        Path wrong = Files.createDirectory(folder.resolve("wrong"));
        Files.writeString(wrong.resolve("spans.csv"), "span,from,to,placement\nS-1,A,B,aerial\n");
        Path records = folder.resolve("records.db");

        Ran ran = run("load", wrong.toString(), "--records", records.toString());

        assertThat(ran.status()).isEqualTo(1);
        assertThat(ran.err()).contains("spans.csv:2: ");
        assertThat(records).doesNotExist();
    }

    @Test
    void the_demo_serves_pages_and_answers() throws Exception {
        Process process = new ProcessBuilder(command("demo", "--port", "0", "--no-browser"))
                .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                .start();
        try (BufferedReader err = process.errorReader(StandardCharsets.UTF_8)) {
            URI address = address(err);
            assertThat(get(address)).contains("<title>Spanwright</title>");
            assertThat(Expected.read(get(address.resolve("/status")))
                            .path("demo")
                            .asBoolean())
                    .isTrue();
            assertThat(Expected.read(get(address.resolve("/trace?circuit=RC-01")))
                            .at("/paths/0/complete")
                            .asBoolean())
                    .isTrue();
        } finally {
            process.destroy();
            assertThat(process.waitFor(1, TimeUnit.MINUTES)).isTrue();
        }
    }

    private static URI address(BufferedReader err) throws IOException {
        String line = err.readLine();
        while (line != null && !line.contains("http://")) {
            line = err.readLine();
        }
        assertThat(line).as("the address").isNotNull();
        return URI.create(line.replaceAll(".*(http://[^ ]*/).*", "$1"));
    }

    private static String get(URI page) throws IOException, InterruptedException {
        HttpResponse<String> answer = HttpClient.newHttpClient()
                .send(HttpRequest.newBuilder(page).build(), HttpResponse.BodyHandlers.ofString(StandardCharsets.UTF_8));
        assertThat(answer.statusCode()).as("%s", page).isEqualTo(200);
        return answer.body();
    }
}
