package spanwright.answers;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import spanwright.network.Block;
import spanwright.network.Network;
import spanwright.planning.FiberUse;
import spanwright.plant.CableType;
import spanwright.plant.Enclosure;
import spanwright.plant.Pass;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.SheathPositions;
import spanwright.plant.SheathTie;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.splicing.EndKey;
import spanwright.splicing.EndState;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;

/** A cable as seen from an enclosure in one direction: where it goes, and the state of every fiber's end. */
final class LegDocument {

    private final View view;
    private final JointsHere joints;

    LegDocument(View view, JointsHere joints) {
        this.view = view;
        this.joints = joints;
    }

    void write(Json json, Pass pass, RunRow row, LegKind side) {
        CableLay lay = view.lay(pass.cable());
        CableType type = lay.type();
        Colors colors = new Colors(view, type);
        boolean back = side == LegKind.BACK;
        json.text("cable", lay.cable().code())
                .text("side", back ? "back" : "ahead")
                .whole("seq", row.seq());
        json.text("cable_type", type.code()).whole("fibers", type.fibers());
        json.whole("fibers_per_tube", type.fibersPerTube()).flag("ribbon", type.ribbon());
        json.texts("tube_colors", colors.tubes()).texts("fiber_colors", colors.places());
        place(json, lay, row.seq(), back);
        Optional<Block> section =
                back ? view.network().sectionBack(row.id()) : view.network().sectionAhead(row.id());
        List<Alike<EndSaid>> ends = Alike.of(
                type.fibers(),
                fiber ->
                        section.map(block -> end(block, back, side, row, fiber)).orElse(EndSaid.NOT_IN_SERVICE));
        json.list("ends", ends, (item, alike) -> alike.what().write(item.text("fibers", alike.numbers())));
    }

    private void place(Json json, CableLay lay, int seq, boolean back) {
        SheathPositions positions = lay.positions();
        int next = back ? seq - 1 : seq + 1;
        int entered = next;
        while (lay.findEnclosure(entered).isEmpty()
                && entered > 0
                && entered < lay.rows().size() - 1) {
            entered += back ? -1 : 1;
        }
        Optional<Enclosure> to = lay.findEnclosure(entered);
        Length here = positions.enclosure(seq);
        Length there = positions.enclosure(entered);
        Length sheath = there.minus(here).abs();
        json.text("to_structure", lay.structure(next).code());
        json.text("to_enclosure", to.map(Enclosure::code).orElse(null));
        json.number("bearing_deg", bearing(lay, seq, back)).metres("sheath_position_m", here);
        json.metres("sheath_m", sheath).metres("glass_m", glass(lay, seq, to, sheath));
        json.text("length_basis", (back ? positions.basis(there, here) : positions.basis(here, there)).word());
        mark(json, lay, seq, back);
    }

    private static Length glass(CableLay lay, int seq, Optional<Enclosure> to, Length sheath) {
        Length tray = lay.findEnclosure(seq).map(Enclosure::trayGlass).orElse(Length.ZERO);
        return lay.glass(sheath).plus(tray).plus(to.map(Enclosure::trayGlass).orElse(Length.ZERO));
    }

    private static @Nullable Double bearing(CableLay lay, int seq, boolean back) {
        List<Position> line = lay.route(back ? seq : seq + 1).line().positions();
        if (back) {
            line = new ArrayList<>(line);
            Collections.reverse(line);
        }
        return Bearing.leaving(line);
    }

    /** The mark of the governing ink that was read where the sheath enters on this side. */
    private static void mark(Json json, CableLay lay, int seq, boolean back) {
        Optional<SheathTie> tie = lay.positions().ties().stream()
                .filter(each -> each.row() == seq && each.out() != back)
                .findFirst();
        if (tie.isEmpty()) {
            json.none("mark");
            return;
        }
        json.object(
                "mark",
                item -> item.number("value", tie.get().number())
                        .text("unit", tie.get().unit().symbol())
                        .text("ink", lay.cable().marksInk())
                        .date("read_on", tie.get().readOn()));
    }

    private EndSaid end(Block section, boolean back, LegKind side, RunRow row, int fiber) {
        int end = 2 * section.piece(fiber) + (back ? 1 : 0);
        long key = EndKey.of(side, row.id(), fiber);
        FiberUse use = view.uses().of(section, fiber).use();
        Joint joint = joints.findAt(key);
        if (joint != null) {
            String state = joint.type() == JointKind.TERMINATION ? "terminated" : "spliced";
            LocalDate verified = joint.facts().verifiedOn();
            return new EndSaid(state, joint.facts().trust().word(), verified, use, joints.index(joint));
        }
        EndState recorded = view.endStates().find(key);
        if (recorded != null) {
            String state = recorded.condition().word();
            return new EndSaid(state, recorded.trust().word(), recorded.verifiedOn(), use, null);
        }
        boolean uncut = view.network().peer(end) != Network.NONE;
        String through = view.endStates().isTubeOpened(key) ? "through" : "unrecorded";
        return new EndSaid(uncut ? through : "unknown", null, null, use, null);
    }

    /** What is said of one end. */
    private record EndSaid(
            String state,
            @Nullable String trust,
            @Nullable LocalDate verifiedOn,
            FiberUse use,
            @Nullable Integer joint) {

        private static final EndSaid NOT_IN_SERVICE =
                new EndSaid("unrecorded", null, null, FiberUse.SPARE_UNKNOWN, null);

        void write(Json json) {
            json.text("state", state).text("trust", trust).date("verified_on", verifiedOn);
            json.text("use", use.word()).whole("joint", joint);
        }
    }
}
