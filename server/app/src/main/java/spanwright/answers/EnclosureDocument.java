package spanwright.answers;

import java.util.Comparator;
import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plant.Structure;
import spanwright.records.Relation;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** The document of an enclosure: its legs, every fiber's state, its joints, panels and splitters. */
public final class EnclosureDocument {

    private static final int MOST_CIRCUITS = 20;

    private final View view;
    private final Changes changes;
    private final Enclosure enclosure;
    private final JointsHere joints;

    /** Of an enclosure as a view shows it. */
    public EnclosureDocument(View view, Changes changes, Enclosure enclosure) {
        this.view = view;
        this.changes = changes;
        this.enclosure = enclosure;
        this.joints = new JointsHere(view, enclosure);
    }

    /** Writes its members. */
    public void write(Json json) {
        Structure structure = view.records().structures().get(enclosure.structure());
        json.text("code", enclosure.code()).text("kind", enclosure.type().word());
        json.text("structure", structure.code())
                .text("structure_kind", structure.type().word());
        json.place(structure.position()).text("state", enclosure.state().word()).text("note", enclosure.note());
        json.metres("tray_glass_m", enclosure.trayGlass());
        json.list("legs", this::legs);
        JointDocument document = new JointDocument(view, changes);
        json.list("joints", joints.list(), document::write);
        json.list("panels", panels(), this::panel);
        json.list("splitters", splitters(), this::splitter);
        changes.write(json, "changed", RecordKind.ENCLOSURE, enclosure.id());
        json.whole("posting", view.posting());
    }

    private void legs(Json json) {
        LegDocument document = new LegDocument(view, joints);
        List<Pass> passes = view.records()
                .passes()
                .owned(Relation.ENCLOSURE_PASSES, enclosure.id())
                .sorted(Comparator.comparing((Pass pass) -> view.cable(pass.cable()))
                        .thenComparing(pass ->
                                view.records().runRows().get(pass.runRow()).seq()))
                .toList();
        for (Pass pass : passes) {
            RunRow row = view.records().runRows().get(pass.runRow());
            int last = view.lay(pass.cable()).rows().size() - 1;
            if (row.seq() > 0) {
                json.objectHere(item -> document.write(item, pass, row, LegKind.BACK));
            }
            if (row.seq() < last) {
                json.objectHere(item -> document.write(item, pass, row, LegKind.AHEAD));
            }
        }
    }

    private List<Panel> panels() {
        return view.records()
                .panels()
                .owned(Relation.ENCLOSURE_PANELS, enclosure.id())
                .sorted(Comparator.comparing(Panel::code))
                .toList();
    }

    private void panel(Json json, Panel panel) {
        json.text("panel", panel.code()).text("connector", panel.connector());
        json.list(
                "ports",
                IntStream.rangeClosed(1, panel.ports()).boxed().toList(),
                (item, number) -> port(item, panel, number));
    }

    private void port(Json json, Panel panel, int number) {
        long rear = EndKey.of(LegKind.REAR, panel.id(), number);
        long front = EndKey.of(LegKind.FRONT, panel.id(), number);
        Joint termination = joints.findAt(rear);
        Joint jumper = joints.findAt(front);
        json.whole("port", number).text("rear", joinedTo(rear));
        json.text(
                "rear_trust",
                termination == null ? null : termination.facts().trust().word());
        json.whole("rear_joint", termination == null ? null : joints.index(termination));
        List<Circuit> circuits = view.uses().circuits().endingOn(panel.id(), number);
        boolean jumpered = jumper != null && jumper.type() == JointKind.JUMPER;
        String free = circuits.isEmpty() ? "free" : "circuits";
        json.text("front", jumpered ? "jumper" : free).text("jumper_to", joinedTo(front));
        json.texts(
                "circuits",
                circuits.stream().limit(MOST_CIRCUITS).map(Circuit::code).toList());
        json.whole("circuits_total", circuits.size());
    }

    private @Nullable String joinedTo(long key) {
        int end = view.network().endOf(key);
        int peer = end == Network.NONE ? Network.NONE : view.network().peer(end);
        return peer == Network.NONE ? null : view.names().end(view.network().keyOf(peer));
    }

    private List<Splitter> splitters() {
        return view.records()
                .splitters()
                .owned(Relation.ENCLOSURE_SPLITTERS, enclosure.id())
                .sorted(Comparator.comparing(Splitter::code))
                .toList();
    }

    private void splitter(Json json, Splitter splitter) {
        Losses losses = new Losses(view);
        json.text("splitter", splitter.code())
                .whole("inputs", splitter.inputs())
                .whole("outputs", splitter.outputs());
        json.list("terminals", terminals -> {
            for (int input = 1; input <= splitter.inputs(); input++) {
                int number = input;
                terminals.objectHere(item -> terminal(item, splitter, LegKind.IN, number, losses));
            }
            for (int output = 1; output <= splitter.outputs(); output++) {
                int number = output;
                terminals.objectHere(item -> terminal(item, splitter, LegKind.OUT, number, losses));
            }
        });
        json.text("source", losses.splitter(splitter, 1).source());
    }

    private void terminal(Json json, Splitter splitter, LegKind kind, int number, Losses losses) {
        long key = EndKey.of(kind, splitter.id(), number);
        boolean input = kind == LegKind.IN;
        Joint joint = joints.findAt(key);
        String name = input ? (number == 1 ? "in" : "in " + number) : "out " + number;
        json.text("terminal", name).text("joined_to", joinedTo(key));
        json.whole("joint", joint == null ? null : joints.index(joint));
        Losses.Known loss = input ? Losses.NOTHING : losses.splitter(splitter, number);
        json.decibels("loss_db", input ? null : loss.expected()).text("loss_basis", loss.basis());
        int piece = view.network()
                .splitterBlock(splitter.id())
                .map((Block block) -> block.piece(input ? number : splitter.inputs() + number))
                .orElse(Network.NONE);
        json.whole(
                "circuits_total",
                piece == Network.NONE
                        ? 0
                        : view.uses().circuits().through(piece).size());
    }
}
