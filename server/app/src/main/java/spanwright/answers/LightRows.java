package spanwright.answers;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.planning.NewJoint;
import spanwright.plant.FiberRange;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.Leg;
import spanwright.splicing.Panel;
import spanwright.temporary.LightOffer;

/** Writes a temporary path as the rows of one posting, and of the posting that takes it back. */
final class LightRows {

    private final View view;
    private final RowTexts texts;
    private final @Nullable LocalDate until;

    LightRows(View view, RowTexts texts, @Nullable LocalDate until) {
        this.view = view;
        this.texts = texts;
        this.until = until;
    }

    /** One change of a posting, as {@code POST /postings} takes it. */
    record Change(String action, String table, Map<String, String> key, Map<String, String> row) {}

    /** What to post, and what takes it back. */
    record Posting(List<Change> changes, List<Change> undo) {}

    Posting of(LightOffer offer) {
        List<Change> changes = new ArrayList<>();
        List<Change> undo = new ArrayList<>();
        List<Change> back = new ArrayList<>();
        Set<String> freed = new HashSet<>();
        offer.ways()
                .forEach(way -> way.joints().forEach(joint -> {
                    free(joint.a(), freed, changes, back);
                    free(joint.b(), freed, changes, back);
                }));
        List<Change> moved = new ArrayList<>();
        for (Circuit circuit : offer.moves()) {
            Circuit before = view.records().circuits().get(circuit.id());
            moved.add(move(circuit));
            undo.add(move(before));
        }
        changes.addAll(moved);
        offer.ways()
                .forEach(way -> way.joints().forEach(joint -> {
                    Change added = added(joint);
                    changes.add(added);
                    undo.add(0, new Change("remove", added.table(), key(added), Map.of()));
                }));
        undo.addAll(back);
        return new Posting(changes, undo);
    }

    private Change move(Circuit circuit) {
        return new Change(
                "change",
                "circuits",
                Map.of("circuit", circuit.code()),
                columns("a", ports(circuit.a()), "z", ports(circuit.z())));
    }

    private String ports(PortRange ports) {
        return view.names().ports(ports.panel(), ports.ports());
    }

    /** Takes away the joint in which an end is now, and notes the row that puts it back. */
    private void free(int end, Set<String> freed, List<Change> changes, List<Change> back) {
        int id = view.network().joint(end);
        if (id == 0) {
            return;
        }
        Joint part = part(view.records().joints().get(id), view.network().keyOf(end));
        RowTexts.RowText text = texts.of(view.records(), part);
        Change added = new Change("add", text.table(), Map.of(), text.columns());
        if (freed.add(text.table() + key(added))) {
            changes.add(new Change("remove", text.table(), key(added), Map.of()));
            back.add(added);
        }
    }

    private static Joint part(Joint joint, long key) {
        int index = 0;
        while (joint.a().key(index) != key && joint.b().key(index) != key) {
            index++;
        }
        return new Joint(
                joint.id(),
                joint.type(),
                joint.enclosure(),
                one(joint.a(), index),
                one(joint.b(), index),
                joint.facts());
    }

    private static EndRange one(EndRange ends, int index) {
        return new EndRange(ends.leg(), FiberRange.of(ends.numbers().at(index)));
    }

    private Change added(NewJoint joint) {
        String enclosure = view.records().enclosures().get(joint.enclosure()).code();
        String a = name(joint.a());
        String b = name(joint.b());
        Map<String, String> row = switch (joint.kind()) {
            case SPLICE -> columns("enclosure", enclosure, "a", a, "b", b);
            case TERMINATION -> termination(enclosure, joint);
            case JUMPER -> columns("a", a, "b", b);
        };
        if (until != null) {
            row.put("temporary_until", until.toString());
        }
        String table = switch (joint.kind()) {
            case SPLICE -> "splices";
            case TERMINATION -> "terminations";
            case JUMPER -> "jumpers";
        };
        return new Change("add", table, Map.of(), row);
    }

    private Map<String, String> termination(String enclosure, NewJoint joint) {
        long rear = view.network().keyOf(joint.a());
        Panel panel = view.records().panels().get(EndKey.owner(rear));
        return columns(
                "enclosure",
                enclosure,
                "panel",
                panel.code(),
                "ports",
                Integer.toString(EndKey.number(rear)),
                "end",
                name(joint.b()),
                "method",
                "pigtail");
    }

    private String name(int end) {
        long key = view.network().keyOf(end);
        return view.names()
                .ends(new EndRange(new Leg(EndKey.kind(key), EndKey.owner(key)), FiberRange.of(EndKey.number(key))));
    }

    private static Map<String, String> key(Change added) {
        Map<String, String> key = new LinkedHashMap<>();
        for (String column : List.of("enclosure", "a", "panel", "ports")) {
            String value = added.row().get(column);
            if (value != null) {
                key.put(column, value);
            }
        }
        return key;
    }

    private static Map<String, String> columns(String... namesAndValues) {
        Map<String, String> columns = new LinkedHashMap<>();
        for (int at = 0; at < namesAndValues.length; at += 2) {
            columns.put(namesAndValues[at], namesAndValues[at + 1]);
        }
        return columns;
    }
}
