package spanwright.sqlite.rows;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.Setting;

class PackedRowsTest {

    @ParameterizedTest
    @EnumSource(RecordKind.class)
    void records_of_every_kind_come_back_as_they_were(RecordKind kind) {
        for (long seed = 0; seed < 20; seed++) {
            SampleRecords samples = new SampleRecords(seed);
            List<Recorded> records = IntStream.range(1, 60)
                    .mapToObj(id -> samples.draw(kind, id))
                    .toList();

            assertThat(read(Layouts.of(kind), write(records)))
                    .as("seed %d", seed)
                    .isEqualTo(records);
        }
    }

    private static byte[] write(List<Recorded> records) {
        Layout layout = Layouts.of(records.get(0).kind());
        ByteWriter out = new ByteWriter(0);
        PackedWriter.writeColumns(layout.columns(), out);
        PackedWriter writer = new PackedWriter(layout.columns(), out);
        for (Recorded record : records) {
            layout.write(record, writer);
            writer.endRow();
        }
        out.octet(0);
        return out.copy();
    }

    private static List<Recorded> read(Layout layout, byte[] bytes) {
        ByteReader in = new ByteReader(bytes, 0);
        PackedReader reader = new PackedReader(PackedReader.columns(in), layout.columns(), in);
        List<Recorded> records = new ArrayList<>();
        while (in.position() < bytes.length - 1) {
            reader.nextRow();
            records.add(layout.read(reader));
        }
        return records;
    }

    @ParameterizedTest(name = "seed {0}")
    @ValueSource(longs = {1, 2, 3})
    void changes_of_all_kinds_come_back_in_order(long seed) {
        SampleRecords samples = new SampleRecords(seed);
        List<Change> changes = new ArrayList<>();
        for (int id = 1; id < 2000; id++) {
            RecordKind kind = RecordKind.values()[id / 7 % RecordKind.values().length];
            Recorded one = samples.draw(kind, id);
            Recorded other = samples.draw(kind, id);
            changes.add(
                    switch (id % 3) {
                        case 0 -> Change.add(one);
                        case 1 -> Change.remove(one);
                        default -> Change.replace(one, other);
                    });
        }
        List<Change> found = new ArrayList<>();
        ChangePacker.pack(changes, page -> found.addAll(ChangePacker.unpack(page)));

        assertThat(found).isEqualTo(changes);
    }

    @Test
    void many_changes_are_parted_into_pages_that_stay_small() {
        List<Change> changes = new ArrayList<>();
        for (int id = 1; id <= 5000; id++) {
            changes.add(Change.add(new Setting(id, "name " + id, "value " + id)));
        }
        List<ChangePacker.Page> pages = new ArrayList<>();
        ChangePacker.pack(changes, pages::add);

        assertThat(pages).hasSizeGreaterThan(2).allSatisfy(page -> {
            assertThat(page.table()).isEqualTo("setting");
            assertThat(page.rows().length).isBetween(1000, 40_000);
        });
    }

    @Test
    void rows_that_count_on_or_stay_the_same_take_a_byte() {
        List<Column> columns = List.of(new Column("id", ColumnType.INTEGER), new Column("trust", ColumnType.TEXT));
        ByteWriter out = new ByteWriter(0);
        PackedWriter writer = new PackedWriter(columns, out);
        for (int id = 1; id <= 1000; id++) {
            writer.integer(id);
            writer.text("posted");
            writer.endRow();
        }

        assertThat(writer.rows()).isEqualTo(1000);
        assertThat(out.size()).isLessThan(1020);
    }

    @Test
    void whole_numbers_of_any_size_come_back() {
        long[] numbers = {
            0, 1, -1, Long.MAX_VALUE, Long.MIN_VALUE, Long.MAX_VALUE, 5, 1L << 61, -(1L << 60), 0, 0, 7, 14, 21
        };
        List<Column> columns = List.of(new Column("n", ColumnType.INTEGER));
        ByteWriter out = new ByteWriter(0);
        PackedWriter writer = new PackedWriter(columns, out);
        for (long number : numbers) {
            writer.integer(number);
            writer.endRow();
            writer.none();
            writer.endRow();
        }
        PackedReader reader = new PackedReader(columns, columns, new ByteReader(out.copy(), 0));
        for (long number : numbers) {
            reader.nextRow();
            assertThat(reader.passNone()).isFalse();
            assertThat(reader.integer()).isEqualTo(number);
            reader.nextRow();
            assertThat(reader.passNone()).isTrue();
        }
    }

