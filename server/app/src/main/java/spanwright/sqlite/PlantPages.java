package spanwright.sqlite;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.sqlite.rows.ByteReader;
import spanwright.sqlite.rows.ByteWriter;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.Layouts;
import spanwright.sqlite.rows.PackedReader;
import spanwright.sqlite.rows.PackedWriter;

/** The records in the side file, joints left out: kind after kind, and which joints are planned only. */
final class PlantPages {

    private static final int FLUSH = 1 << 18;

    private PlantPages() {}

    static void write(Records records, SectionWriter section) throws IOException {
        for (Layout layout : Layouts.all()) {
            ByteWriter out = new ByteWriter(FLUSH * 2);
            out.varint(records.limit(layout.kind()));
            out.varint(records.count(layout.kind()));
            if (layout.kind() != RecordKind.JOINT) {
                writeRows(records, layout, out, section);
            }
            section.put(out.array(), out.size());
        }
        ByteWriter planned = new ByteWriter(1024);
        for (String job : records.plannedJobs()) {
            for (int joint : records.plannedJoints(job)) {
                planned.varint(joint);
            }
        }
        planned.varint(0);
        section.put(planned.array(), planned.size());
    }

    private static void writeRows(Records records, Layout layout, ByteWriter out, SectionWriter section)
            throws IOException {
        PackedWriter.writeColumns(layout.columns(), out);
        PackedWriter writer = new PackedWriter(layout.columns(), out);
        for (int id = 0; id < records.limit(layout.kind()); id++) {
            Recorded record = records.record(layout.kind(), id);
            if (record != null) {
                layout.write(record, writer);
                writer.endRow();
                if (out.size() > FLUSH) {
                    section.put(out.array(), out.size());
                    out.clear();
                }
            }
        }
    }

    /** Puts the records of a section together, and takes the joints from theirs. */
    static Records read(SectionBytes section, SectionBytes joints, int posting) {
        RecordsEditor editor = Records.empty().edit();
        ByteReader in = new ByteReader(section.copy(0, section.length()), 0);
        int jointLimit = 0;
        int jointCount = 0;
        for (Layout layout : Layouts.all()) {
            int limit = in.count();
            int count = in.count();
            if (layout.kind() == RecordKind.JOINT) {
                jointLimit = limit;
                jointCount = count;
            } else {
                readRows(layout, count, in, editor);
                editor.reserveIdentities(layout.kind(), limit);
            }
        }
        List<Integer> planned = new ArrayList<>();
        for (int joint = in.count(); joint != 0; joint = in.count()) {
            planned.add(joint);
        }
        JointPages.adopt(joints, editor, jointCount, jointLimit, planned);
        return editor.build(posting);
    }

    private static void readRows(Layout layout, int count, ByteReader in, RecordsEditor editor) {
        List<Column> columns = PackedReader.columns(in);
        PackedReader reader = new PackedReader(columns, layout.columns(), in);
        for (int row = 0; row < count; row++) {
            reader.nextRow();
            editor.apply(Change.add(layout.read(reader)));
        }
    }
}
