package spanwright.boot;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.cli.CommandLineProgram;

/** The command line with all its parts, in this process. */
class CommandLineTest {

    private static final Pattern ADDRESS = Pattern.compile("http://127\\.0\\.0\\.1:[0-9]+/");

    @TempDir
    private Path folder;

    private String records;

    @BeforeEach
    void name() {
        records = folder.resolve("records.db").toString();
    }

    private static Ran run(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = CommandLineProgram.run(new Parts(), new PrintWriter(out), new PrintWriter(err), args);
        return new Ran(status, out.toString(), err.toString());
    }

    private Ran load(Path what) {
        return run("load", what.toString(), "--records", records, "--by", "A. Marsh", "--reason", "as built");
    }

    /** What a command did. */
    private record Ran(int status, String out, String err) {}

    @Test
    void a_folder_is_loaded_as_one_posting_and_says_how_many_of_each() {
        Ran ran = load(Cases.WORKED);

        assertThat(ran.status()).isZero();
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err()).contains("4 structures", "5 splices", "Posting 1 in ");
    }

    @Test
    void a_folder_with_faults_leaves_nothing_and_names_every_one() throws IOException {
        Path wrong = Files.createDirectory(folder.resolve("wrong"));
        Files.writeString(wrong.resolve("structures.csv"), "structure,kind,lon,lat\nA,tower,0,0\nB,pole,0,91\n");

        Ran ran = load(wrong);

        assertThat(ran.status()).isEqualTo(1);
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err().lines().filter(line -> line.startsWith("structures.csv:")))
                .hasSize(2)
                .anySatisfy(line -> assertThat(line).startsWith("structures.csv:2: "))
                .anySatisfy(line -> assertThat(line).startsWith("structures.csv:3: "));
        assertThat(Path.of(records)).doesNotExist();
        assertThat(folder.toFile().list()).containsExactly("wrong");
    }

    @Test
    void what_cannot_be_loaded_is_said_in_a_sentence() {
        assertThat(load(folder.resolve("nothing")).err()).contains("There is no folder or file");
        assertThat(run(
                                "load",
                                Cases.WORKED.toString(),
                                "--records",
                                folder.resolve("no/records.db").toString())
                        .err())
                .contains("make it first");
        assertThat(run("load", Cases.WORKED.toString(), "--records", records, "--by", " ")
                        .err())
                .contains("--by is blank");
        assertThat(load(Cases.WORKED).status()).isZero();
        Ran again = load(Cases.WORKED);
        assertThat(again.status()).isEqualTo(1);
        assertThat(again.err()).contains("structures.csv:2: ");
    }

    @Test
    void a_trace_holds_what_was_worked_by_hand() {
        load(Cases.WORKED);

        Ran circuit = run("trace", "--circuit", "C-1", "--records", records, "--json");
        Ran port = run(
                "trace",
                "--port",
                "E4/T/4",
                "--wavelength",
                "1550",
                "--budget",
                "3",
                "--margin",
                "0.2",
                "--json",
                "--records",
                records);

        assertThat(circuit.err()).isEmpty();
        Expected.assertHeldBy(
                Expected.read(circuit.out()), Expected.read(Cases.WORKED.resolve("expected-circuit-C-1.json")));
        Expected.assertHeldBy(
                Expected.read(port.out()), Expected.read(Cases.WORKED.resolve("expected-port-E4-T-4.json")));
    }

    @Test
    void numbers_are_plain_decimals() {
        load(Cases.WORKED);

        String json =
                run("trace", "--all-circuits", "--records", records, "--json").out();

        assertThat(json).doesNotContainPattern(": -?[0-9.]+[eE]");
    }

    @Test
    void a_past_posting_and_a_planned_job_are_answered_from() {
        load(Cases.WORKED);
        load(Cases.WORKED_LATER);

        assertThat(run("trace", "--circuit", "C-2", "--records", records).status())
                .isZero();
        Ran before = run("trace", "--circuit", "C-2", "--as-of", "1", "--records", records);
        assertThat(before.status()).isEqualTo(1);
        assertThat(before.err()).contains("There is no circuit C-2. Is C-1 meant?");
        assertThat(run("trace", "--circuit", "C-2", "--as-of", "2001-01-01", "--records", records)
                        .status())
                .isEqualTo(1);
        assertThat(run("trace", "--circuit", "C-2", "--as-of", "3", "--records", records)
                        .err())
                .contains("There is no posting 3; the last is 2.");

        JsonNode now = Expected.read(
                run("trace", "--port", "E1/P/1", "--records", records, "--json").out());
        JsonNode built =
                Expected.read(run("trace", "--port", "E1/P/1", "--as-if", "J-1", "--records", records, "--json")
                        .out());
        assertThat(now.at("/paths/3/ends/1").asText()).isEqualTo("S1 out 4 @ E3");
        assertThat(built.at("/paths/3/ends/1").asText()).isEqualTo("E4/T/5");
        assertThat(run("trace", "--port", "E1/P/1", "--as-if", "J-2", "--records", records)
                        .err())
                .contains("Is J-1 meant?");
    }

    @Test
    void a_table_for_a_person_is_a_hundred_columns_wide_at_most() {
        load(Cases.WORKED);

        for (List<String> asked : List.of(
                List.of("trace", "--all-circuits"),
                List.of("trace", "--port", "E1/P/1", "--budget", "B+"),
                List.of("trace", "--fiber", "F-1:24", "--margin", "1", "--budget", "9"),
                List.of("check"))) {
            Ran ran = run(Stream.concat(asked.stream(), List.of("--records", records).stream())
                    .toArray(String[]::new));
            assertThat(ran.status()).as("%s", asked).isZero();
            assertThat(ran.out().lines())
                    .allSatisfy(line -> assertThat(line.length()).as(line).isLessThanOrEqualTo(100));
        }
    }

    @Test
    void what_is_asked_wrongly_is_input() {
        load(Cases.WORKED);

        assertThat(run("trace", "--circuit", "C-9", "--records", records).err()).contains("Is C-1 meant?");
        assertThat(run("trace", "--port", "E1/P/9", "--records", records).err()).contains("ports 1 to 2, not 9");
        assertThat(run("trace", "--port", "E1/R/1", "--records", records).err()).contains("no panel in E1 R");
        assertThat(run("trace", "--port", "E9/P/1", "--records", records).err()).contains("no enclosure E9");
        assertThat(run("trace", "--port", "E1", "--records", records).err()).contains("is not a port");
        assertThat(run("trace", "--fiber", "F-1:25", "--records", records).err())
                .contains("fibers 1 to 24, not 25");
        assertThat(run("trace", "--fiber", "F-2:1", "--records", records).err()).contains("Is F-1 meant?");
        assertThat(run("trace", "--fiber", "F-1", "--records", records).err()).contains("is not a fiber");
        assertThat(run("trace", "--circuit", "C-1", "--wavelength", "1700", "--records", records)
                        .err())
                .contains("1700 nm");
        assertThat(run("trace", "--circuit", "C-1", "--budget", "Z", "--records", records)
                        .err())
                .contains("'Z' is no budget");
        assertThat(run("trace", "--circuit", "C-1", "--margin", "-1", "--records", records)
                        .err())
                .contains("not a margin");
        assertThat(run("trace", "--circuit", "C-1", "--wavelength", "0", "--records", records)
                        .status())
                .isEqualTo(1);
        assertThat(run("trace", "--circuit", "C-1", "--as-of", "noon", "--records", records)
                        .err())
                .contains("neither a posting's number nor a time");
        assertThat(run(
                                "trace",
                                "--circuit",
                                "C-1",
                                "--records",
                                folder.resolve("none.db").toString())
                        .status())
                .isEqualTo(1);
    }

    @Test
    void what_is_used_wrongly_is_usage() {
        load(Cases.WORKED);

        assertThat(run("trace", "--records", records).status()).isEqualTo(2);
        assertThat(run("trace", "--circuit", "C-1", "--port", "E1/P/1", "--records", records)
                        .status())
                .isEqualTo(2);
        assertThat(run("trace", "--circuit", "C-1").status()).isEqualTo(2);
        assertThat(run("trcae").status()).isEqualTo(2);
        assertThat(run("serve", "--port", "many", "--records", records).status())
                .isEqualTo(2);
    }

    @Test
    void help_says_what_there_is() {
        assertThat(run().out()).contains("load", "trace", "check", "serve", "demo", "before you dig");
        assertThat(run("trace", "--help").out()).contains("--as-of", "--as-if", "--json", "--budget");
        assertThat(run("--version").out()).startsWith("spanwright ");
    }

    @Test
    void what_is_exported_and_loaded_again_answers_the_same() {
        load(Cases.WORKED);
        Path out = folder.resolve("out");
        Ran exported = run("export", "--format", "folder", out.toString(), "--records", records);
        assertThat(exported.status()).as(exported.err()).isZero();
        String first =
                run("trace", "--all-circuits", "--records", records, "--json").out();

        records = folder.resolve("again.db").toString();
        assertThat(load(out).status()).isZero();

        assertThat(run("trace", "--all-circuits", "--records", records, "--json")
                        .out())
                .isEqualTo(first);
        assertThat(run("export", "--format", "folder", out.toString(), "--records", records)
                        .err())
                .contains("is there already");
        Path map = folder.resolve("map.geojson");
        assertThat(run("export", "--format", "geojson", map.toString(), "--records", records)
                        .status())
                .isZero();
        assertThat(Expected.read(map).path("features").isEmpty()).isFalse();
        assertThat(run("export", "--format", "geojson", folder.resolve("no/map").toString(), "--records", records)
                        .err())
                .contains("cannot be written");
        assertThat(run("export", "--format", "pdf", map.toString(), "--records", records)
                        .status())
                .isEqualTo(2);
    }

    @Test
    void findings_are_listed_as_a_document_and_as_a_table() {
        load(Cases.WORKED);

        Ran json = run("check", "--records", records, "--json");
        Ran table = run("check", "--records", records);

        assertThat(json.status()).isZero();
        JsonNode findings = Expected.read(json.out()).path("findings");
        assertThat(findings.isArray()).isTrue();
        findings.forEach(
                finding -> assertThat(finding.path("severity").asText()).isIn("error", "warning", "note"));
        assertThat(table.out()).contains(" errors, ", " warnings, ");
    }

    @Test
    void the_server_answers_until_it_is_stopped_and_refuses_what_it_cannot_have() throws Exception {
        assertThat(run("serve", "--records", records).err()).contains("load a folder into it first");
        load(Cases.WORKED);
        assertThat(run("serve", "--records", records, "--port", "65536").err()).contains("0 to 65535");
        assertThat(run("serve", "--records", records, "--host", "192.0.2.1", "--port", "0")
                        .err())
                .contains("Cannot listen at 192.0.2.1");

        String body = whileRunning("/status", "serve", "--records", records, "--port", "0");

        assertThat(Expected.read(body).path("owner").asText()).isEqualTo("Worked by hand");
        assertThat(Expected.read(body).path("demo").asBoolean()).isFalse();
    }

    @Test
    void the_demo_loads_itself_into_a_fresh_file_and_says_that_it_is_invented() throws Exception {
        Files.writeString(Path.of(records), "");
        assertThat(run("demo", "--records", records).err()).contains("is there already");
        String kept = folder.resolve("kept.db").toString();

        String body = whileRunning("/status", "demo", "--records", kept, "--port", "0", "--no-browser");

        JsonNode status = Expected.read(body);
        assertThat(status.path("demo").asBoolean()).isTrue();
        assertThat(status.path("invented").asText()).contains("invented");
        assertThat(status.at("/counts/circuits").asInt()).isGreaterThan(1_000);
        assertThat(Path.of(kept)).exists();

        JsonNode served = Expected.read(whileRunning("/status", "serve", "--records", kept, "--port", "0"));
        assertThat(served.path("demo").asBoolean()).isFalse();
        assertThat(served.path("invented").asText()).contains("invented");
    }

    /** The built-in fiber types have no value at 1700 nm; what a reel's own sheet gives may end earlier still. */
    @Test
    void one_circuit_that_cannot_be_reckoned_does_not_hide_the_others() throws IOException {
        load(Cases.WORKED);
        String before =
                run("trace", "--all-circuits", "--records", records, "--json").out();
        load(Cases.WORKED_LATER);
        Path more = Files.createDirectory(folder.resolve("more"));
        Files.writeString(more.resolve("circuits.csv"), "circuit,wavelength_nm,a,z\nB-1,1700,E1/P/1,E4/T/4\n");
        assertThat(load(more).status()).isZero();

        Ran named = run("trace", "--circuit", "B-1", "--records", records, "--json");
        assertThat(named.status()).isEqualTo(1);
        assertThat(named.out()).isEmpty();

        Ran all = run("trace", "--all-circuits", "--records", records, "--json");
        assertThat(all.status()).as(all.err()).isZero();
        JsonNode paths = Expected.read(all.out()).path("paths");
        JsonNode wrong = paths.get(0);
        assertThat(wrong.path("wavelength_nm").asInt()).isEqualTo(1700);
        assertThat(wrong.path("problem").asText()).contains("1700 nm");
        assertThat(wrong.at("/totals/loss_db").isNull()).isTrue();
        assertThat(wrong.at("/totals/glass_m").asDouble()).isPositive();
        assertThat(wrong.path("elements").isEmpty()).isTrue();
        JsonNode right = Expected.read(before).path("paths").get(0);
        assertThat(paths.get(1).path("elements")).isEqualTo(right.path("elements"));
        assertThat(paths.get(1).has("problem")).isFalse();
        assertThat(run("trace", "--all-circuits", "--records", records).out()).contains("No loss: ");
    }

    /** Runs a server in a thread of its own, asks it once, stops it. */
    private static String whileRunning(String path, String... args) throws Exception {
        StringWriter err = new StringWriter();
        int[] status = {-1};
        Thread running = new Thread(() -> status[0] =
                CommandLineProgram.run(new Parts(), new PrintWriter(new StringWriter()), new PrintWriter(err), args));
        running.start();
        try {
            Matcher address = ADDRESS.matcher(err.toString());
            for (int tenth = 0; tenth < 600 && !address.find(); tenth++) {
                Thread.sleep(100);
                assertThat(running.isAlive()).as(err.toString()).isTrue();
                address = ADDRESS.matcher(err.toString());
            }
            URI at = URI.create(address.group()).resolve(path);
            return HttpClient.newHttpClient()
                    .send(HttpRequest.newBuilder(at).build(), HttpResponse.BodyHandlers.ofString())
                    .body();
        } finally {
            running.interrupt();
            running.join();
            assertThat(status[0]).isZero();
        }
    }

    @Test
    void the_browser_is_opened_by_the_system_s_own_way() {
        URI page = URI.create("http://127.0.0.1:8080/");

        assertThat(Browser.command("Linux", page)).startsWith("xdg-open");
        assertThat(Browser.command("Mac OS X", page)).startsWith("open");
        assertThat(Browser.command("Windows 11", page)).startsWith("rundll32");
    }
}