    @Test
    void a_page_of_an_older_layout_is_read_by_the_names_of_its_columns() {
        List<Column> then = List.of(
                new Column("id", ColumnType.INTEGER),
                new Column("gone", ColumnType.REAL),
                new Column("value", ColumnType.TEXT),
                new Column("bytes", ColumnType.BLOB));
        List<Column> now = List.of(
                new Column("value", ColumnType.TEXT),
                new Column("fresh", ColumnType.TEXT),
                new Column("id", ColumnType.INTEGER));
        ByteWriter out = new ByteWriter(0);
        PackedWriter.writeColumns(then, out);
        PackedWriter writer = new PackedWriter(then, out);
        for (int id = 1; id < 4; id++) {
            writer.integer(id);
            writer.real(0.5);
            writer.text("v" + id / 2);
            writer.blob(new byte[] {1, 2, 3});
            writer.endRow();
        }
        ByteReader in = new ByteReader(out.copy(), 0);
        PackedReader reader = new PackedReader(PackedReader.columns(in), now, in);
        for (int id = 1; id < 4; id++) {
            reader.nextRow();
            assertThat(reader.text()).isEqualTo("v" + id / 2);
            assertThat(reader.textIfAny()).isNull();
            assertThat(reader.number()).isEqualTo(id);
        }
    }

    @Test
    void a_new_page_foretells_nothing_from_the_one_before() {
        List<Column> columns = List.of(new Column("id", ColumnType.INTEGER), new Column("word", ColumnType.TEXT));
        ByteWriter out = new ByteWriter(0);
        PackedWriter writer = new PackedWriter(columns, out);
        writer.integer(7);
        writer.text("seven");
        writer.endRow();
        writer.restart();
        int second = out.size();
        writer.integer(7);
        writer.text("seven");
        writer.endRow();
        byte[] bytes = out.copy();

        PackedReader reader = new PackedReader(columns, columns, new ByteReader(bytes, second));
        reader.nextRow();
        assertThat(reader.number()).isEqualTo(7);
        assertThat(reader.text()).isEqualTo("seven");
        reader.restart(new ByteReader(bytes, 0));
        reader.nextRow();
        assertThat(reader.number()).isEqualTo(7);
    }

    @Test
    void a_row_that_does_not_fit_its_columns_is_a_bug() {
        List<Column> columns = List.of(new Column("id", ColumnType.INTEGER), new Column("word", ColumnType.TEXT));
        PackedWriter writer = new PackedWriter(columns, new ByteWriter(0));

        assertThatThrownBy(() -> writer.text("id")).isInstanceOf(IllegalStateException.class);
        writer.integer(1);
        assertThatThrownBy(writer::endRow).isInstanceOf(IllegalStateException.class);
        List<Column> many = IntStream.range(0, 65)
                .mapToObj(number -> new Column("c" + number, ColumnType.INTEGER))
                .toList();
        assertThatThrownBy(() -> new PackedWriter(many, new ByteWriter(0)))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void bytes_that_end_too_soon_or_make_no_sense_are_refused() {
        List<Change> changes = List.of(Change.add(new Setting(1, "owner", "Valley Fiber")));
        List<ChangePacker.Page> pages = new ArrayList<>();
        ChangePacker.pack(changes, pages::add);
        byte[] whole = pages.get(0).rows();
        for (int length = 0; length < whole.length; length++) {
            byte[] torn = java.util.Arrays.copyOf(whole, length);
            assertThatThrownBy(() -> ChangePacker.unpack(new ChangePacker.Page("setting", torn)))
                    .as("%d of %d bytes", length, whole.length)
                    .isInstanceOf(RuntimeException.class);
        }
        assertThatThrownBy(() -> ChangePacker.unpack(new ChangePacker.Page("no_such_table", whole)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("no_such_table");
        assertThatThrownBy(() -> PlantLayouts.STATES.value("in disrepair"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("in disrepair");
    }
}
