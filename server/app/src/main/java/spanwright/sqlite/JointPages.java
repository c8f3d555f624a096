package spanwright.sqlite;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.paged.PagedRefs;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Joint;
import spanwright.sqlite.rows.ByteReader;
import spanwright.sqlite.rows.ByteWriter;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.Layouts;
import spanwright.sqlite.rows.PackedReader;
import spanwright.sqlite.rows.PackedWriter;

/**
 * The joints in the side file: packed by pages of neighbouring identities, each unpacked when one of its joints is
 * first asked for. Behind the pages stand their offsets and, last of all, how many there are.
 */
final class JointPages {

    private static final Layout JOINT = Layouts.of(RecordKind.JOINT);
    private static final int PAGE = PagedRefs.PAGE;

    private JointPages() {}

    /** Packs all joints of some records. */
    static void write(Records records, SectionWriter section) throws IOException {
        int pages = (records.limit(RecordKind.JOINT) + PAGE - 1) / PAGE;
        ByteWriter packed = new ByteWriter(1 << 14);
        PackedWriter.writeColumns(JOINT.columns(), packed);
        PackedWriter writer = new PackedWriter(JOINT.columns(), packed);
        ByteWriter offsets = new ByteWriter((pages + 2) * Long.BYTES);
        for (int page = 0; page < pages; page++) {
            offsets.fixed(section.length() + packed.size());
            writer.restart();
            for (int id = page * PAGE; id < (page + 1) * PAGE; id++) {
                Recorded joint = records.record(RecordKind.JOINT, id);
                if (joint != null) {
                    JOINT.write(joint, writer);
                    writer.endRow();
                }
            }
            section.put(packed.array(), packed.size());
            packed.clear();
        }
        offsets.fixed(section.length() + packed.size());
        section.put(packed.array(), packed.size());
        offsets.fixed(pages);
        section.put(offsets.array(), offsets.size());
    }

    /** Hands the joints of a section over to records being put together. */
    static void adopt(SectionBytes section, RecordsEditor editor, int count, int limit, List<Integer> planned) {
        int pages = (int) section.longAt(section.length() - Long.BYTES);
        int offsets = section.length() - Long.BYTES * (pages + 2);
        long first = section.longAt(offsets);
        List<Column> columns = PackedReader.columns(new ByteReader(section.copy(0, (int) first), 0));
        PagedRefs<Recorded> joints = PagedRefs.lazy(limit, page -> unpack(section, offsets, page, columns));
        List<Joint> plannedJoints = new ArrayList<>();
        for (int id : planned) {
            if (joints.find(id) instanceof Joint joint) {
                plannedJoints.add(joint);
            }
        }
        editor.adoptJoints(joints, count, limit, plannedJoints);
    }

    private static @Nullable Object[] unpack(SectionBytes section, int offsets, int page, List<Column> columns) {
        @Nullable Object[] joints = new Object[PAGE];
        int from = (int) section.longAt(offsets + page * Long.BYTES);
        int to = (int) section.longAt(offsets + (page + 1) * Long.BYTES);
        byte[] bytes = section.copy(from, to - from);
        ByteReader in = new ByteReader(bytes, 0);
        PackedReader reader = new PackedReader(columns, JOINT.columns(), in);
        while (in.position() < bytes.length) {
            reader.nextRow();
            Recorded joint = JOINT.read(reader);
            joints[joint.id() % PAGE] = joint;
        }
        return joints;
    }
}
