package spanwright.sqlite;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import spanwright.journal.RecordKind;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.Joint;
import spanwright.sqlite.rows.ByteReader;
import spanwright.sqlite.rows.ByteWriter;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.Layouts;

/** The records in the side file: which joints are planned only, then kind after kind; the joints in a section apart. */
final class PlantPages {

    private PlantPages() {}

    static void write(Records records, SectionWriter section) throws IOException {
        ByteWriter planned = new ByteWriter(1024);
        for (String job : records.plannedJobs()) {
            for (int joint : records.plannedJoints(job)) {
                planned.varint(joint);
            }
        }
        planned.varint(0);
        section.put(planned.array(), planned.size());
        for (Layout layout : Layouts.all()) {
            if (layout.kind() != RecordKind.JOINT) {
                RegisterPages.write(records, layout, section);
            }
        }
    }

    static void writeJoints(Records records, SectionWriter section) throws IOException {
        RegisterPages.write(records, Layouts.of(RecordKind.JOINT), section);
    }

    /**
     * Puts the records together: no more than where they lie is read now.
     *
     * @throws IOException where they are not as this version keeps them
     */
    static Records read(SectionBytes section, SectionBytes joints, int posting) throws IOException {
        RecordsEditor editor = Records.empty().edit();
        List<Layout> layouts = Layouts.all();
        int end = section.length();
        for (int index = layouts.size() - 1; index >= 0; index--) {
            if (layouts.get(index).kind() != RecordKind.JOINT) {
                end = RegisterPages.adopt(section, end, layouts.get(index), editor);
            }
        }
        RegisterPages.adopt(joints, joints.length(), Layouts.of(RecordKind.JOINT), editor);
        for (int id : planned(new ByteReader(section.copy(0, end), 0))) {
            if (editor.record(RecordKind.JOINT, id) instanceof Joint joint) {
                editor.adoptPlanned(joint);
            }
        }
        return editor.build(posting);
    }

    private static List<Integer> planned(ByteReader in) {
        List<Integer> planned = new ArrayList<>();
        for (int joint = in.count(); joint != 0; joint = in.count()) {
            planned.add(joint);
        }
        return planned;
    }
}
