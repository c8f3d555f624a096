package spanwright.exchange;

import static java.nio.charset.StandardCharsets.ISO_8859_1;
import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;
import java.util.zip.Deflater;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;

/**
 * Zips that are broken or mean harm are refused with one sentence. The layout that the tests bend is that of PKWARE
 * APPNOTE 6.3: an entry of the central directory has its flags at 8, its method at 10, its CRC at 16, its packed size
 * at 20, its size at 24, its external attributes at 38; the end record counts entries at 10.
 */
class HostileZipTest {

    private static final String POLES = "structure,kind,lon,lat\nA,pole,0,0\nB,pole,0,1\n";
    private static final int ENTRY = 0x02014B50;
    private static final int LOCAL = 0x04034B50;
    private static final int END = 0x06054B50;

    @TempDir
    Path temp;

    private List<String> faults(Path zip) {
        SnapshotEditor editor = Snapshot.empty().edit();
        return FolderLoad.load(zip, editor, FolderLoad.Progress.NONE).stream()
                .map(Fault::toString)
                .toList();
    }

    private void refused(Path zip, String sentence) {
        assertThat(faults(zip)).singleElement().asString().contains(sentence);
    }

    private Path zip(String... names) throws IOException {
        Path zip = temp.resolve("plant.zip");
        try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(zip))) {
            for (String name : names) {
                out.putNextEntry(new ZipEntry(name));
                out.write(POLES.getBytes(UTF_8));
                out.closeEntry();
            }
        }
        return zip;
    }

    /** Changes bytes behind the first place where a signature stands, lowest byte first. */
    private static Path bent(Path zip, int signature, Consumer<ByteBuffer> change) throws IOException {
        byte[] bytes = Files.readAllBytes(zip);
        ByteBuffer all = ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN);
        int at = 0;
        while (all.getInt(at) != signature) {
            at++;
        }
        change.accept(ByteBuffer.wrap(bytes, at, bytes.length - at).slice().order(ByteOrder.LITTLE_ENDIAN));
        Files.write(zip, bytes);
        return zip;
    }

    @Test
    void a_sound_zip_is_entered() throws IOException {
        assertThat(faults(zip("structures.csv"))).isEmpty();
        assertThat(faults(zip("plant/structures.csv", "plant/"))).isEmpty();
        assertThat(faults(zip("plant/structures.csv", "__MACOSX/structures.csv", "plant/sub/readme.txt")))
                .isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "../structures.csv",
                "../../structures.csv",
                "plant/../../structures.csv",
                "..\\structures.csv",
                "/structures.csv",
                "\\structures.csv",
                "C:\\structures.csv",
                "c:structures.csv",
                "plant/..",
            })
    void a_name_that_lies_outside_is_refused(String name) throws IOException {
        refused(zip("structures.csv", name), "which lies outside of it; pack the files with plain names");
    }

    @ParameterizedTest
    @ValueSource(strings = {"plant\\structures.csv", "./structures.csv", "plant//structures.csv", "plant/./a.csv"})
    void a_name_that_programs_read_differently_is_refused(String name) throws IOException {
        refused(zip("structures.csv", name), "part folders by one /");
    }

    @Test
    void a_name_with_a_line_end_stays_on_one_line() throws IOException {
        assertThat(faults(zip("a\nb.csv"))).singleElement().asString().doesNotContain("\n");
        assertThat(faults(zip("../a\nb.csv"))).singleElement().asString().doesNotContain("\n");
    }

    @Test
    void two_folders_and_a_file_twice_are_refused() throws IOException {
        refused(zip("one/structures.csv", "two/structures.csv"), "several folders with tables, one/ and two/");
        Path zip = zip("structures.csv", "structures.csw");
        byte[] bytes = Files.readAllBytes(zip);
        String text = new String(bytes, ISO_8859_1).replace(".csw", ".csv");
        Files.write(zip, text.getBytes(ISO_8859_1));
        refused(zip, "it holds 'structures.csv' twice");
    }

    @Test
    void a_zip_within_a_zip_and_a_zip_that_holds_itself_are_not_unpacked() throws IOException {
        refused(zip("plant.zip"), "holds no file of a records folder");
        refused(zip("plant/plant.zip"), "holds no file of a records folder");
        refused(zip(), "holds no file of a records folder");
    }

    @Test
    void a_link_is_refused_and_not_followed() throws IOException {
        Path zip = bent(zip("structures.csv"), ENTRY, entry -> entry.putInt(38, 0xA1FF << 16));
        refused(zip, "it holds a link to another file; pack the file itself");
    }

    @Test
    void a_locked_zip_and_an_unknown_packing_are_refused() throws IOException {
        refused(
                bent(zip("structures.csv"), ENTRY, entry -> entry.putShort(8, (short) (entry.getShort(8) | 1))),
                "it is locked with a password");
        refused(bent(zip("structures.csv"), ENTRY, entry -> entry.putShort(10, (short) 14)), "ordinary zip");
    }

    @ParameterizedTest
    @CsvSource({"16, CRC", "24, size"})
    void a_file_that_is_not_as_the_zip_states_is_refused(int at, String what) throws IOException {
        refused(
                bent(zip("structures.csv"), ENTRY, entry -> entry.putInt(at, entry.getInt(at) + 1)),
                "the zip is damaged here; pack the folder anew");
    }

    @Test
    void a_damaged_file_is_refused_whichever_byte_is_damaged() throws IOException {
        Path zip = zip("structures.csv");
        byte[] sound = Files.readAllBytes(zip);
        for (int at = 0; at < sound.length; at++) {
            byte[] bytes = sound.clone();
            bytes[at] ^= (byte) 0xFF;
            Files.write(zip, bytes);
            // Dates, versions and sizes that stand twice do not matter; whatever matters is seen.
            assertThat(faults(zip)).as("byte " + at).hasSizeLessThanOrEqualTo(3);
        }
        for (int length = 0; length < sound.length; length++) {
            Files.write(zip, Arrays.copyOf(sound, length));
            assertThat(faults(zip)).as("cut to " + length).hasSize(1);
        }
    }

    @Test
    void very_many_files_are_refused_before_they_are_held() throws IOException {
        Path zip = temp.resolve("many.zip");
        try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(zip))) {
            for (int file = 0; file <= ZipDirectory.MOST_ENTRIES; file++) {
                out.putNextEntry(new ZipEntry("f" + file));
                out.closeEntry();
            }
        }
        refused(zip, "it holds more than 10,000 files");
        refused(
                bent(zip("structures.csv"), END, end -> end.putShort(10, (short) 0xFFFF)),
                "it holds more than 10,000 files");
        refused(bent(zip("structures.csv"), END, end -> end.putShort(10, (short) 0)), "its list of files is damaged");
        refused(bent(zip("structures.csv"), END, end -> end.putInt(12, -1)), "it holds more than 10,000 files");
        refused(bent(zip("structures.csv"), END, end -> end.putInt(12, 1 << 20)), "its list of files is damaged");
    }

    @Test
    void a_file_that_swells_beyond_reason_is_refused_in_bounded_memory() throws IOException {
        Path zip = temp.resolve("swells.zip");
        try (ZipOutputStream out = new ZipOutputStream(Files.newOutputStream(zip))) {
            out.putNextEntry(new ZipEntry("structures.csv"));
            out.write("structure,kind,lon,lat\n".getBytes(UTF_8));
            blank(out, 40 << 20);
            out.closeEntry();
        }
        assertThat(Files.size(zip)).isLessThan(200_000);
        refused(zip, "the file swells to more than 250 times its packed size");
    }

    @Test
    void a_size_that_is_stated_and_does_not_come_is_not_made_room_for() throws IOException {
        refused(
                bent(zip("structures.csv"), ENTRY, entry -> entry.putInt(24, 0x7FFFFFFF)),
                "the zip is damaged here; pack the folder anew");
        refused(bent(zip("structures.csv"), LOCAL, local -> local.putInt(0, 0)), "cannot be read");
    }

    /** Many names for the same packed bytes: each is within the bound of a file, all together are not. */
    @Test
    void files_that_share_their_bytes_are_bounded_together() throws IOException {
        int size = 40 << 20;
        byte[] packed = packed(size);
        int stated = packed.length * 6;
        ByteBuffer zip = ByteBuffer.allocate(stated + 4096).order(ByteOrder.LITTLE_ENDIAN);
        zip.putInt(LOCAL)
                .putShort((short) 20)
                .putShort((short) 0)
                .putShort((short) 8)
                .position(30);
        zip.put(packed).position(30 + stated);
        int directory = zip.position();
        for (String name : Table.words()) {
            entry(zip, name + ".csv", stated, size);
        }
        int length = zip.position() - directory;
        short count = (short) Table.words().size();
        zip.putInt(END).putInt(0).putShort(count).putShort(count);
        zip.putInt(length).putInt(directory).putShort((short) 0);
        Path file = Files.write(temp.resolve("shared.zip"), Arrays.copyOf(zip.array(), zip.position()));

        assertThat(faults(file))
                .hasSizeLessThanOrEqualTo(2 * Table.words().size())
                .anyMatch(fault -> fault.contains("MiB come out of the zip, as of no records"));
    }

    private static void entry(ByteBuffer zip, String name, int packed, int size) {
        int at = zip.position();
        zip.putInt(ENTRY)
                .putShort((short) 20)
                .putShort((short) 20)
                .putShort((short) 0)
                .putShort((short) 8);
        zip.position(at + 20);
        zip.putInt(packed).putInt(size).putShort((short) name.length()).position(at + 46);
        zip.put(name.getBytes(UTF_8));
    }

    private static byte[] packed(int size) {
        Deflater deflater = new Deflater(9, true);
        byte[] blanks = new byte[size];
        Arrays.fill(blanks, (byte) ' ');
        deflater.setInput(blanks);
        deflater.finish();
        byte[] packed = new byte[size / 100];
        int length = deflater.deflate(packed);
        deflater.end();
        return Arrays.copyOf(packed, length);
    }

    private static void blank(OutputStream out, int size) throws IOException {
        byte[] some = new byte[1 << 16];
        Arrays.fill(some, (byte) ' ');
        for (int written = 0; written < size; written += some.length) {
            out.write(some);
        }
    }
}
