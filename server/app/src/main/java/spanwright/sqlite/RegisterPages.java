package spanwright.sqlite;

import java.io.IOException;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.sqlite.rows.ByteReader;
import spanwright.sqlite.rows.ByteWriter;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.PackedReader;
import spanwright.sqlite.rows.PackedWriter;

/**
 * The records of one kind in the side file: packed by pages of neighbouring identities, each unpacked when one of its
 * records is first asked for. Their columns stand before the pages; behind them their offsets and, last of all, where
 * the register begins, how many pages and records there are, and the limit of their identities.
 */
final class RegisterPages {

    private static final int PAGE = PagedRefs.PAGE;
    private static final int TAIL = 4;

    private final SectionBytes section;
    private final Layout layout;
    private final int begin;
    private final int pages;
    private final int count;
    private final int limit;
    private final int offsets;

    private RegisterPages(SectionBytes section, int end, Layout layout) {
        this.section = section;
        this.layout = layout;
        int tail = end - TAIL * Long.BYTES;
        this.begin = (int) section.longAt(tail);
        this.pages = (int) section.longAt(tail + Long.BYTES);
        this.count = (int) section.longAt(tail + 2 * Long.BYTES);
        this.limit = (int) section.longAt(tail + 3 * Long.BYTES);
        this.offsets = tail - Long.BYTES * (pages + 1);
    }

    /** Packs all records of a kind behind what is in a section already. */
    static void write(Records records, Layout layout, SectionWriter section) throws IOException {
        int pages = (records.limit(layout.kind()) + PAGE - 1) / PAGE;
        ByteWriter offsets = new ByteWriter((pages + 1 + TAIL) * Long.BYTES);
        long begin = section.length();
        ByteWriter packed = new ByteWriter(1 << 14);
        PackedWriter.writeColumns(layout.columns(), packed);
        PackedWriter writer = new PackedWriter(layout.columns(), packed);
        for (int page = 0; page < pages; page++) {
            offsets.fixed(section.length() + packed.size());
            writer.restart();
            writePage(records, layout, page, writer);
            section.put(packed.array(), packed.size());
            packed.clear();
        }
        offsets.fixed(section.length() + packed.size());
        section.put(packed.array(), packed.size());
        offsets.fixed(begin);
        offsets.fixed(pages);
        offsets.fixed(records.count(layout.kind()));
        offsets.fixed(records.limit(layout.kind()));
        section.put(offsets.array(), offsets.size());
    }

    private static void writePage(Records records, Layout layout, int page, PackedWriter writer) {
        int end = Math.min((page + 1) * PAGE, records.limit(layout.kind()));
        for (int id = page * PAGE; id < end; id++) {
            Recorded record = records.record(layout.kind(), id);
            if (record != null) {
                layout.write(record, writer);
                writer.endRow();
            }
        }
    }

    /**
     * Hands the records of a kind over to records being put together.
     *
     * @param end where in the section the kind's bytes end
     * @return where they begin
     * @throws IOException where they were packed with other columns than today's
     */
    static int adopt(SectionBytes section, int end, Layout layout, RecordsEditor editor) throws IOException {
        RegisterPages register = new RegisterPages(section, end, layout);
        int first = (int) section.longAt(register.offsets);
        List<Column> columns =
                PackedReader.columns(new ByteReader(section.copy(register.begin, first - register.begin), 0));
        if (!columns.equals(layout.columns())) {
            throw new IOException("its " + layout.table() + " table has other columns");
        }
        editor.adopt(layout.kind(), PagedRefs.lazy(register.limit, register::unpack), register.count, register.limit);
        return register.begin;
    }

    private @Nullable Object[] unpack(int page) {
        @Nullable Object[] records = new Object[PAGE];
        int from = (int) section.longAt(offsets + page * Long.BYTES);
        int to = (int) section.longAt(offsets + (page + 1) * Long.BYTES);
        byte[] bytes = section.copy(from, to - from);
        ByteReader in = new ByteReader(bytes, 0);
        PackedReader reader = new PackedReader(layout.columns(), layout.columns(), in);
        while (in.position() < bytes.length) {
            reader.nextRow();
            Recorded record = layout.read(reader);
            records[record.id() % PAGE] = record;
        }
        return records;
    }
}
