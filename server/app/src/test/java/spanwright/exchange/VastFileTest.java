package spanwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.network.Snapshot;

/** Files far larger than memory, of which one row, line or cell is nearly all: told at its line, never held. */
class VastFileTest {

    private static final String HEADER = "structure,kind,lon,lat,note\n";
    private static final String SOUND = "A,pole,0,0,\n";
    private static final long SHARE = 48L << 20;
    private static final long WHOLE = 4L << 30;

    /** What a file holds: a beginning, then a piece again and again, then an end. */
    private record Vast(String before, String piece, String after) {

        InputStream bytes(long size) {
            return new Repeated(this, size);
        }
    }

    /** The bytes of a vast file, of which one piece at a time is there. */
    private static final class Repeated extends InputStream {

        private final byte[] many;
        private final byte[] after;
        private ByteArrayInputStream piece;
        private long times;

        Repeated(Vast vast, long size) {
            this.many = vast.piece.repeat((1 << 16) / vast.piece.length()).getBytes(UTF_8);
            this.after = vast.after.getBytes(UTF_8);
            this.piece = new ByteArrayInputStream(vast.before.getBytes(UTF_8));
            this.times = size / many.length;
        }

        @Override
        public int read() {
            throw new UnsupportedOperationException("bytes are read by many");
        }

        @Override
        public int read(byte[] into, int from, int length) {
            int got = piece.read(into, from, length);
            while (got < 0 && times >= 0) {
                piece = new ByteArrayInputStream(times == 0 ? after : many);
                times--;
                got = piece.read(into, from, length);
            }
            return got;
        }
    }

    private static Arguments vast(String name, String before, String piece, String after, String... faults) {
        return Arguments.of(name, new Vast(before, piece, after), List.of(faults));
    }

    static Stream<Arguments> files() {
        String tooLong = "a row of more than 4,194,304 characters; no row needs as many - is a quote left open?";
        return Stream.of(
                vast(
                        "a plain cell",
                        HEADER + SOUND + "B,pole,0,0,",
                        "x",
                        "\nC,pole,0,91,\n",
                        "3: " + tooLong,
                        "4: lat"),
                vast(
                        "a cell in quotes",
                        HEADER + "B,pole,0,0,\"",
                        "xyz \"\" ",
                        "\"\nC,tower,0,0,\n",
                        "2: " + tooLong,
                        "3: kind"),
                vast("a quote left open", HEADER + SOUND + "B,pole,0,0,\"open\n", "C,pole,0,0,\n", "", "3: " + tooLong),
                vast("letters of four bytes", HEADER + "B,pole,0,0,", "\uD83D\uDE00", "\n", "2: " + tooLong),
                vast("cells without end", HEADER + "B,pole,0,0", ",", "\n", "2: more than 1,000 fields"),
                vast("a header without end", "structure,kind,lon,lat", ",note", "\n", "1: more than 1,000 fields"),
                vast("a name without end", "", "structure", "\n", "1: " + tooLong),
                vast("nothing but NUL", HEADER, "\0", "", "2: a control character U+0000"),
                vast(
                        "a cell before text behind its quote",
                        HEADER + "\"B\"",
                        "b",
                        "\n",
                        "2: text after the closing quote"));
    }

    private static List<String> faults(String file, InputStream bytes) {
        Source source = new Source() {
            @Override
            public List<String> names() {
                return List.of(file);
            }

            @Override
            public InputStream open(String name) {
                return bytes;
            }

            @Override
            public void close() {
                // Holds nothing.
            }
        };
        return FolderLoad.load(source, Snapshot.empty().edit()).stream()
                .map(Fault::toString)
                .toList();
    }

    private static void assertTold(Vast vast, long size, List<String> expected) {
        List<String> faults = faults("structures.csv", vast.bytes(size));
        assertThat(faults).hasSameSizeAs(expected);
        for (int index = 0; index < expected.size(); index++) {
            assertThat(faults.get(index)).startsWith("structures.csv:" + expected.get(index));
        }
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("files")
    void is_told_at_its_line(String name, Vast vast, List<String> expected) {
        assertTold(vast, SHARE, expected);
    }

    /** More than any heap of the tests holds. */
    @Tag("slow")
    @ParameterizedTest(name = "{0}")
    @MethodSource("files")
    void of_four_gigabytes_is_told_at_its_line(String name, Vast vast, List<String> expected) {
        assertTold(vast, WHOLE, expected);
    }

    @Test
    void no_more_than_the_longest_row_is_held() throws java.io.IOException {
        Vast vast = new Vast(HEADER + "B,pole,0,0,", "x", "\nC,pole,0,0,\n");
        CsvReader reader = new CsvReader(vast.bytes(SHARE), (line, text) -> {});
        assertThat(reader.first()).isTrue();
        assertThat(reader.next()).isTrue();
        assertThat(reader.line()).isEqualTo(3);
        assertThat(reader.chars().length).isLessThanOrEqualTo(2 * CsvReader.MOST_CHARS);
    }

    @Test
    void a_base_map_is_bounded_as_a_whole_in_one_feature_and_in_one_text() {
        String begin = "{\"type\": \"FeatureCollection\", \"features\": [\n";
        String line = "{\"type\": \"Feature\", \"properties\": {\"layer\": \"water\"}, \"geometry\":"
                + " {\"type\": \"LineString\", \"coordinates\": [";
        Map<Vast, String> expected = Map.of(
                new Vast(begin + line, "[0, 0], ", "[0, 0]]}}]}"),
                "2: cannot be read on from here: a feature of more than half a million positions",
                new Vast(begin + "{\"type\": \"", "x", "\"}]}"),
                "2: is no JSON",
                new Vast(begin, "[", "]}"),
                "2: is no JSON",
                new Vast(begin, "\n", "x]}"),
                "50");
        expected.forEach((vast, fault) -> assertThat(faults("basemap.geojson", vast.bytes(SHARE)))
                .singleElement()
                .asString()
                .startsWith("basemap.geojson:" + fault));
    }
}
