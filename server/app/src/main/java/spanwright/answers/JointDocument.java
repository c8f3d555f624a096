package spanwright.answers;

import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.journal.RecordKind;
import spanwright.network.Network;
import spanwright.splicing.EndRange;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** A range of joints made alike, as an enclosure's document lists it. */
final class JointDocument {

    private static final int MOST_CIRCUITS = 20;
    private static final Comparator<Circuit> FIRST_RESTORED =
            Comparator.comparingInt(Circuit::priority).thenComparing(Circuit::code);

    private final View view;
    private final Changes changes;
    private final Losses losses;

    JointDocument(View view, Changes changes) {
        this.view = view;
        this.changes = changes;
        this.losses = new Losses(view);
    }

    void write(Json json, Joint joint) {
        JointFacts facts = joint.facts();
        json.text("kind", kind(joint));
        json.object("a", side -> ends(side, joint.a())).object("b", side -> ends(side, joint.b()));
        json.whole("count", joint.count()).text("tray", facts.tray()).text("method", method(joint));
        Losses.Known loss = losses.joint(joint);
        json.decibels("loss_db", facts.loss()).decibels("loss_expected_db", loss.expected());
        json.text("basis", loss.basis()).text("source", loss.source());
        json.text("trust", facts.trust().word()).date("verified_on", facts.verifiedOn());
        json.date("spliced_on", facts.splicedOn()).text("spliced_by", facts.splicedBy());
        json.date("temporary_until", facts.temporaryUntil()).text("job", facts.job());
        json.metres("length_m", facts.jumperLength());
        Set<Circuit> circuits = circuits(joint);
        json.texts(
                "circuits",
                circuits.stream().limit(MOST_CIRCUITS).map(Circuit::code).toList());
        json.whole("circuits_total", circuits.size());
        changes.write(json, "changed", RecordKind.JOINT, joint.id());
    }

    private static String kind(Joint joint) {
        return switch (joint.type()) {
            case SPLICE -> "splice";
            case TERMINATION -> "termination";
            case JUMPER -> "jumper";
        };
    }

    private static @Nullable String method(Joint joint) {
        return switch (joint.type()) {
            case SPLICE ->
                joint.facts().method() == null ? null : joint.facts().method().word();
            case TERMINATION -> joint.facts().method() == null ? "direct" : "pigtail";
            case JUMPER -> null;
        };
    }

    private Set<Circuit> circuits(Joint joint) {
        Set<Circuit> circuits = new TreeSet<>(FIRST_RESTORED);
        for (EndRange side : List.of(joint.a(), joint.b())) {
            for (int index = 0; index < side.count(); index++) {
                int end = view.network().endOf(side.key(index));
                if (end != Network.NONE && view.network().joint(end) == joint.id()) {
                    circuits.addAll(view.uses().circuits().through(end >> 1));
                }
            }
        }
        return circuits;
    }

    private void ends(Json json, EndRange range) {
        int owner = range.leg().owner();
        json.text("text", view.names().ends(range))
                .text("kind", kind(range.leg().kind()));
        switch (range.leg().kind()) {
            case BACK, AHEAD -> {
                json.text("of", view.cable(view.records().runRows().get(owner).cable()));
                json.text(
                        "enclosure",
                        view.records()
                                .findPassAt(owner)
                                .map(pass -> view.enclosure(pass.enclosure()))
                                .orElseThrow());
                json.text("side", range.leg().kind() == LegKind.BACK ? "back" : "ahead");
            }
            case IN, OUT -> {
                Splitter splitter = view.records().splitters().get(owner);
                json.text("of", splitter.code())
                        .text("enclosure", view.enclosure(splitter.enclosure()))
                        .none("side");
            }
            case REAR, FRONT -> {
                Panel panel = view.records().panels().get(owner);
                json.text("of", panel.code())
                        .text("enclosure", view.enclosure(panel.enclosure()))
                        .none("side");
            }
        }
        json.text("numbers", range.numbers().toString());
    }

    private static String kind(LegKind kind) {
        return switch (kind) {
            case BACK, AHEAD -> "leg";
            case IN -> "splitter_in";
            case OUT -> "splitter_out";
            case REAR -> "port_rear";
            case FRONT -> "port_front";
        };
    }
}
